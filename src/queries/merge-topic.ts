import { useMutation, useQueryClient } from '@tanstack/react-query';
import { topicSchema } from '#shared/schemas/curriculum.ts';
import { api } from '#src/lib/api.ts';
import { curriculumKeys } from './curriculum.ts';
import { questionKeys } from './questions.ts';
import { statisticsKeys } from './statistics.ts';

interface TopicMerge {
  id: string;
  intoTopicId: string;
}

/** Merges a topic into another, and reads all that names topics again. Done once the list shows it. */
export function useMergeTopic(subjectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, intoTopicId }: TopicMerge) => api.post(`/topics/${id}/merge`, { intoTopicId }, topicSchema),
    onSuccess: async () => {
      for (const queryKey of [questionKeys.all, statisticsKeys.all]) void client.invalidateQueries({ queryKey });
      await client.invalidateQueries({ queryKey: curriculumKeys.topics(subjectId) });
    },
  });
}
