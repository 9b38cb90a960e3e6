import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router';
import { MailList } from '../../features/mailbox/mail-list.tsx';
import { MailText } from '../../features/mailbox/mail-text.tsx';
import { mailListQuery, mailQuery } from '../../features/mailbox/queries.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { mailboxMessages } from '../../i18n/mailbox.ts';
import { paths } from '../../paths.ts';
import { Failure } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

function Message({ id }: { id: string }) {
  const t = useStore(mailboxMessages);
  const { time } = useFormat();
  const { data: mail, error } = useQuery(mailQuery(id));
  if (error) return <Failure error={error} />;
  if (!mail) return <Loading />;
  const { subject, from, to, at, text } = mail;
  return (
    <Sheet>
      <Link to={paths.mailbox} className="mb-2 inline-flex min-h-11 items-center wide:hidden">
        {t.back}
      </Link>
      <h2>{subject}</h2>
      <p className="mt-1 mb-4 border-b border-rule pb-3 text-sm break-words text-ink-soft">
        {t.from({ from })}
        <br />
        {t.to({ to })}
        <br />
        {time(new Date(at), { dateStyle: 'full', timeStyle: 'short' })}
      </p>
      <MailText text={text} />
    </Sheet>
  );
}

/** What the demonstration has sent, so that an address can be confirmed without a real mailbox. */
export default function Mailbox() {
  const t = useStore(mailboxMessages);
  const [search] = useSearchParams();
  const shownId = search.get('message');
  const { data: mails, error } = useQuery(mailListQuery);
  if (error && !mails) throw error;
  if (!mails) return <Loading />;
  return (
    <>
      <PageHeading title={t.title}>
        <p className="mt-2 max-w-prose font-serif">{t.intro}</p>
      </PageHeading>
      {mails.length === 0 ? (
        <p className="max-w-prose">{t.empty}</p>
      ) : (
        <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-6 wide:grid-cols-[22rem_minmax(0,1fr)]">
          <div className={`border border-rule bg-sheet ${shownId === null ? '' : 'hidden wide:block'}`}>
            <MailList mails={mails} shownId={shownId} linkTo={(id) => `${paths.mailbox}?message=${id}`} />
          </div>
          {shownId === null ? (
            <p className="hidden text-ink-soft wide:block">{t.choose}</p>
          ) : (
            <Message key={shownId} id={shownId} />
          )}
        </div>
      )}
    </>
  );
}
