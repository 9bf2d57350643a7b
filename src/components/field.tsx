import { type ComponentPropsWithRef, type ReactNode, useId } from 'react';

interface FieldShape {
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
}

interface FrameProps extends FieldShape {
  id: string;
  children: ReactNode;
}

const join = (...names: (string | false | undefined)[]) => names.filter(Boolean).join(' ');

const describedBy = (id: string, { hint, error }: FieldShape) =>
  join(hint ? `${id}-hint` : undefined, error ? `${id}-error` : undefined) || undefined;

const inputClass = ({ error, isSmall }: FieldShape, more?: string) =>
  join('inp', isSmall && 'sm max-md:!min-h-11', error && 'bad', more);

/** Label above, hint under the label, control, error under the control. */
export function FieldFrame({ id, label, hint, error, isLabelHidden, isSmall, frameClass, children }: FrameProps) {
  return (
    <div className={join('field min-w-0', frameClass)}>
      <label htmlFor={id} className={isLabelHidden ? 'sr-only' : isSmall ? 'text-sm !font-medium' : undefined}>
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="hint mb-1.5">
          {hint}
        </p>
      ) : null}
      {children}
      {error ? (
        <p id={`${id}-error`} className="err mt-1">
          {error}
        </p>
      ) : null}
    </div>
  );
}

/** A one-line input with everything that belongs to it. Takes what `register()` gives. */
export function Field(props: FieldShape & ComponentPropsWithRef<'input'>) {
  const { label, hint, error, isLabelHidden, isSmall, frameClass, className, ...input } = props;
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <FieldFrame {...{ id, label, hint, error, isLabelHidden, isSmall, frameClass }}>
      <input
        {...input}
        id={id}
        className={inputClass(props, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, props)}
      />
    </FieldFrame>
  );
}

/** A field of several lines; it grows with its text where the browser can. */
export function TextArea(props: FieldShape & ComponentPropsWithRef<'textarea'>) {
  const { label, hint, error, isLabelHidden, isSmall, frameClass, className, rows = 2, ...input } = props;
  const ownId = useId();
  const id = input.id ?? ownId;
  // A field that grows with its text forgets its rows, so they become its least height.
  const minHeight = rows > 1 ? `${rows * (isSmall ? 1.125 : 1.375) + 1}rem` : undefined;
  return (
    <FieldFrame {...{ id, label, hint, error, isLabelHidden, isSmall, frameClass }}>
      <textarea
        {...input}
        rows={rows}
        style={{ minHeight, ...input.style }}
        id={id}
        className={inputClass(props, join('block [field-sizing:content]', className))}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, props)}
      />
    </FieldFrame>
  );
}

/** A native select; its options are the children. */
export function Select(props: FieldShape & ComponentPropsWithRef<'select'>) {
  const { label, hint, error, isLabelHidden, isSmall, frameClass, className, children, ...input } = props;
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <FieldFrame {...{ id, label, hint, error, isLabelHidden, isSmall, frameClass }}>
      <select
        {...input}
        id={id}
        className={inputClass(props, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, props)}
      >
        {children}
      </select>
    </FieldFrame>
  );
}

type CheckBoxProps = Pick<FieldShape, 'label' | 'hint' | 'error' | 'frameClass'> & ComponentPropsWithRef<'input'>;

/** One tick box, its label at the right. */
export function CheckBox({ label, hint, error, frameClass, className, ...input }: CheckBoxProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <div className={frameClass}>
      <label htmlFor={id} className="inline-flex min-h-9 max-md:min-h-11 items-center gap-2.5">
        <input
          {...input}
          type="checkbox"
          id={id}
          className={join('size-4 flex-none', className)}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, { label, hint, error })}
        />
        <span>{label}</span>
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="hint pl-[1.625rem]">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} className="err pl-[1.625rem]">
          {error}
        </p>
      ) : null}
    </div>
  );
}
