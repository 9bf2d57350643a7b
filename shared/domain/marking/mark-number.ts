import type { NumberSpec } from '#shared/schemas/question-body.ts';
import type { Verdict } from '#shared/schemas/verdict.ts';
import { quantityWords } from './number-words.ts';
import { readNumber, type TypedNumber } from './read-number.ts';
import { matchUnits, type UnitMatch } from './units.ts';

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
    return isOneMark && !/\p{L}/u.test(answer)
      ? { outcome: 'none', words: `The scheme asks for ${wanted}; your answer does not read as one number.` }
      : undecided(
          `Your answer does not read as one number. The scheme asks for ${wanted}: mark it against the scheme.`,
        );
  }
  const lost = (words: string): Verdict =>
    isOneMark ? { outcome: 'none', words } : undecided(`${words} Mark your working against the scheme.`);
  if (!valuesOf(spec, read).some((value) => isAccepted(spec, value))) {
    const typed = quantityWords(read.value, read.isPercent ? '%' : undefined);
    return lost(`The scheme asks for ${wanted}; your answer reads as ${typed}.`);
  }
  switch (unit) {
    case 'different':
      return lost(`The number is right, but the unit is not: the scheme asks for ${wanted}.`);
    case 'missing':
      return lost(`The number is right, but the unit is part of the answer: the scheme asks for ${wanted}.`);
    case 'maybe':
      return undecided(`The number is right. Check your unit against the scheme, which asks for ${wanted}.`);
    default:
      return { outcome: 'full', words: fullWords(spec, read.value) };
  }
}

const undecided = (words: string): Verdict => ({ outcome: 'undecided', words });

/** How the typed unit stands to the one wanted. `missing`: none typed where one is needed. */
function unitGiven(spec: NumberSpec, read: TypedNumber): Exclude<UnitMatch, 'unknown'> | 'missing' | 'unreadable' {
  const typed = [read.currency, read.isPercent ? '%' : '', read.rest].filter((part) => part !== '');
  const [only] = typed;
  if (typed.length > 1) return 'unreadable';
  if (spec.unit === undefined) {
    if (only === undefined || only === '£') return 'same';
    return read.isPercent ? percentGiven(spec, read) : 'unreadable';
  }
  if (only === undefined) return spec.isUnitRequired ? 'missing' : 'same';
  const match = matchUnits(spec.unit, only);
  return match === 'unknown' ? 'unreadable' : match;
}

/** Without a unit in the scheme, 37.5% is 0.375; that 42% should be 42 is for the student to see. */
const percentGiven = (spec: NumberSpec, { value }: TypedNumber): 'same' | 'maybe' =>
  isAccepted(spec, value / 100) ? 'same' : 'maybe';

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

function fullWords(spec: NumberSpec, value: number): string {
  const typed = quantityWords(value, spec.unit);
  return spec.range || spec.tolerance
    ? `${typed} is within what the scheme accepts: ${wantedWords(spec)}.`
    : `${quantityWords(spec.value, spec.unit)} is what the scheme asks for.`;
}
