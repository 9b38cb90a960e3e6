import { ApiError } from '../../lib/api.ts';

const pausesMs = [1_000, 3_000, 6_000];

/** Tries again when the server could not be reached or failed; a refusal is final. `onWaiting` tells that it waits. */
export async function withRetries<T>(call: () => Promise<T>, onWaiting: (waiting: boolean) => void): Promise<T> {
  for (const pause of [...pausesMs, null]) {
    try {
      const result = await call();
      onWaiting(false);
      return result;
    } catch (error) {
      const again = error instanceof ApiError && (error.status === 0 || error.status >= 500);
      if (!again || pause === null) {
        onWaiting(false);
        throw error;
      }
      onWaiting(true);
      await new Promise((resolve) => setTimeout(resolve, pause));
    }
  }
  throw new Error('unreachable');
}
