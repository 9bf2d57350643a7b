import argon2 from 'argon2';
import { busy } from '#server/errors.ts';

/** OWASP Password Storage Cheat Sheet, argon2id minimum: 19 MiB, two passes, one lane. */
const PARAMETERS = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** Hashes at once, and how many may wait: hashing is the one thing here that can use up a machine. */
const AT_ONCE = 4;
const QUEUE = 200;

let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= QUEUE) {
      throw busy('Many people are signing in at once. Try again in a few seconds.');
    }
    await new Promise<void>((go) => waiting.push(go));
  }
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

/** The same typed word on every keyboard; otherwise a password is untouched. */
const canonical = (password: string) => password.normalize('NFC');

export const hashPassword = (password: string): Promise<string> =>
  inTurn(() => argon2.hash(canonical(password), PARAMETERS));

export const needsRehash = (hash: string): boolean => argon2.needsRehash(hash, PARAMETERS);

// Compared against where there is no account, so that unknown and known names take the same time.
let decoy: Promise<string> | undefined;

/** Verifies a password. Takes the same time where there is no hash. */
export async function verifyPassword(hash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this password');
  const against = hash ?? (await decoy);
  const matches = await inTurn(() => argon2.verify(against, canonical(password)));
  return hash !== null && matches;
}
