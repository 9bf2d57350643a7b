import { execute } from '#server/db/scope.ts';

/**
 * One change to a student's practice at a time: a second tab or set waits here until the first has committed, so that
 * two openings make one set and two answers to one question fold one after the other.
 */
export const takeTurn = (userId: string): Promise<object[]> =>
  execute('SELECT id FROM users WHERE id = $1 FOR NO KEY UPDATE', [userId]);
