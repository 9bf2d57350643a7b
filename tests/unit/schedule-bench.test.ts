import { default_w } from 'ts-fsrs';
import { expect, test } from 'vitest';
import { buildSet } from '#shared/domain/schedule/build-set.ts';
import { acceptanceLines, MAIN_ROW } from '#tests/bench/scheduler/acceptance.ts';
import { boundOf } from '#tests/bench/scheduler/bound.ts';
import { estimate, pairedDifference } from '#tests/bench/scheduler/estimate.ts';
import { Fsrs } from '#tests/bench/scheduler/fsrs.ts';
import { runJob } from '#tests/bench/scheduler/job.ts';
import type { Learner, LearnerType, TrueGrade } from '#tests/bench/scheduler/learner.ts';
import { FsrsLearner } from '#tests/bench/scheduler/learner-a.ts';
import { activation, decayAt, recallAt, strengthOf } from '#tests/bench/scheduler/learner-b.ts';
import { HalfLifeLearner, nextHalfLife } from '#tests/bench/scheduler/learner-c.ts';
import { readOptions } from '#tests/bench/scheduler/options.ts';
import { POLICIES, TIERED_GAIN } from '#tests/bench/scheduler/policies.ts';
import { Draws, uniform } from '#tests/bench/scheduler/random.ts';
import { Results } from '#tests/bench/scheduler/results.ts';
import { DEFAULT_SETTINGS, type Settings } from '#tests/bench/scheduler/settings.ts';
import { Season } from '#tests/bench/scheduler/simulate.ts';
import { buildWorld } from '#tests/bench/scheduler/world.ts';

const SHORT: Settings = { ...DEFAULT_SETTINGS, weeks: 1, isStoppedAtFirstPaper: true };

test('random numbers depend on their keys alone and are spread as they should be', () => {
  const take = (...keys: number[]): number[] => {
    const draws = new Draws(...keys);
    return [draws.uniform(), draws.normal(), draws.gamma(4), draws.beta(1.8, 1.2), draws.whole(8, 12)];
  };
  expect(take(1000, 1)).toEqual(take(1000, 1));
  expect(take(1000, 1)).not.toEqual(take(1000, 2));
  expect(uniform(1, 2, 3)).not.toBe(uniform(1, 3, 2));
  const draws = new Draws(7);
  const many = <T>(draw: () => T): T[] => Array.from({ length: 10_000 }, draw);
  const mean = (xs: number[]): number => xs.reduce((sum, x) => sum + x, 0) / xs.length;
  expect(mean(many(() => draws.uniform()))).toBeCloseTo(0.5, 2);
  expect(mean(many(() => draws.normal() ** 2))).toBeCloseTo(1, 1);
  expect(mean(many(() => draws.gamma(4)))).toBeCloseTo(4, 1);
  // Mean of a beta distribution: a ÷ (a + b).
  expect(mean(many(() => draws.beta(0.9, 2.1)))).toBeCloseTo(0.3, 2);
});

test('learner (a) moves as FSRS-6 does (scheduling specification, section 8)', () => {
  const fsrs = new Fsrs(default_w);
  expect(fsrs.recall(30, 5)).toBeCloseTo(0.742717, 5);
  const grown = ([1, 2, 3, 4] as const).map((grade) => fsrs.next({ stability: 10, difficulty: 5 }, 10, grade));
  expect(grown.map(({ stability }) => stability.toFixed(4))).toEqual(['1.3920', '23.2469', '32.0267', '51.2539']);
  const world = buildWorld(1000, DEFAULT_SETTINGS);
  const learner = new FsrsLearner(world);
  const unknown = world.items.findIndex(({ isKnown }) => !isKnown);
  const known = world.items.findIndex(({ isKnown }) => isKnown);
  const { stability = 0, taughtDay = 0 } = world.items[known] ?? {};
  expect(learner.recall(unknown, 0)).toBe(0.05);
  expect(learner.recall(known, 3)).toBe(learner.fsrs.recall(3 - taughtDay, stability));
  learner.attempt(unknown, 3, 3);
  expect(learner.memory(unknown)?.stability).toBe(learner.fsrs.weights[2]);
});

test('learner (b) follows the activation model of Pavlik and Anderson (2005)', () => {
  const m = activation([{ day: 0, decay: 0.177, strength: 1 }], 1);
  // −0.177 × ln 2160, and from it 0.217·e^m + 0.177 and 1 ÷ (1 + e^((−1.6 − m) ÷ 0.3)).
  expect(m).toBeCloseTo(-1.359, 4);
  expect(decayAt(m)).toBeCloseTo(0.23275, 4);
  expect(recallAt(m)).toBeCloseTo(0.6907, 3);
  expect(recallAt(activation([{ day: -25, decay: 0.177, strength: strengthOf(25) }], 0))).toBeCloseTo(0.9, 9);
});

test('learner (c) forgets by half-lives', () => {
  expect(nextHalfLife(10, 1, 0.5, true)).toBe(30.5);
  expect([2, 10, 100].map((days) => nextHalfLife(days, 1, 0.5, false))).toEqual([1.5, 5, 20]);
  const world = buildWorld(1000, DEFAULT_SETTINGS);
  const learner = new HalfLifeLearner(world);
  const known = world.items.findIndex(({ isKnown }) => isKnown);
  const { stability = 0, taughtDay = 0 } = world.items[known] ?? {};
  expect(learner.recall(known, taughtDay + 8 * stability)).toBeCloseTo(0.5, 9);
});

/** Right half of the time; notes what came of each attempt, by item. */
class Noting implements Learner {
  readonly misread = 0;
  readonly grades = new Map<number, TrueGrade[]>();

