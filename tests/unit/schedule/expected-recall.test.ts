import { describe, expect, test } from 'vitest';
import { standingOf, topicRecall } from '#shared/domain/schedule/expected-recall.ts';

const examOn = '2027-05-20';
const today = '2027-04-20';
const item = (stability: number, lastOn: string) => ({ memory: { stability, difficulty: 5, lastOn }, examOn });

describe('expected recall of a topic', () => {
  test('is the mean over what was attempted, now and on the exam day', () => {
    // R(5, 5) = 0.9 and R(30, 5) = 0.742717: scheduling specification, section 8.
    const figures = topicRecall([item(5, '2027-04-15'), item(10, '2027-04-10'), { memory: null, examOn }], today);
    expect(figures).toMatchObject({ attempted: 2, items: 3 });
    expect(figures.now).toBeCloseTo(0.9, 6);
    // Practised today: the next go is tomorrow. (1 + 0.980346 / 5)^−0.1542, scheduling specification, section 2.
    expect(topicRecall([item(5, today)], today).now).toBeCloseTo(0.9728, 4);
    expect(topicRecall([item(5, today)], today).onExamDay).toBeCloseTo(0.742717, 6);
  });

  test('is unknown where nothing was attempted', () => {
    const nothing = { now: null, onExamDay: null, attempted: 0 };
    expect(topicRecall([{ memory: null, examOn }], today)).toEqual({ ...nothing, items: 1 });
    expect(topicRecall([], today)).toEqual({ ...nothing, items: 0 });
  });

  test('on an exam day that is past is what it is now', () => {
    const { now, onExamDay } = topicRecall([{ ...item(5, '2027-04-15'), examOn: '2027-04-01' }], today);
    expect(onExamDay).toBe(now);
  });
});

// The bands are the product's own words (product description, section 2).
test.each([
  [null, 'notStarted'],
  [0, 'weak'],
  [0.494, 'weak'],
  [0.495, 'developing'],
  [0.5, 'developing'],
  [0.794, 'developing'],
  [0.795, 'secure'],
  [0.8, 'secure'],
  [1, 'secure'],
])('standing at exam-day recall %s is %s', (onExamDay, standing) => {
  expect(standingOf(onExamDay)).toBe(standing);
});
