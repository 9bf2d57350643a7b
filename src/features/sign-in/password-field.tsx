import { type ComponentPropsWithRef, useId, useState } from 'react';

interface PasswordFieldProps extends Omit<ComponentPropsWithRef<'input'>, 'type'> {
  label: string;
  hint?: string;
  error?: string | undefined;
}

/** A password with a button that shows it. Pasting and password managers work as anywhere. */
export function PasswordField({ label, hint, error, ...input }: PasswordFieldProps) {
  const [isShown, setIsShown] = useState(false);
  const id = useId();
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div className="field">
      <div className="flex justify-between items-baseline">
        <label htmlFor={id}>{label}</label>
        <button
          type="button"
          className="link text-sm px-1 -mr-1 py-2 -my-2"
          aria-pressed={isShown}
          onClick={() => setIsShown((was) => !was)}
        >
          {isShown ? 'Hide' : 'Show'}
          <span className="sr-only"> {label.toLowerCase()}</span>
        </button>
      </div>
      {hint ? (
        <p id={`${id}-hint`} className="hint mb-1.5">
          {hint}
        </p>
      ) : null}
      <input
        {...input}
        id={id}
        type={isShown ? 'text' : 'password'}
        className={`inp ${error ? 'bad' : ''}`}
        autoCapitalize="off"
        spellCheck={false}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
      />
      {error ? (
        <p id={`${id}-error`} className="err mt-1">
          {error}
        </p>
      ) : null}
    </div>
  );
}
