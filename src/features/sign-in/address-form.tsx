import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { emailBodySchema } from '../../../shared/contracts/auth.ts';
import { signInMessages } from '../../i18n/sign-in.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field } from '../../ui/field.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useSendMail } from './queries.ts';

interface AddressFormProps {
  sends: Parameters<typeof useSendMail>[0];
  email?: string;
  button: string;
  /** What is said once it is on its way, the same whether or not there is such an account. */
  sent: string;
}

/** Asks for an address and sends it a message. */
export function AddressForm({ sends, email = '', button, sent }: AddressFormProps) {
  const t = useStore(signInMessages);
  const send = useSendMail(sends);
  const form = useForm({ resolver: zodResolver(emailBodySchema), defaultValues: { email } });
  const submit = form.handleSubmit((body) =>
    send.mutate(body.email, { onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <Field
        {...form.register('email')}
        type="email"
        label={t.email}
        error={form.formState.errors.email && t.emailError}
        autoComplete="email"
      />
      <Failure error={send.error} className="" />
      <output className="block empty:-mt-4">{send.isSuccess && <Notice tone="good">{sent}</Notice>}</output>
      <Button type="submit" disabled={send.isPending} className="justify-self-start">
        {button}
      </Button>
    </form>
  );
}
