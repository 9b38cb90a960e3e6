import { queryOptions, useMutation } from '@tanstack/react-query';
import type { ProblemView, Response, SampleReply } from '../../../shared/contracts/practice.ts';
import type { Locale, PartKey } from '../../../shared/vocabulary.ts';
import { api } from '../../lib/api.ts';

/** The samples a visitor can work, in the order they are offered. */
export const sampleIds = ['round-bed', 'back-lawn', 'label-rate'] as const;
export type SampleId = (typeof sampleIds)[number];

export const sampleQuery = (sample: SampleId, locale: Locale) =>
  queryOptions({
    queryKey: ['sample', sample, locale],
    queryFn: () => api<ProblemView>('GET', `/api/sample?sample=${sample}`),
    staleTime: Infinity,
  });

export function useSampleAnswer(sample: SampleId) {
  return useMutation({
    mutationFn: (answer: { part: PartKey; response: Response }) =>
      api<SampleReply>('POST', '/api/sample/answers', { sample, ...answer }),
  });
}
