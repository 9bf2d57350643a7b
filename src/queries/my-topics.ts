import { queryOptions } from '@tanstack/react-query';
import { myTopicListSchema } from '#shared/schemas/my-topics.ts';
import { api } from '#src/lib/api.ts';
import { practiceKeys } from './practice.ts';

/** The student's own topics with where each stands, and what that would mean in their papers. */
export const myTopicsQuery = () =>
  queryOptions({
    queryKey: practiceKeys.topics(),
    queryFn: ({ signal }) => api.get('/my-topics', myTopicListSchema, signal),
  });
