import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Request, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { v7 as uuidv7 } from 'uuid';
import { addressHeader } from './auth.ts';

/**
 * Gives each request its id and overwrites the header that carries the caller's address to better-auth, so that nobody
 * chooses the address they are limited by.
 */
export function identify(): RequestHandler {
  return (request, response, next) => {
    const id = uuidv7();
    request.id = id;
    response.setHeader('X-Request-Id', id);
    request.headers[addressHeader] = request.ip ?? '0.0.0.0';
    next();
  };
}

/** The route's pattern, never the path as sent: a path can hold ids, tokens or whatever someone typed. */
function placeOf(request: IncomingMessage): string {
  const { route, path } = request as Request & { route?: { path?: unknown } };
  if (typeof route?.path === 'string' && route.path !== '/api/auth/*splat') return route.path;
  if (path.startsWith('/api/auth/')) return path.split('/').slice(0, 4).join('/');
  return path.startsWith('/assets/') ? '/assets/*' : '/*';
}

/** One line a request: id, method, place, status, milliseconds. No query, no cookie, no address, no person. */
export function requestLog(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: (request) => (request as Request).id,
    quietReqLogger: true,
    autoLogging: { ignore: (request) => request.url === '/healthz' || request.url === '/readyz' },
    serializers: { req: () => undefined, res: () => undefined, err: () => undefined },
    customAttributeKeys: { reqId: 'requestId', responseTime: 'ms' },
    customProps: (request: IncomingMessage, response: ServerResponse) =>
      response.writableEnded || response.headersSent
        ? { method: request.method, route: placeOf(request), status: response.statusCode }
        : {},
    customLogLevel: (_request, response, error) => {
      if (error || response.statusCode >= 500) return 'error';
      return response.statusCode >= 400 ? 'warn' : 'info';
    },
    customSuccessMessage: () => 'request',
    customErrorMessage: () => 'request',
    wrapSerializers: false,
  });
}
