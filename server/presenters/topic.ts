import type { Tier } from '#shared/schemas/common.ts';
import type { TopicDto } from '#shared/schemas/curriculum.ts';

export interface TopicRow {
  id: string;
  specification_id: string;
  parent_id: string | null;
  number: string;
  title: string;
  tier: Tier | null;
  option: string | null;
  weights: TopicDto['weights'];
  live_questions: number;
  all_questions: number;
  taught: TopicDto['taught'];
}

/** A topic as the teachers of its subject see it. */
export const presentTopic = (row: TopicRow): TopicDto => ({
  id: row.id,
  specificationId: row.specification_id,
  parentId: row.parent_id,
  number: row.number,
  title: row.title,
  tier: row.tier,
  option: row.option,
  weights: row.weights,
  liveQuestions: row.live_questions,
  allQuestions: row.all_questions,
  taught: row.taught,
});
