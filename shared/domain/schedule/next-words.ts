import { longDayWords } from '#shared/domain/time/words.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';

export interface NextFacts {
  marks: number;
  maxMarks: number;
  howSure: HowSure;
  /** About when the question comes back; null where no day is left before its paper. */
  returnsOn: string | null;
  /** Title and day of the next paper that examines it; null without a sitting. */
  paper: { title: string; on: string } | null;
}

/** What happens next with a question, after its mark: about when it comes back, and when its paper is. */
export function nextWords({ marks, maxMarks, howSure, returnsOn, paper }: NextFacts): string {
  const cause = causeWords(maxMarks - marks, maxMarks, howSure);
  if (returnsOn === null) {
    const exam = paper ? `${paper.title} on ${longDayWords(paper.on)}` : 'the exam';
    return `${cause}${cause ? 'and this' : 'This'} was the last look before ${exam}.`;
  }
  const back = `${cause}${cause ? 'so this' : 'This'} comes back about ${longDayWords(returnsOn)}.`;
  return paper ? `${back} ${paper.title} is on ${longDayWords(paper.on)}.` : back;
}

/** Why it comes back, as the opening of the sentence; empty where every mark was earned. */
function causeWords(missed: number, maxMarks: number, howSure: HowSure): string {
  if (missed === 0) return '';
  if (howSure === 'certain') return `You were certain and dropped ${missed === 1 ? 'a mark' : `${missed} marks`}, `;
  if (missed === maxMarks) return 'No marks this time, ';
  return `${missed === 1 ? 'One mark was' : `${missed} marks were`} missed, `;
}
