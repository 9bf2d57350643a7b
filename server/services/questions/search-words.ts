import { foldText } from './plain-words.ts';

/** Most words of a search that count; nobody types more. */
const WORDS = 12;

const escapePattern = (word: string) => word.replace(/[\\%_]/g, '\\$&');

export interface Search {
  /** LIKE patterns, all of which the text must match; null where nothing is searched for. */
  patterns: string[] | null;
  /** Set where the search is a question's number: "223", "#223". */
  number: number | null;
}

/** A typed search as patterns: each word anywhere, in any order, signs of SQL and of Markdown taken literally or left out. */
export function searchWords(typed: string | undefined): Search {
  const words = foldText((typed ?? '').replaceAll('\0', '').replace(/[$*`|]/g, ' '))
    .split(' ')
    .filter((word) => word !== '')
    .slice(0, WORDS);
  const [first] = words;
  if (first === undefined) return { patterns: null, number: null };
  const number = words.length === 1 ? /^#?(\d{1,9})$/.exec(first)?.[1] : undefined;
  return {
    patterns: words.map((word) => `%${escapePattern(word)}%`),
    number: number === undefined ? null : Number(number),
  };
}
