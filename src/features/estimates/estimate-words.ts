import type { EstimateBandDto, EstimatesDto, MemoryModelDto } from '#shared/schemas/estimate.ts';
import { dateWords } from '#src/lib/dates.ts';

/** "18,420". */
export const countWords = (count: number): string => count.toLocaleString('en-GB');

/** "−6.3", "+1", "0": a difference in points, with the sign of the trade. */
export function pointsWords(points: number): string {
  if (points === 0) return '0';
  return points < 0 ? `−${-points}` : `+${points}`;
}

/** "1 point", "6.3 points". */
const sizeWords = (points: number): string => `${Math.abs(points)} ${Math.abs(points) === 1 ? 'point' : 'points'}`;

/** "80–90%". */
export const bandWords = ({ from, to }: Pick<EstimateBandDto, 'from' | 'to'>): string => `${from}–${to}%`;

export interface SeenBand extends Pick<EstimateBandDto, 'from' | 'to'> {
  attempts: number;
  expected: number;
  observed: number;
  /** Observed less expected, in points. */
  difference: number;
}

/** The bands whose figures may be shown. */
export const seenBands = (bands: readonly EstimateBandDto[]): SeenBand[] =>
  bands.flatMap(({ from, to, figures }) =>
    figures ? [{ from, to, ...figures, difference: figures.observed - figures.expected }] : [],
  );

/** The page's first sentence. */
export function openingWords({ attempts, students, check }: EstimatesDto): string {
  const met = `answers to questions met before`;
  if (!check) {
    const who = students === 1 ? '1 student has' : `${students} students have`;
    return `So far ${who} given ${countWords(attempts)} ${met}. Figures are shown from ten students on.`;
  }
  return `Over the last ${countWords(attempts)} ${met}, students recalled ${check.observed}%; the model expected ${check.expected}%.`;
}

/** Where the school stands to the threshold. */
export function driftWords({ check, thresholdPoints }: EstimatesDto): string | null {
  if (!check) return null;
  const { driftPoints, isPastThreshold } = check;
  const limit = Math.abs(thresholdPoints);
  if (isPastThreshold) return `That is ${sizeWords(driftPoints)} too hopeful, past the limit of ${limit}.`;
  if (driftPoints < 0) return `That is ${sizeWords(driftPoints)} too hopeful, within the limit of ${limit}.`;
  return driftPoints === 0
    ? 'That is as expected.'
    : `That is ${sizeWords(driftPoints)} better than expected: the estimates are careful.`;
}

/** Which weights students' estimates go by. */
export function inUseWords(models: readonly MemoryModelDto[]): string {
  const model = models.find(({ isInUse }) => isInUse);
  if (model) {
    return `In use: version ${model.version}, fitted on ${dateWords(model.fittedOn)} to ${countWords(model.attempts)} attempts of this school.`;
  }
  return models.length === 0
    ? 'In use: the library’s own weights. None have been fitted to this school’s answers yet.'
    : 'In use: the library’s own weights. No version fitted to this school’s answers has done better.';
}

const studentCount = (count: number | null): string => (count === null ? 'fewer than ten' : countWords(count));

/** Weights of students' own, as counts alone. */
export const ownFitWords = ({ studentFits }: EstimatesDto): string =>
  `Weights of a student’s own: tried for ${studentCount(studentFits.tried)} students, adopted for ${studentCount(studentFits.adopted)}.`;

/** How many students' own estimates are past the threshold. */
export const driftingWords = ({ driftingStudents, thresholdPoints }: EstimatesDto): string =>
  `Students whose own estimates are more than ${Math.abs(thresholdPoints)} points too hopeful: ${studentCount(driftingStudents)}.`;

/** What became of a version. */
export function outcomeWords({ isAdopted, isInUse }: MemoryModelDto): string {
  if (isInUse) return 'Adopted, in use';
  return isAdopted ? 'Adopted, since replaced' : 'Kept as it was';
}
