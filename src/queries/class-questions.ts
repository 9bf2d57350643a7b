import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { type ChooseForClass, classQuestionListSchema, classQuestionSchema } from '#shared/schemas/class-question.ts';
import { api } from '#src/lib/api.ts';

const classQuestionKeys = {
  all: ['class-questions'] as const,
  of: (questionId: string) => [...classQuestionKeys.all, questionId] as const,
};

export const classQuestionsQuery = (questionId: string) =>
  queryOptions({
    queryKey: classQuestionKeys.of(questionId),
    queryFn: ({ signal }) => api.get(`/questions/${questionId}/classes`, classQuestionListSchema, signal),
    // Answers come in all day, and what may be set hangs on other questions too.
    staleTime: 0,
    select: (list) => list.items,
  });

/** Chooses for one class. One at a time, so that the last of several choices counts. */
export function useChooseForClass(questionId: string, classId: string) {
  const client = useQueryClient();
  const { queryKey } = classQuestionsQuery(questionId);
  return useMutation({
    scope: { id: `choose for ${classId}` },
    mutationFn: (wish: ChooseForClass) =>
      api.put(`/questions/${questionId}/classes/${classId}`, wish, classQuestionSchema),
    onSuccess: (saved) => {
      client.setQueryData(queryKey, (list) =>
        list ? { items: list.items.map((row) => (row.classId === classId ? saved : row)) } : list,
      );
    },
    // What it was refused for shows at its row from now on.
    onError: () => client.invalidateQueries({ queryKey }),
  });
}
