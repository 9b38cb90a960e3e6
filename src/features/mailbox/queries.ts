import { queryOptions } from '@tanstack/react-query';
import type { MailMessage, MailSummary } from '../../../shared/contracts/mailbox.ts';
import { api } from '../../lib/api.ts';

export const mailListQuery = queryOptions({
  queryKey: ['mailbox'],
  queryFn: () => api<MailSummary[]>('GET', '/api/mailbox'),
  // Someone waiting for a message should not have to press anything.
  refetchInterval: 4_000,
  staleTime: 0,
});

export const mailQuery = (id: string) =>
  queryOptions({
    queryKey: ['mailbox', id],
    queryFn: () => api<MailMessage>('GET', `/api/mailbox/${encodeURIComponent(id)}`),
    staleTime: Infinity,
  });
