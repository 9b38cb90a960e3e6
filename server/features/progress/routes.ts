import { route, type Route } from '../../http/route.ts';
import type { ProgressService } from './service.ts';

/** One's own levels and record. */
export function progressRoutes(progress: ProgressService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/levels',
      access: 'own-account',
      handler: ({ person }) => progress.levels(person.id),
    }),
    route({
      method: 'get',
      path: '/api/progress',
      access: 'own-account',
      handler: ({ person }) => progress.progress(person.id, person.language),
    }),
  ];
}
