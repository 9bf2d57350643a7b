import { default_w } from 'ts-fsrs';
import { describe, expect, test } from 'vitest';
import { isDue, returnOn } from '#shared/domain/schedule/due.ts';
import { foldLog } from '#shared/domain/schedule/fold.ts';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL, type Memory } from '#shared/domain/schedule/memory.ts';
import { addDays, daysBetween } from '#shared/domain/time/calendar.ts';
import sequences from '#tests/reference/fsrs/computed-sequences.json' with { type: 'json' };
import disagreements from '#tests/reference/fsrs/known-disagreements.json' with { type: 'json' };
import published from '#tests/reference/fsrs/published-vectors.json' with { type: 'json' };

// Sources and licences of every number: tests/reference/fsrs/README.md and the `source` of each case.

/** The data holds grade 4 too, which the algorithm knows and Plait never awards. */
const asGrade = (grade: number): Grade => grade as Grade;

function run(grades: readonly number[], gaps: readonly number[]): Memory[] {
  const states: Memory[] = [];
  for (const [index, grade] of grades.entries()) {
    const last = states.at(-1);
    states.push(
      last ? DEFAULT_MODEL.next(last, asGrade(grade), gaps[index] ?? 0) : DEFAULT_MODEL.first(asGrade(grade)),
    );
  }
  return states;
}

const caseOf = (id: string) => {
  const found = published.cases.find((one) => one.id === id);
  if (!found) throw new Error(`No case ${id}`);
  return found;
};

test('the weights are the published FSRS-6 defaults, so 19-number sets (K4) and low first stabilities (K6) cannot occur', () => {
  expect([...default_w]).toEqual(published.default_parameters);
  expect(default_w).toHaveLength(21);
  expect(Math.min(...default_w.slice(0, 4))).toBeGreaterThan(0.1);
});

describe('published vectors', () => {
  test('P1 (py-fsrs test_review_card, go-fsrs TestBasicSchedulerExample): intervals of the reviews in days', () => {
    const { grades = [], expect: wanted } = caseOf('P1');
    const intervals = wanted.scheduled_days ?? [];
    const states = run(grades, [0, ...intervals]);
    // A 0 is a step within the day, which the library's card scheduler adds and Plait does not have.
    for (const [index, days] of intervals.entries()) {
      if (days > 0) expect(Math.round(states[index]?.stability ?? 0)).toBe(days);
    }
  });

  test('P2 (fsrs-rs test_memory_state, py-fsrs test_memo_state): final state', () => {
    const { grades = [], day_gaps = [], expect: wanted } = caseOf('P2');
    const last = run(grades, day_gaps).at(-1);
    expect(Math.abs((last?.stability ?? 0) - (wanted.final_stability ?? 0))).toBeLessThan(1e-4);
    expect(Math.abs((last?.difficulty ?? 0) - (wanted.final_difficulty ?? 0))).toBeLessThan(1e-4);
  });

  test('P3 (ts-fsrs FSRS-6.test.ts): first states', () => {
    const { stability, difficulty } = caseOf('P3').expect;
    if (!stability || !difficulty) throw new Error('P3 has no states');
    for (const grade of [1, 2, 3, 4]) {
      const first = DEFAULT_MODEL.first(asGrade(grade));
      expect(Math.abs(first.stability - (stability[grade - 1] ?? 0))).toBeLessThan(1e-6);
      expect(Math.abs(first.difficulty - (difficulty[grade - 1] ?? 0))).toBeLessThan(1e-6);
    }
  });

  test('P4 (go-fsrs TestNextInterval, fsrs-rs test_next_interval): the curve crosses each retention at its interval', () => {
    const days = caseOf('P4').expect.interval_days_capped_36500 ?? [];
    for (const [index, interval] of days.entries()) {
      const retention = (index + 1) / 10;
      const isCapped = interval === 36_500;
      if (!isCapped) expect(DEFAULT_MODEL.recall(interval + 0.5, 1)).toBeLessThanOrEqual(retention + 1e-9);
      if (interval > 1) expect(DEFAULT_MODEL.recall(interval - 0.5, 1)).toBeGreaterThanOrEqual(retention - 1e-9);
    }
    expect(days).toHaveLength(10);
  });

  test('P5 (py-fsrs test_stability_lower_bound): 1,000 lapses', () => {
    let memory = DEFAULT_MODEL.first(1);
    for (let time = 0; time < 1000; time += 1) {
      memory = DEFAULT_MODEL.next(memory, 1, Math.max(1, Math.round(memory.stability)) + 1);
      expect(memory.stability).toBeGreaterThanOrEqual(0.001);
    }
  });

  test('P6 and K3: libraries differ on a capped interval; Plait caps the date itself, at the day before the paper', () => {
    const paperOn = '2027-06-09';
    let on = '2027-03-01';
    let memory: Memory | null = null;
    for (const grade of caseOf('P6').grades ?? []) {
      memory = memory === null ? DEFAULT_MODEL.first(asGrade(grade)) : DEFAULT_MODEL.next(memory, asGrade(grade), 8);
      const back = returnOn({ ...memory, lastOn: on }, paperOn, on);
      expect(back).not.toBeNull();
      expect(daysBetween(back ?? paperOn, paperOn)).toBeGreaterThanOrEqual(1);
      on = addDays(on, 8);
    }
  });
});

