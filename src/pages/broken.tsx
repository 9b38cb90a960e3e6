import { useStore } from '@nanostores/react';
import { Component, type ReactNode } from 'react';
import { shellMessages } from '../i18n/shell.ts';
import { ApiError } from '../lib/api.ts';
import { paths } from '../paths.ts';
import { Button, ButtonLink } from '../ui/button.tsx';
import { PageHeading } from '../ui/page.tsx';
import { NotFound } from './not-found.tsx';

/** A page that exists but is not for this person's roles. */
export function Forbidden() {
  const t = useStore(shellMessages);
  return (
    <>
      <PageHeading title={t.forbiddenTitle} />
      <p className="mb-5 max-w-prose">{t.forbiddenText}</p>
      <ButtonLink to={paths.today}>{t.goToToday}</ButtonLink>
    </>
  );
}

/** Shown in place of a page that failed: what happened, what was kept, what to do. */
export function Broken({ error }: { error: unknown }) {
  const t = useStore(shellMessages);
  const status = error instanceof ApiError ? error.status : null;
  if (status === 404) return <NotFound />;
  if (status === 403) return <Forbidden />;
  return (
    <>
      <PageHeading title={t.brokenTitle} />
      <p className="mb-5 max-w-prose">{status === 0 ? t.offlineText : t.brokenText}</p>
      <Button onClick={() => window.location.reload()}>{t.tryAgain}</Button>
    </>
  );
}

/** Catches what a page throws; a new page begins anew, by its key. */
export class PageBoundary extends Component<{ children: ReactNode }, { error: unknown }> {
  override state: { error: unknown } = { error: null };

  static getDerivedStateFromError(error: unknown) {
    return { error };
  }

  override render() {
    return this.state.error === null ? this.props.children : <Broken error={this.state.error} />;
  }
}
