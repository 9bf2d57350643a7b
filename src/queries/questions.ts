import { keepPreviousData, type QueryClient, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  type CreateQuestion,
  type ListQuestions,
  type QuestionDto,
  questionPageSchema,
  questionSchema,
  reviewPageSchema,
  type SaveDraft,
} from '#shared/schemas/question.ts';
import { api } from '#src/lib/api.ts';
import { searchString } from '#src/lib/search-string.ts';
import { curriculumKeys } from './curriculum.ts';

export type QuestionFilter = Omit<ListQuestions, 'limit'> & { limit?: number };

export const questionKeys = {
  all: ['questions'] as const,
  lists: () => [...questionKeys.all, 'list'] as const,
  list: (filter: QuestionFilter) => [...questionKeys.lists(), filter] as const,
  detail: (id: string) => [...questionKeys.all, 'detail', id] as const,
  reviews: () => [...questionKeys.all, 'review'] as const,
  review: (cursor: string | undefined) => [...questionKeys.reviews(), cursor ?? null] as const,
};

export const questionQuery = (id: string) =>
  queryOptions({
    queryKey: questionKeys.detail(id),
    queryFn: ({ signal }) => api.get(`/questions/${id}`, questionSchema, signal),
    // A newer copy must never slip under somebody who is typing; a stale save says so instead.
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

/** The question as the server has it now, without showing it: a form that is open keeps what was typed. */
export const readQuestion = (id: string): Promise<QuestionDto> => api.get(`/questions/${id}`, questionSchema);

export const questionListQuery = (filter: QuestionFilter) =>
  queryOptions({
    queryKey: questionKeys.list(filter),
    queryFn: ({ signal }) => api.get(`/questions${searchString(filter)}`, questionPageSchema, signal),
    placeholderData: keepPreviousData,
  });

export const reviewQueueQuery = (cursor?: string) =>
  queryOptions({
    queryKey: questionKeys.review(cursor),
    queryFn: ({ signal }) => api.get(`/review-queue${searchString({ cursor })}`, reviewPageSchema, signal),
    placeholderData: keepPreviousData,
  });

/** Marks every list that may show the question as old. Nobody waits for them to be read again. */
function forgetLists(client: QueryClient) {
  for (const queryKey of [questionKeys.lists(), questionKeys.reviews(), curriculumKeys.topicLists()]) {
    void client.invalidateQueries({ queryKey });
  }
}

/** Keeps the answer to a save. Counts by topic are left alone: they are read again when a step is taken. */
function keepSaved(client: QueryClient, question: QuestionDto) {
  client.setQueryData(questionQuery(question.id).queryKey, question);
  void client.invalidateQueries({ queryKey: questionKeys.lists() });
}

export function useCreateQuestion() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: CreateQuestion) => api.post('/questions', input, questionSchema),
    onSuccess: (question) => keepSaved(client, question),
  });
}

export function useSaveDraft(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: SaveDraft) => api.put(`/questions/${id}/draft`, input, questionSchema),
    onSuccess: (question) => keepSaved(client, question),
  });
}

/** What may be done to a question besides editing it. */
export type QuestionStep =
  | { kind: 'send' | 'live'; revision: number }
  | { kind: 'return'; revision: number; comment: string }
  | { kind: 'versions' | 'retire' };

export function useQuestionStep(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ kind, ...body }: QuestionStep) => api.post(`/questions/${id}/${kind}`, body, questionSchema),
    onSuccess: (question) => {
      client.setQueryData(questionQuery(question.id).queryKey, question);
      forgetLists(client);
    },
  });
}

export function useDiscardDraft(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (revision: number) => api.delete(`/questions/${id}/draft`, { revision }),
    onSuccess: () => forgetLists(client),
  });
}
