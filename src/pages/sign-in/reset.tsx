import { useStore } from '@nanostores/react';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router';
import { ResetForm } from '../../features/sign-in/reset-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { NarrowPage } from '../../ui/narrow-page.tsx';
import { Notice } from '../../ui/notice.tsx';

export default function Reset() {
  const t = useStore(signInMessages);
  const [search] = useSearchParams();
  const [done, setDone] = useState(false);
  return (
    <NarrowPage
      title={t.resetTitle}
      {...(done ? {} : { text: t.resetText, below: <Link to={paths.forgot}>{t.resetAgain}</Link> })}
    >
      <output className="block">
        {done && (
          <Notice tone="good" className="mb-4">
            {t.resetDone}
          </Notice>
        )}
      </output>
      {done ? (
        <ButtonLink to={paths.signIn}>{t.toSignIn}</ButtonLink>
      ) : (
        <ResetForm token={search.get('token') ?? ''} onDone={() => setDone(true)} />
      )}
    </NarrowPage>
  );
}
