import { UNIT_SYMBOLS } from './unit-names.ts';

/** Powers of symbols: { m: 1, s: -2 }. */
export type Powers = ReadonlyMap<string, number>;

/** Powers of ten. BIPM SI Brochure, 9th edition (2019), table 7. */
const PREFIX_POWERS: Record<string, number> = { n: -9, μ: -6, m: -3, c: -2, d: -1, h: 2, k: 3, M: 6, G: 9, T: 12 };

/** Named units as multiples of products of others. BIPM SI Brochure, 9th edition (2019), tables 4 and 8. */
const DEFINITIONS: Record<string, readonly [multiple: number, product: string]> = {
  N: [1, 'kg^1 m^1 s^-2'],
  J: [1, 'kg^1 m^2 s^-2'],
  W: [1, 'kg^1 m^2 s^-3'],
  Pa: [1, 'kg^1 m^-1 s^-2'],
  V: [1, 'kg^1 m^2 s^-3 A^-1'],
  Ω: [1, 'kg^1 m^2 s^-3 A^-2'],
  C: [1, 'A^1 s^1'],
  Hz: [1, 's^-1'],
  Bq: [1, 's^-1'],
  min: [60, 's^1'],
  h: [3600, 's^1'],
  day: [86_400, 's^1'],
  week: [604_800, 's^1'],
  t: [1000, 'kg^1'],
  ha: [10_000, 'm^2'],
  B: [8, 'bit^1'],
  p: [0.01, '£^1'],
};

/** How many of `wanted` one of `given` is: 0.1 for mm in cm. Null where they measure different things. */
export function unitRatio(wanted: Powers, given: Powers): number | null {
  const [a, b] = [sizeOf(wanted), sizeOf(given)];
  return spellPowers(a.powers) === spellPowers(b.powers) ? b.multiple / a.multiple : null;
}

/** One spelling of a product, whatever the order of its factors. */
export const spellPowers = (powers: Powers): string =>
  [...powers]
    .filter(([, power]) => power !== 0)
    .map(([symbol, power]) => `${symbol}^${power}`)
    .sort()
    .join(' ');

/** Multiplies `powers` by a product such as "mile^1 h^-1", raised to `exponent`. */
export function multiplyPowers(powers: Map<string, number>, product: string, exponent: number): void {
  for (const [symbol, power] of factors(product)) powers.set(symbol, (powers.get(symbol) ?? 0) + power * exponent);
}

const factors = (product: string): [symbol: string, power: number][] =>
  product.split(' ').map((factor) => {
    const [symbol = '', power] = factor.split('^');
    return [symbol, Number(power)];
  });

function sizeOf(unit: Powers): { multiple: number; powers: Powers } {
  const powers = new Map<string, number>();
  let multiple = 1;
  const include = (name: string, power: number): void => {
    const [prefix, symbol] = UNIT_SYMBOLS.get(name) ?? ['', name];
    const [times, product] = DEFINITIONS[symbol] ?? [1, null];
    multiple *= 10 ** ((PREFIX_POWERS[prefix] ?? 0) * power) * times ** power;
    if (product === null) powers.set(symbol, (powers.get(symbol) ?? 0) + power);
    else for (const [factor, inner] of factors(product)) include(factor, inner * power);
  };
  // Within a product a degree Celsius is a difference of temperature: J/kg °C is J/kg K.
  for (const [symbol, power] of unit) include(symbol === '°C' && unit.size > 1 ? 'K' : symbol, power);
  return { multiple, powers };
}
