import { join } from 'node:path';
import express, { type Express } from 'express';
import type { Logger } from 'pino';
import { AppError } from '../shared/errors.ts';
import type { Database } from './db/client.ts';
import type { Env } from './env.ts';
import { accountRepo } from './features/account/repo.ts';
import { entitlement } from './features/account/entitlement.ts';
import { mountHealth } from './features/operations/health.ts';
import { featureRoutes } from './features.ts';
import { buildAuth } from './http/auth.ts';
import { authHandler } from './http/auth-handler.ts';
import { authMail } from './http/auth-mail.ts';
import { createBackground, type Background } from './http/background.ts';
import { errorHandler } from './http/error-handler.ts';
import { originsOf } from './http/origin.ts';
import { identify, requestLog } from './http/request-log.ts';
import { mountRoutes, type Route } from './http/route.ts';
import { securityHeaders } from './http/security-headers.ts';
import { sessionFinder } from './http/session.ts';
import { serveClient } from './http/static-files.ts';
import { accountTries } from './http/tries.ts';
import type { Mail } from './outside/mail.ts';
import { projectRoot } from './project-root.ts';

export interface AppDeps {
  env: Env;
  database: Database;
  mail: Mail;
  log: Logger;
  now?: () => Date;
  /** The built client; dist/client unless given. */
  clientFolder?: string;
  /** Adds routes of the caller's own before ours, such as the benchmark's bare one. */
  mount?: (app: Express) => void;
  /** Where lessons are read from; content unless given. */
  contentFolder?: string;
}

export interface BuiltApp {
  app: Express;
  /** Every API route, for the test that walks them all. */
  routes: readonly Route[];
  background: Background;
  /** From now on /readyz says no, so that a load balancer sends nobody here. */
  beginStopping: () => void;
}

/** Builds the product from its parts; nothing listens yet. */
export function buildApp(deps: AppDeps): BuiltApp {
  const { env, database, mail, log, now = () => new Date() } = deps;
  const { pool, db } = database;
  const appUrl = env.APP_URL;
  const origins = originsOf(appUrl);
  const background = createBackground(log);
  const tries = accountTries(pool);
  const sessions = sessionFinder({ pool, secret: env.AUTH_SECRET, appUrl });
  const auth = buildAuth({
    db,
    appUrl,
    secret: env.AUTH_SECRET,
    mail: authMail({ mail, appUrl }),
    background,
    log,
    onNewPassword: (email) => tries.forgive('password', email),
  });
  const { dropUnconfirmed } = accountRepo(db);
  const routes = featureRoutes({ env, database, auth, tries, now, contentFolder: deps.contentFolder });
  let stopping = false;

  const app = express();
  app.disable('x-powered-by');
  // Replies of the API are never stored, so a hash of each is work for nothing; static files keep theirs.
  app.disable('etag');
  app.set('trust proxy', env.TRUST_PROXY);
  app.set('query parser', 'simple');
  app.use(identify(), requestLog(log), securityHeaders(appUrl));
  mountHealth(app, { pool, log, isStopping: () => stopping });
  app.use('/api', express.json({ limit: '64kb' }));
  app.all('/api/auth/*splat', authHandler({ auth, sessions, tries, appUrl, origins, dropUnconfirmed }));
  deps.mount?.(app);
  mountRoutes(app, routes, { sessions, entitlement, origins });
  app.use('/api', () => {
    throw new AppError('not-found');
  });
  serveClient(app, deps.clientFolder ?? join(projectRoot, 'dist', 'client'));
  app.use(() => {
    throw new AppError('not-found');
  });
  app.use(errorHandler(log));
  return { app, routes, background, beginStopping: () => void (stopping = true) };
}
