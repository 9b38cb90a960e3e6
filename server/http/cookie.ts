import { createHmac, timingSafeEqual } from 'node:crypto';

const signatureLength = 44;

/** The prefix of every cookie of the product; better-auth adds its own `__Secure-` under https. */
export const cookiePrefix = 'tankmark';

export function sessionCookieName(appUrl: string): string {
  return `${appUrl.startsWith('https:') ? '__Secure-' : ''}${cookiePrefix}.session_token`;
}

/** The value of the first cookie of that name, still as it was sent; null when there is none. */
export function rawCookie(header: string | undefined, name: string): string | null {
  if (header === undefined) return null;
  for (const pair of header.split(';')) {
    const at = pair.indexOf('=');
    if (at > 0 && pair.slice(0, at).trim() === name) return pair.slice(at + 1).trim();
  }
  return null;
}

function decoded(raw: string): string | null {
  try {
    return decodeURIComponent(raw);
  } catch {
    return null;
  }
}

/**
 * The token of a cookie signed the way better-auth signs it: `token.base64(HMAC-SHA256(token))`, percent-encoded.
 * Null when the signature is not ours. The comparison takes the same time wherever the first difference lies.
 */
export function signedToken(raw: string | null, secret: string): string | null {
  const value = raw === null ? null : decoded(raw);
  if (value === null) return null;
  const dot = value.lastIndexOf('.');
  const signature = value.slice(dot + 1);
  if (dot < 1 || signature.length !== signatureLength || !signature.endsWith('=')) return null;
  const token = value.slice(0, dot);
  const expected = createHmac('sha256', secret).update(token).digest();
  const given = Buffer.from(signature, 'base64');
  return given.length === expected.length && timingSafeEqual(given, expected) ? token : null;
}
