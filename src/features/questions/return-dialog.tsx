import { type FormEvent, useState } from 'react';
import { Dialog } from '#src/components/dialog.tsx';
import { TextArea } from '#src/components/field.tsx';

interface ReturnDialogProps {
  author: string;
  isBusy: boolean;
  error?: string | undefined;
  onReturn: (comment: string) => void;
  onClose: () => void;
}

/** Sends a question back to its author with what should change. */
export function ReturnDialog({ author, isBusy, error, onReturn, onClose }: ReturnDialogProps) {
  const [comment, setComment] = useState('');
  const [isEmpty, setIsEmpty] = useState(false);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const text = comment.trim();
    setIsEmpty(text === '');
    if (text) onReturn(text);
  };
  return (
    <Dialog title={`Return this question to ${author}?`} onClose={onClose}>
      <form noValidate onSubmit={submit} className="mt-3">
        <TextArea
          label="What should change"
          hint="The author sees this at the top of the draft."
          rows={4}
          maxLength={2000}
          value={comment}
          error={isEmpty ? 'Say what should change.' : error}
          onChange={(event) => setComment(event.target.value)}
        />
        <div className="mt-5 flex flex-wrap gap-2">
          <button type="submit" className="btn" disabled={isBusy}>
            Return to author
          </button>
          <button type="button" className="btn quiet" onClick={onClose}>
            Keep reviewing
          </button>
        </div>
      </form>
    </Dialog>
  );
}
