const PREFIX = 'plait.answers.';

/** Where the answers of one person's set wait until the server has them. */
export const unsentKey = (userId: string, setId: string): string => `${PREFIX}${userId}.${setId}`;

function unsentKeys(userId: string): string[] {
  try {
    return Object.keys(sessionStorage).filter((key) => key.startsWith(`${PREFIX}${userId}.`));
  } catch {
    return [];
  }
}

/** The sets of a person with answers that wait on this device. */
export const unsentSets = (userId: string): string[] =>
  unsentKeys(userId).map((key) => key.slice(unsentKey(userId, '').length));

/** How many answers of a person wait on this device. */
export function countUnsent(userId: string): number {
  return unsentKeys(userId).reduce((count, key) => {
    try {
      const kept: unknown = JSON.parse(sessionStorage.getItem(key) ?? '[]');
      return count + (Array.isArray(kept) ? kept.length : 1);
    } catch {
      return count + 1;
    }
  }, 0);
}
