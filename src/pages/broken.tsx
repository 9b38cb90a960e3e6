import { useStore } from '@nanostores/react';
import { isRouteErrorResponse, useRouteError } from 'react-router';
import { shellMessages } from '../i18n/shell.ts';
import { ApiError } from '../lib/api.ts';
import { paths } from '../paths.ts';
import { Button, ButtonLink } from '../ui/button.tsx';
import { PageHeading } from '../ui/page.tsx';
import { NotFound } from './not-found.tsx';

function statusOf(error: unknown): number | null {
  if (isRouteErrorResponse(error)) return error.status;
  return error instanceof ApiError ? error.status : null;
}

/** Shown in place of a page that failed: what happened, what was kept, what to do. */
export function Broken() {
  const t = useStore(shellMessages);
  const error = useRouteError();
  const status = statusOf(error);
  if (status === 404) return <NotFound />;
  if (status === 403) {
    return (
      <>
        <PageHeading title={t.forbiddenTitle} />
        <p className="mb-5 max-w-prose">{t.forbiddenText}</p>
        <ButtonLink to={paths.today}>{t.goToToday}</ButtonLink>
      </>
    );
  }
  return (
    <>
      <PageHeading title={t.brokenTitle} />
      <p className="mb-5 max-w-prose">{status === 0 ? t.offlineText : t.brokenText}</p>
      <Button onClick={() => window.location.reload()}>{t.tryAgain}</Button>
    </>
  );
}
