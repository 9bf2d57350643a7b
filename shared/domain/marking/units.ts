import { plainCharacters } from './typed-text.ts';
import { UNIT_NAMES, UNIT_NAMES_ANY_CASE, UNIT_NAMES_LOOSE } from './unit-names.ts';
import { multiplyPowers, type Powers, spellPowers, unitRatio } from './unit-size.ts';

/**
 * How a typed unit stands to the expected one. `maybe`: it may name the same quantity in other words (N/kg for m/s²),
 * or differs in letter case only, or is ambiguous (m for minutes).
 * `unknown`: it is not a unit that the marker knows.
 */
export type UnitMatch = 'same' | 'maybe' | 'different' | 'unknown';

type Names = ReadonlyMap<string, readonly string[]>;

const UNIT_LIMIT = 40;
/** Symbols written without a space between them: "kgms" is three. */
const RUN_LIMIT = 3;
const READING_LIMIT = 64;
/** A second number among the units: "h 5 min" after a 1. */
const MIXED = /\p{L} \d+ ?\p{L}/u;
/** The same, where the first unit may also be read as having that power: "m 5", "h5m". */
const MAYBE_MIXED = /\p{L}(?: \d| ?\d+ ?\p{L})/u;
/** A sum in another currency is a slip that the scheme may forgive. */
const CURRENCIES = /^(?:[£$€]|(?:pound|dollar|euro)s?|GBP)$/iu;
/** A run of letters with the power written after it, or one other character. */
const TOKEN = /([\p{L}°%£$€]+)(?: ?\^? ?\(?([+-]?[0-3])\)?)?|[^\p{L}°%£$€]/gu;

/** Compares two units as typed: "mol dm⁻³" is "mol/dm3", "metres per second" is "ms^-1", "kgs" is "kg". */
export function matchUnits(expected: string, typed: string): UnitMatch {
  const [a, b] = [plainUnit(expected), plainUnit(typed)];
  if (bare(a) === bare(b)) return 'same';
  if (a.length > UNIT_LIMIT || b.length > UNIT_LIMIT) return 'unknown';
  if (MIXED.test(b)) return 'unknown';
  const wanted = readings(a, UNIT_NAMES);
  const isCaseOnly = bare(a).toLowerCase() === bare(b).toLowerCase();
  if (wanted.length === 0) return isCaseOnly ? 'same' : 'unknown';
  const given = readings(b, UNIT_NAMES);
  if (given.length === 0) return matchAnyCase(wanted, b);
  if (overlap(wanted, given)) return 'same';
  const isEqual = ratios(wanted, given).some((ratio) => Math.abs(ratio - 1) < 1e-9);
  const isLikely =
    isCaseOnly ||
    isEqual ||
    (CURRENCIES.test(a) && CURRENCIES.test(b)) ||
    overlap(wanted, readings(b.toLowerCase(), UNIT_NAMES_LOOSE));
  if (isLikely) return 'maybe';
  return MAYBE_MIXED.test(b) ? 'unknown' : 'different';
}

/** How many of the expected unit one of the typed unit may be: [0.1] for mm in cm. None for another quantity. */
export function unitRatios(expected: string, typed: string): number[] {
  const [a, b] = [plainUnit(expected), plainUnit(typed)];
  if (a.length > UNIT_LIMIT || b.length > UNIT_LIMIT || MIXED.test(b)) return [];
  return ratios(readings(a, UNIT_NAMES), readings(b, UNIT_NAMES));
}

const ratios = (wanted: readonly Powers[], given: readonly Powers[]): number[] =>
  wanted.flatMap((one) => given.map((other) => unitRatio(one, other)).filter((ratio) => ratio !== null));

/** Untidy case ("hz", "KG") is the right unit where it can mean no other; "mj" can. */
function matchAnyCase(wanted: readonly Powers[], typed: string): UnitMatch {
  const given = readings(typed.toLowerCase(), UNIT_NAMES_ANY_CASE);
  if (!overlap(wanted, given)) return 'unknown';
  return new Set(given.map(spellPowers)).size === 1 ? 'same' : 'maybe';
}

const plainUnit = (unit: string): string =>
  plainCharacters(unit)
    .replace(/\bper cent\b/giu, '%')
    .replace(/\bdeg(?:ree)?s?\.? ?(?=c\b|celsius\b|centigrade\b)/giu, '')
    .replace(/° ?(?=c\b)/giu, '°');

const bare = (unit: string): string => unit.replace(/[ .,]/gu, '');

function overlap(a: readonly Powers[], b: readonly Powers[]): boolean {
  const spelled = b.map(spellPowers);
  return a.some((powers) => spelled.includes(spellPowers(powers)));
}

/** Every way of reading a unit; none where a word of it is unknown. */
function readings(unit: string, names: Names): Powers[] {
  let found: Powers[] = [new Map()];
  let side = 1;
  let nextPower = 1;
  for (const [token, letters, power] of unit.matchAll(TOKEN)) {
    if (letters === undefined) {
      if (token === '/') side = -1;
      else if (!' .·*()'.includes(token)) return [];
    } else if (/^per$/iu.test(letters)) side = -1;
    else if (/^(?:squared?|sq|cubed|cubic)$/iu.test(letters)) {
      const exponent = /^s/iu.test(letters) ? 2 : 3;
      // "4 squared" may be 16: a power that follows no unit is the number's.
      if (/ed$/iu.test(letters))
        found = found.filter(({ size }) => size > 0).map((reading) => raiseLast(reading, exponent));
      else nextPower = exponent;
    } else {
      const options = runs(letters, names, RUN_LIMIT);
      const exponent = side * nextPower * Number(power ?? 1);
      found = found.flatMap((reading) => options.map((run) => joined(reading, run, side, exponent)));
      nextPower = 1;
    }
    if (found.length === 0 || found.length > READING_LIMIT) return [];
  }
  return found.filter(({ size }) => size > 0);
}

/** Splits run-together letters into known symbols; untidy ones are split only where they are no name themselves. */
function runs(letters: string, names: Names, limit: number): string[][] {
  const whole = (names.get(letters) ?? []).map((meaning) => [meaning]);
  if (limit === 1 || (whole.length > 0 && names !== UNIT_NAMES)) return whole;
  const split: string[][] = [];
  for (let end = 1; end < Math.min(letters.length, 4); end += 1) {
    for (const meaning of names.get(letters.slice(0, end)) ?? []) {
      for (const rest of runs(letters.slice(end), names, limit - 1)) split.push([meaning, ...rest]);
    }
  }
  return [...whole, ...split];
}

/** Multiplies a reading by a run of symbols; a written power belongs to the last of them. */
function joined(reading: Powers, run: readonly string[], side: number, exponent: number): Powers {
  const powers = new Map(reading);
  run.forEach((meaning, index) => {
    multiplyPowers(powers, meaning, index === run.length - 1 ? exponent : side);
  });
  return powers;
}

/** "metres squared": the power follows the word, which stands last in the map. */
function raiseLast(reading: Powers, exponent: number): Powers {
  const last = [...reading].at(-1);
  return last === undefined ? reading : new Map([...reading, [last[0], last[1] * exponent]]);
}
