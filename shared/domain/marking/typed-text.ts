const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻';
const PLAIN = '0123456789+-';
/** Keyboards offer a ring above and a masculine ordinal, which would fold into a mark and a letter. */
const DEGREES = /[˚∘]|(?<!\p{L})[ºᵒ]/gu;

/** Signs that keyboards give for an apostrophe. NFKC would part some of them into a space and an accent. */
const APOSTROPHES = /[`´‘’‛‚ʹʻʼʽ′‵＇｀᾽᾿]/gu;
const QUOTES = /[“”„‟«»‹›「」『』]|''/gu;

/**
 * Typed text in one spelling of its characters: raised digits as ^2, one-character fractions as 1/2 (after a space),
 * any minus or dash as -, any degree sign as °, straight quotes and apostrophes, single spaces. Case is kept.
 */
export function plainCharacters(typed: string): string {
  return typed
    .replace(
      /[⁰¹²³⁴-⁹⁺⁻]+/gu,
      (raised) => `^${[...raised].map((sign) => PLAIN[SUPERSCRIPTS.indexOf(sign)] ?? '').join('')}`,
    )
    .replace(DEGREES, '°')
    .replace(APOSTROPHES, "'")
    .replace(/[¼½¾⅐-⅞]/gu, (fraction) => ` ${fraction}`)
    .normalize('NFKC')
    .replace(/⁄/gu, '/')
    .replace(/[−‐‑‒–—﹣]/gu, '-')
    .replace(/′/gu, "'")
    .replace(QUOTES, '"')
    .replace(/\s+/gu, ' ')
    .trim();
}
