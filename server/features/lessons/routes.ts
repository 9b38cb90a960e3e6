import {
  lessonListSchema,
  lessonParamsSchema,
  lessonProgressBodySchema,
  lessonProgressViewSchema,
} from '../../../shared/contracts/lessons.ts';
import { route, type Route } from '../../http/route.ts';
import type { LessonService } from './service.ts';

/** The list of lessons and how far a person is in each. The text itself is part of the built client. */
export function lessonRoutes(lessons: LessonService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/lessons',
      access: 'course',
      visitors: true,
      free: true,
      reply: lessonListSchema,
      handler: ({ person, language }) => lessons.list(person?.id ?? null, language),
    }),
    route({
      method: 'put',
      path: '/api/lessons/:slug/progress',
      access: 'course',
      params: lessonParamsSchema,
      body: lessonProgressBodySchema,
      reply: lessonProgressViewSchema,
      handler: ({ person, params, body }) => lessons.save(person.id, params.slug, body),
    }),
  ];
}
