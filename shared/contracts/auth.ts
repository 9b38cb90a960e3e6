import { z } from 'zod';
import { locales } from '../vocabulary.ts';

/** Bounds of a password, in characters: long enough to resist guessing, short enough not to be a load. */
export const passwordLength = { least: 10, most: 128 } as const;

export const emailSchema = z.email().max(254).toLowerCase();
export const newPasswordSchema = z.string().min(passwordLength.least).max(passwordLength.most);
/** A password that is only compared: its lower bound is nobody's business. */
export const givenPasswordSchema = z.string().min(1).max(passwordLength.most);
export const nameSchema = z.string().trim().min(1).max(80);
const tokenSchema = z.string().min(1).max(2_000);

export const signUpBodySchema = z.object({
  name: nameSchema,
  email: emailSchema,
  password: newPasswordSchema,
  language: z.enum(locales).default('en'),
});
export type SignUpBody = z.input<typeof signUpBodySchema>;

export const signInBodySchema = z.object({
  email: emailSchema,
  password: givenPasswordSchema,
  /** False ends the session with the browser. */
  rememberMe: z.boolean().default(true),
});
export type SignInBody = z.input<typeof signInBodySchema>;

export const emailBodySchema = z.object({ email: emailSchema });

export const resetPasswordBodySchema = z.object({ token: tokenSchema, newPassword: newPasswordSchema });
export type ResetPasswordBody = z.infer<typeof resetPasswordBodySchema>;

export const changeEmailBodySchema = z.object({ newEmail: emailSchema });

export const changePasswordBodySchema = z.object({
  currentPassword: givenPasswordSchema,
  newPassword: newPasswordSchema,
  /** True signs the person out everywhere else. */
  revokeOtherSessions: z.boolean().default(true),
});
export type ChangePasswordBody = z.input<typeof changePasswordBodySchema>;

export const confirmQuerySchema = z.object({ token: tokenSchema });
export const noBodySchema = z.object({});
