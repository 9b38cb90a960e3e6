import type { Entitlement } from '../../http/route.ts';
import type { Person } from '../../http/session.ts';

/**
 * "May this person use the paid part?" The only place where it is asked; the route mechanism asks it for every route of
 * the course. There are no seats yet, so whoever is signed in has everything.
 */
export function entitlement(_person: Person): Entitlement {
  return { full: true };
}
