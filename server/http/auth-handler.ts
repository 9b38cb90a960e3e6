import type { Request, RequestHandler, Response as Reply } from 'express';
import { AppError } from '../../shared/errors.ts';
import type { Auth } from './auth.ts';
import { authEndpoints, authFailure, type AuthEndpoint } from './auth-endpoints.ts';
import { isOurs } from './origin.ts';
import { jsonBody, parsePart } from './parse.ts';
import type { Sessions } from './session.ts';
import type { Tries } from './tries.ts';

export interface AuthHandlerDeps {
  auth: Auth;
  sessions: Sessions;
  tries: Tries;
  appUrl: string;
  origins: readonly string[];
  /** Drops a sign-up of that address that was never confirmed, so that the latest one is the one that counts. */
  dropUnconfirmed: (email: string) => Promise<void>;
}

/** Headers better-auth reads; the rest of a request is none of its business. */
const passedOn = [
  'cookie',
  'origin',
  'referer',
  'user-agent',
  'sec-fetch-site',
  'sec-fetch-mode',
  'sec-fetch-dest',
  'x-client-address',
];

function webRequest(request: Request, target: { url: string; body: unknown }): globalThis.Request {
  const headers = new Headers();
  for (const name of passedOn) {
    const value = request.get(name);
    if (value !== undefined) headers.set(name, value);
  }
  if (target.body === undefined) return new Request(target.url, { method: request.method, headers });
  headers.set('content-type', 'application/json');
  return new Request(target.url, { method: request.method, headers, body: JSON.stringify(target.body) });
}

function parsed(
  endpoint: AuthEndpoint,
  request: Request,
): { body: Record<string, unknown> | undefined; search: string } {
  const given = jsonBody(request);
  const body =
    endpoint.body && parsePart(endpoint.body, endpoint.path === '/sign-out' ? (given ?? {}) : given, 'bad-body');
  const query = endpoint.query && parsePart(endpoint.query, request.query, 'bad-query');
  const search = query ? `?${new URLSearchParams(query as Record<string, string>).toString()}` : '';
  return { body, search };
}

async function countedFor(
  endpoint: AuthEndpoint,
  body: Record<string, unknown> | undefined,
  find: () => ReturnType<Sessions['find']>,
): Promise<string | null> {
  if (!endpoint.counts) return null;
  if (endpoint.counts.by === 'email') return String(body?.email);
  const person = await find();
  if (!person) throw new AppError('not-signed-in');
  return person.id;
}

/**
 * Only cookies and the outcome leave: better-auth's own bodies hold the session's token, which no script is to see. The
 * client asks /api/session who is here.
 */
async function passBack(answer: Response, reply: Reply): Promise<void> {
  for (const cookie of answer.headers.getSetCookie()) reply.append('Set-Cookie', cookie);
  if (answer.status >= 400) {
    const text = await answer.text();
    const said = text === '' ? {} : (JSON.parse(text) as { code?: unknown });
    const seconds = Number(answer.headers.get('x-retry-after') ?? 0);
    const retry = answer.status === 429 ? { retryAfterSeconds: Math.max(1, seconds) } : {};
    throw new AppError(authFailure(answer.status, said.code), retry);
  }
  reply.setHeader('Cache-Control', 'no-store');
  reply.json({ status: true });
}

/**
 * Everything under /api/auth: our contract first, the count of tries, then better-auth, and its refusals in the form every
 * other route's have.
 */
export function authHandler(deps: AuthHandlerDeps): RequestHandler {
  const { auth, sessions, tries, appUrl, origins } = deps;
  return async (request, reply) => {
    const path = request.path.replace(/^\/api\/auth/, '');
    const endpoint = authEndpoints.find((one) => one.method === request.method && one.path === path);
    if (!endpoint) throw new AppError('not-found');
    if (endpoint.method === 'POST' && !isOurs(request.headers, origins)) throw new AppError('foreign-origin');
    const { body, search } = parsed(endpoint, request);
    const subject = await countedFor(endpoint, body, () => sessions.find(request.headers.cookie));
    if (endpoint.counts && subject !== null) await tries.spend(endpoint.counts.limit, subject);
    if (path === '/sign-up/email') await deps.dropUnconfirmed(String(body?.email));
    const answer = await auth.handler(webRequest(request, { url: `${appUrl}/api/auth${path}${search}`, body }));
    if (answer.ok && endpoint.counts?.limit === 'password' && subject !== null)
      await tries.forgive('password', subject);
    await passBack(answer, reply);
  };
}
