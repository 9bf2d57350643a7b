import type { ReactNode } from 'react';
import { FieldError } from './field-frame.tsx';

interface ChoiceRowProps {
  /** Ids of the note and the error are made from it: the choice names `${id}-hint`. */
  id: string;
  title: string;
  /** What stands under the title. */
  note: ReactNode;
  /** Why the last change was not saved. */
  error?: string | undefined;
  /** The control itself. */
  children: ReactNode;
}

/** One line of a list of choices that are saved as they are made: what it is, and the choice at its right. */
export function ChoiceRow({ id, title, note, error, children }: ChoiceRowProps) {
  return (
    <div className="grid grid-cols-1 items-center gap-x-8 gap-y-2.5 border-b border-rule-soft py-3.5 last:border-b-0 sm:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0">
        <p className="font-semibold">{title}</p>
        <div id={`${id}-hint`} className="hint mt-0.5 max-w-[34rem]">
          {note}
        </div>
        <FieldError id={id} isSaid>
          {error}
        </FieldError>
      </div>
      <div className="min-w-0 max-sm:[&>.seg]:w-full">{children}</div>
    </div>
  );
}
