import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError } from './api.ts';

const mostRetries = 2;

/** Reads are tried again when the server could not be reached or failed, never when it refused. */
function worthRetrying(count: number, error: unknown): boolean {
  const refused = error instanceof ApiError && error.status >= 400 && error.status < 500;
  return !refused && count < mostRetries;
}

/** A session that ran out or was ended elsewhere: ask who is here, and the page will lead to signing in. */
function onError(error: unknown): void {
  if (error instanceof ApiError && error.code === 'not-signed-in') {
    void queryClient.invalidateQueries({ queryKey: ['session'] });
  }
}

export const queryClient: QueryClient = new QueryClient({
  queryCache: new QueryCache({ onError }),
  mutationCache: new MutationCache({ onError }),
  defaultOptions: {
    queries: { retry: worthRetrying, staleTime: 15_000, networkMode: 'always' },
    mutations: { retry: false, networkMode: 'always' },
  },
});
