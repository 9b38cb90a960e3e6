import { ServerResponse } from 'node:http';
import type { Request, RequestHandler } from 'express';
import helmet from 'helmet';

/** Pages whose address carries a token: nothing of it may leave by the Referer header. */
const pagesWithToken = new Set(['/confirm', '/reset']);

/** The headers that a handler sets, taken down from a reply that goes nowhere. */
function headersSetBy(set: ReturnType<typeof helmet>, request: Request): Map<string, string> {
  const reply = new ServerResponse(request);
  set(request, reply, (error?: unknown) => {
    if (error) throw error;
  });
  reply.setHeader('Permissions-Policy', 'camera=(), geolocation=(), microphone=(), payment=(), usb=()');
  return new Map(Object.entries(reply.getHeaders()).map(([name, value]) => [name, String(value)]));
}

/**
 * Security headers with a strict content policy: everything from here, no inline script, no foreign host. Style attributes
 * are allowed since the HTML of rendered formulas carries its sizes in them.
 */
export function securityHeaders(appUrl: string): RequestHandler {
  const https = appUrl.startsWith('https:');
  const set = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'"],
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        frameAncestors: ["'none'"],
        formAction: ["'self'"],
        ...(https ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: https ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
    xFrameOptions: { action: 'deny' },
    crossOriginEmbedderPolicy: false,
  });
  let headers: Map<string, string> | null = null;
  return (request, response, next) => {
    // They are the same for every reply: made once, by the first.
    headers ??= headersSetBy(set, request);
    response.setHeaders(headers);
    if (pagesWithToken.has(request.path)) response.setHeader('Referrer-Policy', 'no-referrer');
    next();
  };
}
