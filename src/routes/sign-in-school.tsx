import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { schoolParamsSchema } from '#shared/schemas/auth.ts';
import { Field } from '#src/components/field.tsx';
import { SignInFrame } from '#src/features/sign-in/sign-in-frame.tsx';

/** Asks which school, where the address does not say. */
export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(schoolParamsSchema),
    defaultValues: { code: '' },
  });
  const submit = handleSubmit(({ code }) => {
    const query = search.toString();
    return navigate(`/sign-in/${code}${query ? `?${query}` : ''}`);
  });
  return (
    <SignInFrame>
      <title>Sign in – Plait</title>
      <h1>Sign in</h1>
      <p className="text-ink-2 text-md mt-2 mb-7">Which school are you at?</p>
      <form className="grid gap-5" onSubmit={(event) => void submit(event)} noValidate aria-label="School">
        <Field
          label="School code"
          hint="It is in the letter or e-mail from your school."
          autoComplete="organization"
          autoCapitalize="off"
          spellCheck={false}
          error={formState.errors.code?.message}
          {...register('code')}
        />
        <button className="btn big w-full" type="submit">
          Go on
        </button>
      </form>
    </SignInFrame>
  );
}
