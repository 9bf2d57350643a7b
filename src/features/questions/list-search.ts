import { z } from 'zod';
import { listQuestionsSchema, questionSortSchema } from '#shared/schemas/question.ts';
import { readPage } from '#src/lib/cursor-pages.ts';
import type { QuestionFilter } from '#src/queries/questions.ts';

const { kind, status } = listQuestionsSchema.shape;

/** What the address of the list says. Anything unknown in it is passed over. */
const listSearchSchema = z.object({
  q: z.string().max(200).catch(''),
  topic: z.uuid().optional().catch(undefined),
  kind: kind.catch(undefined),
  status: status.catch(undefined),
  author: z.uuid().optional().catch(undefined),
  sort: questionSortSchema.catch('number'),
});
export type ListSearch = z.output<typeof listSearchSchema>;

export const readListSearch = (search: URLSearchParams): ListSearch =>
  listSearchSchema.parse(
    Object.fromEntries(
      ['q', 'topic', 'kind', 'status', 'author', 'sort'].map((name) => [name, search.get(name) ?? undefined]),
    ),
  );

/** True where the list is narrowed, so that an empty one means no match. */
export const isNarrowed = ({ q, topic, kind: k, status: s, author }: ListSearch) =>
  Boolean(q.trim() || topic || k || s || author);

export function toFilter(subjectId: string, search: URLSearchParams): QuestionFilter {
  const { q, topic, kind: k, status: s, author, sort } = readListSearch(search);
  return {
    subjectId,
    q: q.trim() || undefined,
    topicId: topic,
    kind: k,
    status: s,
    authorId: author,
    sort,
    cursor: readPage(search).cursor,
  };
}

/** The address with some of it changed; a change of filter starts again at the first page. */
export function withSearch(search: URLSearchParams, change: Record<string, string | undefined>): URLSearchParams {
  const next = new URLSearchParams(search);
  for (const name of ['cursor', 'from']) next.delete(name);
  for (const [name, value] of Object.entries(change)) {
    if (value) next.set(name, value);
    else next.delete(name);
  }
  return next;
}
