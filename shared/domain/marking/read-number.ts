import { plainCharacters } from './typed-text.ts';

/** What a typed answer reads as. */
export interface TypedNumber {
  value: number;
  /** True after a % sign, which is not part of `value`: "42%" has the value 42. */
  isPercent: boolean;
  /** Typed before the number; empty where none was. */
  currency: '' | '£' | '$' | '€';
  /** Typed before the number, as of a magnification: "×800", "x800". */
  times: '' | '×';
  /** Typed as near the number, not as it: "≈7", "about 7". */
  isAbout: boolean;
  /** What follows the number: a unit, or anything else. */
  rest: string;
}

const DIGITS = String.raw`(?:\d{1,3}(?:,\d{3})+(?![\d,])|\d{1,3}(?: \d{3})+(?! ?[\d/,])|\d+)(?:\.\d*)?|\.\d+`;
const POWER_OF_TEN = String.raw` ?[x×*·⋅✕] ?10 ?\^ ?\(? ?([+-]? ?\d{1,3}) ?\)?`;

/** A plain or mixed fraction, or a decimal with an optional power of ten. Every pattern runs in linear time. */
const FRACTION = /^(?:(\d{1,12}) )?(\d{1,12}(?:\.\d{1,12})?) ?\/ ?(\d{1,12}(?:\.\d{1,12})?)(?![\d.,])/u;
const DECIMAL = new RegExp(`^(${DIGITS})(?![\\d,])(?:e([+-]?\\d{1,3})(?!\\d)|${POWER_OF_TEN}(?!\\d))?`, 'iu');
const BARE_POWER = /^10 ?\^ ?\(? ?([+-]? ?\d{1,3}) ?\)?(?!\d)/u;

const ABOUT = /^(?:[~∼≈≃≅]|(?:about|around|roughly|approximately|approx\.?)(?!\p{L})) ?/iu;
const TIMES = /^[x×✕] ?(?=[\d.])/iu;

/** Longest name that may stand before an equals sign: "Concentration of acid =". */
const LABEL = /^[\p{L}\d ()_'^*+./×·≈-]{0,80}$/u;

/**
 * Reads an answer as one number in any ordinary typed form: 1,200; −5; .5; 3/4; 2 1/3; 1.2e3; 1.2 × 10³; £3.50; 42%; ×800.
 * Null where it is none, or more than one.
 */
export function readNumber(typed: string): TypedNumber | null {
  const last = afterLastEquals(plainCharacters(typed));
  if (last === null) return null;
  const written = last.replace(ABOUT, '');
  const text = written.replace(TIMES, '').replace(/\.$/u, '');
  const head = /^([+-]?) ?([£$€]?) ?([+-]?) ?/u.exec(text);
  const [opening = '', sign = '', currency = '', laterSign = ''] = head ?? [];
  if (sign !== '' && laterSign !== '') return null;
  const read = readValue(text.slice(opening.length));
  if (read === null) return null;
  const isNegative = sign === '-' || laterSign === '-';
  const rest = read.rest.trim();
  const isPercent = rest.startsWith('%');
  return {
    value: isNegative ? -read.value : read.value,
    isPercent,
    currency: currency as TypedNumber['currency'],
    isAbout: ABOUT.test(last),
    times: TIMES.test(written) ? '×' : '',
    rest: isPercent ? rest.slice(1).trim() : rest,
  };
}

/** The last value of a chain of equals signs is the answer, with the ≈ before it; what stands before does no harm. */
function afterLastEquals(text: string): string | null {
  const pieces = text.split(/=|(?=≈)/u);
  const last = pieces.pop() ?? '';
  const areLabels = pieces.every((piece) => LABEL.test(piece) && !/(?:^| )(?:or|and|not) /iu.test(piece));
  return areLabels ? last.trim() : null;
}

function readValue(text: string): { value: number; rest: string } | null {
  const fraction = FRACTION.exec(text);
  if (fraction) {
    const [whole, units, top, bottom] = fraction;
    const share = Number(top) / Number(bottom);
    if (!Number.isFinite(share) || (units !== undefined && share >= 1)) return null;
    return { value: Number(units ?? 0) + share, rest: text.slice(whole.length) };
  }
  const bare = BARE_POWER.exec(text);
  if (bare) return { value: 10 ** integer(bare[1]), rest: text.slice(bare[0].length) };
  const decimal = DECIMAL.exec(text);
  if (!decimal) return null;
  const [whole, digits = '', e, power] = decimal;
  const value = Number(`${digits.replace(/[, ]/gu, '')}e${integer(e ?? power)}`);
  return Number.isFinite(value) ? { value, rest: text.slice(whole.length) } : null;
}

const integer = (typed: string | undefined): number => Number((typed ?? '0').replace(/ /gu, ''));
