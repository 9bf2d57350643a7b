import { notifyManager, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { useToast } from '#src/components/toast.tsx';
import { questionQuery, readQuestion } from '#src/queries/questions.ts';
import type { DraftSaver } from './draft-saver.ts';
import type { DraftFields } from './question-form.ts';
import type { QuestionForm } from './question-shape.ts';
import { questionText } from './question-text.ts';

interface TroubleInput {
  id: string;
  saver: DraftSaver<DraftFields>;
  form: UseFormReturn<QuestionForm>;
  onReload: () => void;
}

/** The ways on from a save that failed. */
export function useTrouble({ id, saver, form, onReload }: TroubleInput) {
  const client = useQueryClient();
  const toast = useToast();
  const [isBusy, setIsBusy] = useState(false);
  const fetchNewer = async () => {
    setIsBusy(true);
    try {
      return await readQuestion(id);
    } catch {
      toast('The newer one could not be read. Yours is still here.');
      return null;
    } finally {
      setIsBusy(false);
    }
  };
  const copyMine = async () => {
    await navigator.clipboard.writeText(questionText(form.getValues())).then(
      () => toast('Copied. Paste it anywhere to keep it.'),
      () => toast('The browser did not allow copying. Select the text and copy it by hand.'),
    );
  };
  return {
    isBusy,
    onCopyMine: () => void copyMine(),
    onTryAgain: () => void saver.flush(),
    onLoadNewer: () =>
      void fetchNewer().then((newer) => {
        if (!newer) return;
        saver.rebase(newer.current.revision, true);
        client.setQueryData(questionQuery(id).queryKey, newer);
        // Queries tell their news a moment later; the form has to start from it and not from what it showed before.
        notifyManager.schedule(onReload);
      }),
    onSaveMine: () =>
      void fetchNewer().then((newer) => {
        if (!newer) return;
        saver.rebase(newer.current.revision, false);
        void saver.flush();
      }),
  };
}
