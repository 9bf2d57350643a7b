import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { changePasswordSchema } from '#shared/schemas/auth.ts';
import { PasswordField } from '#src/features/sign-in/password-field.tsx';
import { showProblem } from '#src/lib/show-problem.ts';
import { useMe } from '#src/queries/me.ts';
import { useChangePassword } from '#src/queries/session.ts';

/** Change password. */
export function Component() {
  const me = useMe();
  const change = useChangePassword();
  const [isChanged, setIsChanged] = useState(false);
  const { register, handleSubmit, setError, reset, formState } = useForm({
    resolver: zodResolver(changePasswordSchema),
    defaultValues: { current: '', next: '' },
  });
  const { errors } = formState;
  const least = me.can.practise ? 10 : 12;
  const submit = handleSubmit((input) => {
    setIsChanged(false);
    return change.mutateAsync(input).then(
      () => {
        reset();
        setIsChanged(true);
      },
      (error: unknown) => showProblem(error, setError),
    );
  });
  return (
    <div className="page">
      <title>Change password – Plait</title>
      <h1>Change password</h1>
      <p className="text-ink-2 text-md mt-1.5 mb-7 max-w-[36rem]">
        Other devices on which you are signed in are signed out.
      </p>
      <form
        className="grid gap-5 max-w-[25rem]"
        onSubmit={(event) => void submit(event)}
        noValidate
        aria-label="Change password"
      >
        {errors.root ? (
          <p role="alert" className="note gap">
            {errors.root.message}
          </p>
        ) : null}
        <p role="status" className={isChanged ? 'note' : 'sr-only'}>
          {isChanged ? 'Saved. Use the new password from now on.' : ''}
        </p>
        <input
          type="text"
          className="hidden"
          autoComplete="username"
          value={me.username}
          readOnly
          tabIndex={-1}
          aria-hidden="true"
        />
        <PasswordField
          label="Password now"
          autoComplete="current-password"
          error={errors.current?.message}
          {...register('current')}
        />
        <PasswordField
          label="New password"
          hint={`At least ${least} characters. Four words together are easy to remember and hard to guess.`}
          autoComplete="new-password"
          error={errors.next?.message}
          {...register('next')}
        />
        <button className="btn big w-full" type="submit" disabled={change.isPending}>
          {change.isPending ? 'Saving' : 'Change password'}
        </button>
      </form>
    </div>
  );
}
