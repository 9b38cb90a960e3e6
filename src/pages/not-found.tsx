import { useStore } from '@nanostores/react';
import { shellMessages } from '../i18n/shell.ts';
import { useMe } from '../lib/session.ts';
import { paths } from '../paths.ts';
import { ButtonLink } from '../ui/button.tsx';
import { PageHeading } from '../ui/page.tsx';

export function NotFound() {
  const t = useStore(shellMessages);
  const me = useMe();
  return (
    <>
      <PageHeading title={t.notFoundTitle} />
      <p className="mb-5 max-w-prose">{t.notFoundText}</p>
      <ButtonLink to={me ? paths.today : paths.welcome}>{me ? t.goToToday : t.goToWelcome}</ButtonLink>
    </>
  );
}
