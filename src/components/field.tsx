import type { ComponentPropsWithRef } from 'react';
import { FieldError, FieldFrame, FieldHint, type FieldShape, join, useFieldParts } from './field-frame.tsx';

/** Splits what the frame shows from what the control itself takes. */
function split<Props extends FieldShape & { className?: string | undefined; id?: string | undefined }>(props: Props) {
  const { label, hint, error, isLabelHidden, isSmall, frameClass, aside, className, ...control } = props;
  const look = join('inp', isSmall && 'sm max-md:!min-h-11', error && 'bad');
  return { frame: { label, hint, error, isLabelHidden, isSmall, frameClass, aside }, control, look, className };
}

/** A one-line input with everything that belongs to it. Takes what `register()` gives. */
export function Field(props: FieldShape & ComponentPropsWithRef<'input'>) {
  const { frame, control, look, className } = split(props);
  const { id, aria } = useFieldParts(props.id, props);
  return (
    <FieldFrame {...frame} id={id}>
      <input {...control} {...aria} className={join(look, className)} />
    </FieldFrame>
  );
}

/** A field of several lines; it grows with its text where the browser can. */
export function TextArea(props: FieldShape & ComponentPropsWithRef<'textarea'>) {
  const { frame, control, look, className } = split(props);
  const { id, aria } = useFieldParts(props.id, props);
  const rows = props.rows ?? 2;
  // A field that grows with its text forgets its rows, so they become its least height.
  const minHeight = rows > 1 ? `${rows * (props.isSmall ? 1.125 : 1.375) + 1}rem` : undefined;
  return (
    <FieldFrame {...frame} id={id}>
      <textarea
        {...control}
        {...aria}
        rows={rows}
        style={{ minHeight, ...props.style }}
        className={join(look, 'block [field-sizing:content]', className)}
      />
    </FieldFrame>
  );
}

/** A native select; its options are the children. */
export function Select(props: FieldShape & ComponentPropsWithRef<'select'>) {
  const { frame, control, look, className } = split(props);
  const { id, aria } = useFieldParts(props.id, props);
  return (
    <FieldFrame {...frame} id={id}>
      <select {...control} {...aria} className={join(look, className)} />
    </FieldFrame>
  );
}

type CheckBoxProps = Pick<FieldShape, 'label' | 'hint' | 'error' | 'frameClass'> & ComponentPropsWithRef<'input'>;

/** One tick box, its label at the right. */
export function CheckBox({ label, hint, error, frameClass, className, ...input }: CheckBoxProps) {
  const { id, aria } = useFieldParts(input.id, { hint, error });
  return (
    <div className={frameClass}>
      <label htmlFor={id} className="inline-flex min-h-9 max-md:min-h-11 items-center gap-2.5">
        <input {...input} {...aria} type="checkbox" className={join('size-4 flex-none', className)} />
        <span>{label}</span>
      </label>
      <FieldHint id={id} className="pl-[1.625rem]">
        {hint}
      </FieldHint>
      <FieldError id={id} className="pl-[1.625rem]">
        {error}
      </FieldError>
    </div>
  );
}
