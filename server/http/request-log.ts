import { randomUUID } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { addressHeader } from './auth.ts';

declare module 'express-serve-static-core' {
  interface Request {
    /** The request's own id, in its log line and its X-Request-Id. */
    id: string;
  }
}

/**
 * Gives each request its id and overwrites the header that carries the caller's address to better-auth, so that nobody
 * chooses the address they are limited by.
 */
export function identify(): RequestHandler {
  return (request, response, next) => {
    const id = randomUUID();
    request.id = id;
    response.setHeader('X-Request-Id', id);
    request.headers[addressHeader] = request.ip ?? '0.0.0.0';
    next();
  };
}

/** The route's pattern, never the path as sent: a path can hold ids, tokens or whatever someone typed. */
function placeOf(request: Request): string {
  const { route, path } = request as Request & { route?: { path?: unknown } };
  if (typeof route?.path === 'string' && route.path !== '/api/auth/*splat') return route.path;
  if (path.startsWith('/api/auth/')) return path.split('/').slice(0, 4).join('/');
  return path.startsWith('/assets/') ? '/assets/*' : '/*';
}

const quiet = new Set(['/healthz', '/readyz']);

/** One line a request: id, method, place, status, milliseconds. No query, no cookie, no address, no person. */
export function requestLog(log: Logger): RequestHandler {
  return (request, response, next) => {
    if (quiet.has(request.url)) return next();
    const began = performance.now();
    response.once('close', () => {
      const { statusCode: status, writableFinished } = response;
      const line = {
        requestId: request.id,
        method: request.method,
        route: placeOf(request),
        status,
        ms: Math.round(performance.now() - began),
        // The caller left before the reply was sent.
        ...(writableFinished ? {} : { aborted: true }),
      };
      if (status >= 500) log.error(line, 'request');
      else if (status >= 400) log.warn(line, 'request');
      else log.info(line, 'request');
    });
    next();
  };
}
