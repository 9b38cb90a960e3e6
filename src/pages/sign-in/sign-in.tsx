import { useStore } from '@nanostores/react';
import { Link, Navigate, useNavigate, useSearchParams } from 'react-router';
import { SignInForm } from '../../features/sign-in/sign-in-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { NarrowPage } from '../../ui/narrow-page.tsx';
import { Notice } from '../../ui/notice.tsx';

/** Only a page of ours: an address that starts with one slash. */
export function safeNext(next: string | null): string {
  return next !== null && /^\/(?![/\\])/.test(next) ? next : paths.today;
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
