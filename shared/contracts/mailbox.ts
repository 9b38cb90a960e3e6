import { z } from 'zod';

/** One message in the demonstration's mailbox, as the list shows it. */
export const mailSummarySchema = z.object({
  id: z.string(),
  to: z.string(),
  subject: z.string(),
  at: z.iso.datetime(),
});
export const mailListSchema = z.array(mailSummarySchema);
export type MailSummary = z.infer<typeof mailSummarySchema>;

export const mailMessageSchema = mailSummarySchema.extend({ from: z.string(), text: z.string(), html: z.string() });
export type MailMessage = z.infer<typeof mailMessageSchema>;

export const mailParamsSchema = z.object({ id: z.string().regex(/^[A-Za-z0-9_-]{1,80}$/) });
