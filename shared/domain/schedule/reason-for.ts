import type { Reason } from '#shared/schemas/reason.ts';
import type { StudyContext } from './context.ts';
import { recallPercent } from './mastery.ts';
import type { Chosen } from './select.ts';
import { isBarelyFormed, outlookOf } from './value.ts';

/** A paper that is this near is the reason itself. */
const SOON_DAYS = 7;

/** Why a question was chosen: the first reason that holds. Source: scheduling specification, section 4. */
export function reasonFor({ candidate, tier, isOfChosenTopic }: Chosen, context: StudyContext): Reason {
  const { memory, paperId, topicId, topicMarks, lastWasBelowHalf } = candidate;
  if (tier === 0) return { kind: 'setByTeacher' };
  if (isOfChosenTopic) return { kind: 'chosenTopic' };
  const days = context.daysToExam(candidate);
  // What was missed today comes back by its mark, whatever is made of its memory.
  const isAgainToday = candidate.answeredToday !== null;
  if (context.daysToLastChance(days) === 1 && !isAgainToday) return { kind: 'lastLook', paperId };
  if (isBarelyFormed(candidate) || isAgainToday) return { kind: lastWasBelowHalf ? 'missedLast' : 'notFirm' };
  if (memory === null) return { kind: 'firstLook', topicMarks: Math.round(topicMarks) };
  if (days <= SOON_DAYS && paperId !== null) return { kind: 'paperSoon', paperId, days };
  if (context.weakerTopicIds.has(topicId)) return { kind: 'weakTopic' };
  const { without, withGo } = outlookOf(candidate, context);
  // Less what the model has lately expected too much: what is said must not be what has just proved too hopeful.
  const said = (recalled: number) => recallPercent(Math.max(0, recalled - context.optimism));
  return { kind: 'gain', withoutPercent: said(without), withGoPercent: said(withGo) };
}
