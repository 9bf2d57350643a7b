import type { TextSpec } from '#shared/schemas/question-body.ts';
import type { Verdict } from '#shared/schemas/verdict.ts';
import { isSlip, misspeltWithin, nearest } from './spelling.ts';
import { bareText, comparisonKey, differsInSymbolCase, looseKey, spacedWords } from './text-key.ts';

/** Longest answer looked through for a misspelling, in characters; listed answers have up to 200. */
const SEARCH_LIMIT = 300;

/**
 * Marks a typed word or phrase against the listed ones. Case (but of symbols), articles, spaces, hyphens, the mark at
 * the end and quotes do not matter. A slip in spelling, accents or apostrophes, or an accepted answer within a longer
 * one, is not guessed at. On a part of several marks only a listed answer decides: another may still earn some of them.
 */
export function markText(spec: TextSpec, answer: string, marks: number): Verdict {
  const { accept, reject = [] } = spec;
  const key = comparisonKey(answer);
  const isSame = (listed: string): boolean => comparisonKey(listed) === key;
  const wanted = `“${accept[0] ?? ''}”`;
  const accepted = accept.filter(isSame);
  // Where both lists have it but for its case, as CO and co, the case decides.
  const isExact = (listed: string): boolean => bareText(listed) === bareText(answer);
  const rejected = reject.filter(isSame).find((listed) => accepted.length === 0 || isExact(listed));
  const sure =
    accepted.find(isExact) ??
    (rejected === undefined ? accepted.find((listed) => !differsInSymbolCase(listed, answer)) : undefined);
  if (sure !== undefined) return { outcome: 'full', words: `The scheme accepts “${sure}”.` };
  if (rejected !== undefined) {
    return { outcome: 'none', words: `The scheme asks for ${wanted}. It does not accept “${rejected}”.` };
  }
  if (accepted[0] !== undefined) return undecided(`The scheme has “${accepted[0]}”; your capitals differ.`);
  const loose = looseKey(key);
  const accented = accept.find((listed) => looseKey(comparisonKey(listed)) === loose);
  if (accented !== undefined) return undecided(`The scheme has “${accented}”; your accents or apostrophes differ.`);
  const near = nearest(accept, key);
  if (near !== null && isSlip(near)) {
    const rival = nearest(reject, key);
    return marks === 1 && rival !== null && rival.slips <= near.slips
      ? {
          outcome: 'none',
          words: `The scheme asks for “${near.listed}”. Your spelling is as near to “${rival.listed}”.`,
        }
      : undecided(`This is close to “${near.listed}”, but not spelled the same.`);
  }
  const held = accept.find(holding(answer));
  if (held !== undefined) return undecided(`Your answer has “${held}” in it, with more around it.`);
  if (answer.length > SEARCH_LIMIT) return undecided('Your answer is longer than Plait can look through.');
  const misspelt = misspeltWithin(answer, accept, reject);
  if (misspelt !== undefined) {
    return undecided(`Your answer has something close to “${misspelt}” in it, with more around it.`);
  }
  return marks === 1 && spec.unlisted === 'wrong'
    ? { outcome: 'none', words: `The scheme asks for ${wanted}, and your answer is not among those it lists.` }
    : undecided('Your answer is not among those the scheme lists.');
}

const undecided = (words: string): Verdict => ({
  outcome: 'undecided',
  words: `${words} Mark it against the scheme: same meaning counts.`,
});

/** A test of whether a listed answer stands in the text as whole words. */
function holding(text: string): (listed: string) => boolean {
  const inText = spacedWords(text);
  return (listed) => spacedWords(listed) !== ' ' && inText.includes(spacedWords(listed));
}
