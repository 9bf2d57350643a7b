import { useSyncExternalStore } from 'react';
import { hideTime, isTimeHidden } from '#src/lib/hidden-time.ts';

let isHidden = isTimeHidden();
const listeners = new Set<() => void>();

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function toggle(): void {
  isHidden = !isHidden;
  hideTime(isHidden);
  for (const listener of listeners) listener();
}

/** Whether the time of a set is hidden on this device, through all its questions, and the way to change it. */
export function useHiddenTime(): { isHidden: boolean; toggle: () => void } {
  return { isHidden: useSyncExternalStore(subscribe, () => isHidden), toggle };
}
