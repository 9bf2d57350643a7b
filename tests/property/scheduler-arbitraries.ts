import fc from 'fast-check';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import type { StudyMoment } from '#shared/domain/schedule/context.ts';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import type { Orderable } from '#shared/domain/schedule/order.ts';
import { aCandidate, dayFromToday, MOMENT } from '#tests/support/a-candidate.ts';

/** Absent but for one in `among`. */
const rarely = <T>(arbitrary: fc.Arbitrary<T>, among: number): fc.Arbitrary<T | null> =>
  fc.oneof({ weight: among - 1, arbitrary: fc.constant(null) }, { weight: 1, arbitrary });

const daysFromToday = (min: number, max: number) => fc.integer({ min, max }).map(dayFromToday);

/** Evenly spread over the orders of magnitude from `min` to `max`. */
export const spread = (min: number, max: number): fc.Arbitrary<number> =>
  fc
    .double({ min: Math.log(min), max: Math.log(max), noNaN: true })
    .map((power) => Math.min(max, Math.max(min, Math.exp(power))));

export const grades = fc.constantFrom<Grade[]>(1, 2, 3);
export const difficulties = fc.double({ min: 1, max: 10, noNaN: true });
export const memories = fc.record({
  stability: spread(0.001, 400),
  difficulty: difficulties,
  lastOn: fc.oneof({ weight: 9, arbitrary: daysFromToday(-300, -1) }, daysFromToday(0, 0)),
});

const subjectIds = ['bi', 'ch', 'el', 'fr', 'ma', 'ph'];
const TOPICS_A_SUBJECT = 4;

/** What the questions of a topic have in common. */
const topicFacts = fc.record({
  topicWeight: fc.double({ min: 0.01, max: 1, noNaN: true }),
  topicMarks: fc.integer({ min: 0, max: 40 }),
  examOn: fc.option(daysFromToday(-3, 80), { freq: 12 }),
  taughtOn: fc.option(daysFromToday(-300, 5), { freq: 9 }),
});

const questionFacts = fc.record({
  topic: fc.integer({ min: 0, max: subjectIds.length * TOPICS_A_SUBJECT - 1 }),
  attempted: fc.option(fc.record({ memory: memories, firstGrade: grades }), { freq: 2 }),
  lastWasBelowHalf: fc.boolean(),
  answeredToday: rarely(
    fc.record({
      answers: fc.integer({ min: 1, max: 2 }),
      firstGrade: fc.option(grades, { freq: 4 }),
      firstAt: fc.integer({ min: 0, max: 1000 }),
    }),
    6,
  ),
  isTaken: fc.integer({ min: 0, max: 9 }).map((one) => one === 0),
  isSet: fc.integer({ min: 0, max: 9 }).map((one) => one === 0),
  marks: fc.integer({ min: 1, max: 6 }),
  expectedSeconds: fc.oneof(fc.integer({ min: 5, max: 150 }), fc.integer({ min: 5, max: 600 })),
});

/** Names of a topic and its subject. */
const topicOf = (topic: number) => {
  const subjectId = subjectIds[topic % subjectIds.length] ?? '';
  return { subjectId, topicId: `${subjectId}-${Math.floor(topic / subjectIds.length)}` };
};

/** Up to 80 questions of one student, ids unique. Without `size` a list would seldom have more than ten. */
export const candidateLists: fc.Arbitrary<Candidate[]> = fc
  .tuple(
    fc.array(topicFacts, {
      minLength: subjectIds.length * TOPICS_A_SUBJECT,
      maxLength: subjectIds.length * TOPICS_A_SUBJECT,
    }),
    fc.array(questionFacts, { maxLength: 80, size: 'max' }),
  )
  .map(([topics, questions]) =>
    questions.map(({ topic, attempted, ...question }, index) =>
      aCandidate({
        ...question,
        ...topics[topic],
        ...topicOf(topic),
        ...(attempted ?? { memory: null, firstGrade: null }),
        questionId: `q${index}`,
      }),
    ),
  );

/** The same day, with practice ending before, among or after the papers, and errors of the model small and large. */
export const moments: fc.Arbitrary<StudyMoment> = fc.record({
  today: fc.constant(MOMENT.today),
  lastStudyOn: fc.option(daysFromToday(-2, 90), { freq: 2 }),
  model: fc.constant(MOMENT.model),
  optimism: fc.double({ min: 0, max: 0.3, noNaN: true }),
});

/** Up to five topics to choose, of which there may be no question. */
export const chosenTopics: fc.Arbitrary<string[]> = fc.uniqueArray(
  fc
    .tuple(fc.constantFrom(...subjectIds), fc.integer({ min: 0, max: TOPICS_A_SUBJECT - 1 }))
    .map(([subjectId, topic]) => `${subjectId}-${topic}`),
  { maxLength: 5 },
);

/** Questions in up to 8 topics of up to 4 subjects; recall takes few values, so that ties occur. */
export const setsToOrderOf = (maxLength: number): fc.Arbitrary<Orderable[]> =>
  fc
    .array(fc.record({ topic: fc.integer({ min: 0, max: 7 }), recall: fc.integer({ min: 0, max: 10 }) }), {
      maxLength,
      size: 'max',
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

/** As many as a set may have. */
export const setsToOrder = setsToOrderOf(60);

export const confusablePairs = fc.array(
  fc.tuple(fc.integer({ min: 0, max: 7 }), fc.integer({ min: 0, max: 7 })).map(([a, b]) => [`t${a}`, `t${b}`] as const),
  { maxLength: 5 },
);
