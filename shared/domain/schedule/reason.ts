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
    case 'due':
      return `Due again: expected recall today is about ${roundedPercent(reason.recallPercent)}%, an estimate.`;
  }
}

function firstLookWords(topic: string, marks: number): string {
  if (marks === 0) return `First look at this question on ${topic}.`;
  return `First look: ${topic} carries ${marks} ${marks === 1 ? 'mark' : 'marks'}.`;
}

/** An estimate is shown to the nearest 5, and never as certainty. */
export const roundedPercent = (percent: number): number => Math.min(95, Math.max(5, Math.round(percent / 5) * 5));
