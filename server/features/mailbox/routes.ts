import { mailListSchema, mailMessageSchema, mailParamsSchema } from '../../../shared/contracts/mailbox.ts';
import { AppError } from '../../../shared/errors.ts';
import { route, type Route } from '../../http/route.ts';
import type { MailboxService } from './service.ts';

/**
 * What was sent, in demonstrations and development only; elsewhere there is no mailbox and both addresses are 404. Open to
 * visitors, since whoever confirms an address is not signed in yet: all mail of a demonstration can be read by all.
 */
export function mailboxRoutes(mailbox: MailboxService | null): Route[] {
  const open = (): MailboxService => {
    if (!mailbox) throw new AppError('not-found');
    return mailbox;
  };
  return [
    route({
      method: 'get',
      path: '/api/mailbox',
      access: 'mailbox',
      visitors: true,
      reply: mailListSchema,
      handler: () => open().list(),
    }),
    route({
      method: 'get',
      path: '/api/mailbox/:id',
      access: 'mailbox',
      visitors: true,
      params: mailParamsSchema,
      reply: mailMessageSchema,
      handler: ({ params }) => open().one(params.id),
    }),
  ];
}
