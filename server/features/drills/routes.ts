import { z } from 'zod';
import {
  drillListSchema,
  drillViewSchema,
  newDrillBodySchema,
  problemViewSchema,
} from '../../../shared/contracts/practice.ts';
import { route, type Route } from '../../http/route.ts';
import type { DrillService } from './service.ts';

const drillParams = z.object({ drillId: z.uuid() });

/** Untimed runs of problems on chosen topics. */
export function drillRoutes(drills: DrillService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/drills',
      access: 'course',
      reply: drillListSchema,
      handler: ({ person }) => drills.recent(person),
    }),
    route({
      method: 'post',
      path: '/api/drills',
      access: 'course',
      body: newDrillBodySchema,
      status: 201,
      reply: drillViewSchema,
      handler: ({ person, body }) => drills.create(person, body),
    }),
    route({
      method: 'get',
      path: '/api/drills/:drillId',
      access: 'course',
      params: drillParams,
      reply: drillViewSchema,
      handler: ({ person, params }) => drills.view(person, params.drillId),
    }),
    route({
      method: 'post',
      path: '/api/drills/:drillId/next',
      access: 'course',
      params: drillParams,
      reply: problemViewSchema,
      handler: ({ person, params }) => drills.next(person, params.drillId),
    }),
  ];
}
