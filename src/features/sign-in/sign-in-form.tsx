import { zodResolver } from '@hookform/resolvers/zod';
import { useId } from 'react';
import { useForm } from 'react-hook-form';
import { signInSchema } from '#shared/schemas/auth.ts';
import { Field } from '#src/components/field.tsx';
import { useSignIn } from '#src/queries/session.ts';
import { PasswordField } from './password-field.tsx';
import { signInWords } from './sign-in-words.ts';

interface SignInFormProps {
  schoolCode: string;
  onSignedIn: () => void;
}

/** Name and password of one school. */
export function SignInForm({ schoolCode, onSignedIn }: SignInFormProps) {
  const signIn = useSignIn();
  const hintId = useId();
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(signInSchema),
    defaultValues: { schoolCode, name: '', password: '', isOwnDevice: false },
  });
  const { errors } = formState;
  const submit = handleSubmit((input) =>
    signIn.mutateAsync(input).then(onSignedIn, (error: unknown) => {
      setError('root', { type: 'server', message: signInWords(error) });
    }),
  );
  return (
    <form className="grid gap-5" onSubmit={(event) => void submit(event)} noValidate aria-label="Sign in">
      <p role="alert" className={errors.root ? 'note gap text-md' : 'hidden'}>
        {errors.root?.message}
      </p>
      <Field
        label="E-mail or school username"
        autoComplete="username"
        autoCapitalize="off"
        spellCheck={false}
        error={errors.name?.message}
        {...register('name')}
      />
      <PasswordField
        label="Password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register('password')}
      />
      <label className="flex items-start gap-3 min-h-11">
        <input
          type="checkbox"
          className="size-5 mt-px flex-none"
          aria-describedby={hintId}
          {...register('isOwnDevice')}
        />
        <span>
          This is my own device
          <span id={hintId} className="block hint mt-0.5">
            Leave this empty on a school or shared device.
          </span>
        </span>
      </label>
      <button className="btn big w-full" type="submit" disabled={signIn.isPending}>
        {signIn.isPending ? 'Signing in' : 'Sign in'}
      </button>
    </form>
  );
}
