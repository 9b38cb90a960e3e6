import type { Locale } from '../../shared/vocabulary.ts';
import type { Mail } from '../outside/mail.ts';
import { compose } from '../outside/messages/compose.ts';
import type { MessageKind } from '../outside/messages/message-texts.ts';

/** The one a message goes to. */
export interface Addressee {
  name: string;
  email: string;
  language?: unknown;
}

/** The messages of signing up and in. Every link leads to a page of ours that then asks the API. */
export interface AuthMail {
  confirm: (to: Addressee, token: string) => Promise<void>;
  reset: (to: Addressee, token: string) => Promise<void>;
  allowAddress: (to: Addressee, newAddress: string, token: string) => Promise<void>;
  alreadyHere: (to: Addressee) => Promise<void>;
}

/** What a token made by better-auth is for. It was signed a moment ago in this process, so it is only read. */
function isForNewAddress(token: string): boolean {
  const payload = token.split('.')[1] ?? '';
  const claims = JSON.parse(Buffer.from(payload, 'base64url').toString('utf8')) as { requestType?: string };
  return claims.requestType === 'change-email-verification';
}

export function authMail(options: { mail: Mail; appUrl: string }): AuthMail {
  const { mail, appUrl } = options;

  function send(to: Addressee, what: { kind: MessageKind; path: string; newAddress?: string }): Promise<void> {
    const language: Locale = to.language === 'es' ? 'es' : 'en';
    const { kind, path, newAddress } = what;
    return mail.send(compose({ kind, to: to.email, language, name: to.name, url: `${appUrl}${path}`, newAddress }));
  }
  const confirmPath = (kind: string, token: string): string =>
    `/confirm?${new URLSearchParams({ kind, token }).toString()}`;

  return {
    confirm(to, token) {
      const kind = isForNewAddress(token) ? 'address-new' : 'confirm';
      return send(to, { kind, path: confirmPath(kind, token) });
    },
    reset: (to, token) => send(to, { kind: 'reset', path: `/reset?${new URLSearchParams({ token }).toString()}` }),
    allowAddress: (to, newAddress, token) =>
      send(to, { kind: 'address-old', path: confirmPath('address-old', token), newAddress }),
    alreadyHere: (to) => send(to, { kind: 'already-here', path: '/sign-in' }),
  };
}
