import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { LessonProgressBody, LessonProgressView, LessonSummary } from '../../../shared/contracts/lessons.ts';
import type { ProblemView } from '../../../shared/contracts/practice.ts';
import type { Tier } from '../../../shared/vocabulary.ts';
import { api } from '../../lib/api.ts';

export const lessonsQuery = queryOptions({
  queryKey: ['lessons'],
  queryFn: () => api<LessonSummary[]>('GET', '/api/lessons'),
});

/** Keeps where the reader is; the list follows without being fetched again. */
export function useSaveProgress(slug: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: LessonProgressBody) => api<LessonProgressView>('PUT', `/api/lessons/${slug}/progress`, body),
    onSuccess: (progress) => {
      client.setQueryData(lessonsQuery.queryKey, (lessons) =>
        lessons?.map((lesson) => (lesson.slug === slug ? { ...lesson, progress } : lesson)),
      );
    },
  });
}

export interface CheckpointKey {
  lesson: string;
  id: string;
  family: string;
  tier: Tier;
}

/** The checkpoint's problem: the person's own from an earlier visit, or a first one. */
export const checkpointQuery = ({ lesson, id, family, tier }: CheckpointKey) =>
  queryOptions({
    queryKey: ['checkpoint', lesson, id, family, tier],
    queryFn: () =>
      api<ProblemView>('POST', `/api/lessons/${lesson}/checkpoints/${id}`, { family, tier, fresh: false }),
    staleTime: Infinity,
  });

/** Draws the checkpoint anew, with other numbers. */
export function useFreshCheckpoint(key: CheckpointKey) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      api<ProblemView>('POST', `/api/lessons/${key.lesson}/checkpoints/${key.id}`, {
        family: key.family,
        tier: key.tier,
        fresh: true,
      }),
    onSuccess: (problem) => client.setQueryData(checkpointQuery(key).queryKey, problem),
  });
}