  recall(): number {
    return 0.5;
  }

  attempt(item: number, _day: number, grade: TrueGrade): void {
    this.grades.set(item, [...(this.grades.get(item) ?? []), grade]);
  }
}

test('all policies meet the same luck: an attempt of an item comes out the same, whenever it is made', () => {
  const world = buildWorld(1000, SHORT);
  const met = ['random', 'due', 'tg'].map((id) => {
    const learner = new Noting();
    const policy = POLICIES.find((one) => one.id === id);
    if (policy) new Season(world, learner).run(policy);
    return learner.grades;
  });
  const byItem = [...new Set(met.flatMap((grades) => [...grades.keys()]))].map((item) =>
    met.map((grades) => grades.get(item) ?? []).sort((a, b) => b.length - a.length),
  );
  const shared = byItem.filter(([, second]) => (second?.length ?? 0) > 0);
  expect(shared.length).toBeGreaterThan(100);
  for (const [longest = [], ...others] of shared) {
    for (const other of others) expect(longest.slice(0, other.length)).toEqual(other);
  }
});

test('the sets of the benchmark are the sets of the product', () => {
  const expected = new Map<string, string[]>();
  const asked = new Map<string, string[]>();
  const season = new Season(buildWorld(1001, SHORT), new Noting());
  const { value } = TIERED_GAIN.prepare(season);
  season.run({
    ...TIERED_GAIN,
    prepare: () => ({
      value: (candidate, context) => {
        const key = `${season.day}/${season.set}`;
        if (!expected.has(key)) {
          const set = buildSet({ ...season.selection(TIERED_GAIN.maxSubjects), mode: 'mixed', confusable: [] });
          expected.set(key, set.map(({ questionId }) => questionId).sort());
        }
        return value(candidate, context);
      },
      saw: (item) => {
        const key = `${season.day}/${season.set}`;
        asked.set(key, [...(asked.get(key) ?? []), season.candidates[item]?.questionId ?? ''].sort());
      },
    }),
  });
  expect(expected.size).toBeGreaterThan(5);
  expect(asked).toEqual(expected);
});

test('a learner of a seed comes out the same each time, better with practice, and under the bound', () => {
  const job = { rowId: MAIN_ROW, seed: 1000, type: 'a' as const, settings: SHORT, policies: ['none', 'due', 'tg'] };
  const { outcomes } = runJob(job);
  expect(runJob({ ...job, policies: ['tg', 'none'] }).outcomes).toEqual({ tg: outcomes.tg, none: outcomes.none });
  expect(outcomes.none).toBeLessThan(outcomes.due ?? 0);
  expect(outcomes.due).toBeLessThan(outcomes.tg ?? 0);
  expect(outcomes.tg).toBeLessThan(boundOf(buildWorld(1000, SHORT)));
});

test('means, standard errors and paired differences', () => {
  expect(estimate([0.1, 0.2, 0.3])).toEqual({
    mean: expect.closeTo(20),
    error: expect.closeTo(10 / Math.sqrt(3)),
    count: 3,
  });
  expect(pairedDifference([0.5, 0.7], [0.4, 0.6])).toEqual({
    mean: expect.closeTo(10),
    error: expect.closeTo(0),
    count: 2,
  });
  expect(() => pairedDifference([0.5], [0.4, 0.6])).toThrow(RangeError);
});

test('a line fails where TG does not reach it', () => {
  const given = (type: LearnerType, outcomes: Record<string, number>, rowId = MAIN_ROW) =>
    [0, 1].map((seed) => ({
      job: { rowId, seed, type, settings: DEFAULT_SETTINGS, policies: [] },
      outcomes: Object.fromEntries(Object.entries(outcomes).map(([id, share]) => [id, share + seed / 1000])),
    }));
  const lines = acceptanceLines(
    new Results([
      ...given('a', { tg: 0.96, due: 0.94, greedy: 0.94, bound: 0.995 }),
      ...given('c', { tg: 0.9, due: 0.85, greedy: 0.86 }),
      ...given('c', { tg: 0.8, due: 0.85 }, '25min'),
    ]),
    0,
  );
  const isRun = ({ isPassed }: { isPassed: boolean | null }) => isPassed !== null;
  expect(lines.filter(isRun).map(({ text, isPassed }) => [text, isPassed])).toEqual([
    ['TG at least 0.97 of the bound on (a)', false],
    ['TG − due order at least +3 on (a)', false],
    ['TG − due order at least +4 on (c)', true],
    ['TG − greedy gain at least +1 on (a)', true],
    ['TG − greedy gain at least +5 on (c)', false],
    ['TG not below due order on (c), 25 min/day', false],
  ]);
  // What was not run is named, and not called passed.
  expect(lines.filter((line) => !isRun(line)).map(({ text }) => text)).toContain('TG − due order at least +2.5 on (b)');
});

test('options say what cannot be', () => {
  expect(readOptions(['--minutes', '25'])?.settings.setsADay).toBe(1);
  expect(readOptions([])).toMatchObject({ learners: 40, seed: 5000, isStandard: true, hasSensitivity: true });
  expect(readOptions(['--no-sensitivity'])?.hasSensitivity).toBe(false);
  expect(readOptions(['--quick'])?.hasSensitivity).toBe(false);
  expect(readOptions(['--help'])).toBeNull();
  for (const args of [
    ['--minutes', '30'],
    ['--types', 'd'],
    ['--policies', 'best'],
    ['--learners', '1'],
  ]) {
    expect(() => readOptions(args)).toThrow(RangeError);
  }
});
