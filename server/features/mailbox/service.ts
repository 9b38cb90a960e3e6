import type { z } from 'zod';
import {
  mailListSchema,
  mailMessageSchema,
  type MailMessage,
  type MailSummary,
} from '../../../shared/contracts/mailbox.ts';
import { AppError } from '../../../shared/errors.ts';

const answerWithinMs = 3_000;

/** Reads the local mail sink over HTTP. */
export function mailboxService(baseUrl: string) {
  async function read<T>(path: string, schema: z.ZodType<T>): Promise<T> {
    const url = `${baseUrl.replace(/\/+$/, '')}${path}`;
    let response: Response;
    try {
      response = await fetch(url, { signal: AbortSignal.timeout(answerWithinMs) });
    } catch (cause) {
      throw new AppError('mailbox-unreachable', { cause });
    }
    if (response.status === 404) throw new AppError('not-found');
    const parsed = response.ok ? schema.safeParse(await response.json().catch(() => null)) : null;
    if (!parsed?.success) throw new AppError('mailbox-unreachable');
    return parsed.data;
  }
  return {
    list: (): Promise<MailSummary[]> => read('/messages', mailListSchema),
    one: (id: string): Promise<MailMessage> => read(`/messages/${encodeURIComponent(id)}`, mailMessageSchema),
  };
}
export type MailboxService = ReturnType<typeof mailboxService>;
