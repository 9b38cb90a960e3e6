import { z } from 'zod';
import { problemViewSchema, sampleAnswerBodySchema, sampleReplySchema } from '../../../shared/contracts/practice.ts';
import { route, type Route } from '../../http/route.ts';
import type { SampleService } from './service.ts';

const sampleQuery = z.object({ sample: z.string().min(1).max(40).default('round-bed') });

/** The sample problem on the welcome page; nothing a visitor sends is kept. */
export function sampleRoutes(samples: SampleService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/sample',
      access: 'welcome',
      visitors: true,
      query: sampleQuery,
      reply: problemViewSchema,
      handler: ({ query, language }) => samples.view(query.sample, language),
    }),
    route({
      method: 'post',
      path: '/api/sample/answers',
      access: 'welcome',
      visitors: true,
      body: sampleAnswerBodySchema,
      reply: sampleReplySchema,
      handler: ({ body, language }) => samples.answer(body.sample, body, language),
    }),
  ];
}
