import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Pages whose address carries a token: nothing of it may leave by the Referer header. */
const pagesWithToken = new Set(['/confirm', '/reset']);

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
  return (request, response, next) => {
    set(request, response, (error?: unknown) => {
      if (pagesWithToken.has(request.path)) response.setHeader('Referrer-Policy', 'no-referrer');
      response.setHeader('Permissions-Policy', 'camera=(), geolocation=(), microphone=(), payment=(), usb=()');
      next(error);
    });
  };
}
