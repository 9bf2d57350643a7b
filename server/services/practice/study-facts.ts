import { select } from '#server/db/scope.ts';

export interface SubjectFact {
  id: string;
  code: string;
  name: string;
  strand: string;
  position: number;
}

export interface TopicFact {
  id: string;
  number: string;
  title: string;
  subjectId: string;
}

/** Names of a school's subjects, by id: a few dozen rows. */
export async function loadSubjects(): Promise<Map<string, SubjectFact>> {
  const rows = await select<SubjectFact>('SELECT id, code, name, strand, position FROM subjects ORDER BY position, id');
  return new Map(rows.map((row) => [row.id, row]));
}

/** Names of these topics, by id. */
export async function loadTopics(ids: Iterable<string>): Promise<Map<string, TopicFact>> {
  const rows = await select<TopicFact>(
    `SELECT t.id, t.number, t.title, sp.subject_id AS "subjectId"
     FROM topics t JOIN specifications sp ON sp.id = t.specification_id WHERE t.id = ANY($1)`,
    [[...new Set(ids)]],
  );
  return new Map(rows.map((row) => [row.id, row]));
}

/** A paper's title as a student reads it: "Biology Paper 1". */
export async function loadPaperTitles(ids: Iterable<string>): Promise<Map<string, string>> {
  const rows = await select<{ id: string; title: string }>(
    `SELECT p.id, s.name || ' ' || p.title AS title
     FROM papers p JOIN specifications sp ON sp.id = p.specification_id JOIN subjects s ON s.id = sp.subject_id
     WHERE p.id = ANY($1)`,
    [[...new Set(ids)]],
  );
  return new Map(rows.map((row) => [row.id, row.title]));
}

/** A fact that must be there: a missing one is a fault of ours, not of the request. */
export function need<T>(facts: ReadonlyMap<string, T>, id: string): T {
  const fact = facts.get(id);
  if (fact === undefined) throw new Error('a row names a fact that was not loaded');
  return fact;
}
