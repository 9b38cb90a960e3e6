import { useStore } from '@nanostores/react';
import { Link, useLocation } from 'react-router';
import { AddressForm } from '../../features/sign-in/address-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { useSession } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { NarrowPage } from '../../ui/narrow-page.tsx';
import { Notice } from '../../ui/notice.tsx';

export default function LookInYourMail() {
  const t = useStore(signInMessages);
  const { email, again } = (useLocation().state ?? {}) as { email?: string; again?: boolean };
  const mailbox = useSession()?.mailbox ?? false;
  return (
    <NarrowPage title={t.mailTitle} below={<Link to={paths.signIn}>{t.toSignIn}</Link>}>
      {again && (
        <Notice tone="plain" className="mb-3">
          {t.confirmFirst}
        </Notice>
      )}
      <p className="mb-4 font-serif">{email === undefined ? t.mailTextUnknown : t.mailText({ email })}</p>
      {mailbox && (
        <p className="mb-4">
          <Link to={paths.mailbox}>{t.toMailbox}</Link>
        </p>
      )}
      <p className="mb-4 border-t border-rule pt-4">{t.mailNothing}</p>
      <AddressForm sends="send-verification-email" email={email} button={t.sendAgain} sent={t.sentAgain} />
    </NarrowPage>
  );
}
