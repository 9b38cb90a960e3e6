import type { Express } from 'express';
import supertest from 'supertest';
import { buildApp } from '../../server/app.ts';
import { openDatabase, type Database } from '../../server/db/client.ts';
import { migrateDatabase } from '../../server/db/migrate.ts';
import { readEnv, type Env } from '../../server/env.ts';
import type { Background } from '../../server/http/background.ts';
import { createLog } from '../../server/http/log.ts';
import type { Route } from '../../server/http/route.ts';
import type { Mail } from '../../server/outside/mail.ts';
import { createTestDatabase } from './database.ts';
import { memoryMail, type MemoryMail } from './memory-mail.ts';

export const testOrigin = 'http://tankmark.test';
export const testSecret = 'a secret for tests only, long enough to be one';

export interface TestApp {
  app: Express;
  env: Env;
  routes: readonly Route[];
  database: Database;
  mail: MemoryMail;
  background: Background;
  beginStopping: () => void;
  /** Every line of the log so far. */
  logLines: string[];
  /** A client of our own pages: it sends the origin a browser would, and the cookie it is given. */
  as: (cookie?: string) => TestClient;
  close: () => Promise<void>;
}

export interface TestClient {
  get: (path: string) => supertest.Test;
  post: (path: string, body?: object) => supertest.Test;
  put: (path: string, body?: object) => supertest.Test;
  patch: (path: string, body?: object) => supertest.Test;
  delete: (path: string, body?: object) => supertest.Test;
}

export interface StartOptions {
  env?: Record<string, string>;
  mail?: Mail;
  clientFolder?: string;
  contentFolder?: string;
  now?: () => Date;
}

function clientOf(app: Express, cookie: string | undefined, origin: string): TestClient {
  const agent = supertest(app);
  const call = (method: 'get' | 'post' | 'put' | 'patch' | 'delete', path: string, body?: object): supertest.Test => {
    const request = agent[method](path);
    if (method !== 'get') void request.set('Origin', origin);
    if (cookie !== undefined) void request.set('Cookie', cookie);
    return body === undefined ? request : request.send(body);
  };
  return {
    get: (path) => call('get', path),
    post: (path, body) => call('post', path, body),
    put: (path, body) => call('put', path, body),
    patch: (path, body) => call('patch', path, body),
    delete: (path, body) => call('delete', path, body),
  };
}

/** The whole server on a database of its own, with mail kept in memory. Nothing listens on a port. */
export async function startApp(options: StartOptions = {}): Promise<TestApp> {
  const testDatabase = await createTestDatabase();
  const env = readEnv({
    NODE_ENV: 'test',
    DATABASE_URL: testDatabase.url,
    APP_URL: testOrigin,
    AUTH_SECRET: testSecret,
    SMTP_URL: 'smtp://127.0.0.1:9',
    MAIL_FROM: 'Tankmark <office@example.test>',
    ...options.env,
  });
  const logLines: string[] = [];
  const stream = { write: (line: string) => void logLines.push(line) };
  const database = openDatabase({ url: env.DATABASE_URL, connections: 5, onIdleError: () => undefined });
  await migrateDatabase(database.pool);
  const mail = memoryMail();
  const built = buildApp({
    ...options,
    env,
    database,
    mail: options.mail ?? mail,
    log: createLog({ level: 'trace', stream }),
  });
  return {
    ...built,
    env,
    database,
    mail,
    logLines,
    as: (cookie) => clientOf(built.app, cookie, env.APP_URL),
    async close() {
      await built.background.settled();
      await database.close();
      await testDatabase.drop();
    },
  };
}
