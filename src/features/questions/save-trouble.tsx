import type { SaveFailure } from './draft-saver.ts';

interface SaveTroubleProps {
  why: SaveFailure;
  isBusy: boolean;
  onLoadNewer: () => void;
  onSaveMine: () => void;
  onCopyMine: () => void;
  onTryAgain: () => void;
}

/** Why the draft is not saved, what is safe, and the ways on. */
export function SaveTrouble({ why, isBusy, onLoadNewer, onSaveMine, onCopyMine, onTryAgain }: SaveTroubleProps) {
  if (why.kind === 'stale') {
    return (
      <div role="alert" className="note gap mb-6">
        <p>
          <b>This draft was saved somewhere else meanwhile.</b> What you typed is still here and not lost. Copy it, then
          load the newer draft, or save yours in its place.
        </p>
        <div className="mt-3 flex flex-wrap gap-2">
          <button type="button" className="btn quiet sm max-md:!min-h-11" disabled={isBusy} onClick={onCopyMine}>
            Copy mine
          </button>
          <button type="button" className="btn quiet sm max-md:!min-h-11" disabled={isBusy} onClick={onLoadNewer}>
            Load the newer one
          </button>
          <button type="button" className="btn quiet sm max-md:!min-h-11" disabled={isBusy} onClick={onSaveMine}>
            Save mine in its place
          </button>
        </div>
      </div>
    );
  }
  const words: Record<Exclude<SaveFailure['kind'], 'stale'>, [string, string]> = {
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
  return (
    <div role="alert" className="note cau mb-6">
      <p>
        <b>{title}</b> {text}
      </p>
      <button type="button" className="btn quiet sm mt-3 max-md:!min-h-11" onClick={onTryAgain}>
        Save now
      </button>
    </div>
  );
}
