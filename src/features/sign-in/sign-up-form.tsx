import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { passwordLength, signUpBodySchema, type SignUpBody } from '../../../shared/contracts/auth.ts';
import { locales } from '../../../shared/vocabulary.ts';
import { languageNames, useLocale } from '../../i18n/i18n.ts';
import { signInMessages } from '../../i18n/sign-in.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field, SelectField } from '../../ui/field.tsx';
import { PasswordField } from '../../ui/password-field.tsx';
import { useSignUp } from './queries.ts';

/** Name, address, password and language of a new trainee. */
export function SignUpForm({ onDone }: { onDone: (email: string) => void }) {
  const t = useStore(signInMessages);
  const language = useLocale();
  const signUp = useSignUp();
  const form = useForm({ resolver: zodResolver(signUpBodySchema), defaultValues: { language } });
  const { errors } = form.formState;
  const submit = form.handleSubmit((body: SignUpBody) =>
    signUp.mutate(body, { onSuccess: () => onDone(body.email), onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <Field
        {...form.register('name')}
        label={t.name}
        help={t.nameHelp}
        error={errors.name && t.nameError}
        autoComplete="name"
      />
      <Field
        {...form.register('email')}
        type="email"
        label={t.email}
        error={errors.email && t.emailError}
        autoComplete="email"
      />
      <PasswordField
        {...form.register('password')}
        label={t.password}
        help={t.passwordHelp({ least: passwordLength.least })}
        error={errors.password && t.passwordError(passwordLength)}
        autoComplete="new-password"
        show={t.show}
      />
      <SelectField {...form.register('language')} label={t.language}>
        {locales.map((one) => (
          <option key={one} value={one}>
            {languageNames[one]}
          </option>
        ))}
      </SelectField>
      <Failure error={signUp.error} className="" />
      <Button type="submit" disabled={signUp.isPending} className="justify-self-start">
        {t.create}
      </Button>
    </form>
  );
}
