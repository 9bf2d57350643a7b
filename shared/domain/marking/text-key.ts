import { plainCharacters } from './typed-text.ts';

const END = /(?<![ .,;])[ .,;]+$/u;

/** Typed text in plain characters, without the quotation marks around it and the comma, semicolon or stop at its end. */
export function bareText(text: string): string {
  const plain = plainCharacters(text);
  const ended = plain.replace(END, '');
  const isQuoted = ended.length > 2 && /^["']/u.test(ended) && ended.endsWith(ended.charAt(0));
  const bare = isQuoted ? ended.slice(1, -1).replace(END, '').trim() : ended;
  // A mark alone may be what is asked for.
  return bare === '' ? plain : bare;
}

/** Lower case, without leading article, inner "the", hyphens between letters, and spaces but between digits. */
export const comparisonKey = (text: string): string =>
  keptWords(text)
    .join(' ')
    .replace(/(?<=\p{L})-(?=\p{L})/gu, ' ')
    .replace(/(?<!\d) | (?!\d)/gu, '');

/** A key without its accents and apostrophes, which keyboards make hard to type; œ as oe. */
export const looseKey = (key: string): string =>
  withoutApostrophes(key).normalize('NFD').replace(/\p{M}/gu, '').replace(/œ/gu, 'oe').replace(/æ/gu, 'ae');

export const withoutApostrophes = (key: string): string => key.replace(/'/gu, '');

/** Words without punctuation or the hyphen or stroke that joins them, a space before and after each. */
export const spacedWords = (text: string): string =>
  ` ${keptWords(text).join(' ')} `
    .replace(/(?<=\p{L})[+/-](?=[\p{L}\d])|(?<=\d)[+/-](?=\p{L})/gu, ' ')
    .replace(/[^\p{L}\p{M}\d^+/-]+/gu, ' ');

function keptWords(text: string): string[] {
  const all = bareText(text).toLowerCase().split(' ');
  const kept = all.filter((word, index) => word !== 'the' && !(index === 0 && (word === 'a' || word === 'an')));
  return kept.length > 0 ? kept : all;
}

/**
 * Whether the two differ in letter case where it tells symbols apart: the listed one has up to three characters of
 * mixed case (Co, mG), or the typed one has and the letters after its first differ too (Co for CO; not Au for au).
 */
export function differsInSymbolCase(listed: string, typed: string): boolean {
  const [a, b] = [bareText(listed), bareText(typed)];
  if (a === b || a.toLowerCase() !== b.toLowerCase()) return false;
  return isSymbol(a) || (isSymbol(b) && a.slice(1) !== b.slice(1));
}

/** Up to three characters of mixed case that are no capitalised word: "Co", "mG", "kPa", "Br-"; not "Bob". */
const isSymbol = (text: string): boolean =>
  text.length <= 3 && /\p{Lu}/u.test(text) && /\p{Ll}/u.test(text) && !/^\p{Lu}\p{Ll}{2}$/u.test(text);
