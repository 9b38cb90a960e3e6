import { createBrowserRouter, redirect, type LoaderFunctionArgs, type RouteObject } from 'react-router';
import type { AccessKey } from '../shared/contracts/access.ts';
import { queryClient } from './lib/query-client.ts';
import { mayDo, sessionQuery } from './lib/session.ts';
import { locale } from './i18n/i18n.ts';
import { paths, patterns } from './paths.ts';
import { Broken } from './pages/broken.tsx';
import { Frame } from './pages/frame.tsx';
import { Loading } from './ui/loading.tsx';

type Page = () => Promise<{ default: () => React.ReactNode }>;

async function knowSession(): Promise<null> {
  const { me } = await queryClient.ensureQueryData(sessionQuery);
  if (me && me.language !== locale.get()) locale.set(me.language);
  return null;
}

/** A page for people signed in whose roles allow it; others are sent to sign in, or told it is not theirs. */
function guarded(access: AccessKey) {
  return async ({ request }: LoaderFunctionArgs): Promise<null> => {
    const { me } = await queryClient.ensureQueryData(sessionQuery);
    const url = new URL(request.url);
    if (!me) throw redirect(paths.signInThen(url.pathname + url.search));
    if (!mayDo(me, access)) throw new Response('', { status: 403 });
    return null;
  };
}

function page(path: string, load: Page, access?: AccessKey): RouteObject {
  return {
    path,
    ...(access === undefined ? {} : { loader: guarded(access) }),
    lazy: async () => ({ Component: (await load()).default }),
    ErrorBoundary: Broken,
  };
}

export const routes: RouteObject[] = [
  {
    element: <Frame />,
    loader: knowSession,
    shouldRevalidate: () => false,
    HydrateFallback: Loading,
    ErrorBoundary: Broken,
    children: [
      page(patterns.welcome, () => import('./pages/welcome/welcome.tsx')),
      page(patterns.signUp, () => import('./pages/sign-in/sign-up.tsx')),
      page(patterns.signIn, () => import('./pages/sign-in/sign-in.tsx')),
      page(patterns.lookInYourMail, () => import('./pages/sign-in/look-in-your-mail.tsx')),
      page(patterns.confirm, () => import('./pages/sign-in/confirm.tsx')),
      page(patterns.forgot, () => import('./pages/sign-in/forgot.tsx')),
      page(patterns.reset, () => import('./pages/sign-in/reset.tsx')),
      page(patterns.mailbox, () => import('./pages/mailbox/mailbox.tsx')),
      page(patterns.today, () => import('./pages/practice/today.tsx'), 'own-account'),
      page(patterns.course, () => import('./pages/course/course.tsx'), 'course'),
      page(patterns.lesson, () => import('./pages/course/lesson.tsx'), 'course'),
      page(patterns.drills, () => import('./pages/practice/drills.tsx'), 'course'),
      page(patterns.drill, () => import('./pages/practice/drill.tsx'), 'course'),
      page(patterns.problem, () => import('./pages/practice/problem.tsx'), 'course'),
      page(patterns.progress, () => import('./pages/practice/progress.tsx'), 'own-account'),
      page(patterns.account, () => import('./pages/account/account.tsx'), 'own-account'),
      page(patterns.families, () => import('./pages/staff/families.tsx'), 'proof-sheet'),
      page(patterns.family, () => import('./pages/staff/family.tsx'), 'proof-sheet'),
      page('*', () => import('./pages/not-found.tsx')),
    ],
  },
];

export const router = createBrowserRouter(routes);
