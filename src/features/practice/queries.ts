import { queryOptions, useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useRef } from 'react';
import { v4 as uuid } from 'uuid';
import type {
  AnswerReply,
  DrillView,
  LevelView,
  NewDrillBody,
  ProblemView,
  ProgressView,
  Response,
} from '../../../shared/contracts/practice.ts';
import type { PartKey } from '../../../shared/vocabulary.ts';
import { api, ApiError } from '../../lib/api.ts';
import { withRetries } from './with-retries.ts';

export const problemQuery = (id: string) =>
  queryOptions({ queryKey: ['problem', id], queryFn: () => api<ProblemView>('GET', `/api/problems/${id}`) });
export const drillQuery = (id: string) =>
  queryOptions({ queryKey: ['drill', id], queryFn: () => api<DrillView>('GET', `/api/drills/${id}`) });
export const drillsQuery = queryOptions({
  queryKey: ['drills'],
  queryFn: () => api<DrillView[]>('GET', '/api/drills'),
});
export const levelsQuery = queryOptions({
  queryKey: ['levels'],
  queryFn: () => api<LevelView[]>('GET', '/api/levels'),
});
export const progressQuery = queryOptions({
  queryKey: ['progress'],
  queryFn: () => api<ProgressView>('GET', '/api/progress'),
});

/** What an answer or a given-up problem makes out of date. */
async function spoil(client: QueryClient, problem: Pick<ProblemView, 'drill'>): Promise<void> {
  const drill = problem.drill ? [client.invalidateQueries({ queryKey: ['drill', problem.drill.id] })] : [];
  await Promise.all([
    ...drill,
    client.invalidateQueries({ queryKey: ['levels'] }),
    client.invalidateQueries({ queryKey: ['progress'] }),
    client.invalidateQueries({ queryKey: ['drills'] }),
    client.invalidateQueries({ queryKey: ['lessons'] }),
  ]);
}

export interface SentAnswer {
  part: PartKey;
  response: Response;
  seconds: number;
}

/**
 * Sends one answer. Its key is made once a press, so that sending it again records it once; pressing again after no reply
 * came sends the same entry under the same key, since the first may have arrived.
 */
export function useAnswer(problemId: string, onWaiting: (waiting: boolean) => void) {
  const client = useQueryClient();
  const unanswered = useRef<{ key: string; entry: string } | null>(null);
  return useMutation({
    mutationFn: ({ part, response, seconds }: SentAnswer) => {
      const entry = JSON.stringify([part, response]);
      const key = unanswered.current?.entry === entry ? unanswered.current.key : uuid();
      unanswered.current = { key, entry };
      const path = `/api/problems/${problemId}/parts/${part}/answers`;
      return withRetries(() => api<AnswerReply>('POST', path, { key, response, seconds }), onWaiting);
    },
    onError: (error) => {
      const hasArrived = error instanceof ApiError && error.status >= 400 && error.status < 500;
      if (hasArrived) unanswered.current = null;
    },
    onSuccess: async (reply) => {
      unanswered.current = null;
      if (reply.unreadable) return;
      const { queryKey } = problemQuery(problemId);
      const { parts, state } = reply;
      client.setQueryData(queryKey, (before) => before && { ...before, parts, state });
      const problem = client.getQueryData(queryKey);
      // The worked solution is fetched once all is answered.
      if (state === 'done') await client.invalidateQueries({ queryKey });
      if (problem) await spoil(client, problem);
    },
  });
}

export function useHint(problemId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ part, number }: { part: PartKey; number: number }) =>
      api<ProblemView>('POST', `/api/problems/${problemId}/parts/${part}/hints`, { number }),
    onSuccess: (problem) => client.setQueryData(problemQuery(problemId).queryKey, problem),
  });
}

export function useGiveUp(problemId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api<ProblemView>('POST', `/api/problems/${problemId}/solution`),
    onSuccess: (problem) => {
      client.setQueryData(problemQuery(problemId).queryKey, problem);
      return spoil(client, problem);
    },
  });
}

export function useAnother(problemId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api<ProblemView>('POST', `/api/problems/${problemId}/another`),
    onSuccess: (problem) => client.setQueryData(problemQuery(problem.id).queryKey, problem),
  });
}

/** The drill's open problem, or its next one. */
export function useNextProblem(drillId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api<ProblemView>('POST', `/api/drills/${drillId}/next`),
    onSuccess: (problem) => {
      client.setQueryData(problemQuery(problem.id).queryKey, problem);
      return client.invalidateQueries({ queryKey: ['drill', drillId] });
    },
  });
}

export function useNewDrill() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: NewDrillBody) => api<DrillView>('POST', '/api/drills', body),
    onSuccess: (drill) => {
      client.setQueryData(drillQuery(drill.id).queryKey, drill);
      return client.invalidateQueries({ queryKey: ['drills'] });
    },
  });
}
