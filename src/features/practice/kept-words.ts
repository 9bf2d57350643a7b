import type { Keeping } from '#src/lib/kept-store.ts';
import type { Away } from './use-answer-queue.ts';

/** What has to stay open until everything is sent; nothing where it outlives the browser. */
const untilThen: Record<Keeping, string> = {
  device: 'If you close it, they go when you next open Plait.',
  tab: 'Keep it open until then.',
  page: 'This browser stores nothing, so do not close or reload it until then.',
};

/** "Your answers are kept on this page and sent when you are back. Keep it open until then." */
export function keptUntilSent(what: string, keeping: Keeping, away: NonNullable<Away>): string {
  const where = keeping === 'device' ? 'device' : 'page';
  const when = away === 'offline' ? 'you are back' : 'it has time';
  return `${what} kept on this ${where} and sent when ${when}. ${untilThen[keeping]}`;
}

/** "Kept on this device". */
export const keptHeading = (keeping: Keeping): string =>
  keeping === 'device' ? 'Kept on this device' : 'Kept on this page';

/** What to do about one answer that waits. */
export const keptAdvice: Record<Keeping, string> = {
  device: 'The mark appears when you are back. If you close Plait, the answer goes when you next open it.',
  tab: 'The mark appears when you are back. Keep this page open until then.',
  page: 'The mark appears when you are back. This browser stores nothing: do not close or reload this page until then.',
};
