// Holds the order of a set against a table of least numbers of neighbours: npm run check:order -- FILE.json
import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { type Orderable, type OrderMode, orderSet } from '#shared/domain/schedule/order.ts';

/** Questions that one row may order: several times the largest set. */
const MOST_QUESTIONS = 240;
const MOST_ROWS = 100_000;

/** Questions a topic, and the least number of neighbours of one topic that any order of them can have. */
const rowSchema = z.object({
  counts: z
    .array(z.int().min(1))
    .min(1)
    .refine((counts) => counts.reduce((sum, count) => sum + count, 0) <= MOST_QUESTIONS, {
      error: `more than ${MOST_QUESTIONS} questions`,
    }),
  min_adjacent_equal: z.int().min(0),
});
const tableSchema = z.object({ rows: z.array(rowSchema).min(1).max(MOST_ROWS) });
type Row = z.output<typeof rowSchema>;

const MODES: readonly OrderMode[] = ['normal', 'hardestFirst'];
const MODE_WORDS: Record<OrderMode, string> = { normal: 'in normal order', hardestFirst: 'hardest first' };

/** Questions of the row's topics, topic by topic. Two subjects take the topics in turn; recall takes a few values. */
const itemsOf = ({ counts }: Row): Orderable[] =>
  counts
    .flatMap((count, topic) => Array.from({ length: count }, () => topic))
    .map((topic, priority) => ({
      questionId: `q${priority}`,
      topicId: `t${topic}`,
      subjectId: `s${topic % 2}`,
      recall: ((priority * 7) % 10) / 10,
      priority,
    }));

/** Neighbours of one topic in the order the product gives; null where the order is not made of the row's questions. */
function neighboursOf(row: Row, mode: OrderMode): number | null {
  const items = itemsOf(row);
  const ordered = orderSet(items, mode);
  if (ordered.length !== items.length || new Set([...ordered, ...items]).size !== items.length) return null;
  return ordered.filter(({ topicId }, index) => topicId === ordered[index - 1]?.topicId).length;
}

/** What is wrong with a row's orders; empty where both attain the minimum. */
function faultsOf(row: Row): string[] {
  return MODES.flatMap((mode) => {
    const neighbours = neighboursOf(row, mode);
    if (neighbours === row.min_adjacent_equal) return [];
    return [`${neighbours === null ? 'questions lost or doubled' : neighbours} ${MODE_WORDS[mode]}`];
  });
}

/** The rows of a file. @throws Error saying in one sentence why they cannot be read */
async function readRows(file: string | undefined): Promise<Row[]> {
  if (file === undefined) throw new Error('Name a file: npm run check:order -- FILE.json');
  const text = await readFile(file, 'utf8').catch((error: Error) => {
    throw new Error(`${file} cannot be read: ${error.message}`);
  });
  let content: unknown;
  try {
    content = JSON.parse(text);
  } catch (error) {
    throw new Error(`${file} is not JSON: ${error instanceof Error ? error.message : error}`);
  }
  const table = tableSchema.safeParse(content);
  if (table.success) return table.data.rows;
  throw new Error(`${file} is not a table of rows { counts, min_adjacent_equal }:\n${z.prettifyError(table.error)}`);
}

/** @returns the exit code: 0 where every row attains its minimum, 1 where one does not, 2 where there is no table */
async function checkOrder(file: string | undefined): Promise<number> {
  let rows: Row[];
  try {
    rows = await readRows(file);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    return 2;
  }
  let attained = 0;
  for (const row of rows) {
    const faults = faultsOf(row);
    if (faults.length === 0) attained += 1;
    else console.log(`Topics of ${row.counts.join(', ')}: minimum ${row.min_adjacent_equal}, ${faults.join(', ')}`);
  }
  console.log(`${attained} of ${rows.length} rows attain the minimum`);
  return attained === rows.length ? 0 : 1;
}

process.exitCode = await checkOrder(process.argv[2]);
