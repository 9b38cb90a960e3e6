import { z } from 'zod';
import { locales, roles } from '../vocabulary.ts';
import { accessKeys } from './access.ts';
import { givenPasswordSchema, nameSchema } from './auth.ts';

/** Who is signed in, for the client. */
export const meViewSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  language: z.enum(locales),
  roles: z.array(z.enum(roles)),
  /** What the person's roles allow, by the rows of the access table; the client shows and guards its pages by it. */
  may: z.array(z.enum(accessKeys)),
  /** Whether the whole course is open to them. */
  full: z.boolean(),
});
export type MeView = z.infer<typeof meViewSchema>;

/** What the client asks first: who is here, if anyone, and which optional pages there are. */
export const sessionViewSchema = z.object({ me: meViewSchema.nullable(), mailbox: z.boolean() });
export type SessionView = z.infer<typeof sessionViewSchema>;

export const changeMeBodySchema = z
  .object({ name: nameSchema.optional(), language: z.enum(locales).optional() })
  .refine((body) => body.name !== undefined || body.language !== undefined, 'Give a name or a language');
export type ChangeMeBody = z.infer<typeof changeMeBodySchema>;

export const signedInViewSchema = z.object({
  id: z.uuid(),
  /** True for the session this request came with. */
  current: z.boolean(),
  /** What it runs on, as far as the browser says: "Firefox", "Android"; null when it says nothing known. */
  browser: z.string().nullable(),
  system: z.string().nullable(),
  since: z.iso.datetime(),
  lastSeen: z.iso.datetime(),
});
export const signedInListSchema = z.array(signedInViewSchema);
export type SignedInView = z.infer<typeof signedInViewSchema>;

export const sessionParamsSchema = z.object({ sessionId: z.uuid() });
export const endedViewSchema = z.object({ ended: z.number().int() });

export const deleteMeBodySchema = z.object({ password: givenPasswordSchema });
