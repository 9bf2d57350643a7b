import { DRIFT_THRESHOLD, hasDrifted } from '#shared/domain/schedule/drift.ts';
import type { EstimateBandDto, EstimatesDto, MemoryModelDto } from '#shared/schemas/estimate.ts';

/** Sums over the students' checks. Shares are 0 to 1; figures and counts of fewer than ten students are null. */
export interface CheckRow {
  students: number;
  attempts: number;
  observed: number | null;
  expected: number | null;
  drifting: number | null;
  checked_on: string | null;
  tried: number | null;
  adopted: number | null;
}

/** Attempts of one tenth of expected recall, all students'; `at` counts from 1, `expected` is a sum. */
export interface BandRow {
  at: number;
  attempts: number;
  expected: number;
  recalled: number;
}

export interface ModelRow {
  version: number;
  fitted_on: string;
  attempts: number;
  drift: number;
  log_loss_before: number;
  log_loss_after: number;
  is_adopted: boolean;
  is_in_use: boolean;
}

const BANDS = 10;

// Whole percentages: with the totals beside them they do not give a band away that is held back.
const percent = (share: number): number => Math.round(share * 100);
const points = (share: number): number => Math.round(share * 1000) / 10;
const loss = (value: number): number => Math.round(value * 10_000) / 10_000;

function presentBand(index: number, row: BandRow | undefined): EstimateBandDto {
  const [from, to] = [index * BANDS, (index + 1) * BANDS];
  if (!row) return { from, to, figures: null };
  const { attempts, expected, recalled } = row;
  return {
    from,
    to,
    figures: { attempts, expected: percent(expected / attempts), observed: percent(recalled / attempts) },
  };
}

const presentModel = (row: ModelRow): MemoryModelDto => ({
  version: row.version,
  fittedOn: row.fitted_on,
  attempts: row.attempts,
  logLossBefore: loss(row.log_loss_before),
  logLossAfter: loss(row.log_loss_after),
  driftPoints: points(row.drift),
  isAdopted: row.is_adopted,
  isInUse: row.is_in_use,
});

function presentCheck({ attempts, observed, expected }: CheckRow): EstimatesDto['check'] {
  if (observed === null || expected === null) return null;
  return {
    observed: percent(observed),
    expected: percent(expected),
    driftPoints: points(observed - expected),
    isPastThreshold: hasDrifted({ attempts, observed, expected }),
  };
}

/** How expected recall has turned out over a school, as staff read it. */
export const presentEstimates = (facts: { check: CheckRow; bands: BandRow[]; models: ModelRow[] }): EstimatesDto => ({
  checkedOn: facts.check.checked_on,
  students: facts.check.students,
  attempts: facts.check.attempts,
  check: presentCheck(facts.check),
  thresholdPoints: points(DRIFT_THRESHOLD),
  bands: Array.from({ length: BANDS }, (_band, index) =>
    presentBand(
      index,
      facts.bands.find(({ at }) => at === index + 1),
    ),
  ),
  driftingStudents: facts.check.drifting,
  models: facts.models.map(presentModel),
  studentFits: { tried: facts.check.tried, adopted: facts.check.adopted },
});
