import { z } from 'zod';

const flag = z.enum(['0', '1', 'true', 'false']).transform((value) => value === '1' || value === 'true');

function isZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en-US', { timeZone: name }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}

const schema = z
  .object({
    NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
    DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\/\S+$/, 'expected an address like postgres://user@host/name'),
    DATABASE_POOL: z.coerce.number().int().min(1).max(200).default(10),
    HOST: z.string().min(1).default('127.0.0.1'),
    PORT: z.coerce.number().int().min(0).max(65_535).default(4180),
    APP_URL: z
      .url({ protocol: /^https?$/ })
      .transform((value) => value.replace(/\/+$/, ''))
      .optional(),
    AUTH_SECRET: z.string().min(32, 'expected 32 characters or more'),
    SMTP_URL: z.string().regex(/^smtps?:\/\/\S+$/, 'expected an address like smtp://host:port'),
    MAIL_FROM: z.string().min(3),
    MAILBOX_URL: z.url({ protocol: /^https?$/ }).optional(),
    DEMO: flag.default(false),
    LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
    TIME_ZONE: z.string().refine(isZone, 'expected an IANA name like America/Chicago').default('America/Chicago'),
    TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
  })
  .transform((env) => ({ ...env, APP_URL: env.APP_URL ?? `http://${env.HOST}:${env.PORT}` }));

export type Env = z.output<typeof schema>;

/** All faults of the configuration at once. */
export class EnvError extends Error {
  readonly faults: readonly string[];

  constructor(faults: readonly string[]) {
    super(`The configuration is not complete:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
    this.name = 'EnvError';
    this.faults = faults;
  }
}

/** Reads the configuration; an empty variable counts as not set. Throws one EnvError naming every fault. */
export function readEnv(source: Readonly<Record<string, string | undefined>> = process.env): Env {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== undefined && value !== ''));
  const result = schema.safeParse(given);
  if (result.success) return result.data;
  throw new EnvError(
    result.error.issues.map((issue) => {
      const name = issue.path.join('.');
      return given[name] === undefined ? `${name} is not set` : `${name}: ${issue.message}`;
    }),
  );
}
