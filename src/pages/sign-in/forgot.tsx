import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import { AddressForm } from '../../features/sign-in/address-form.tsx';
import { signInMessages } from '../../i18n/sign-in.ts';
import { useSession } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { NarrowPage } from '../../ui/narrow-page.tsx';

export default function Forgot() {
  const t = useStore(signInMessages);
  const mailbox = useSession()?.mailbox ?? false;
  return (
    <NarrowPage
      title={t.forgotTitle}
      text={t.forgotText}
      below={
        <>
          {mailbox && <Link to={paths.mailbox}>{t.toMailbox}</Link>}
          <Link to={paths.signIn}>{t.toSignIn}</Link>
        </>
      }
    >
      <AddressForm sends="request-password-reset" button={t.send} sent={t.forgotSent} />
    </NarrowPage>
  );
}
