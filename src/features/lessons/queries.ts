import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { LessonProgressBody, LessonProgressView, LessonSummary } from '../../../shared/contracts/lessons.ts';
import { api } from '../../lib/api.ts';

export const lessonsQuery = queryOptions({
  queryKey: ['lessons'],
  queryFn: () => api<LessonSummary[]>('GET', '/api/lessons'),
});

/** Keeps where the reader is; what comes back goes into the list at once. */
export function useSaveProgress(slug: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: LessonProgressBody) => api<LessonProgressView>('PUT', `/api/lessons/${slug}/progress`, body),
    onSuccess: (progress) => {
      client.setQueryData<LessonSummary[]>(lessonsQuery.queryKey, (lessons) =>
        lessons?.map((lesson) => (lesson.slug === slug ? { ...lesson, progress } : lesson)),
      );
    },
  });
}
