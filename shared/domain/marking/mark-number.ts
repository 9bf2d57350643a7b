import type { NumberSpec } from '#shared/schemas/question-body.ts';
import type { Verdict } from '#shared/schemas/verdict.ts';
import { numberWords, quantityWords } from './number-words.ts';
import { readNumber, type TypedNumber } from './read-number.ts';
import { matchUnits, type UnitMatch, unitRatios } from './units.ts';

/** Relative slack for the arithmetic of doubles, so that 9.9 is within 0.1 of 9.8. */
const ROUNDING = 1e-12;

/**
 * Marks a typed number. On a part of several marks only the right value decides: a wrong one may still earn method
 * marks, which the last line does not show.
 */
export function markNumber(spec: NumberSpec, answer: string, marks: number): Verdict {
  const isOneMark = marks === 1;
  const wanted = wantedWords(spec);
  const read = readNumber(answer);
  const unit = read === null ? null : unitGiven(spec, read);
  if (read === null || unit === 'unreadable') {
    return isOneMark && !/[\p{L}\p{N}]/u.test(answer)
      ? { outcome: 'none', words: `The scheme asks for ${wanted}; your answer does not read as one number.` }
      : undecided(
          `Your answer does not read as one number. The scheme asks for ${wanted}: mark it against the scheme.`,
        );
  }
  const lost = (words: string): Verdict =>
    isOneMark ? { outcome: 'none', words } : undecided(`${words} Mark your working against the scheme.`);
  if (unit === 'different' && isConverted(spec, read)) {
    return undecided(
      `${typedWords(read)} is as much as the ${wanted} of the scheme. Check whether it asks for that unit.`,
    );
  }
  if (!valuesOf(spec, read).some((value) => isAccepted(spec, value))) {
    if (signsOf(read).length === 0 && isAccepted(spec, read.value * shareOf(spec.unit))) {
      return undecided(`${typedWords(read)} is as much as ${wanted}. Check whether the scheme accepts that form.`);
    }
    return lost(`The scheme asks for ${wanted}; your answer reads as ${typedWords(read)}.`);
  }
  switch (unit) {
    case 'different':
      return lost(`The number is right, but the unit is not: the scheme asks for ${wanted}.`);
    case 'missing':
      return lost(`The number is right, but the unit is part of the answer: the scheme asks for ${wanted}.`);
    case 'maybe':
      return undecided(`The number is right. Check your unit against the scheme, which asks for ${wanted}.`);
    default:
      if (read.isAbout) return undecided(`The number is right, as “about”. Check whether the scheme allows that.`);
      return { outcome: 'full', words: fullWords(spec, read.value) };
  }
}

const undecided = (words: string): Verdict => ({ outcome: 'undecided', words });

/** The right quantity in another unit: 174.5 mm for 17.45 cm. */
const isConverted = (spec: NumberSpec, read: TypedNumber): boolean =>
  spec.unit !== undefined &&
  unitRatios(spec.unit, signsOf(read).join('')).some((ratio) => isAccepted(spec, read.value * ratio));

/** What is typed around the number. */
const signsOf = ({ currency, times, isPercent, rest }: TypedNumber): string[] =>
  [currency, times, isPercent ? '%' : '', rest].filter((part) => part !== '');

/** How the typed unit stands to the one wanted. `missing`: none typed where one is needed. */
function unitGiven(spec: NumberSpec, read: TypedNumber): Exclude<UnitMatch, 'unknown'> | 'missing' | 'unreadable' {
  const typed = signsOf(read);
  const [only] = typed;
  if (typed.length > 1) return 'unreadable';
  if (spec.unit === undefined) {
    if (only === undefined || only === '£' || only === '×') return 'same';
    // Whether 37.5% may stand for 0.375, or 42% for 42, is for the student to see.
    return read.isPercent ? 'maybe' : 'unreadable';
  }
  if (only === undefined) return spec.isUnitRequired ? 'missing' : 'same';
  const match = matchUnits(spec.unit, only);
  return match === 'unknown' ? 'unreadable' : match;
}

/** How many of a unit make one whole: 100 of %, 1000 of "per 1,000"; 1 of any other. */
function shareOf(unit = ''): number {
  if (/^(?:%|per ?cent)$/iu.test(unit)) return 100;
  const [, whole] = /(?:^| )per (\d[\d, ]*)/u.exec(unit) ?? [];
  return whole === undefined ? 1 : Number(whole.replace(/[, ]/gu, ''));
}

const valuesOf = (spec: NumberSpec, { value, isPercent }: TypedNumber): number[] =>
  isPercent && spec.unit === undefined ? [value, value / 100] : [value];

function isAccepted({ value: wanted, tolerance = 0, range }: NumberSpec, value: number): boolean {
  const [low, high] = range ? [range.min, range.max] : [wanted - tolerance, wanted + tolerance];
  const slack = ROUNDING * Math.max(Math.abs(low), Math.abs(high));
  return value >= low - slack && value <= high + slack;
}

function wantedWords({ value, unit, tolerance, range }: NumberSpec): string {
  if (range) return `${quantityWords(range.min, undefined)} to ${quantityWords(range.max, unit)}`;
  const exact = quantityWords(value, unit);
  return tolerance ? `${exact}, give or take ${quantityWords(tolerance, undefined)}` : exact;
}

function typedWords({ value, currency, isPercent, rest }: TypedNumber): string {
  if (currency === '£') return quantityWords(value, currency);
  return currency === ''
    ? quantityWords(value, isPercent ? '%' : rest || undefined)
    : `${currency}${numberWords(value)}`;
}

function fullWords(spec: NumberSpec, value: number): string {
  const typed = quantityWords(value, spec.unit);
  return spec.range || spec.tolerance
    ? `${typed} is within what the scheme accepts: ${wantedWords(spec)}.`
    : `${quantityWords(spec.value, spec.unit)} is what the scheme asks for.`;
}
