import { useEffect, useRef, useState } from 'react';
import type { TopicDto } from '#shared/schemas/curriculum.ts';

/**
 * The topic whose merging is being asked about. Its row is gone once that is done, with the button that had the focus,
 * which goes to the heading of the list instead. @param headingId of that heading, which can take the focus
 */
export function useMerging(headingId: string) {
  const [from, setFrom] = useState<TopicDto | null>(null);
  const isMerged = useRef(false);
  useEffect(() => {
    if (from !== null || !isMerged.current) return;
    isMerged.current = false;
    document.getElementById(headingId)?.focus();
  }, [from, headingId]);
  const end = () => setFrom(null);
  return {
    from,
    ask: setFrom,
    onClose: end,
    onMerged: () => {
      isMerged.current = true;
      end();
    },
  };
}
