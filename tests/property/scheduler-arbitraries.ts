import fc from 'fast-check';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import type { Orderable } from '#shared/domain/schedule/order.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { aCandidate, TODAY } from '#tests/support/a-candidate.ts';

const daysFromToday = (min: number, max: number) => fc.integer({ min, max }).map((days) => addDays(TODAY, days));

export const memories = fc.record({
  stability: fc.double({ min: 0.001, max: 400, noNaN: true }),
  difficulty: fc.double({ min: 1, max: 10, noNaN: true }),
  lastOn: daysFromToday(-300, 0),
});

const candidate = fc.record({
  topic: fc.integer({ min: 0, max: 3 }),
  subjectId: fc.constantFrom('bi', 'ch', 'el', 'fr', 'ma', 'ph'),
  memory: fc.option(memories),
  lastWasBelowHalf: fc.boolean(),
  answeredToday: fc.option(
    fc.record({
      answers: fc.integer({ min: 1, max: 2 }),
      firstGrade: fc.constantFrom(null, 1 as const, 2 as const, 3 as const),
      firstAt: fc.integer({ min: 0, max: 1000 }),
    }),
    { freq: 8 },
  ),
  marks: fc.integer({ min: 1, max: 6 }),
  expectedSeconds: fc.integer({ min: 5, max: 600 }),
  topicWeight: fc.double({ min: 0.01, max: 1, noNaN: true }),
  topicMarks: fc.integer({ min: 0, max: 40 }),
  itemsInTopic: fc.integer({ min: 1, max: 20 }),
  examOn: daysFromToday(-3, 80),
  taughtOn: fc.option(daysFromToday(-300, 5)),
});

/** Up to 80 questions of one student, ids unique. */
export const candidateLists: fc.Arbitrary<Candidate[]> = fc
  .array(candidate, { maxLength: 80 })
  .map((rows) =>
    rows.map(({ topic, ...row }, index) =>
      aCandidate({ ...row, questionId: `q${index}`, topicId: `${row.subjectId}-${topic}` }),
    ),
  );

/** Up to 60 questions of a set in up to 8 topics of up to 4 subjects; recall takes few values, so that ties occur. */
export const setsToOrder: fc.Arbitrary<Orderable[]> = fc
  .array(fc.record({ topic: fc.integer({ min: 0, max: 7 }), recall: fc.integer({ min: 0, max: 10 }) }), {
    maxLength: 60,
  })
  .map((rows) =>
    rows.map(({ topic, recall }, priority) => ({
      questionId: `q${priority}`,
      topicId: `t${topic}`,
      subjectId: `s${topic % 4}`,
      recall: recall / 10,
      priority,
    })),
  );

export const confusablePairs = fc.array(
  fc.tuple(fc.integer({ min: 0, max: 7 }), fc.integer({ min: 0, max: 7 })).map(([a, b]) => [`t${a}`, `t${b}`] as const),
  { maxLength: 5 },
);
