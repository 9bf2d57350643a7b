import { select } from '#server/db/scope.ts';
import type { QuestionBody, QuestionKind } from '#shared/schemas/question-body.ts';
import type { Reason } from '#shared/schemas/reason.ts';

/** One item of a set with the question version it asks. */
export interface LoadedItem {
  id: string;
  set_id: string;
  position: number;
  question_id: string;
  question_version_id: string;
  subject_id: string;
  /** The topic it was asked under, or the one that this was merged into since. */
  topic_id: string;
  reason: Reason;
  number: number;
  kind: QuestionKind;
  body: QuestionBody;
}

const ITEM = `
  SELECT i.id, i.set_id, i.position, i.question_id, i.question_version_id, i.subject_id,
    coalesce(t.merged_into_id, t.id) AS topic_id, i.reason,
    q.number, v.kind, v.body
  FROM set_items i
  JOIN topics t ON t.id = i.topic_id
  JOIN questions q ON q.id = i.question_id
  JOIN question_versions v ON v.id = i.question_version_id`;

/** A set's items in their order. */
export const loadSetItems = (setId: string): Promise<LoadedItem[]> =>
  select<LoadedItem>(`${ITEM} WHERE i.set_id = $1 ORDER BY i.position`, [setId]);

/** One item of a set; undefined where the set has no such item. */
export const loadSetItem = async (setId: string, itemId: string): Promise<LoadedItem | undefined> =>
  (await select<LoadedItem>(`${ITEM} WHERE i.set_id = $1 AND i.id = $2`, [setId, itemId]))[0];
