import type { IncomingHttpHeaders } from 'node:http';

const loopback = ['localhost', '127.0.0.1', '[::1]'];

/** The origins the product is served from: that of APP_URL, and on this machine each name of the machine itself. */
export function originsOf(appUrl: string): string[] {
  const { origin, protocol, hostname, port } = new URL(appUrl);
  if (!loopback.includes(hostname)) return [origin];
  return loopback.map((host) => `${protocol}//${host}${port === '' ? '' : `:${port}`}`);
}

/**
 * Whether a request that changes something comes from our own pages. Browsers send `Origin` with every such request, and
 * `Sec-Fetch-Site` that no page can forge; a request with neither is not from a page of ours.
 */
export function isOurs(headers: IncomingHttpHeaders, origins: readonly string[]): boolean {
  const site = headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none') return false;
  const { origin } = headers;
  if (origin === undefined || origin === 'null') return site === 'same-origin';
  return origins.includes(origin);
}
