import { sequelize } from '#server/db/sequelize.ts';

/** Statements the app sends while `work` runs, the school setting included. */
export async function countQueries<T>(work: () => Promise<T>): Promise<{ result: T; queries: number }> {
  let queries = 0;
  sequelize.addHook('beforeQuery', 'count', () => {
    queries += 1;
  });
  try {
    return { result: await work(), queries };
  } finally {
    sequelize.removeHook('beforeQuery', 'count');
  }
}
