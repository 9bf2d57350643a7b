import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { type CreateTopic, subjectListSchema, topicListSchema, topicSchema } from '#shared/schemas/curriculum.ts';
import { api } from '#src/lib/api.ts';

export const curriculumKeys = {
  all: ['curriculum'] as const,
  subjects: () => [...curriculumKeys.all, 'subjects'] as const,
  topicLists: () => [...curriculumKeys.all, 'topics'] as const,
  topics: (subjectId: string) => [...curriculumKeys.topicLists(), subjectId] as const,
};

export const subjectsQuery = () =>
  queryOptions({
    queryKey: curriculumKeys.subjects(),
    queryFn: ({ signal }) => api.get('/subjects', subjectListSchema, signal),
    staleTime: 10 * 60_000,
    select: (list) => list.items,
  });

export const topicsQuery = (subjectId: string) =>
  queryOptions({
    queryKey: curriculumKeys.topics(subjectId),
    queryFn: ({ signal }) => api.get(`/subjects/${subjectId}/topics`, topicListSchema, signal),
    staleTime: 60_000,
    select: (list) => list.items,
  });

/** Adds a topic, and reads the subject's topics and options again. Done once the list shows it. */
export function useCreateTopic(subjectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: CreateTopic) => api.post(`/subjects/${subjectId}/topics`, input, topicSchema),
    onSuccess: async () => {
      void client.invalidateQueries({ queryKey: curriculumKeys.subjects() });
      await client.invalidateQueries({ queryKey: curriculumKeys.topics(subjectId) });
    },
  });
}

interface TaughtChange {
  classId: string;
  topicId: string;
  /** Null takes the date away. */
  taughtOn: string | null;
}

/** Sets when a class was taught a topic. */
export function useSetTaught(subjectId: string) {
  const client = useQueryClient();
  const { queryKey } = topicsQuery(subjectId);
  return useMutation({
    mutationFn: ({ classId, topicId, taughtOn }: TaughtChange) =>
      api.put(`/classes/${classId}/topics/${topicId}/taught`, { taughtOn }),
    onSuccess: (_nothing, { classId, topicId, taughtOn }) =>
      client.setQueryData(queryKey, (list) =>
        list
          ? {
              ...list,
              items: list.items.map((topic) =>
                topic.id === topicId
                  ? {
                      ...topic,
                      taught: topic.taught.map((row) => (row.classId === classId ? { ...row, taughtOn } : row)),
                    }
                  : topic,
              ),
            }
          : list,
      ),
  });
}
