import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { signInBodySchema, type SignInBody } from '../../../shared/contracts/auth.ts';
import { signInMessages } from '../../i18n/sign-in.ts';
import { ApiError } from '../../lib/api.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field } from '../../ui/field.tsx';
import { PasswordField } from '../../ui/password-field.tsx';
import { useSignIn } from './queries.ts';

interface SignInFormProps {
  onDone: () => void;
  /** The address was never confirmed; a new message is on its way. */
  onUnconfirmed: (email: string) => void;
}

export function SignInForm({ onDone, onUnconfirmed }: SignInFormProps) {
  const t = useStore(signInMessages);
  const signIn = useSignIn();
  const form = useForm({ resolver: zodResolver(signInBodySchema), defaultValues: { rememberMe: true } });
  const { errors } = form.formState;
  const submit = form.handleSubmit((body: SignInBody) =>
    signIn.mutate(body, {
      onSuccess: onDone,
      onError: (error) => {
        markFaults(error, form.setError);
        if (error instanceof ApiError && error.code === 'address-unconfirmed') onUnconfirmed(body.email);
      },
    }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <Field
        {...form.register('email')}
        type="email"
        label={t.email}
        error={errors.email && t.emailError}
        autoComplete="username"
      />
      <PasswordField
        {...form.register('password')}
        label={t.password}
        error={errors.password && t.passwordMissing}
        autoComplete="current-password"
        show={t.show}
      />
      <label className="inline-flex min-h-11 items-center gap-2.5">
        <input type="checkbox" {...form.register('rememberMe')} className="size-5 accent-dye" />
        {t.remember}
      </label>
      <Failure error={signIn.error} className="" />
      <Button type="submit" disabled={signIn.isPending} className="justify-self-start">
        {t.signIn}
      </Button>
    </form>
  );
}
