import { vi } from 'vitest';

/** Stands in for the server in tests of the client: `answer` gets each request's address and its JSON body. */
export function answerFetch(answer: (path: string, body: unknown) => Response): void {
  vi.spyOn(globalThis, 'fetch').mockImplementation(async (input, init) => {
    const path = input instanceof Request ? input.url : input.toString();
    const body: unknown = typeof init?.body === 'string' ? JSON.parse(init.body) : undefined;
    return answer(path, body);
  });
}
