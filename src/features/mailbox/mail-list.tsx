import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { MailSummary } from '../../../shared/contracts/mailbox.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { mailboxMessages } from '../../i18n/mailbox.ts';

interface MailListProps {
  mails: readonly MailSummary[];
  shownId: string | null;
  linkTo: (id: string) => string;
}

/** What was sent, newest first. */
export function MailList({ mails, shownId, linkTo }: MailListProps) {
  const t = useStore(mailboxMessages);
  const { time } = useFormat();
  return (
    <ul aria-label={t.list}>
      {mails.map(({ id, to, subject, at }) => (
        <li key={id} className="border-t border-rule first:border-t-0">
          <Link
            to={linkTo(id)}
            aria-current={id === shownId ? 'true' : undefined}
            className="block border-l-[3px] border-transparent px-3 py-2.5 text-ink no-underline hover:bg-dye-wash aria-[current=true]:border-dye aria-[current=true]:bg-dye-wash"
          >
            <span className="block font-semibold">{subject}</span>
            <span className="block text-sm break-words text-ink-soft">{t.to({ to })}</span>
            <span className="block text-sm text-ink-soft">
              {time(new Date(at), { dateStyle: 'medium', timeStyle: 'short' })}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
