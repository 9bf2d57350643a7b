import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { ConfirmDialog } from '#src/components/dialog.tsx';
import { useToast } from '#src/components/toast.tsx';
import { problemWords } from '#src/lib/show-problem.ts';
import { type QuestionStep, useDiscardDraft, useQuestionStep } from '#src/queries/questions.ts';
import { ReturnDialog } from './return-dialog.tsx';

interface QuestionActionsProps {
  question: QuestionDto;
  /** Saves what is typed first. Null where that failed, and the step is not taken. */
  settle: () => Promise<number | null>;
  onTry: () => void;
  /** Checks and sends the draft; the editor owns it, since the faults belong at its fields. */
  onSend?: (() => void) | undefined;
  /** Called once the draft is gone, with true where an older version remains. */
  onDiscarded: (hasOlder: boolean) => void;
}

type Asking = 'return' | 'retire' | 'discard' | null;

/** Every step open to this person, as the question's `can` lists them. */
export function QuestionActions({ question, settle, onTry, onSend, onDiscarded }: QuestionActionsProps) {
  const [asking, setAsking] = useState<Asking>(null);
  const { take, discard, error, isBusy } = useSteps(question, settle, () => setAsking(null), onDiscarded);
  const { can, number, current } = question;
  const isLastDraft = question.versions.length <= 1;
  const main = can.send && onSend ? 'send' : can.putLive ? 'live' : can.startVersion ? 'version' : null;
  const look = (name: string) => `btn ${main === name ? '' : 'quiet'} max-sm:flex-1`;
  return (
    <div className="max-sm:w-full">
      <div className="flex flex-wrap gap-2">
        {can.discardDraft ? (
          <button type="button" className="btn bare" onClick={() => setAsking('discard')}>
            Discard draft
          </button>
        ) : null}
        {can.retire ? (
          <button type="button" className="btn bare" onClick={() => setAsking('retire')}>
            Retire
          </button>
        ) : null}
        <button type="button" className="btn quiet max-sm:flex-1" onClick={onTry}>
          Try answers
        </button>
        {can.returnToAuthor ? (
          <button type="button" className="btn quiet max-sm:flex-1" onClick={() => setAsking('return')}>
            {can.putLive ? 'Return to author' : 'Take back'}
          </button>
        ) : null}
        {can.putLive ? (
          <button type="button" className={look('live')} disabled={isBusy} onClick={() => void take({ kind: 'live' })}>
            Put live
          </button>
        ) : null}
        {can.startVersion ? (
          <button
            type="button"
            className={look('version')}
            disabled={isBusy}
            onClick={() => void take({ kind: 'versions' })}
          >
            Start a new version
          </button>
        ) : null}
        {can.send && onSend ? (
          <button type="button" className={look('send')} disabled={isBusy} onClick={onSend}>
            Send for review
          </button>
        ) : null}
      </div>
      {error && asking === null ? (
        <p role="alert" className="err mt-2 max-w-[34rem]">
          {error}
        </p>
      ) : null}
      {asking === 'return' ? (
        <ReturnDialog
          author={current.author.name}
          isBusy={isBusy}
          error={error}
          onReturn={(comment) => void take({ kind: 'return', comment })}
          onClose={() => setAsking(null)}
        />
      ) : null}
      {asking === 'retire' ? (
        <ConfirmDialog
          title={`Retire question ${number}?`}
          confirm="Retire"
          cancel="Keep it"
          isBusy={isBusy}
          error={error}
          onConfirm={() => void take({ kind: 'retire' })}
          onClose={() => setAsking(null)}
        >
          Students no longer meet it. Answers given so far and their statistics stay.
        </ConfirmDialog>
      ) : null}
      {asking === 'discard' ? (
        <ConfirmDialog
          title={isLastDraft ? `Discard question ${number}?` : `Discard version ${current.version}?`}
          confirm="Discard draft"
          cancel="Keep it"
          isBusy={isBusy}
          error={error}
          onConfirm={() => void discard()}
          onClose={() => setAsking(null)}
        >
          {isLastDraft
            ? 'It was never live, so the whole question goes. This cannot be undone.'
            : 'The older versions stay as they are. This cannot be undone.'}
        </ConfirmDialog>
      ) : null}
    </div>
  );
}

type Step = { kind: 'live' | 'versions' | 'retire' } | { kind: 'return'; comment: string };

function useSteps(
  question: QuestionDto,
  settle: QuestionActionsProps['settle'],
  onDone: () => void,
  onDiscarded: QuestionActionsProps['onDiscarded'],
) {
  const step = useQuestionStep(question.id);
  const discarding = useDiscardDraft(question.id);
  const toast = useToast();
  const navigate = useNavigate();
  const { number, current } = question;
  const said: Record<Step['kind'], string> = {
    live: `Question ${number} is live. Students can meet it from their next set.`,
    versions: `A new draft of question ${number} is open. The live version stays as it is.`,
    retire: `Question ${number} is retired.`,
    return: `Question ${number} is back with ${current.author.name}.`,
  };
  const take = async (wanted: Step) => {
    const revision = await settle();
    if (revision === null) return;
    const body: QuestionStep =
      wanted.kind === 'live' || wanted.kind === 'return' ? { ...wanted, revision } : { kind: wanted.kind };
    await step.mutateAsync(body).then(
      () => {
        onDone();
        toast(said[wanted.kind]);
        if (wanted.kind === 'return') void navigate('/review');
      },
      // The words stand beside the buttons, from `step.error`.
      () => undefined,
    );
  };
  const discard = async () => {
    // A save on its way would make the revision old, so it goes first.
    const revision = (await settle()) ?? current.revision;
    await discarding.mutateAsync(revision).then(
      () => {
        onDone();
        toast(`The draft of question ${number} is gone.`);
        onDiscarded(question.versions.length > 1);
      },
      () => undefined,
    );
  };
  const failed = step.error ?? discarding.error;
  return {
    take,
    discard,
    error: failed ? problemWords(failed) : undefined,
    isBusy: step.isPending || discarding.isPending,
  };
}
