import { DrizzleQueryError } from 'drizzle-orm';
import pino, { type DestinationStream, type Logger } from 'pino';

const address = /[^\s@<>"']+@[^\s@<>"']+/g;
const mostCauses = 3;

/** A text of a library's, without the addresses it may name. */
export function withoutAddresses(text: string): string {
  return text.replace(address, '[address]');
}

/** What may be logged of an error: names, codes and places in the code, nothing a person typed. */
export function loggedError(error: unknown, depth = 0): Record<string, unknown> {
  if (!(error instanceof Error)) return { type: typeof error };
  const { code, constraint, table } = error as { code?: unknown; constraint?: unknown; table?: unknown };
  // A database's message repeats the values it was given; its code, table and constraint say enough.
  const fromDatabase = error instanceof DrizzleQueryError || (typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code));
  return {
    type: error.name,
    ...(typeof code === 'string' ? { code } : {}),
    ...(typeof constraint === 'string' ? { constraint } : {}),
    ...(typeof table === 'string' ? { table } : {}),
    ...(fromDatabase ? {} : { message: withoutAddresses(error.message) }),
    stack: (error.stack ?? '')
      .split('\n')
      .filter((line) => line.startsWith('    at '))
      .slice(0, 12),
    ...(error.cause === undefined || depth >= mostCauses ? {} : { cause: loggedError(error.cause, depth + 1) }),
  };
}

/** The product's log: JSON lines on standard output, or on the stream a test listens to. */
export function createLog(options: { level: string; stream?: DestinationStream }): Logger {
  const settings = { level: options.level, base: null, serializers: { err: loggedError } };
  return options.stream ? pino(settings, options.stream) : pino(settings);
}
