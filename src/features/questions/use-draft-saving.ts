import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { isTransient, NetworkError, ProblemError } from '#src/lib/api.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { questionQuery, readQuestion, useCreateQuestion, useSaveDraft } from '#src/queries/questions.ts';
import { DraftSaver, type SaveFailure, type SaveState } from './draft-saver.ts';
import { type DraftFields, toDraft } from './question-form.ts';
import type { QuestionForm } from './question-shape.ts';
import { movedWords } from './status-words.ts';

/** What became of a draft that could not be saved onto: saved again by somebody, or no draft any more. */
async function explainConflict(id: string, detail: string): Promise<SaveFailure> {
  try {
    const { current, can } = await readQuestion(id);
    if (current.status !== 'draft') return { kind: 'moved', detail: movedWords(current) };
    return can.edit ? { kind: 'stale', detail } : { kind: 'refused', detail };
  } catch {
    return { kind: 'stale', detail };
  }
}

async function explain(error: unknown, id: string): Promise<SaveFailure> {
  const detail = problemWords(error);
  if (error instanceof NetworkError) return { kind: 'offline', detail };
  if (isTransient(error)) return { kind: 'busy', detail };
  if (error instanceof ProblemError) {
    if (error.status === 401) return { kind: 'signedOut', detail };
    if (error.status === 409 || error.status === 403) return explainConflict(id, detail);
  }
  return { kind: 'refused', detail };
}

interface DraftSaving {
  id: string;
  subjectId: string;
  question: QuestionDto | null;
  form: UseFormReturn<QuestionForm>;
  /** Called once, when a new question has been made. */
  onMade: (question: QuestionDto) => void;
}

/** Saves the form as it is typed. Nothing is kept in the browser's storage, since a draft holds a mark scheme. */
export function useDraftSaving({ id, subjectId, question, form, onMade }: DraftSaving) {
  const client = useQueryClient();
  const { mutateAsync: create } = useCreateQuestion();
  const { mutateAsync: save } = useSaveDraft(id);
  const [state, setState] = useState<SaveState>({ kind: 'clean' });

  const [saver] = useState(() => {
    const make = async (draft: DraftFields) => {
      try {
        const made = await create({ id, subjectId, ...draft });
        onMade(made);
        return made.current.revision;
      } catch (error) {
        if (!(error instanceof ProblemError && error.status === 409)) throw error;
        // An earlier try arrived although its answer did not: the question is ours, so save onto it.
        const made = await client.fetchQuery({ ...questionQuery(id), staleTime: 0 });
        onMade(made);
        return (await save({ revision: made.current.revision, ...draft })).current.revision;
      }
    };
    return new DraftSaver<DraftFields>(
      {
        read: () => toDraft(form.getValues()),
        send: async (revision, draft) =>
          revision === null ? make(draft) : (await save({ revision, ...draft })).current.revision,
        explain: (error) => explain(error, id),
        onState: setState,
      },
      question?.current.revision ?? null,
    );
  });

  useEffect(() => {
    const changed = form.subscribe({ formState: { values: true }, callback: () => saver.changed() });
    const online = () => void (saver.hasUnsaved && saver.flush());
    window.addEventListener('online', online);
    return () => {
      changed();
      window.removeEventListener('online', online);
      saver.stop();
    };
  }, [form, saver]);

  return { state, saver };
}
