import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { passwordLength, resetPasswordBodySchema } from '../../../shared/contracts/auth.ts';
import { signInMessages } from '../../i18n/sign-in.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { PasswordField } from '../../ui/password-field.tsx';
import { useReset } from './queries.ts';

/** A new password for whoever holds the link. */
export function ResetForm({ token, onDone }: { token: string; onDone: () => void }) {
  const t = useStore(signInMessages);
  const reset = useReset();
  const form = useForm({ resolver: zodResolver(resetPasswordBodySchema), defaultValues: { token } });
  const submit = form.handleSubmit((body) =>
    reset.mutate(body, { onSuccess: onDone, onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <PasswordField
        {...form.register('newPassword')}
        label={t.newPassword}
        help={t.passwordHelp({ least: passwordLength.least })}
        error={form.formState.errors.newPassword && t.passwordError(passwordLength)}
        autoComplete="new-password"
        show={t.show}
      />
      <Failure error={reset.error} className="" />
      <Button type="submit" disabled={reset.isPending} className="justify-self-start">
        {t.save}
      </Button>
    </form>
  );
}
