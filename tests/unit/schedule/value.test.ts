import { describe, expect, test } from 'vitest';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { contextOf } from '#shared/domain/schedule/context.ts';
import { dueWeakNearest } from '#shared/domain/schedule/value.ts';
import { aCandidate, TODAY } from '#tests/support/a-candidate.ts';

const memory = (stability: number, lastOn: string) => ({ stability, difficulty: 5, lastOn });
const worthOf = (candidate: Candidate, others: readonly Candidate[] = []) =>
  dueWeakNearest(candidate, contextOf([candidate, ...others], TODAY));

/** Topics with one attempted question each, recalled the better the higher the number. */
const rankedTopics = (count: number): Candidate[] =>
  Array.from({ length: count }, (_, index) =>
    aCandidate({ questionId: `q${index}`, topicId: `t${index}`, memory: memory(5 * (index + 1), '2027-01-01') }),
  );

describe('what is asked', () => {
  test('the new and the due, not what is still well recalled', () => {
    expect(worthOf(aCandidate({ questionId: 'new' }))).not.toBeNull();
    expect(worthOf(aCandidate({ questionId: 'due', memory: memory(5, '2027-04-15') }))).not.toBeNull();
    expect(worthOf(aCandidate({ questionId: 'early', memory: memory(5.5, '2027-04-15') }))).toBeNull();
  });

  test('tier 1 is the last day before the paper or a barely formed memory', () => {
    expect(worthOf(aCandidate({ questionId: 'q', examOn: '2027-04-21' }))?.tier).toBe(1);
    expect(worthOf(aCandidate({ questionId: 'q', examOn: TODAY }))?.tier).toBe(1);
    expect(worthOf(aCandidate({ questionId: 'q', memory: memory(0.9, '2027-04-19') }))?.tier).toBe(1);
    expect(worthOf(aCandidate({ questionId: 'q', memory: memory(1, '2027-04-19') }))?.tier).toBe(2);
    expect(worthOf(aCandidate({ questionId: 'q' }))?.tier).toBe(2);
  });
});

describe('what counts more', () => {
  const score = (given: Partial<Candidate>) => worthOf(aCandidate({ questionId: 'q', ...given }))?.score ?? 0;

  test('the share of marks on a nearer paper', () => {
    expect(score({})).toBeCloseTo((0.01 * 0.5 * 5) / 35, 12);
    expect(score({ topicWeight: 0.2 })).toBeCloseTo(2 * score({}), 12);
    expect(score({ examOn: '2027-04-30' })).toBeGreaterThan(score({}));
    expect(score({ examOn: '2027-04-25' })).toBeCloseTo((score({}) * 35) / 10, 12);
  });

  test('the same whether a question is short or long, and whether the bank is small or large', () => {
    expect(score({ marks: 4, expectedSeconds: 180 })).toBe(score({}));
    const scoreIn = (size: number) => {
      const [first, ...others] = Array.from({ length: size }, (_, index) =>
        aCandidate({ questionId: `q${String(index).padStart(3, '0')}`, itemsInTopic: size }),
      );
      return (first && worthOf(first, others)?.score) ?? 0;
    };
    expect(scoreIn(50)).toBeCloseTo(scoreIn(5), 12);
  });

  test('the first turns of a topic: the least recalled question whole, the next half', () => {
    const [first, second] = [aCandidate({ questionId: 'a' }), aCandidate({ questionId: 'b' })];
    expect(worthOf(second, [first])?.score).toBeCloseTo((worthOf(first, [second])?.score ?? 0) / 2, 12);
    const forgotten = aCandidate({ questionId: 'c', memory: memory(0.5, '2026-01-01') });
    const context = contextOf([first, second, forgotten], TODAY);
    expect([...context.turnInTopic]).toEqual([
      ['c', 1],
      ['a', 2],
      ['b', 3],
    ]);
  });

  test('a topic that is weak for its paper', () => {
    const due = aCandidate({ questionId: 'due', memory: memory(5, '2027-04-15') });
    const firm = aCandidate({ questionId: 'firm', memory: memory(200, '2027-04-19') });
    const lost = aCandidate({ questionId: 'lost', memory: memory(0.3, '2027-01-01') });
    expect(worthOf(due, [lost])?.score ?? 0).toBeGreaterThan(worthOf(due, [firm])?.score ?? 0);
  });
});

describe('the reason is the first that applies', () => {
  const reason = (given: Partial<Candidate>, others: readonly Candidate[] = []) =>
    worthOf(aCandidate({ questionId: 'zz', ...given }), others)?.reason;
  const barely = memory(0.5, '2027-04-19');
  const due = memory(10, '2027-04-08');

  test.each<[string, Partial<Candidate>, unknown]>([
    ['paper tomorrow', { examOn: '2027-04-21', memory: barely }, { kind: 'lastLook', paperId: 'paper' }],
    ['barely formed and missed', { memory: barely, lastWasBelowHalf: true }, { kind: 'missedLast' }],
    ['barely formed after a pass', { memory: barely }, { kind: 'notFirm' }],
    ['never attempted', { examOn: '2027-04-24' }, { kind: 'firstLook', topicMarks: 12 }],
    ['paper within a week', { memory: due, examOn: '2027-04-27' }, { kind: 'paperSoon', paperId: 'paper', days: 7 }],
    ['otherwise due', { memory: due, examOn: '2027-04-28' }, { kind: 'due', recallPercent: 89 }],
  ])('%s', (_what, given, expected) => {
    expect(reason(given)).toEqual(expected);
  });

  test('a weak topic is one of the lowest third', () => {
    expect(reason({ topicId: 'mine', memory: memory(1, '2027-01-01') }, rankedTopics(5))).toEqual({
      kind: 'weakTopic',
    });
    expect(reason({ topicId: 'mine', memory: memory(60, '2027-01-01') }, rankedTopics(5))?.kind).toBe('due');
    expect(contextOf(rankedTopics(5), TODAY).weakerTopicIds).toEqual(new Set(['t0']));
    expect(contextOf(rankedTopics(2), TODAY).weakerTopicIds.size).toBe(0);
  });
});
