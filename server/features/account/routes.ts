import type { IncomingHttpHeaders } from 'node:http';
import {
  changeMeBodySchema,
  deleteMeBodySchema,
  endedViewSchema,
  meViewSchema,
  sessionParamsSchema,
  sessionViewSchema,
  signedInListSchema,
} from '../../../shared/contracts/account.ts';
import { route, type Route } from '../../http/route.ts';
import type { AccountService } from './service.ts';

export interface AccountRouteDeps {
  account: AccountService;
  /** Whether there is a mailbox page. */
  mailbox: boolean;
  /** Lengthens the session when it is due; gives back the cookies to set. */
  extendSession: (headers: IncomingHttpHeaders) => Promise<string[]>;
  /** Cookies that end the session in the browser. */
  goodbyeCookies: readonly string[];
}

/** One's own account. */
export function accountRoutes({ account, mailbox, extendSession, goodbyeCookies }: AccountRouteDeps): Route[] {
  return [
    // What the client asks first. A visitor gets an answer, not an error; for everyone else the session is kept alive here.
    route({
      method: 'get',
      path: '/api/session',
      access: 'welcome',
      visitors: true,
      reply: sessionViewSchema,
      handler: async ({ person, headers, setHeader }) => {
        if (!person) return { me: null, mailbox };
        const cookies = await extendSession(headers);
        if (cookies.length > 0) setHeader('Set-Cookie', cookies);
        return { me: account.me(person), mailbox };
      },
    }),
    route({
      method: 'get',
      path: '/api/me',
      access: 'own-account',
      reply: meViewSchema,
      handler: ({ person }) => account.me(person),
    }),
    route({
      method: 'patch',
      path: '/api/me',
      access: 'own-account',
      body: changeMeBodySchema,
      reply: meViewSchema,
      handler: ({ person, body }) => account.change(person, body),
    }),
    route({
      method: 'delete',
      path: '/api/me',
      access: 'own-account',
      body: deleteMeBodySchema,
      handler: async ({ person, body, setHeader }) => {
        await account.remove(person, body.password);
        setHeader('Set-Cookie', goodbyeCookies);
      },
    }),
    route({
      method: 'get',
      path: '/api/me/sessions',
      access: 'own-account',
      reply: signedInListSchema,
      handler: ({ person }) => account.sessions(person),
    }),
    route({
      method: 'delete',
      path: '/api/me/sessions',
      access: 'own-account',
      reply: endedViewSchema,
      handler: async ({ person }) => ({ ended: await account.endOtherSessions(person) }),
    }),
    route({
      method: 'delete',
      path: '/api/me/sessions/:sessionId',
      access: 'own-account',
      params: sessionParamsSchema,
      handler: ({ person, params }) => account.endSession(person, params.sessionId),
    }),
    route({
      method: 'get',
      path: '/api/me/export',
      access: 'own-account',
      handler: ({ person, setHeader }) => {
        setHeader('Content-Disposition', 'attachment; filename="tankmark-my-data.json"');
        return account.exportAll(person);
      },
    }),
  ];
}