describe('published properties and tables', () => {
  test('Q1: recall after as many days as the stability is 90%; so an item is due from then on', () => {
    const examples = published.properties.flatMap(({ examples: rows }) => rows ?? []);
    for (const { stability, t_days, R } of examples) {
      expect(Math.abs(DEFAULT_MODEL.recall(t_days, stability) - R)).toBeLessThan(1e-6);
    }
    expect(examples.length).toBeGreaterThan(0);
    const memory = { stability: 7, difficulty: 5, lastOn: '2027-03-01' };
    expect(isDue(memory, '2027-03-07')).toBe(false);
    expect(isDue(memory, '2027-03-08')).toBe(true);
  });

  test('the forgetting curve', () => {
    for (const { t_days, stability, R } of published.forgetting_curve.rows) {
      expect(Math.abs(DEFAULT_MODEL.recall(t_days, stability) - R)).toBeLessThan(1e-6);
    }
  });

  test('the intervals from a wanted retention', () => {
    for (const { desired_retention, stability, interval_unrounded } of published.interval_from_retention.rows) {
      expect(Math.abs(DEFAULT_MODEL.recall(interval_unrounded, stability) - desired_retention)).toBeLessThan(1e-6);
    }
  });
});

describe('20 histories computed with py-fsrs 6.3.1', () => {
  test.each(sequences.sequences.map((sequence) => [sequence.id, sequence.reviews] as const))('%s', (_id, reviews) => {
    let memory: Memory | null = null;
    for (const { day_gap, grade, retrievability_before, stability, difficulty } of reviews) {
      if (memory !== null && retrievability_before !== null) {
        expect(Math.abs(DEFAULT_MODEL.recall(day_gap, memory.stability) - retrievability_before)).toBeLessThan(1e-6);
      }
      memory =
        memory === null ? DEFAULT_MODEL.first(asGrade(grade)) : DEFAULT_MODEL.next(memory, asGrade(grade), day_gap);
      expect(Math.abs(memory.stability / stability - 1)).toBeLessThan(1e-5);
      expect(Math.abs(memory.difficulty - difficulty)).toBeLessThan(1e-5);
    }
  });
});

describe('known disagreements between libraries', () => {
  test('K1 and K2: the libraries differ on a second attempt within a day; Plait takes no side, for it changes nothing', () => {
    const grades = disagreements.cases.find(({ id }) => id === 'K1')?.example?.grades ?? [];
    const events = grades.map((grade, index) => ({
      answerId: `a${index}`,
      givenAt: index,
      givenOn: '2027-03-01',
      grade: asGrade(grade),
      prior: null,
    }));
    expect(events).toHaveLength(2);
    expect(foldLog(events, DEFAULT_MODEL).memory).toEqual({ ...DEFAULT_MODEL.first(2), lastOn: '2027-03-01' });
    expect(foldLog(events, DEFAULT_MODEL).attempts).toBe(2);
  });
});
