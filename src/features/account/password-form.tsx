import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { changePasswordBodySchema, passwordLength } from '../../../shared/contracts/auth.ts';
import { accountMessages } from '../../i18n/account.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field } from '../../ui/field.tsx';
import { Notice } from '../../ui/notice.tsx';
import { ShowPassword } from '../../ui/password-field.tsx';
import { useChangePassword } from './queries.ts';

export function PasswordForm() {
  const t = useStore(accountMessages);
  const change = useChangePassword();
  const form = useForm({
    resolver: zodResolver(changePasswordBodySchema),
    defaultValues: { currentPassword: '', newPassword: '', revokeOtherSessions: true },
  });
  const [shown, setShown] = useState(false);
  const typed = { type: shown ? 'text' : 'password', autoCapitalize: 'none', spellCheck: false };
  const { errors } = form.formState;
  const submit = form.handleSubmit((body) =>
    change.mutate(body, { onSuccess: () => form.reset(), onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <Field
        {...typed}
        {...form.register('currentPassword')}
        label={t.currentPassword}
        error={errors.currentPassword && t.passwordMissing}
        autoComplete="current-password"
      />
      <Field
        {...typed}
        {...form.register('newPassword')}
        label={t.newPassword}
        help={t.passwordHelp({ least: passwordLength.least })}
        error={errors.newPassword && t.passwordError(passwordLength)}
        autoComplete="new-password"
      />
      <ShowPassword text={t.show} shown={shown} onChange={setShown} />
      <label className="inline-flex min-h-11 items-center gap-2.5">
        <input type="checkbox" {...form.register('revokeOtherSessions')} className="size-5 accent-dye" />
        {t.endOthers}
      </label>
      <Failure error={change.error} className="" />
      <output className="block empty:-mt-4">
        {change.isSuccess && <Notice tone="good">{t.passwordChanged}</Notice>}
      </output>
      <Button type="submit" look="quiet" disabled={change.isPending} className="justify-self-start">
        {t.changePassword}
      </Button>
    </form>
  );
}
