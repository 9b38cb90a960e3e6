import { queryOptions } from '@tanstack/react-query';
import type { FamilySummary, ProofSheet } from '../../../shared/contracts/families.ts';
import type { Tier } from '../../../shared/vocabulary.ts';
import { api } from '../../lib/api.ts';

/** Which samples a proof sheet shows; the address of the page carries it. */
export interface Draw {
  tier: Tier | null;
  seed: string;
  count: number;
}

export const familiesQuery = queryOptions({
  queryKey: ['families'],
  queryFn: () => api<FamilySummary[]>('GET', '/api/staff/families'),
});

export const proofQuery = (family: string, draw: Draw) =>
  queryOptions({
    queryKey: ['families', family, draw],
    queryFn: () => {
      const search = new URLSearchParams({ seed: draw.seed, count: String(draw.count) });
      if (draw.tier !== null) search.set('tier', String(draw.tier));
      return api<ProofSheet>('GET', `/api/staff/families/${encodeURIComponent(family)}?${search.toString()}`);
    },
  });
