import { type ComponentPropsWithRef, useState } from 'react';
import { Field } from '#src/components/field.tsx';

interface PasswordFieldProps extends Omit<ComponentPropsWithRef<'input'>, 'type'> {
  label: string;
  hint?: string;
  error?: string | undefined;
}

/** A password with a button that shows it. Pasting and password managers work as anywhere. */
export function PasswordField(props: PasswordFieldProps) {
  const [isShown, setIsShown] = useState(false);
  return (
    <Field
      {...props}
      type={isShown ? 'text' : 'password'}
      autoCapitalize="off"
      spellCheck={false}
      aside={
        <button
          type="button"
          className="link text-sm px-1 -mr-1 py-2 -my-2"
          aria-pressed={isShown}
          onClick={() => setIsShown((was) => !was)}
        >
          {isShown ? 'Hide' : 'Show'}
          <span className="sr-only"> {props.label.toLowerCase()}</span>
        </button>
      }
    />
  );
}
