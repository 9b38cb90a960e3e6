import { zodResolver } from '@hookform/resolvers/zod';
import { useStore } from '@nanostores/react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import type { MeView } from '../../../shared/contracts/account.ts';
import { nameSchema } from '../../../shared/contracts/auth.ts';
import { locales } from '../../../shared/vocabulary.ts';
import { accountMessages } from '../../i18n/account.ts';
import { languageNames } from '../../i18n/i18n.ts';
import { markFaults } from '../../lib/field-faults.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Field, SelectField } from '../../ui/field.tsx';
import { useChangeMe } from './queries.ts';

const bodySchema = z.object({ name: nameSchema, language: z.enum(locales) });

/** Name and language. */
export function AboutYou({ me }: { me: MeView }) {
  const t = useStore(accountMessages);
  const change = useChangeMe();
  const form = useForm({ resolver: zodResolver(bodySchema), defaultValues: { name: me.name, language: me.language } });
  const submit = form.handleSubmit((body) =>
    change.mutate(body, { onError: (error) => markFaults(error, form.setError) }),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
      <Field
        {...form.register('name')}
        label={t.name}
        error={form.formState.errors.name && t.nameError}
        autoComplete="name"
      />
      <SelectField {...form.register('language')} label={t.language}>
        {locales.map((locale) => (
          <option key={locale} value={locale}>
            {languageNames[locale]}
          </option>
        ))}
      </SelectField>
      <Failure error={change.error} className="" />
      <div className="flex items-center gap-4">
        <Button type="submit" disabled={change.isPending}>
          {t.save}
        </Button>
        <output className="block font-semibold text-turf">{change.isSuccess && t.saved}</output>
      </div>
    </form>
  );
}
