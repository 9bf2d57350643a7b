import { type ReactNode, useId } from 'react';

export interface FieldShape {
  label: ReactNode;
  /** Said under the label, before the reader types. */
  hint?: ReactNode;
  /** Said under the field; makes it invalid. */
  error?: string | undefined;
  /** Kept for screen readers only, where a heading beside the field already names it. */
  isLabelHidden?: boolean;
  isSmall?: boolean;
  /** Classes of the whole field, for its place in a grid. */
  frameClass?: string;
  /** Stands at the right of the label: a button that acts on the field. */
  aside?: ReactNode;
}

export const join = (...names: (string | false | undefined)[]) => names.filter(Boolean).join(' ');

/** What a control needs to be tied to its label, hint and error. */
export function useFieldParts(given: string | undefined, { hint, error }: Pick<FieldShape, 'hint' | 'error'>) {
  const ownId = useId();
  const id = given ?? ownId;
  const described = join(hint ? `${id}-hint` : undefined, error ? `${id}-error` : undefined);
  return {
    id,
    aria: { id, 'aria-invalid': error ? true : undefined, 'aria-describedby': described || undefined },
  };
}

interface NoteProps {
  /** Of the control that it belongs to. */
  id: string;
  className?: string;
  children: ReactNode;
}

export function FieldHint({ id, className = 'mb-1.5', children }: NoteProps) {
  return children ? (
    <p id={`${id}-hint`} className={join('hint', className)}>
      {children}
    </p>
  ) : null;
}

/** @param isSaid true where it appears while the reader is elsewhere, and so has to be read out */
export function FieldError({ id, className = 'mt-1', isSaid = false, children }: NoteProps & { isSaid?: boolean }) {
  return children ? (
    <p id={`${id}-error`} role={isSaid ? 'alert' : undefined} className={join('err', className)}>
      {children}
    </p>
  ) : null;
}

/** Label above, hint under the label, control, error under the control. */
export function FieldFrame(props: FieldShape & { id: string; children: ReactNode }) {
  const { id, label, hint, error, isLabelHidden, isSmall, frameClass, aside, children } = props;
  const name = (
    <label htmlFor={id} className={isLabelHidden ? 'sr-only' : isSmall ? 'text-sm !font-medium' : undefined}>
      {label}
    </label>
  );
  return (
    <div className={join('field min-w-0', frameClass)}>
      {aside ? (
        <div className="flex items-baseline justify-between gap-3">
          {name}
          {aside}
        </div>
      ) : (
        name
      )}
      <FieldHint id={id}>{hint}</FieldHint>
      {children}
      <FieldError id={id}>{error}</FieldError>
    </div>
  );
}
