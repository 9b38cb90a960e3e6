import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { AppError, type FailureCode } from '../../shared/errors.ts';
import { problemByCode, problemJson } from './problem.ts';

const bodyFaults: Readonly<Record<string, FailureCode>> = {
  'entity.parse.failed': 'bad-json',
  'entity.too.large': 'body-too-large',
  'encoding.unsupported': 'media-type',
  'charset.unsupported': 'media-type',
};

/** What a thrown value is to the outside. Faults of a request that Express itself found are the caller's, the rest ours. */
function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  const { type, status } = (typeof error === 'object' && error !== null ? error : {}) as {
    type?: unknown;
    status?: unknown;
  };
  const fault = typeof type === 'string' ? bodyFaults[type] : undefined;
  if (fault) return new AppError(fault);
  const callers = typeof status === 'number' && status >= 400 && status < 500;
  return new AppError(callers ? 'bad-request' : 'internal', { cause: error });
}

export function sendProblem(response: Response, error: AppError): void {
  const id = response.getHeader('X-Request-Id');
  if (error.retryAfterSeconds !== null) response.setHeader('Retry-After', String(error.retryAfterSeconds));
  response.setHeader('Cache-Control', 'no-store');
  response
    .status(problemByCode[error.code].status)
    .type('application/problem+json')
    .send(JSON.stringify(problemJson(error, typeof id === 'string' ? id : undefined)));
}

/** The last handler: every failure becomes problem+json; what we did not foresee is logged and says nothing outside. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, _request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const failure = asAppError(error);
    if (problemByCode[failure.code].status >= 500) {
      const id = response.getHeader('X-Request-Id');
      log.error({ requestId: id, code: failure.code, err: failure.cause ?? failure }, 'request failed');
    }
    sendProblem(response, failure);
  };
}
