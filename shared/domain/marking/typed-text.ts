const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻';
const PLAIN = '0123456789+-';

/**
 * Typed text in one spelling of its characters: raised digits as ^2, one-character fractions as 1/2 (after a space),
 * any minus or dash as -, straight quotes, single spaces. Case is kept.
 */
export function plainCharacters(typed: string): string {
  return typed
    .replace(
      /[⁰¹²³⁴-⁹⁺⁻]+/gu,
      (raised) => `^${[...raised].map((sign) => PLAIN[SUPERSCRIPTS.indexOf(sign)] ?? '').join('')}`,
    )
    .replace(/[¼½¾⅐-⅞]/gu, (fraction) => ` ${fraction}`)
    .normalize('NFKC')
    .replace(/⁄/gu, '/')
    .replace(/[−‐‑‒–—﹣]/gu, '-')
    .replace(/[‘’ʼ′]/gu, "'")
    .replace(/[“”]/gu, '"')
    .replace(/\s+/gu, ' ')
    .trim();
}
