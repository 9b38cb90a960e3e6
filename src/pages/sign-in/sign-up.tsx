import { useStore } from '@nanostores/react';
import { Link, useNavigate } from 'react-router';
import { SignUpForm } from '../../features/sign-in/sign-up-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { paths } from '../../paths.ts';
import { NarrowPage } from '../../ui/narrow-page.tsx';

export default function SignUp() {
  const t = useStore(signInMessages);
  const navigate = useNavigate();
  return (
    <NarrowPage
      title={t.signUpTitle}
      text={t.signUpText}
      below={
        <p>
          {t.haveOne} <Link to={paths.signIn}>{t.signInTitle}</Link>
        </p>
      }
    >
      <SignUpForm onDone={(email) => void navigate(paths.lookInYourMail, { state: { email } })} />
    </NarrowPage>
  );
}
