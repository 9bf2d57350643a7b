import { describe, expect, test } from 'vitest';
import { select, withSchool } from '#server/db/scope.ts';
import { runNightly } from '#server/jobs/nightly.ts';
import { fitModel } from '#server/services/practice/fit-model.ts';
import { loadModel } from '#server/services/practice/load-study.ts';
import { loadOptimiser, type Optimise } from '#server/services/practice/optimiser.ts';
import { verifyLog } from '#server/services/practice/verify-log.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { AFTERWARDS, aDriftingStudy } from '#tests/support/drifting.ts';

const DAY_MS = 24 * 3600_000;
const weights = (changed: Record<number, number>): number[] =>
  DEFAULT_MODEL.weights.map((weight, index) => changed[index] ?? weight);

/** Memories that hardly grow, and memories that grow for ever: the made-up answers speak for the first. */
const HONEST = weights({ 8: 0, 10: 0.01, 11: 0.001 });
const HOPEFUL = weights({ 8: 4, 11: 5 });

/** An optimiser that has its answer ready, and remembers what it was asked. */
function ready(answer: number[]): { optimise: Optimise; asked: number[] } {
  const asked: number[] = [];
  return {
    asked,
    optimise: async (sequences) => {
      asked.push(sequences.flat().length);
      return answer;
    },
  };
}

interface ModelRow {
  user_id: string | null;
  version: number;
  weights: number[];
  attempts: number;
  log_loss_before: number;
  log_loss_after: number;
  drift: number;
  is_adopted: boolean;
}

const models = (schoolId: string) =>
  withSchool(schoolId, () => select<ModelRow>('SELECT * FROM memory_models ORDER BY user_id NULLS FIRST, version'));
const faults = async (schoolId: string) => (await withSchool(schoolId, verifyLog)).faults;

describe('a school that recalls less than was expected', () => {
  test('gets better weights, and every state is folded by them', async () => {
    const { school, student } = await aDriftingStudy();
    const report = await runNightly(school.id, { optimise: ready(HONEST).optimise, now: AFTERWARDS });
    expect(report).toMatchObject({ checked: 1, schoolFit: 'adopted' });
    expect(report.rebuilt).toBeGreaterThan(0);
    const [model] = await models(school.id);
    expect(model).toMatchObject({ user_id: null, version: 1, attempts: 1200, is_adopted: true });
    expect(model?.log_loss_after).toBeLessThan(model?.log_loss_before ?? 0);
    expect(model?.drift).toBeLessThan(-0.08);
    const { model: inForce } = await withSchool(school.id, () => loadModel(student.id));
    expect(inForce.weights[8]).toBe(0);
    expect(await faults(school.id)).toEqual([]);
  });

  test('keeps its weights where the fitted ones do worse, and keeps the fit', async () => {
    const { school, student } = await aDriftingStudy();
    const report = await runNightly(school.id, { optimise: ready(HOPEFUL).optimise, now: AFTERWARDS });
    expect(report).toMatchObject({ schoolFit: 'kept', rebuilt: 0 });
    const [model] = await models(school.id);
    expect(model).toMatchObject({ version: 1, is_adopted: false });
    expect(model?.log_loss_after).toBeGreaterThan(model?.log_loss_before ?? 0);
    const { model: inForce } = await withSchool(school.id, () => loadModel(student.id));
    expect(inForce).toBe(DEFAULT_MODEL);
  });

  test('is fitted to the older four fifths alone', async () => {
    const { school } = await aDriftingStudy();
    const { optimise, asked } = ready(HOPEFUL);
    await fitModel(school.id, { userId: null, drift: -0.2 }, { optimise, now: AFTERWARDS });
    // 40 of 50 days of 24 questions, each with its lesson before it.
    expect(asked).toEqual([24 * 41]);
  });

  test('is never fitted to under a thousand attempts', async () => {
    const { school } = await aDriftingStudy(37, 27);
    const { optimise, asked } = ready(HONEST);
    const report = await runNightly(school.id, { optimise, now: AFTERWARDS });
    expect(report).toMatchObject({ schoolFit: 'too few attempts', studentFits: ['too few attempts'], rebuilt: 0 });
    expect(asked).toEqual([]);
    expect(await models(school.id)).toEqual([]);
  });

  test('goes on without an optimiser', async () => {
    const absent = loadOptimiser(() => {
      throw new Error('Cannot find module');
    });
    expect(absent).toBeNull();
    const { school } = await aDriftingStudy();
    const report = await runNightly(school.id, { optimise: absent, now: AFTERWARDS });
    expect(report).toMatchObject({ checked: 1, schoolFit: null, studentFits: [], rebuilt: 0 });
    expect(await models(school.id)).toEqual([]);
  });

  test('is fitted again after a week, as the next version', async () => {
    const { school } = await aDriftingStudy();
    const { optimise } = ready(HOPEFUL);
    const fitAt = (now: Date) => fitModel(school.id, { userId: null, drift: -0.2 }, { optimise, now });
    expect(await fitAt(AFTERWARDS)).toBe('kept');
    expect(await fitAt(new Date(AFTERWARDS.getTime() + 6 * DAY_MS))).toBe('fitted lately');
    expect(await fitAt(new Date(AFTERWARDS.getTime() + 7 * DAY_MS))).toBe('kept');
    expect((await models(school.id)).map(({ version }) => version)).toEqual([1, 2]);
  });

  test('is fitted once by two processes at once', async () => {
    const { school } = await aDriftingStudy();
    const { optimise } = ready(HOPEFUL);
    const fitOnce = () => fitModel(school.id, { userId: null, drift: -0.2 }, { optimise, now: AFTERWARDS });
    await Promise.all([fitOnce(), fitOnce()]);
    expect((await models(school.id)).map(({ version }) => version)).toEqual([1]);
  });
});

test('a student’s own weights go before the school’s', async () => {
  const { school, student } = await aDriftingStudy();
  const task = { userId: student.id, drift: -0.2 };
  expect(await fitModel(school.id, task, { optimise: ready(HONEST).optimise, now: AFTERWARDS })).toBe('adopted');
  await fitModel(school.id, { userId: null, drift: -0.2 }, { optimise: ready(HONEST).optimise, now: AFTERWARDS });
  const report = await runNightly(school.id, { optimise: null, now: AFTERWARDS });
  expect(report.rebuilt).toBe(1);
  const [row] = await withSchool(school.id, () =>
    select<{ user_id: string | null }>(
      'SELECT m.user_id FROM student_models s JOIN memory_models m ON m.id = s.model_id',
    ),
  );
  expect(row?.user_id).toBe(student.id);
  expect(await faults(school.id)).toEqual([]);
});

test('weights that are no numbers are refused', async () => {
  const { school } = await aDriftingStudy();
  const { optimise } = ready(weights({ 3: Number.NaN }));
  await expect(fitModel(school.id, { userId: null, drift: -0.2 }, { optimise, now: AFTERWARDS })).rejects.toThrow(
    'The optimiser gave no weights.',
  );
  expect(await models(school.id)).toEqual([]);
});

const optimiser = loadOptimiser();
test.runIf(optimiser)('the open library’s optimiser finds weights that foretell the newest fifth better', async () => {
  const { school } = await aDriftingStudy();
  const report = await runNightly(school.id, { optimise: optimiser, now: AFTERWARDS });
  expect(report.schoolFit).toBe('adopted');
  const [model] = await models(school.id);
  expect(model?.log_loss_after).toBeLessThan(model?.log_loss_before ?? 0);
  expect(await faults(school.id)).toEqual([]);
});
