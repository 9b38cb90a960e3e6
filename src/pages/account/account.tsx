import { useStore } from '@nanostores/react';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router';
import { AboutYou } from '../../features/account/about-you.tsx';
import { AddressForm } from '../../features/account/address-form.tsx';
import { DeleteAccount } from '../../features/account/delete-account.tsx';
import { Look } from '../../features/account/look.tsx';
import { PasswordForm } from '../../features/account/password-form.tsx';
import { SessionList } from '../../features/account/session-list.tsx';
import { SignOut } from '../../features/account/sign-out.tsx';
import { accountMessages } from '../../i18n/account.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { buttonLook } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <Sheet aria-label={title} className="mb-6 break-inside-avoid">
      <h2 className="mb-3">{title}</h2>
      {children}
    </Sheet>
  );
}

/** One's own account. */
export default function Account() {
  const t = useStore(accountMessages);
  const navigate = useNavigate();
  const me = useMe();
  const leave = () => void navigate(paths.welcome, { replace: true });
  if (!me) return <Loading />;
  return (
    <>
      <PageHeading title={t.title}>
        <div className="mt-3">
          <SignOut onDone={leave} />
        </div>
      </PageHeading>
      <div className="gap-6 wide:columns-2">
        <Section title={t.you}>
          <AboutYou me={me} />
          <div className="mt-5 border-t border-rule pt-4">
            <Look />
          </div>
        </Section>
        <Section title={t.address}>
          <AddressForm email={me.email} />
        </Section>
        <Section title={t.password}>
          <PasswordForm />
        </Section>
        <Section title={t.sessions}>
          <SessionList />
        </Section>
        <Section title={t.data}>
          <p className="mb-3">{t.dataText}</p>
          <a href="/api/me/export" download className={buttonLook('quiet')}>
            {t.download}
          </a>
        </Section>
        <Section title={t.remove}>
          <DeleteAccount me={me} onDone={leave} />
        </Section>
      </div>
    </>
  );
}
