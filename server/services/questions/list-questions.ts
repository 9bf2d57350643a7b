import { cutPage, readCursor } from '#server/db/page.ts';
import { select } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { presentQuestionRow, type QuestionRow } from '#server/presenters/question-row.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { loadFigures } from '#server/services/statistics/version-figures.ts';
import type { ListQuestions, QuestionPageDto, VersionStatus } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { FACETS, KEYS, PAGES, TOTAL } from './list-sql.ts';
import { searchWords } from './search-words.ts';

interface Facet {
  status: VersionStatus;
  kind: QuestionKind;
  author_id: string;
  author: string;
  questions: number;
}

const sum = (facets: Facet[]) => facets.reduce((total, facet) => total + facet.questions, 0);

/** Authors, each once, in the order of the rows. */
const authorsOf = (facets: Facet[]) =>
  [...new Map(facets.map((facet) => [facet.author_id, facet.author]))]
    .slice(0, 200)
    .map(([id, name]) => ({ id, name }));

/**
 * One page of a subject's questions. `counts` and `authors` are the whole subject's; `total` is what the filters leave.
 * A row speaks of the version being worked on, its figures of the live one. @throws Problem 404; 422 at `cursor`
 */
export async function listQuestions({ actor }: Scope, query: ListQuestions): Promise<QuestionPageDto> {
  const { subjectId, status = null, kind = null, authorId = null, topicId = null, sort, limit } = query;
  authorize(subjectPolicy, 'read', actor, { subjectId });
  const cursor = readCursor(sort, KEYS[sort].type, query.cursor);
  const { patterns, number } = searchWords(query.q);
  const filters = [subjectId, status, kind, authorId, topicId, patterns, number];

  const rows = await select<QuestionRow>(PAGES[sort], [...filters, cursor?.key ?? null, cursor?.id ?? null, limit + 1]);
  const facets = await select<Facet>(FACETS, [subjectId]);
  const count = (state: VersionStatus) => sum(facets.filter((facet) => facet.status === state));
  const { items, nextCursor } = cutPage(sort, rows, limit);
  const isCounted = patterns === null && topicId === null;
  const [counted] = isCounted ? [] : await select<{ total: number }>(TOTAL, filters);
  const matching = facets.filter(
    (facet) =>
      (status === null || facet.status === status) &&
      (kind === null || facet.kind === kind) &&
      (authorId === null || facet.author_id === authorId),
  );
  const shownVersion = (row: QuestionRow) => row.live_version_id ?? row.version_id;
  const figuresOf = await loadFigures(items.map(shownVersion));
  return {
    items: items.map((row) => presentQuestionRow(row, figuresOf(shownVersion(row)))),
    nextCursor,
    total: counted?.total ?? sum(matching),
    counts: { draft: count('draft'), inReview: count('inReview'), live: count('live'), retired: count('retired') },
    authors: authorsOf(facets),
  };
}
