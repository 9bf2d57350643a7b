import { describe, expect, test } from 'vitest';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { gainOf, unseenOutlook } from '#shared/domain/schedule/outlook.ts';
import { firstMemory, firstStability, unseenRecall } from '#shared/domain/schedule/unseen.ts';

const close = (actual: number, expected: number) => expect(Math.abs(actual - expected)).toBeLessThanOrEqual(1e-4);
const none = { tried: 0, recalled: 0 };

// Worked numbers of the scheduling specification, section 8.
describe('recall of what was never attempted', () => {
  test('is even where nothing is known', () => {
    expect(unseenRecall(none, none, none)).toBe(0.5);
  });

  test('is drawn from all to the subject to the topic', () => {
    const all = { tried: 100, recalled: 60 };
    const subject = { tried: 20, recalled: 8 };
    close(unseenRecall({ tried: 5, recalled: 4 }, subject, all), 0.6471);
    // U, as a topic without attempts sees it; G, as a subject without attempts does.
    close(unseenRecall(none, subject, all), 0.456);
    close(unseenRecall(none, none, all), 0.5962);
  });

  test('never claims more than 97% nor less than 3%', () => {
    const [best, worst] = [
      { tried: 900, recalled: 900 },
      { tried: 900, recalled: 0 },
    ];
    expect(unseenRecall(best, best, best)).toBe(0.97);
    expect(unseenRecall(worst, worst, worst)).toBe(0.03);
  });
});

describe('a question never attempted, taught 200 days ago, paper in 60 days', () => {
  test.each([
    [0.5, 2.2135, 39.1961, 1.1006, 0.2237],
    [0.8, 60.3144, 120, 3.6456, 0.1064],
    [0.2, 0.0057, 2.3065, 0.212, 0.2644],
  ])('recall %d: stability %d, %d if right, %d if wrong, gain %d', (recall, before, right, wrong, gain) => {
    const prior = { recall, days: 200 };
    close(DEFAULT_MODEL.stabilityOf(recall, 200), before);
    close(firstStability(DEFAULT_MODEL, prior, 3), right);
    close(firstStability(DEFAULT_MODEL, prior, 1), wrong);
    close(gainOf(unseenOutlook(DEFAULT_MODEL, prior, 60)), gain);
  });

  // Section 4: the cap of 120 days can make a go worth nothing from 59 days on.
  test('can be worth nothing where it is well known', () => {
    const prior = { recall: 0.94, days: 200 };
    expect(gainOf(unseenOutlook(DEFAULT_MODEL, prior, 59))).toBeLessThanOrEqual(0);
    expect(gainOf(unseenOutlook(DEFAULT_MODEL, prior, 30))).toBeGreaterThan(0);
  });
});

describe('the memory after a first attempt', () => {
  test('has the difficulty of its grade, and the stability that what was believed before makes of it', () => {
    const memory = firstMemory(DEFAULT_MODEL, 3, { recall: 0.5, days: 200 });
    close(memory.stability, 39.1961);
    close(memory.difficulty, 2.1181);
  });

  test('is capped at 10 days after a miss', () => {
    expect(firstMemory(DEFAULT_MODEL, 1, { recall: 0.97, days: 900 }).stability).toBe(10);
  });

  test('after an effortful pass lies between the plain start of its grade and a normal pass', () => {
    const prior = { recall: 0.5, days: 200 };
    const effortful = firstMemory(DEFAULT_MODEL, 2, prior).stability;
    expect(effortful).toBeGreaterThan(DEFAULT_MODEL.first(2).stability);
    expect(effortful).toBeLessThan(firstMemory(DEFAULT_MODEL, 3, prior).stability);
  });

  test('is the plain start where nothing was recorded', () => {
    for (const grade of [1, 2, 3] as const) {
      expect(firstMemory(DEFAULT_MODEL, grade, null)).toEqual(DEFAULT_MODEL.first(grade));
    }
  });
});
