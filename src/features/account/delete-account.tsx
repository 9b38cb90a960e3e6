import { useStore } from '@nanostores/react';
import { useState, type FormEvent } from 'react';
import type { MeView } from '../../../shared/contracts/account.ts';
import { accountMessages } from '../../i18n/account.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { PasswordField } from '../../ui/password-field.tsx';
import { useDeleteMe } from './queries.ts';

/** Deletes the account: asks once, by name, and for the password. */
export function DeleteAccount({ me, onDone }: { me: MeView; onDone: () => void }) {
  const t = useStore(accountMessages);
  const [asking, setAsking] = useState(false);
  const [password, setPassword] = useState('');
  const [missing, setMissing] = useState(false);
  const remove = useDeleteMe(onDone);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setMissing(password === '');
    if (password !== '') remove.mutate(password);
  };
  return (
    <>
      <p className="mb-3 max-w-prose">{t.removeText}</p>
      {!asking && (
        <Button look="danger" onClick={() => setAsking(true)}>
          {t.removeBegin}
        </Button>
      )}
      {asking && (
        <form onSubmit={submit} noValidate className="grid gap-4 border-l-4 border-clay bg-clay-wash p-4">
          <p className="font-semibold [overflow-wrap:anywhere]">{t.removeAsk({ name: me.name, email: me.email })}</p>
          <PasswordField
            label={t.currentPassword}
            value={password}
            onChange={(event) => setPassword(event.target.value)}
            error={missing ? t.passwordMissing : undefined}
            autoComplete="current-password"
            show={t.showOne}
          />
          <Failure error={remove.error} className="" />
          <div className="flex flex-wrap gap-4">
            <Button type="submit" look="danger" disabled={remove.isPending}>
              {t.removeYes}
            </Button>
            <Button look="plain" onClick={() => setAsking(false)}>
              {t.removeNo}
            </Button>
          </div>
        </form>
      )}
    </>
  );
}
