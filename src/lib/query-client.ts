import { QueryClient } from '@tanstack/react-query';
import { ApiError } from './api.ts';

const mostRetries = 2;

/** Reads are tried again when the server could not be reached or failed, never when it refused. */
function worthRetrying(count: number, error: unknown): boolean {
  const refused = error instanceof ApiError && error.status >= 400 && error.status < 500;
  return !refused && count < mostRetries;
}

export const queryClient = new QueryClient({
  defaultOptions: { queries: { retry: worthRetrying, staleTime: 15_000 }, mutations: { retry: false } },
});
