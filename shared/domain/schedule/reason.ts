import type { Reason } from '#shared/schemas/reason.ts';

export interface ReasonNames {
  topic: string;
  /** The paper of the reason's `paperId`; null where it has none, or is no longer known. */
  paper: string | null;
}

/** Says why a question was chosen, in one or two sentences. */
export function reasonWords(reason: Reason, { topic, paper }: ReasonNames): string {
  switch (reason.kind) {
    case 'lastLook':
      return `Last look before ${paper ?? 'the exam'}.`;
    case 'missedLast':
      return 'You missed this last time. One more go makes it stick.';
    case 'notFirm':
      return 'Not firm yet. One more go makes it stick.';
    case 'firstLook':
      return firstLookWords(topic, reason.topicMarks);
    case 'paperSoon':
      return `${paper ?? 'The exam'} is ${reason.days === 1 ? 'tomorrow' : `in ${reason.days} days`}.`;
    case 'weakTopic':
      return `${topic} is one of your weaker topics.`;
    case 'gain':
      return gainWords(reason);
    case 'setByTeacher':
      return 'Your teacher set this one.';
    case 'chosenTopic':
      return `You chose to practise ${topic}.`;
    case 'due':
      return `Due again: expected recall today is about ${roundedPercent(reason.recallPercent)}%, an estimate.`;
  }
}

/** Rounded to 5, both may read the same; then only where it stands is said. */
function gainWords({ withoutPercent, withGoPercent }: Extract<Reason, { kind: 'gain' }>): string {
  const [without, withGo] = [roundedPercent(withoutPercent), roundedPercent(withGoPercent)];
  const before = `Before this go, about ${without}% on the day of the paper`;
  return withGo > without ? `${before}; after it, about ${withGo}%. An estimate.` : `${before}. An estimate.`;
}

function firstLookWords(topic: string, marks: number): string {
  if (marks === 0) return `First look at this question on ${topic}.`;
  return `First look: ${topic} carries ${marks} ${marks === 1 ? 'mark' : 'marks'}.`;
}

/** An estimate is shown to the nearest 5, and never as certainty. */
export const roundedPercent = (percent: number): number => Math.min(95, Math.max(5, Math.round(percent / 5) * 5));

/** The same in a few words, for a whole set: of one question it would give the topic away before the answer. */
function reasonLine(reason: Reason, paper: string | null): string {
  switch (reason.kind) {
    case 'lastLook':
      return `Last look before ${paper ?? 'the exam'}`;
    case 'missedLast':
      return 'Missed last time';
    case 'notFirm':
      return 'Not firm yet';
    case 'firstLook':
      return 'First look at a question';
    case 'paperSoon':
      return `${paper ?? 'The exam'} is ${reason.days === 1 ? 'tomorrow' : `in ${reason.days} days`}`;
    case 'weakTopic':
      return 'From your weaker topics';
    case 'gain':
      return 'Where one go adds most by the day of the paper';
    case 'setByTeacher':
      return 'Set by your teacher';
    case 'chosenTopic':
      return 'From the topics you chose';
    case 'due':
      return 'Due again';
  }
}

/** The reasons of a set's questions, each once with how many it holds for, the commonest first. */
export function countReasons(
  reasons: readonly Reason[],
  paperTitles: ReadonlyMap<string, string>,
): { words: string; questions: number }[] {
  const counts = new Map<string, number>();
  for (const reason of reasons) {
    const paper = 'paperId' in reason && reason.paperId ? (paperTitles.get(reason.paperId) ?? null) : null;
    const words = reasonLine(reason, paper);
    counts.set(words, (counts.get(words) ?? 0) + 1);
  }
  return [...counts]
    .map(([words, questions]) => ({ words, questions }))
    .sort((a, b) => b.questions - a.questions || (a.words < b.words ? -1 : 1));
}
