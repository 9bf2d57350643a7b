import { queryOptions } from '@tanstack/react-query';
import {
  type AnswerResultDto,
  answerResultSchema,
  type HandIn,
  type OpenSet,
  type SelfMark,
  type SetDto,
  type SetSummaryDto,
  setSchema,
  setSummarySchema,
} from '#shared/schemas/practice.ts';
import { type SetKind, setKindSchema } from '#shared/schemas/set-kind.ts';
import { api } from '#src/lib/api.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { forgetOverviews, practiceKeys } from './practice.ts';

/** A set stays as it is for as long as it is open here; answers are written into it as they are acknowledged. */
export const setQuery = (id: string) =>
  queryOptions({
    queryKey: practiceKeys.set(id),
    queryFn: ({ signal }) => api.get(`/sets/${id}`, setSchema, signal),
    staleTime: Number.POSITIVE_INFINITY,
  });

export const summaryQuery = (id: string) =>
  queryOptions({
    queryKey: practiceKeys.summary(id),
    queryFn: ({ signal }) => api.get(`/sets/${id}/summary`, setSummarySchema, signal),
  });

/** Opens today's set as asked for, or continues the one already open. @throws ProblemError 409 nothing-to-practise */
export async function openSet(asked: OpenSet): Promise<SetDto> {
  const set = await api.post('/sets', asked, setSchema);
  queryClient.setQueryData(setQuery(set.id).queryKey, set);
  forgetOverviews();
  return set;
}

/** Writes a result into the set as held here, and `seconds` of work with it. */
function keepResult(setId: string, result: AnswerResultDto, seconds: number): void {
  queryClient.setQueryData(setQuery(setId).queryKey, (set) =>
    set
      ? {
          ...set,
          secondsSoFar: set.secondsSoFar + seconds,
          items: set.items.map((item) => (item.id === result.setItemId ? { ...item, result } : item)),
        }
      : set,
  );
  forgetOverviews();
}

export async function handIn(setId: string, answer: HandIn): Promise<AnswerResultDto> {
  const result = await api.post(`/sets/${setId}/answers`, answer, answerResultSchema);
  keepResult(setId, result, result.already ? 0 : answer.seconds);
  return result;
}

export async function saveSelfMark(setId: string, marks: SelfMark): Promise<AnswerResultDto> {
  const result = await api.post(`/sets/${setId}/self-marks`, marks, answerResultSchema);
  keepResult(setId, result, 0);
  return result;
}

export async function finishSet(setId: string): Promise<SetSummaryDto> {
  const summary = await api.post(`/sets/${setId}/finish`, {}, setSummarySchema);
  queryClient.setQueryData(summaryQuery(setId).queryKey, summary);
  queryClient.setQueryData(setQuery(setId).queryKey, (set) => (set ? { ...set, status: 'finished' as const } : set));
  forgetOverviews();
  return summary;
}

/** Tells the server that somebody is working, so that a long question does not end the session. */
export const sendHeartbeat = (): Promise<void> => api.post('/me/heartbeat', {});

export const isSetKind = (value: unknown): value is SetKind => setKindSchema.safeParse(value).success;
