import { useStore } from '@nanostores/react';
import { Link, Navigate, useNavigate, useSearchParams } from 'react-router';
import { SignInForm } from '../../features/sign-in/sign-in-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { NarrowPage } from '../../ui/narrow-page.tsx';
import { Notice } from '../../ui/notice.tsx';

/** Only a page of ours. The address is read as a browser reads it: "/<tab>/other" leads to another site, too. */
export function safeNext(next: string | null): string {
  const { origin } = window.location;
  if (next === null || !next.startsWith('/') || !URL.canParse(next, origin)) return paths.today;
  const url = new URL(next, origin);
  const isOurs = url.origin === origin && !url.pathname.startsWith('//');
  return isOurs ? `${url.pathname}${url.search}${url.hash}` : paths.today;
}

export default function SignIn() {
  const t = useStore(signInMessages);
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const me = useMe();
  const next = safeNext(search.get('next'));
  if (me) return <Navigate to={next} replace />;
  return (
    <NarrowPage
      title={t.signInTitle}
      below={
        <>
          <p>
            <Link to={paths.forgot}>{t.forgotLink}</Link>
          </p>
          <p>
            {t.noneYet} <Link to={paths.signUp}>{t.signUpTitle}</Link>
          </p>
        </>
      }
    >
      {search.has('next') && (
        <Notice tone="plain" className="mb-4">
          {t.signInFirst}
        </Notice>
      )}
      <SignInForm
        onDone={() => void navigate(next, { replace: true })}
        onUnconfirmed={(email) => void navigate(paths.lookInYourMail, { state: { email, again: true } })}
      />
    </NarrowPage>
  );
}
