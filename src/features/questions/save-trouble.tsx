import type { SaveFailure } from './draft-saver.ts';

interface SaveTroubleProps {
  why: SaveFailure;
  isBusy: boolean;
  onLoadNewer: () => void;
  onSaveMine: () => void;
  onCopyMine: () => void;
  onTryAgain: () => void;
}

interface Step {
  label: string;
  run: () => void;
}

/** What happened, and the ways on, each a button. */
function Trouble({ tone, title, text, steps, isBusy = false }: TroubleProps) {
  return (
    <div role="alert" className={`note ${tone} mb-6`}>
      <p>
        <b>{title}</b> {text}
      </p>
      <div className="mt-3 flex flex-wrap gap-2">
        {steps.map(({ label, run }) => (
          <button key={label} type="button" className="btn quiet sm max-md:!min-h-11" disabled={isBusy} onClick={run}>
            {label}
          </button>
        ))}
      </div>
    </div>
  );
}

interface TroubleProps {
  tone: 'gap' | 'cau';
  title: string;
  text: string;
  steps: Step[];
  isBusy?: boolean;
}

/** Why the draft is not saved, what is safe, and the ways on. */
export function SaveTrouble({ why, isBusy, onLoadNewer, onSaveMine, onCopyMine, onTryAgain }: SaveTroubleProps) {
  const copy = { label: 'Copy mine', run: onCopyMine };
  if (why.kind === 'stale') {
    return (
      <Trouble
        tone="gap"
        title="This draft was saved somewhere else meanwhile."
        text="What you typed is still here and not lost. Copy it, then load the newer draft, or save yours in its place."
        steps={[
          copy,
          { label: 'Load the newer one', run: onLoadNewer },
          { label: 'Save mine in its place', run: onSaveMine },
        ]}
        isBusy={isBusy}
      />
    );
  }
  if (why.kind === 'moved') {
    return (
      <Trouble
        tone="gap"
        title="Your last changes are not saved."
        text={`${why.detail} What you typed is still here: copy it, then open the question as it stands.`}
        steps={[copy, { label: 'Open it as it stands', run: onLoadNewer }]}
        isBusy={isBusy}
      />
    );
  }
  const words: Record<Exclude<SaveFailure['kind'], 'stale' | 'moved'>, [string, string]> = {
    offline: [
      'You are offline.',
      'What you typed is kept on this page and saved when you are back. Leave the page open.',
    ],
    busy: ['Plait did not answer.', 'What you typed is kept on this page, and saving is tried again.'],
    signedOut: [
      'You are signed out.',
      'Sign in again in another tab, then save here. What you typed is kept on this page.',
    ],
    refused: ['That could not be saved.', why.detail],
  };
  const [title, text] = words[why.kind];
  return <Trouble tone="cau" title={title} text={text} steps={[{ label: 'Save now', run: onTryAgain }]} />;
}
