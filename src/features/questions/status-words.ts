import type { QuestionDto, QuestionVersionDto, VersionStatus } from '#shared/schemas/question.ts';
import { dayMonthWords, dayOf } from '#src/lib/dates.ts';
import type { SaveState } from './draft-saver.ts';

const statusInSentence: Record<VersionStatus, string> = {
  draft: 'draft',
  inReview: 'in review',
  live: 'live',
  superseded: 'superseded',
  retired: 'retired',
};

/** "just now", "2 minutes ago", "3 hours ago", "on 6 January". */
function agoWords(instant: string, now: number, zone: string): string {
  const minutes = Math.floor((now - Date.parse(instant)) / 60_000);
  if (minutes < 1) return 'just now';
  if (minutes < 60) return `${minutes} minute${minutes === 1 ? '' : 's'} ago`;
  const hours = Math.floor(minutes / 60);
  if (hours < 24) return `${hours} hour${hours === 1 ? '' : 's'} ago`;
  return `on ${dayMonthWords(dayOf(instant, zone))}`;
}

/** How the save of the draft stands, as a phrase; null where nothing was typed since it was opened. */
export function saveWords(state: SaveState, savedAt: string): string | null {
  switch (state.kind) {
    case 'clean':
      return null;
    case 'unsaved':
      return 'Changes not saved yet';
    case 'saving':
      return 'Saving…';
    case 'saved':
      return `Saved ${savedAt}`;
    case 'failed':
      return {
        stale: 'Not saved',
        moved: 'Not saved',
        offline: 'Not saved: offline, kept here and tried again',
        busy: 'Not saved: kept here and tried again',
        signedOut: 'Not saved: you are signed out',
        refused: 'Not saved',
      }[state.why.kind];
  }
}

/** What happened to a draft while it was being written on. */
export function movedWords({ version, status, reviewer }: QuestionVersionDto): string {
  if (status === 'inReview') return `Version ${version} was sent for review meanwhile, and is not changed there.`;
  const by = reviewer ? ` by ${reviewer.name}` : '';
  return status === 'live'
    ? `Version ${version} was put live${by} meanwhile. A change to it is a new version.`
    : `Version ${version} is ${statusInSentence[status]} meanwhile.`;
}

/**
 * "Version 3, draft, saved 2 minutes ago. Version 2 is live."
 * @param hasSaving true where the state of saving is said beside it, so that the time is not said twice
 */
export function statusWords(question: QuestionDto, now: number, zone: string, hasSaving = false): string {
  const { current, live } = question;
  const first = `Version ${current.version}, ${statusInSentence[current.status]}`;
  const when =
    current.status === 'inReview' && current.sentAt
      ? `, by ${current.author.name}, sent ${agoWords(current.sentAt, now, zone)}`
      : current.status === 'live' && current.liveAt
        ? ` since ${dayMonthWords(dayOf(current.liveAt, zone))}`
        : hasSaving
          ? ''
          : `, saved ${agoWords(current.savedAt, now, zone)}`;
  const also = live && live.id !== current.id ? ` Version ${live.version} is live.` : '';
  return `${first}${when}.${also}`;
}
