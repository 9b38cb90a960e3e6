import type { Express } from 'express';
import type { Logger } from 'pino';
import type { Pool } from 'pg';
import { missingMigrations } from '../../db/migrate.ts';

const answerWithinMs = 2_000;

/** `/healthz`: the process answers. `/readyz`: the database does too, and has every migration. */
export function mountHealth(app: Express, deps: { pool: Pool; log: Logger; isStopping: () => boolean }): void {
  app.get('/healthz', (_request, response) => {
    response.setHeader('Cache-Control', 'no-store').json({ status: 'ok' });
  });
  app.get('/readyz', async (_request, response) => {
    response.setHeader('Cache-Control', 'no-store');
    const reason = deps.isStopping() ? 'stopping' : await notReady(deps);
    response
      .status(reason === null ? 200 : 503)
      .json(reason === null ? { status: 'ready' } : { status: 'not ready', reason });
  });
}

async function notReady({ pool, log }: { pool: Pool; log: Logger }): Promise<string | null> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => reject(new Error('The database did not answer in time.')), answerWithinMs);
  });
  try {
    const missing = await Promise.race([missingMigrations(pool), late]);
    return missing === 0 ? null : 'migrations';
  } catch (error) {
    log.error({ err: error }, 'not ready');
    return 'database';
  } finally {
    clearTimeout(timer);
  }
}
