import { select } from '#server/db/scope.ts';
import { type PartStanding, presentResult } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import type { AnswerResultDto } from '#shared/schemas/practice.ts';
import type { QuestionBody } from '#shared/schemas/question-body.ts';
import type { LoadedItem } from './load-set-items.ts';
import { MEMORY_COLUMNS, type MemoryRow, memoryOf } from './memory-row.ts';
import { loadNextPapers } from './next-papers.ts';
import { loadPaperTitles, loadTopics, need } from './study-facts.ts';
import { NEWEST_MARK } from './study-sql.ts';

interface AnswerRow extends MemoryRow {
  id: string;
  set_item_id: string;
  how_sure: HowSure;
  responses: string[];
  marked_parts: MarkedPart[] | null;
  marks: number | null;
}

const loadAnswers = (itemIds: readonly string[]) =>
  select<AnswerRow>(
    `SELECT a.id, a.set_item_id, a.how_sure, a.responses, m.parts AS marked_parts, m.marks,
       ${MEMORY_COLUMNS}
     FROM answers a ${NEWEST_MARK}
     LEFT JOIN memory_states ms ON ms.user_id = a.user_id AND ms.question_id = a.question_id
     WHERE a.set_item_id = ANY($1)`,
    [itemIds],
  );

/** How each part stands before the student has ticked anything: decided by Plait, or waiting. */
export const machineStandings = (body: QuestionBody, responses: readonly string[]): PartStanding[] =>
  body.parts.map((part, index) => {
    const verdict = markPart(part, responses[index] ?? '');
    return {
      markedBy: verdict.outcome === 'undecided' ? 'student' : 'plait',
      words: verdict.words,
      earned: verdict.earned,
    };
  });

const markedStandings = (parts: readonly MarkedPart[]): PartStanding[] =>
  parts.map(({ markedBy, words, earned }) => ({ markedBy: markedBy === 'plait' ? 'plait' : 'student', words, earned }));

const reasonPaperId = ({ reason }: LoadedItem): string[] =>
  'paperId' in reason && reason.paperId ? [reason.paperId] : [];

/**
 * Results of those of the items that have been answered, by set item. A bounded number of statements whatever the
 * number of items. @param alreadyId an item whose answer this request did not make
 */
export async function loadResults(
  scope: Scope,
  items: readonly LoadedItem[],
  alreadyId?: string,
): Promise<Map<string, AnswerResultDto>> {
  const answers = await loadAnswers(items.map((item) => item.id));
  if (answers.length === 0) return new Map();
  const byItem = new Map(items.map((item) => [item.id, item]));
  const answered = answers.map((answer) => need(byItem, answer.set_item_id));
  const topicIds = answered.map((item) => item.topic_id);
  const topics = await loadTopics(topicIds);
  const papers = await loadNextPapers(scope, topicIds);
  const titles = await loadPaperTitles(answered.flatMap(reasonPaperId));
  return new Map(
    answers.map((answer) => {
      const item = need(byItem, answer.set_item_id);
      const paper = papers.get(item.topic_id) ?? null;
      const [reasonPaper] = reasonPaperId(item);
      const memory = memoryOf(answer);
      const result = presentResult({
        answerId: answer.id,
        setItemId: item.id,
        already: item.id === alreadyId,
        howSure: answer.how_sure,
        responses: answer.responses,
        body: item.body,
        topic: need(topics, item.topic_id),
        reason: item.reason,
        reasonPaper: reasonPaper ? (titles.get(reasonPaper) ?? null) : null,
        parts: answer.marked_parts
          ? markedStandings(answer.marked_parts)
          : machineStandings(item.body, answer.responses),
        marks: answer.marks,
        returnsOn: memory && returnOn(memory, paper?.on ?? null, scope.today),
        paper: paper && { title: paper.title, on: paper.on },
      });
      return [item.id, result];
    }),
  );
}
