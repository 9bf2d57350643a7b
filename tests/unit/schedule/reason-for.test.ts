import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import type { StudyMoment } from '#shared/domain/schedule/context.ts';
import { reasonFor } from '#shared/domain/schedule/reason-for.ts';
import { contextFor, selectSet } from '#shared/domain/schedule/select.ts';
import { tieredGain } from '#shared/domain/schedule/value.ts';
import { type Reason, reasonSchema } from '#shared/schemas/reason.ts';
import { aCandidate, aMemory, dayFromToday, MOMENT, TODAY } from '#tests/support/a-candidate.ts';

/** Topics with one attempted question each, all in a subject of their own, recalled the better the higher the number. */
const others: Candidate[] = Array.from({ length: 5 }, (_, index) =>
  aCandidate({
    questionId: `q${index}`,
    topicId: `t${index}`,
    subjectId: 'other',
    memory: aMemory(5 * (index + 1), 90),
    firstGrade: 3,
  }),
);

/** Why one question is in a set that takes everything. */
function reasonOf(given: Partial<Candidate>, moment: Partial<StudyMoment> & { topicIds?: string[] } = {}): Reason {
  const candidates = [aCandidate({ questionId: 'mine', topicId: 'mine', ...given }), ...others];
  const selection = { ...MOMENT, candidates, budgetSeconds: 5000, maxSubjects: 4, ...moment };
  const context = contextFor(selection);
  const choice = selectSet(selection, tieredGain, context).find(({ candidate }) => candidate.questionId === 'mine');
  if (!choice) throw new Error('It was not chosen');
  return reasonSchema.parse(reasonFor(choice, context));
}

// Everything that could be said of one question, then the same with the first reason taken away, again and again.
const barely = aMemory(0.5, 1);
const weak = aMemory(1, 100);
const firm = aMemory(60, 20);
const tomorrow = dayFromToday(1);

describe('the first reason that holds (scheduling specification, section 4)', () => {
  test.each<[string, Partial<Candidate>, string[], Reason]>([
    [
      'set by a teacher',
      { isSet: true, examOn: tomorrow, memory: barely, lastWasBelowHalf: true },
      ['mine'],
      { kind: 'setByTeacher' },
    ],
    [
      'of a topic the student chose',
      { examOn: tomorrow, memory: barely, lastWasBelowHalf: true },
      ['mine'],
      { kind: 'chosenTopic' },
    ],
    [
      'paper tomorrow',
      { examOn: tomorrow, memory: barely, lastWasBelowHalf: true },
      [],
      { kind: 'lastLook', paperId: 'paper' },
    ],
    ['paper today', { examOn: TODAY }, [], { kind: 'lastLook', paperId: 'paper' }],
    ['the season ends tomorrow', { examOn: tomorrow, paperId: null }, [], { kind: 'lastLook', paperId: null }],
    [
      'barely formed and missed',
      { examOn: dayFromToday(2), memory: barely, lastWasBelowHalf: true },
      [],
      { kind: 'missedLast' },
    ],
    ['barely formed after a pass', { examOn: dayFromToday(2), memory: barely }, [], { kind: 'notFirm' }],
    ['never attempted', { examOn: dayFromToday(2), topicMarks: 11.6 }, [], { kind: 'firstLook', topicMarks: 12 }],
    [
      'paper within a week',
      { examOn: dayFromToday(7), memory: weak },
      [],
      { kind: 'paperSoon', paperId: 'paper', days: 7 },
    ],
    ['one of the weaker topics', { examOn: dayFromToday(8), memory: weak }, [], { kind: 'weakTopic' }],
  ])('%s', (_what, given, topicIds, reason) => {
    expect(reasonOf(given, { topicIds })).toEqual(reason);
  });

  test('else what a go makes of exam-day recall, in whole percent', () => {
    // R(20 + 30, 60) without a go. With one, two ways: recalled today with R(20, 60), or not.
    const { model } = MOMENT;
    const today = model.recall(20, 60);
    const withGo =
      today * model.recall(30, model.passed(60, 5, today)) + (1 - today) * model.recall(30, model.missed(60, 5, today));
    expect(reasonOf({ memory: firm })).toEqual({
      kind: 'gain',
      withoutPercent: Math.round(100 * model.recall(50, 60)),
      withGoPercent: Math.round(100 * withGo),
    });
  });

  test('less what the model has lately expected too much', () => {
    expect(reasonOf({ memory: firm }, { optimism: 0.1 })).toMatchObject({
      withoutPercent: Math.round(100 * (MOMENT.model.recall(50, 60) - 0.1)),
    });
  });

  test('the last planned study day is a last look, however far the paper', () => {
    expect(reasonOf({ memory: firm }, { lastStudyOn: TODAY })).toEqual({ kind: 'lastLook', paperId: 'paper' });
  });

  test.each<[boolean, Reason['kind']]>([
    [true, 'missedLast'],
    [false, 'notFirm'],
  ])('missed today and asked again goes by its mark (below half: %s), with its paper tomorrow too', (below, kind) => {
    const missed = {
      examOn: tomorrow,
      memory: aMemory(3, 0),
      lastWasBelowHalf: below,
      answeredToday: { answers: 1, firstGrade: 1 as const, firstAt: 1 },
    };
    expect(reasonOf(missed).kind).toBe(kind);
  });
});
