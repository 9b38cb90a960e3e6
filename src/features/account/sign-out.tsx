import { useStore } from '@nanostores/react';
import { accountMessages } from '../../i18n/account.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useSignOut } from './queries.ts';

export function SignOut({ onDone }: { onDone: () => void }) {
  const t = useStore(accountMessages);
  const signOut = useSignOut(onDone);
  return (
    <>
      <Button look="quiet" disabled={signOut.isPending} onClick={() => signOut.mutate()}>
        {t.signOut}
      </Button>
      <Failure error={signOut.error} className="mt-3" />
    </>
  );
}
