import type { IncomingHttpHeaders } from 'node:http';
import type { Auth } from './auth.ts';
import { sessionCookieName } from './cookie.ts';

/** Lengthens a session that is due for it, through better-auth; gives back the cookies to set, none when it is not. */
export function sessionExtender(auth: Auth): (headers: IncomingHttpHeaders) => Promise<string[]> {
  return async ({ cookie = '' }) => {
    const { headers } = await auth.api.getSession({ headers: new Headers({ cookie }), returnHeaders: true });
    return headers.getSetCookie();
  };
}

/** Compares a password with its stored hash the way signing in does. */
export function passwordCheck(auth: Auth): (given: { hash: string; password: string }) => Promise<boolean> {
  return async (given) => (await auth.$context).password.verify(given);
}

/** The cookies that make a browser forget its session. */
export function goodbyeCookies(appUrl: string): string[] {
  const name = sessionCookieName(appUrl);
  return [`${name}=; Max-Age=0; Path=/; HttpOnly; SameSite=Lax${name.startsWith('__Secure-') ? '; Secure' : ''}`];
}
