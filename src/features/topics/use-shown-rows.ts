import { useState } from 'react';

/** The first rows of a long list, and the rest on request. */
export function useShownRows<Row>(rows: Row[], first: number) {
  const [isWhole, setIsWhole] = useState(false);
  const shown = isWhole ? rows : rows.slice(0, first);
  return { shown, hiddenCount: rows.length - shown.length, showAll: () => setIsWhole(true) };
}
