import { useStore } from '@nanostores/react';
import { useEffect, useRef } from 'react';
import { useSearchParams } from 'react-router';
import { useConfirm } from '../../features/sign-in/queries.ts';
import { signInMessages } from '../../i18n/sign-in.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { NarrowPage } from '../../ui/narrow-page.tsx';

/** Where the links of confirming messages lead: hands in the token, says what came of it. */
export default function Confirm() {
  const t = useStore(signInMessages);
  const [search] = useSearchParams();
  const me = useMe();
  const { mutate, isSuccess, error } = useConfirm();
  const token = search.get('token') ?? '';
  const handedIn = useRef(false);
  useEffect(() => {
    if (handedIn.current) return;
    handedIn.current = true;
    mutate(token);
  }, [mutate, token]);
  if (error) {
    return (
      <NarrowPage key="failed" title={t.confirmFailedTitle}>
        <Failure error={error} className="mb-4" />
        <div className="flex flex-wrap gap-4">
          <ButtonLink to={paths.lookInYourMail}>{t.sendAgain}</ButtonLink>
          <ButtonLink to={paths.signIn} look="quiet">
            {t.toSignIn}
          </ButtonLink>
        </div>
      </NarrowPage>
    );
  }
  if (!isSuccess) {
    return (
      <NarrowPage key="waiting" title={t.confirmTitle}>
        <Loading />
      </NarrowPage>
    );
  }
  const kind = search.get('kind');
  const said =
    kind === 'address-old'
      ? ([t.allowedTitle, t.allowedText] as const)
      : kind === 'address-new'
        ? ([t.changedTitle, t.changedText] as const)
        : ([t.confirmedTitle, t.confirmedText] as const);
  return (
    <NarrowPage key="done" title={said[0]}>
      <p className="mb-4 font-serif">{said[1]}</p>
      <ButtonLink to={me ? paths.today : paths.signIn}>{me ? t.toToday : t.toSignIn}</ButtonLink>
    </NarrowPage>
  );
}
