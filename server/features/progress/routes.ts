import { levelListSchema, progressViewSchema } from '../../../shared/contracts/practice.ts';
import { route, type Route } from '../../http/route.ts';
import type { ProgressService } from './service.ts';

/** One's own levels and record. */
export function progressRoutes(progress: ProgressService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/levels',
      access: 'own-account',
      reply: levelListSchema,
      handler: ({ person }) => progress.levels(person.id),
    }),
    route({
      method: 'get',
      path: '/api/progress',
      access: 'own-account',
      reply: progressViewSchema,
      handler: ({ person }) => progress.progress(person.id, person.language),
    }),
  ];
}
