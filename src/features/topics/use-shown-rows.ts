import { useState } from 'react';

const FIRST_ROWS = 12;

/** The first rows of a long group, and the rest on request. */
export function useShownRows<Row>(rows: Row[]) {
  const [isWhole, setIsWhole] = useState(false);
  const shown = isWhole ? rows : rows.slice(0, FIRST_ROWS);
  return { shown, hiddenCount: rows.length - shown.length, showAll: () => setIsWhole(true) };
}
