import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { changeEmailBodySchema } from '../../../shared/contracts/auth.ts';
import { accountMessages } from '../../i18n/account.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field } from '../../ui/field.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useChangeAddress } from './queries.ts';

/** Asks for another address; it changes once both have confirmed. */
export function AddressForm({ email }: { email: string }) {
  const t = useStore(accountMessages);
  const change = useChangeAddress();
  const form = useForm({ resolver: zodResolver(changeEmailBodySchema), defaultValues: { newEmail: '' } });
  const submit = form.handleSubmit((body) =>
    change.mutate(body.newEmail, { onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <p className="[overflow-wrap:anywhere]">{t.addressNow({ email })}</p>
      <Field
        {...form.register('newEmail')}
        type="email"
        label={t.newAddress}
        help={t.addressHelp}
        error={form.formState.errors.newEmail && t.addressError}
        autoComplete="email"
      />
      <Failure error={change.error} className="" />
      <output className="block empty:-mt-4">{change.isSuccess && <Notice tone="good">{t.addressSent}</Notice>}</output>
      <Button type="submit" look="quiet" disabled={change.isPending} className="justify-self-start">
        {t.changeAddress}
      </Button>
    </form>
  );
}
