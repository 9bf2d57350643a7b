import type { z } from 'zod';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { presentTopic } from '#server/presenters/topic.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { topicListSchema } from '#shared/schemas/curriculum.ts';
import { loadTopics } from './load-topics.ts';

/** A subject's topics with their weights, questions and dates taught. @throws Problem 404 */
export async function listTopics({ actor }: Scope, subjectId: string): Promise<z.output<typeof topicListSchema>> {
  authorize(subjectPolicy, 'read', actor, { subjectId });
  const rows = await loadTopics(actor, subjectId);
  return { items: rows.map(presentTopic) };
}
