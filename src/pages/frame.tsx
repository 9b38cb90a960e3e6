import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { Suspense, useLayoutEffect } from 'react';
import { Link, Outlet, useLocation } from 'react-router';
import type { MeView } from '../../shared/contracts/account.ts';
import { chooseLocale, languageNames, useLocale } from '../i18n/i18n.ts';
import { shellMessages } from '../i18n/shell.ts';
import { useScrollMemory } from '../lib/scroll-memory.ts';
import { mayDo, sessionQuery } from '../lib/session.ts';
import { paths } from '../paths.ts';
import { ButtonLink } from '../ui/button.tsx';
import { Loading } from '../ui/loading.tsx';
import { Mark } from '../ui/mark.tsx';
import { Broken, PageBoundary } from './broken.tsx';

const railLink =
  'flex min-h-11 items-center justify-center border-t-[3px] border-transparent px-1 text-[0.8125rem] font-medium text-ink no-underline wide:justify-start wide:border-t-0 wide:border-l-[3px] wide:px-2.5 wide:text-base aria-[current=page]:border-dye aria-[current=page]:bg-dye-wash aria-[current=page]:font-bold';

/** Whether a page lies under a link of the rail; problems belong to the drills. */
function isUnder(pathname: string, link: string): boolean {
  const inside = (place: string) => pathname === place || pathname.startsWith(`${place}/`);
  return inside(link) || (link === paths.drills && inside('/problems'));
}

function Rail({ me, mailbox }: { me: MeView; mailbox: boolean }) {
  const t = useStore(shellMessages);
  const { pathname } = useLocation();
  const links = [
    [paths.today, t.today],
    [paths.course, t.course],
    [paths.drills, t.drills],
    [paths.progress, t.progress],
    [paths.account, t.account],
    ...(mayDo(me, 'proof-sheet') ? [[paths.families, t.families] as const] : []),
  ] as const;
  return (
    <nav
      aria-label={t.main}
      className="fixed inset-x-0 bottom-0 z-20 border-t border-rule bg-sheet pb-[env(safe-area-inset-bottom)] wide:sticky wide:top-0 wide:flex wide:h-screen wide:w-[13.5rem] wide:flex-none wide:flex-col wide:border-t-0 wide:border-r wide:bg-transparent wide:py-6 wide:pr-4 wide:pl-6"
    >
      <Link
        to={paths.welcome}
        aria-label={t.welcome}
        className="mb-6 hidden items-end gap-2 text-ink no-underline wide:flex"
      >
        <Mark />
        <span className="font-serif text-[1.375rem] leading-none font-bold tracking-tight">Tankmark</span>
      </Link>
      <ul className="flex justify-around wide:block">
        {links.map(([to, text]) => (
          <li key={to} className="wide:mb-1">
            <Link to={to} className={railLink} aria-current={isUnder(pathname, to) ? 'page' : undefined}>
              {text}
            </Link>
          </li>
        ))}
      </ul>
      <div className="mt-auto hidden text-sm text-ink-soft wide:block">
        {mailbox && (
          <Link to={paths.mailbox} className="mb-3 inline-flex min-h-6 items-center">
            {t.mailbox}
          </Link>
        )}
        <p className="break-words">{me.name}</p>
      </div>
    </nav>
  );
}

/** The other language, named in its own words. */
function OtherLanguage() {
  const other = useLocale() === 'en' ? 'es' : 'en';
  return (
    <button
      type="button"
      lang={other}
      onClick={() => chooseLocale(other)}
      className="min-h-11 text-dye underline underline-offset-[.18em]"
    >
      {languageNames[other]}
    </button>
  );
}

function Top({ mailbox }: { mailbox: boolean }) {
  const t = useStore(shellMessages);
  return (
    <header className="no-print mx-auto flex w-full max-w-[72rem] flex-wrap items-center gap-x-3 px-4 py-4 wide:gap-x-4 wide:px-8">
      <Link
        to={paths.welcome}
        aria-label={t.welcome}
        className="mr-auto flex min-h-11 items-center gap-2 text-ink no-underline"
      >
        <Mark />
        <span className="font-serif text-[1.375rem] leading-none font-bold tracking-tight">Tankmark</span>
      </Link>
      {mailbox && (
        <Link to={paths.mailbox} className="hidden min-h-11 items-center wide:inline-flex">
          {t.mailbox}
        </Link>
      )}
      <OtherLanguage />
      <ButtonLink to={paths.signIn} className="max-wide:px-3 whitespace-nowrap">
        {t.signIn}
      </ButtonLink>
    </header>
  );
}

/** The page in hand: what it throws is caught, and while it is fetched something is seen at once. */
function Page() {
  const { pathname } = useLocation();
  return (
    <PageBoundary key={pathname}>
      <Suspense fallback={<Loading />}>
        <Outlet />
      </Suspense>
    </PageBoundary>
  );
}

/** What stands round every page: the way through the product, a bar below on phones and a rail on wide screens. */
export function Frame() {
  const t = useStore(shellMessages);
  const { data: session, error } = useQuery(sessionQuery);
  const me = session?.me ?? null;
  const mailbox = session?.mailbox ?? false;
  const language = me?.language;
  useScrollMemory();
  useLayoutEffect(() => {
    if (language !== undefined) chooseLocale(language);
  }, [language]);
  return (
    <div className={me ? 'min-h-screen pb-28 wide:flex wide:pb-0' : 'min-h-screen'}>
      <a href="#content" className="sr-only focus:not-sr-only focus:absolute focus:z-30 focus:bg-sheet focus:p-3">
        {t.skip}
      </a>
      {me ? <Rail me={me} mailbox={mailbox} /> : <Top mailbox={mailbox} />}
      <main
        id="content"
        tabIndex={-1}
        data-quiet-focus=""
        className={`w-full min-w-0 px-4 py-4 wide:px-9 wide:py-7 ${me ? 'max-w-[76rem]' : 'mx-auto max-w-[72rem]'}`}
      >
        {session && <Page />}
        {!session && (error ? <Broken error={error} /> : <Loading />)}
      </main>
    </div>
  );
}
