import { distance } from 'fastest-levenshtein';
import type { TextSpec } from '#shared/schemas/question-body.ts';
import type { Verdict } from '#shared/schemas/verdict.ts';
import { plainCharacters } from './typed-text.ts';

/**
 * Marks a typed word or phrase against the listed ones. Case, articles, spaces, hyphens, the final stop and the kind
 * of quotes do not matter. A slip in spelling or accents, or an accepted answer within a longer one, is not guessed at.
 */
export function markText(spec: TextSpec, answer: string): Verdict {
  const key = comparisonKey(answer);
  const accepted = spec.accept.find((listed) => comparisonKey(listed) === key);
  if (accepted !== undefined) return { outcome: 'full', words: `The scheme accepts “${accepted}”.` };
  const wanted = `“${spec.accept[0] ?? ''}”`;
  const rejected = (spec.reject ?? []).find((listed) => comparisonKey(listed) === key);
  if (rejected !== undefined) {
    return { outcome: 'none', words: `The scheme asks for ${wanted}. It does not accept “${rejected}”.` };
  }
  const accented = spec.accept.find((listed) => withoutAccents(comparisonKey(listed)) === withoutAccents(key));
  if (accented !== undefined) {
    return { outcome: 'undecided', words: `The scheme has “${accented}”; your accents differ. ${SELF_MARK}` };
  }
  const near = nearest(spec.accept, key);
  if (near !== null && isSlip(near)) {
    const rival = nearest(spec.reject ?? [], key);
    return rival !== null && rival.slips <= near.slips
      ? {
          outcome: 'none',
          words: `The scheme asks for “${near.listed}”. Your spelling is as near to “${rival.listed}”.`,
        }
      : { outcome: 'undecided', words: `This is close to “${near.listed}”, but not spelled the same. ${SELF_MARK}` };
  }
  const isHeld = holding(answer);
  const held = spec.accept.find(isHeld);
  if (held !== undefined && !spec.reject?.some(isHeld)) {
    return { outcome: 'undecided', words: `Your answer has “${held}” in it, with more around it. ${SELF_MARK}` };
  }
  return spec.unlisted === 'wrong'
    ? { outcome: 'none', words: `The scheme asks for ${wanted}, and your answer is not among those it lists.` }
    : { outcome: 'undecided', words: `Your answer is not among those the scheme lists. ${SELF_MARK}` };
}

const SELF_MARK = 'Mark it against the scheme: same meaning counts.';

/** Lower case, without leading article, inner "the", final stop, hyphens between letters, and spaces but between digits. */
const comparisonKey = (text: string): string =>
  words(text)
    .join(' ')
    .replace(/(?<=\p{L})-(?=\p{L})/gu, ' ')
    .replace(/(?<!\d) | (?!\d)/gu, '');

function words(text: string): string[] {
  const all = plainCharacters(text)
    .toLowerCase()
    .replace(/(?<![ .])[ .]+$/u, '')
    .split(' ');
  const kept = all.filter((word, index) => word !== 'the' && !(index === 0 && (word === 'a' || word === 'an')));
  return kept.length > 0 ? kept : all;
}

const withoutAccents = (key: string): string => key.normalize('NFD').replace(/\p{M}/gu, '');

interface Near {
  listed: string;
  key: string;
  slips: number;
}

const digitsOf = (key: string): string => key.replace(/\D/gu, '');

/** The listed answer with the fewest slips from `key`; null where all differ by more than two, or in a digit. */
function nearest(listed: readonly string[], key: string): Near | null {
  let best: Near | null = null;
  for (const one of listed) {
    const candidate = comparisonKey(one);
    if (Math.abs(candidate.length - key.length) > 2 || digitsOf(candidate) !== digitsOf(key)) continue;
    const slips = distance(candidate, key);
    if (slips <= 2 && (best === null || slips < best.slips)) best = { listed: one, key: candidate, slips };
  }
  return best;
}

/** One slip in a word of 5 letters or more, two in one of 9 or more. */
function isSlip({ key, slips }: Near): boolean {
  const letters = key.match(/\p{L}/gu)?.length ?? 0;
  return slips <= (letters >= 9 ? 2 : letters >= 5 ? 1 : 0);
}

/** A test of whether a listed answer stands in the text as whole words. */
function holding(text: string): (listed: string) => boolean {
  const inText = spacedWords(text);
  return (listed) => spacedWords(listed) !== ' ' && inText.includes(spacedWords(listed));
}

/** Words without punctuation, a space before and after each. */
const spacedWords = (text: string): string => ` ${words(text).join(' ')} `.replace(/[^\p{L}\p{M}\d^+/-]+/gu, ' ');
