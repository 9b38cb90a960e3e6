import type { ProblemJson } from '../../shared/contracts/problem-json.ts';

/** A refusal by the server, as it was told, or that it could not be reached (status 0). */
export class ApiError extends Error {
  readonly status: number;
  readonly code: string;
  readonly fields: readonly { field: string; message: string }[];
  readonly reference: string | null;

  constructor(problem: Pick<ProblemJson, 'status' | 'detail' | 'errors' | 'instance'> & { code: string }) {
    super(problem.detail);
    this.name = 'ApiError';
    this.status = problem.status;
    this.code = problem.code;
    this.fields = problem.errors ?? [];
    this.reference = problem.instance ?? null;
  }
}

const unreachable = { status: 0, code: 'unreachable', detail: 'The server cannot be reached.' };

async function failure(response: Response): Promise<ApiError> {
  const type = response.headers.get('content-type') ?? '';
  if (type.includes('json')) return new ApiError((await response.json()) as ProblemJson);
  return new ApiError({ status: response.status, code: 'internal', detail: response.statusText });
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/**
 * The only fetch of the client. The reply's type is its contract's, which the server parses before sending.
 * @throws ApiError
 */
export async function api<T>(method: Method, path: string, body?: unknown): Promise<T> {
  // The page's language goes along: the browser's own may differ from the one a visitor chose.
  const headers = { accept: 'application/json', 'accept-language': document.documentElement.lang || 'en' };
  const init: RequestInit = { method, credentials: 'same-origin', headers };
  if (body !== undefined) {
    init.body = JSON.stringify(body);
    init.headers = { ...headers, 'content-type': 'application/json' };
  }
  let response: Response;
  try {
    response = await fetch(path, init);
  } catch {
    throw new ApiError(unreachable);
  }
  if (!response.ok) throw await failure(response);
  return (response.status === 204 ? undefined : await response.json()) as T;
}
