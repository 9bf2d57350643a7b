import { useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { ProblemError } from '#src/lib/api.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { useQuestionStep } from '#src/queries/questions.ts';
import { type FormPath, pointerToFormPath } from './check-question.ts';
import type { QuestionForm } from './question-shape.ts';

interface Sending {
  id: string;
  form: UseFormReturn<QuestionForm>;
  settle: () => Promise<number | null>;
  onSent: () => void;
}

/** Sends a draft for review: checked here first, then by the server, every fault at its field. */
export function useSend({ id, form, settle, onSent }: Sending) {
  const step = useQuestionStep(id);
  const [attempt, setAttempt] = useState(0);
  const refuse = () => setAttempt((count) => count + 1);
  const send = async () => {
    const revision = await settle();
    if (revision === null) return;
    try {
      await step.mutateAsync({ kind: 'send', revision });
      onSent();
    } catch (error) {
      const faults = error instanceof ProblemError ? error.errors : [];
      for (const { pointer, detail } of faults) {
        form.setError(pointerToFormPath(pointer) as FormPath, { type: 'server', message: detail });
      }
      if (faults.length === 0) form.setError('root', { type: 'server', message: problemWords(error) });
      refuse();
    }
  };
  return { send: () => void form.handleSubmit(send, refuse)(), attempt, isSending: step.isPending };
}
