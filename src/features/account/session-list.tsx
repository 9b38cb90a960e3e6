import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import type { SignedInView } from '../../../shared/contracts/account.ts';
import { accountMessages } from '../../i18n/account.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { Button } from '../../ui/button.tsx';
import { Chip } from '../../ui/chip.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { sessionsQuery, useEndSession } from './queries.ts';

function useDeviceName(): (session: SignedInView) => string {
  const t = useStore(accountMessages);
  return ({ browser, system }) => {
    if (browser && system) return t.onSystem({ browser, system });
    return browser ?? system ?? t.unknownDevice;
  };
}

/** Where the person is signed in, each session with the way to end it. */
export function SessionList() {
  const t = useStore(accountMessages);
  const { time } = useFormat();
  const deviceName = useDeviceName();
  const { data: sessions, error } = useQuery(sessionsQuery);
  const end = useEndSession();
  if (error) return <Failure error={error} />;
  if (!sessions) return <Loading />;
  return (
    <>
      <p className="mb-2 text-sm text-ink-soft">{t.sessionsHelp}</p>
      <Failure error={end.error} />
      <ul className="mb-3">
        {sessions.map((session) => {
          const device = deviceName(session);
          const when = time(new Date(session.lastSeen), { dateStyle: 'medium', timeStyle: 'short' });
          return (
            <li
              key={session.id}
              className="flex flex-wrap items-center gap-x-4 border-t border-rule py-2 first:border-t-0"
            >
              <div className="mr-auto">
                <p className="font-semibold">
                  {device} {session.current && <Chip tone="filling">{t.thisOne}</Chip>}
                </p>
                <p className="text-sm text-ink-soft">{t.lastSeen({ when })}</p>
              </div>
              {!session.current && (
                <Button
                  look="plain"
                  aria-label={t.endNamed({ device })}
                  disabled={end.isPending}
                  onClick={() => end.mutate(session.id)}
                >
                  {t.end}
                </Button>
              )}
            </li>
          );
        })}
      </ul>
      {sessions.length > 2 && (
        <Button look="quiet" disabled={end.isPending} onClick={() => end.mutate(null)}>
          {t.endAllOthers}
        </Button>
      )}
    </>
  );
}
