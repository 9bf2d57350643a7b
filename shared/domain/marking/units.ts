import { plainCharacters } from './typed-text.ts';
import { UNIT_NAMES, UNIT_NAMES_ANY_CASE } from './unit-names.ts';

/**
 * How a typed unit stands to the expected one. `maybe`: it may name the same quantity in other words (N/kg for m/s²).
 * `unknown`: it is not a unit that the marker knows.
 */
export type UnitMatch = 'same' | 'maybe' | 'different' | 'unknown';

/** Powers of symbols: { m: 1, s: -2 }. */
type Powers = ReadonlyMap<string, number>;
type Names = ReadonlyMap<string, readonly string[]>;

const UNIT_LIMIT = 40;
/** Symbols written without a space between them: "kgms" is three. */
const RUN_LIMIT = 3;
const READING_LIMIT = 64;
/** A run of letters with the power written after it, or one other character. */
const TOKEN = /([\p{L}°%£$€]+)(?: ?\^? ?\(?([+-]?\d)\)?)?|[^\p{L}°%£$€]/gu;

/** Named units as products of others. */
const PRODUCTS: Record<string, string> = {
  N: 'kg^1 m^1 s^-2',
  J: 'kg^1 m^2 s^-2',
  W: 'kg^1 m^2 s^-3',
  Pa: 'kg^1 m^-1 s^-2',
  V: 'kg^1 m^2 s^-3 A^-1',
  Ω: 'kg^1 m^2 s^-3 A^-2',
  C: 'A^1 s^1',
  Hz: 's^-1',
  Bq: 's^-1',
};

/** Compares two units as typed: "mol dm⁻³" is "mol/dm3", "metres per second" is "ms^-1"; mJ is not MJ. */
export function matchUnits(expected: string, typed: string): UnitMatch {
  const [a, b] = [plainUnit(expected), plainUnit(typed)];
  if (bare(a) === bare(b)) return 'same';
  if (a.length > UNIT_LIMIT || b.length > UNIT_LIMIT) return 'unknown';
  const wanted = readings(a, UNIT_NAMES);
  if (wanted.length === 0) return bare(a).toLowerCase() === bare(b).toLowerCase() ? 'same' : 'unknown';
  const given = readings(b, UNIT_NAMES);
  if (given.length === 0) return matchAnyCase(wanted, b);
  if (overlap(wanted, given)) return 'same';
  return overlap(wanted.map(expanded), given.map(expanded)) ? 'maybe' : 'different';
}

/** Untidy case ("hz", "KG") is the right unit where it can mean no other; "mj" can. */
function matchAnyCase(wanted: readonly Powers[], typed: string): UnitMatch {
  const given = readings(typed.toLowerCase(), UNIT_NAMES_ANY_CASE);
  if (!overlap(wanted, given)) return 'unknown';
  return new Set(given.map(spell)).size === 1 ? 'same' : 'maybe';
}

const plainUnit = (unit: string): string =>
  plainCharacters(unit)
    .replace(/\bper cent\b/giu, '%')
    .replace(/\bdeg(?:ree)?s?\.? ?(?=c\b|celsius\b|centigrade\b)/giu, '')
    .replace(/° ?(?=c\b)/giu, '°');

const bare = (unit: string): string => unit.replace(/[ .]/gu, '');

const spell = (powers: Powers): string =>
  [...powers]
    .filter(([, power]) => power !== 0)
    .map(([symbol, power]) => `${symbol}^${power}`)
    .sort()
    .join(' ');

function overlap(a: readonly Powers[], b: readonly Powers[]): boolean {
  const spelled = b.map(spell);
  return a.some((powers) => spelled.includes(spell(powers)));
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
      if (/ed$/iu.test(letters)) found = found.map((reading) => raiseLast(reading, exponent));
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
  if (limit === 1 || (whole.length > 0 && names === UNIT_NAMES_ANY_CASE)) return whole;
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
    multiply(powers, meaning, index === run.length - 1 ? exponent : side);
  });
  return powers;
}

/** "metres squared": the power follows the word, which stands last in the map. */
function raiseLast(reading: Powers, exponent: number): Powers {
  const last = [...reading].at(-1);
  return last === undefined ? reading : new Map([...reading, [last[0], last[1] * exponent]]);
}

function multiply(powers: Map<string, number>, product: string, exponent: number): void {
  for (const factor of product.split(' ')) {
    const [symbol = '', power] = factor.split('^');
    powers.set(symbol, (powers.get(symbol) ?? 0) + Number(power) * exponent);
  }
}

function expanded(reading: Powers): Powers {
  const powers = new Map<string, number>();
  for (const [symbol, power] of reading) multiply(powers, PRODUCTS[symbol] ?? `${symbol}^1`, power);
  return powers;
}
