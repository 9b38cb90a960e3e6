import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import type { AccessKey } from '../../shared/contracts/access.ts';
import type { MeView, SessionView } from '../../shared/contracts/account.ts';
import { api } from './api.ts';

/** Who is here, if anyone, and which optional pages there are. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: () => api<SessionView>('GET', '/api/session'),
  staleTime: 60_000,
});

export function useSession(): SessionView | undefined {
  return useQuery(sessionQuery).data;
}

/** The person signed in; null for a visitor, and while it is not known yet. */
export function useMe(): MeView | null {
  return useSession()?.me ?? null;
}

export function mayDo(me: MeView | null, capability: AccessKey): boolean {
  return me?.may.includes(capability) ?? false;
}

/** Forgets everything known of the person before, then asks again who is here. */
export function useSessionChange(): () => Promise<void> {
  const client = useQueryClient();
  return async () => {
    client.removeQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
    await client.fetchQuery({ ...sessionQuery, staleTime: 0 });
  };
}
