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

/** Words for the symbols. */
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

/** Symbols that students also write for another unit, and the degree for which a temperature's own is meant. */
const AMBIGUOUS: Record<string, readonly string[]> = {
  m: ['min^1', 'mile^1'],
  '°': ['°C^1'],
  deg: ['°C^1'],
  degs: ['°C^1'],
  degree: ['°C^1'],
  degrees: ['°C^1'],
};

type Names = Map<string, readonly string[]>;

function add(names: Names, name: string, meanings: readonly string[]): void {
  names.set(name, [...new Set([...(names.get(name) ?? []), ...meanings])]);
}

function buildNames(): Names {
  const names: Names = new Map();
  for (const [symbol, prefixes] of Object.entries(PREFIXES)) {
    for (const prefix of ['', ...prefixes.split(' ').filter(Boolean)]) {
      add(names, `${prefix}${symbol}`, [`${prefix}${symbol}^1`]);
      for (const word of WORDS[symbol] ?? [])
        add(names, `${PREFIX_WORDS[prefix] ?? ''}${word}`, [`${prefix}${symbol}^1`]);
    }
  }
  for (const [name, meaning] of Object.entries(ALIASES)) add(names, name, [meaning]);
  for (const [name, meanings] of [...names]) if (/^\p{L}+[^\P{L}s]$/u.test(name)) add(names, `${name}s`, meanings);
  return names;
}

function withoutCase(names: Names): Names {
  const folded: Names = new Map();
  for (const [name, meanings] of names) add(folded, name.toLowerCase(), meanings);
  return folded;
}

/** What may be meant where the exact reading is another unit: "Kg", "ms" as the plural of "m", "m" for minutes. */
function buildLoose(names: Names): Names {
  const loose = withoutCase(names);
  for (const [name, meanings] of names) if (/^\p{L}$/u.test(name)) add(loose, `${name.toLowerCase()}s`, meanings);
  for (const [name, meanings] of Object.entries(AMBIGUOUS)) add(loose, name, meanings);
  return loose;
}

const ALL_NAMES = buildNames();

/** What a symbol or word, or its plural, may mean: powers of symbols, "dm^3" or "mile^1 h^-1". Case matters. */
export const UNIT_NAMES: ReadonlyMap<string, readonly string[]> = ALL_NAMES;

/** The same without case, for writing that can mean only one thing. */
export const UNIT_NAMES_ANY_CASE: ReadonlyMap<string, readonly string[]> = withoutCase(ALL_NAMES);

/** Lower-case names with everything that a student may mean by them; enough to doubt a unit, never to accept one. */
export const UNIT_NAMES_LOOSE: ReadonlyMap<string, readonly string[]> = buildLoose(ALL_NAMES);

/** Every symbol with its prefix parted: "kJ" is ["k", "J"]. */
export const UNIT_SYMBOLS: ReadonlyMap<string, readonly [prefix: string, symbol: string]> = new Map(
  Object.entries(PREFIXES).flatMap(([symbol, prefixes]) =>
    ['', ...prefixes.split(' ').filter(Boolean)].map((prefix) => [`${prefix}${symbol}`, [prefix, symbol]] as const),
  ),
);
