/** Symbols of units that GCSE papers use, each with the prefixes it takes there. */
const PREFIXES: Record<string, string> = {
  m: 'n μ m c d k M',
  g: 'n μ m k',
  s: 'n μ m',
  A: 'μ m k',
  K: '',
  mol: 'm μ',
  N: 'μ m k M',
  J: 'm k M G',
  W: 'm k M G',
  V: 'm k M',
  Ω: 'm k M',
  Pa: 'h k M',
  Hz: 'k M G T',
  C: 'n μ m',
  Bq: 'k M',
  Sv: 'μ m',
  T: 'm μ',
  eV: 'k M',
  B: 'k M G T',
  bit: 'k M G',
  t: '',
  min: '',
  h: '',
  day: '',
  week: '',
  year: '',
  '°': '',
  '°C': '',
  '%': '',
  '£': '',
  p: '',
  $: '',
  '€': '',
  ha: '',
  mile: '',
};

const PREFIX_WORDS: Record<string, string> = {
  n: 'nano',
  μ: 'micro',
  m: 'milli',
  c: 'centi',
  d: 'deci',
  h: 'hecto',
  k: 'kilo',
  M: 'mega',
  G: 'giga',
  T: 'tera',
};

/** Words for the symbols that take prefixes; a plural s is added. */
const WORDS: Record<string, readonly string[]> = {
  m: ['metre', 'meter'],
  g: ['gram', 'gramme'],
  s: ['second', 'sec'],
  A: ['amp', 'ampere'],
  K: ['kelvin'],
  mol: ['mole'],
  N: ['newton'],
  J: ['joule'],
  W: ['watt'],
  V: ['volt'],
  Ω: ['ohm'],
  Pa: ['pascal'],
  Hz: ['hertz'],
  C: ['coulomb'],
  Bq: ['becquerel'],
  Sv: ['sievert'],
  T: ['tesla'],
  eV: ['electronvolt'],
  B: ['byte'],
  bit: ['bit'],
  t: ['tonne'],
  min: ['minute', 'min'],
  h: ['hour', 'hr'],
  day: ['day'],
  week: ['week'],
  year: ['year', 'yr'],
  '°': ['degree', 'deg'],
  '£': ['pound'],
  p: ['penny', 'pence'],
  $: ['dollar'],
  '€': ['euro'],
  ha: ['hectare'],
  mile: ['mile'],
};

/** Other spellings, as the product of powers that they stand for. */
const ALIASES: Record<string, string> = {
  l: 'dm^3',
  L: 'dm^3',
  litre: 'dm^3',
  litres: 'dm^3',
  liter: 'dm^3',
  liters: 'dm^3',
  ml: 'cm^3',
  mL: 'cm^3',
  millilitre: 'cm^3',
  millilitres: 'cm^3',
  cc: 'cm^3',
  mph: 'mile^1 h^-1',
  kmph: 'km^1 h^-1',
  kph: 'km^1 h^-1',
  kWh: 'kW^1 h^1',
  Wh: 'W^1 h^1',
  MWh: 'MW^1 h^1',
  C: '°C^1',
  oC: '°C^1',
  celsius: '°C^1',
  Celsius: '°C^1',
  centigrade: '°C^1',
  percent: '%^1',
  GBP: '£^1',
  um: 'μm^1',
  ug: 'μg^1',
  us: 'μs^1',
  uA: 'μA^1',
};

function buildNames(): Map<string, readonly string[]> {
  const names = new Map<string, readonly string[]>();
  const add = (name: string, meaning: string) => names.set(name, [...new Set([...(names.get(name) ?? []), meaning])]);
  for (const [symbol, prefixes] of Object.entries(PREFIXES)) {
    for (const prefix of ['', ...prefixes.split(' ').filter(Boolean)]) {
      add(`${prefix}${symbol}`, `${prefix}${symbol}^1`);
      for (const word of WORDS[symbol] ?? []) {
        add(`${PREFIX_WORDS[prefix] ?? ''}${word}`, `${prefix}${symbol}^1`);
        add(`${PREFIX_WORDS[prefix] ?? ''}${word}s`, `${prefix}${symbol}^1`);
      }
    }
  }
  for (const [name, meaning] of Object.entries(ALIASES)) add(name, meaning);
  return names;
}

/** What a symbol or word may mean: powers of symbols, "dm^3" or "mile^1 h^-1". Case matters. */
export const UNIT_NAMES: ReadonlyMap<string, readonly string[]> = buildNames();

/** The same without case, for writing that can mean only one thing. */
export const UNIT_NAMES_ANY_CASE: ReadonlyMap<string, readonly string[]> = [...UNIT_NAMES].reduce(
  (folded, [name, meanings]) =>
    folded.set(name.toLowerCase(), [...new Set([...(folded.get(name.toLowerCase()) ?? []), ...meanings])]),
  new Map<string, readonly string[]>(),
);
