import { lazy, type ComponentType, type ReactNode } from 'react';
import { Navigate, Route, Routes, useLocation } from 'react-router';
import type { AccessKey } from '../shared/contracts/access.ts';
import { mayDo, useMe } from './lib/session.ts';
import { Forbidden } from './pages/broken.tsx';
import { Frame } from './pages/frame.tsx';
import { NotFound } from './pages/not-found.tsx';
import { paths, patterns } from './paths.ts';

// The router is used without its data part: loaders and actions would be a fifth of the shell, and reads are the query
// client's business here.

/** A page for people signed in whose roles allow it; others are sent to sign in, or told that it is not theirs. */
function Guarded({ access, children }: { access: AccessKey; children: ReactNode }) {
  const me = useMe();
  const { pathname, search } = useLocation();
  if (!me) return <Navigate to={paths.signInThen(pathname + search)} replace />;
  return mayDo(me, access) ? children : <Forbidden />;
}

function page(path: string, load: () => Promise<{ default: ComponentType }>, access?: AccessKey) {
  const Page = lazy(load);
  const element = access === undefined ? <Page /> : <Guarded access={access}>{<Page />}</Guarded>;
  return <Route key={path} path={path} element={element} />;
}

const open = [
  page(patterns.welcome, () => import('./pages/welcome/welcome.tsx')),
  page(patterns.signUp, () => import('./pages/sign-in/sign-up.tsx')),
  page(patterns.signIn, () => import('./pages/sign-in/sign-in.tsx')),
  page(patterns.lookInYourMail, () => import('./pages/sign-in/look-in-your-mail.tsx')),
  page(patterns.confirm, () => import('./pages/sign-in/confirm.tsx')),
  page(patterns.forgot, () => import('./pages/sign-in/forgot.tsx')),
  page(patterns.reset, () => import('./pages/sign-in/reset.tsx')),
  page(patterns.mailbox, () => import('./pages/mailbox/mailbox.tsx')),
];

const guarded = [
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
];

/** Every page at its address, inside the frame. */
export function Pages() {
  return (
    <Routes>
      <Route element={<Frame />}>
        {open}
        {guarded}
        <Route path="*" element={<NotFound />} />
      </Route>
    </Routes>
  );
}
