import { distance } from 'fastest-levenshtein';
import { comparisonKey, looseKey, spacedWords, withoutApostrophes } from './text-key.ts';

interface Near {
  listed: string;
  key: string;
  slips: number;
}

const digitsOf = (key: string): string => key.replace(/\D/gu, '');

/** The listed answer with the fewest slips from `key`; null where all differ by more than two, or in a digit. */
export function nearest(listed: readonly string[], key: string): Near | null {
  let best: Near | null = null;
  for (const one of listed) {
    const candidate = comparisonKey(one);
    const slips = fewSlips(candidate, key);
    if (slips !== null && (best === null || slips < best.slips)) best = { listed: one, key: candidate, slips };
  }
  return best;
}

/** One slip in a word of 5 letters or more, two in one of 9 or more. */
export function isSlip({ key, slips }: Omit<Near, 'listed'>): boolean {
  const letters = key.match(/\p{L}/gu)?.length ?? 0;
  return slips <= (letters >= 9 ? 2 : letters >= 5 ? 1 : 0);
}

/**
 * The accepted answer of which a misspelling stands somewhere in the text; undefined where there is none, or a
 * rejected one is as near to those words.
 */
export function misspeltWithin(text: string, accept: readonly string[], reject: readonly string[]): string | undefined {
  const words = spacedWords(text).trim().split(' ');
  const rivals = reject.map((one) => withoutApostrophes(comparisonKey(one)));
  return accept.find((listed) => {
    const key = withoutApostrophes(comparisonKey(listed));
    if (!/\p{L}/u.test(key)) return false;
    const loose = looseKey(key);
    return stretches(words, Math.min(key.length, loose.length) - 2, Math.max(key.length, loose.length) + 2).some(
      (stretch) => {
        const slips = looseKey(stretch) === loose ? 0 : fewSlips(key, stretch);
        return (
          slips !== null && isSlip({ key, slips }) && !rivals.some((rival) => (fewSlips(rival, stretch) ?? 3) <= slips)
        );
      },
    );
  });
}

/** Runs of neighbouring words, as keys of `shortest` to `longest` characters. */
function stretches(words: readonly string[], shortest: number, longest: number): string[] {
  const found: string[] = [];
  for (let start = 0; start < words.length; start += 1) {
    let key = '';
    for (const word of words.slice(start, start + longest)) {
      key += /\d$/u.test(key) && /^\d/u.test(word) ? ` ${word}` : word;
      if (key.length > longest) break;
      if (key.length >= shortest) found.push(key);
    }
  }
  return found;
}

/** Slips between two keys; null where they are more than two, or one is in a digit. */
function fewSlips(listed: string, key: string): number | null {
  if (Math.abs(listed.length - key.length) > 2 || digitsOf(listed) !== digitsOf(key)) return null;
  const slips = slipsBetween(listed, key);
  return slips <= 2 ? slips : null;
}

/** Letters to add, leave out or replace, and neighbours to swap: "nuclues" is one slip from "nucleus". */
function slipsBetween(listed: string, key: string): number {
  const edits = distance(listed, key);
  // A swap counts as two edits. Beyond four edits, two swaps cannot bring it within the two slips that matter.
  if (edits < 2 || edits > 4) return edits;
  for (let at = 0; at + 1 < key.length; at += 1) {
    const swapped = `${key.slice(0, at)}${key[at + 1]}${key[at]}${key.slice(at + 2)}`;
    if (distance(listed, swapped) === edits - 2) return 1 + slipsBetween(listed, swapped);
  }
  return edits;
}
