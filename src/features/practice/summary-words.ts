import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { type Standing, standingWords } from '#shared/schemas/standing.ts';

type Row = SetSummaryDto['topics'][number];

export interface Change extends Pick<Row, 'subject' | 'topic'> {
  /** "Weak to developing, about 62% on the day"; without a figure where there is not enough yet. */
  words: string;
  standing: Standing;
}

const lower = (standing: Standing): string => standingWords[standing].toLowerCase();

function changeOf({ before, after, subject, topic, maxMarks }: Row): Change | null {
  // Nothing of it is marked yet, so nothing has changed.
  if (!after || maxMarks === 0) return null;
  const { standing, recallOnDay } = after;
  const change = (words: string): Change => ({ subject, topic, standing, words });
  if (before?.standing === standing && standing !== 'weak') return null;
  // Where there is not enough yet, no figure is given.
  if (standing === 'notEnough') {
    return change(before ? `${standingWords[before.standing]} to not enough yet` : 'First look: not enough yet');
  }
  const about = `about ${recallOnDay}% on the day`;
  if (!before) return change(`First look: ${lower(standing)}, ${about}`);
  if (before.standing === standing) return change(`Still weak, ${about}`);
  return change(`${standingWords[before.standing]} to ${lower(standing)}, ${about}`);
}

const ORDER: Standing[] = ['secure', 'developing', 'weak', 'notEnough', 'notStarted'];

/** The topics that moved to another standing, were met for the first time or are still weak, the strongest first. */
export const changesOf = (rows: Row[]): Change[] =>
  rows.flatMap((row) => changeOf(row) ?? []).sort((a, b) => ORDER.indexOf(a.standing) - ORDER.indexOf(b.standing));

/** What is not in the marks yet, or null. */
export function waitingWords(count: number): string | null {
  if (count === 0) return null;
  return count === 1
    ? 'One answer waits for you to mark it against the scheme. It is in none of these marks until then.'
    : `${count} answers wait for you to mark them against the scheme. They are in none of these marks until then.`;
}
