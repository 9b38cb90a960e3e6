import { z } from 'zod';
import {
  answerBodySchema,
  answerReplySchema,
  hintBodySchema,
  newCheckpointBodySchema,
  partParamsSchema,
  problemViewSchema,
  type AnswerReply,
} from '../../../shared/contracts/practice.ts';
import { route, type Route } from '../../http/route.ts';
import type { ProgressService } from '../progress/service.ts';
import type { PracticeService } from './service.ts';

const problemParams = z.object({ problemId: z.uuid() });
const slug = z.string().regex(/^[a-z0-9-]{1,80}$/);
const checkpointParams = z.object({ slug, checkpoint: slug });

/** Problems put before a person: seen, answered, hinted, given up, worked again. */
export function practiceRoutes(practice: PracticeService, progress: Pick<ProgressService, 'levelAfter'>): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/problems/:problemId',
      access: 'course',
      params: problemParams,
      reply: problemViewSchema,
      handler: ({ person, params }) => practice.view(person, params.problemId),
    }),
    route({
      method: 'post',
      path: '/api/problems/:problemId/parts/:part/answers',
      access: 'course',
      params: partParamsSchema,
      body: answerBodySchema,
      reply: answerReplySchema,
      handler: async ({ person, params, body }): Promise<AnswerReply> => {
        const { levels, topic, ...shown } = await practice.answer(person, params, body);
        return { ...shown, level: levels && progress.levelAfter(levels, topic) };
      },
    }),
    route({
      method: 'post',
      path: '/api/problems/:problemId/parts/:part/hints',
      access: 'course',
      params: partParamsSchema,
      body: hintBodySchema,
      reply: problemViewSchema,
      handler: ({ person, params, body }) => practice.hint(person, params.problemId, body.number),
    }),
    route({
      method: 'post',
      path: '/api/problems/:problemId/solution',
      access: 'course',
      params: problemParams,
      reply: problemViewSchema,
      handler: ({ person, params }) => practice.giveUp(person, params.problemId),
    }),
    route({
      method: 'post',
      path: '/api/problems/:problemId/another',
      access: 'course',
      params: problemParams,
      status: 201,
      reply: problemViewSchema,
      handler: ({ person, params }) => practice.another(person, params.problemId),
    }),
    route({
      method: 'post',
      path: '/api/lessons/:slug/checkpoints/:checkpoint',
      access: 'course',
      params: checkpointParams,
      body: newCheckpointBodySchema,
      reply: problemViewSchema,
      handler: ({ person, params, body }) =>
        practice.checkpoint(person, { lesson: params.slug, checkpoint: params.checkpoint }, body),
    }),
  ];
}
