import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problemJsonSchema } from '../../shared/contracts/problem-json.ts';
import { failureCodes } from '../../shared/errors.ts';
import { problemByCode } from '../../server/http/problem.ts';
import { signedInPerson, testPassword } from '../support/factories.ts';
import { linkIn } from '../support/memory-mail.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

let test: TestApp;
let clientFolder: string;
const script = 'export const part = 1;\n'.repeat(200);
beforeAll(async () => {
  clientFolder = await mkdtemp(join(tmpdir(), 'tankmark-client-'));
  await mkdir(join(clientFolder, 'assets'));
  await writeFile(join(clientFolder, 'index.html'), '<!doctype html><title>Tankmark</title>');
  await writeFile(join(clientFolder, 'assets', 'main-a1b2c3.js'), script);
  test = await startApp({ clientFolder });
});
afterAll(async () => {
  await test.close();
  await rm(clientFolder, { recursive: true });
});

describe('health', () => {
  it('says that the process answers and that the database does', async () => {
    expect((await test.as().get('/healthz')).body).toEqual({ status: 'ok' });
    const ready = await test.as().get('/readyz');
    expect([ready.status, ready.body]).toEqual([200, { status: 'ready' }]);
  });

  it('is not ready without every migration, while stopping, or with the database gone', async () => {
    const other = await startApp();
    await other.database.pool.query('update drizzle.__drizzle_migrations set hash = $1', ['another']);
    const lacking = await other.as().get('/readyz');
    expect([lacking.status, lacking.body]).toEqual([503, { status: 'not ready', reason: 'migrations' }]);
    await other.database.pool.query('truncate drizzle.__drizzle_migrations');
    other.beginStopping();
    expect((await other.as().get('/readyz')).body).toEqual({ status: 'not ready', reason: 'stopping' });
    await other.close();
    expect((await supertest(other.app).get('/healthz')).status).toBe(200);
    const gone = await startApp();
    await gone.close();
    const without = await supertest(gone.app).get('/readyz');
    expect([without.status, without.body]).toEqual([503, { status: 'not ready', reason: 'database' }]);
  });
});

describe('every reply', () => {
  it('carries the security headers, a strict content policy and an id of its own', async () => {
    const [one, two] = [await test.as().get('/'), await test.as().get('/api/session')];
    for (const reply of [one, two]) {
      const policy = String(reply.headers['content-security-policy']);
      expect(policy.split(';').sort()).toEqual(
        [
          "base-uri 'none'",
          "connect-src 'self'",
          "default-src 'self'",
          "font-src 'self'",
          "form-action 'self'",
          "frame-ancestors 'none'",
          "img-src 'self' data:",
          "manifest-src 'self'",
          "object-src 'none'",
          "script-src 'self'",
          "script-src-attr 'none'",
          "style-src 'self'",
          "style-src-attr 'unsafe-inline'",
          "worker-src 'self'",
        ].sort(),
      );
      expect(reply.headers).toMatchObject({
        'x-content-type-options': 'nosniff',
        'x-frame-options': 'DENY',
        'cross-origin-opener-policy': 'same-origin',
        'referrer-policy': 'strict-origin-when-cross-origin',
      });
      expect(reply.headers['x-powered-by']).toBeUndefined();
      expect(reply.headers['strict-transport-security']).toBeUndefined();
    }
    const ids = [one, two].map((reply) => String(reply.headers['x-request-id']));
    expect(ids[0]).toMatch(/^[0-9a-f-]{36}$/);
    expect(ids[0]).not.toBe(ids[1]);
  });

  it('asks for https only where the product is served by it', async () => {
    const secure = await startApp({ env: { APP_URL: 'https://tankmark.test' } });
    const reply = await secure.as().get('/api/session');
    expect(reply.headers['strict-transport-security']).toBe('max-age=31536000; includeSubDomains');
    await secure.close();
  });

  it.each(['/confirm?token=x', '/reset?token=x'])('lets nothing of the address %s leave', async (path) => {
    expect((await test.as().get(path)).headers['referrer-policy']).toBe('no-referrer');
  });
});

describe('what is wrong with a request', () => {
  it.each([
    ['an unknown API address', () => test.as().get('/api/no/such'), 404, 'not-found'],
    ['a known address with another method', () => test.as().put('/api/lessons', {}), 404, 'not-found'],
    ['an address that can’t be read', () => test.as().get('/api/problems/%E0%A4%A'), 400, 'bad-request'],
    [
      'malformed JSON',
      () => test.as().post('/api/sample/answers').type('application/json').send('{"sample": '),
      400,
      'bad-json',
    ],
    [
      'a body of more than 64 kB',
      () => test.as().post('/api/sample/answers', { sample: 'x'.repeat(70_000) }),
      413,
      'body-too-large',
    ],
    [
      'a form instead of JSON',
      () => test.as().post('/api/sample/answers').type('form').send('sample=round-bed'),
      415,
      'media-type',
    ],
    [
      'malformed JSON to sign in',
      () => test.as().post('/api/auth/sign-in/email').type('json').send('{'),
      400,
      'bad-json',
    ],
    ['a bad query', () => test.as().get(`/api/sample?sample=${'x'.repeat(50)}`), 400, 'bad-query'],
  ] as const)('%s', async (_what, send, status, code) => {
    const reply = await send();
    expect(reply.status).toBe(status);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    const problem = problemJsonSchema.parse(JSON.parse(reply.text));
    expect(problem).toMatchObject({ status, code, instance: `urn:uuid:${String(reply.headers['x-request-id'])}` });
  });

  it('names the query parameter', async () => {
    const reply = await test.as().get('/api/sample?sample=');
    expect(reply.body).toMatchObject({ code: 'bad-query', errors: [{ field: 'sample' }] });
  });

  it('says nothing of a fault of ours', async () => {
    const broken = await startApp();
    const { cookie } = await signedInPerson(broken);
    await broken.database.pool.query('drop table lesson_progress');
    const reply = await broken.as(cookie).get('/api/lessons');
    expect(reply.status).toBe(500);
    expect(reply.body).toEqual({
      type: 'urn:tankmark:problem:internal',
      title: 'Something went wrong',
      status: 500,
      code: 'internal',
      detail: 'Something went wrong on our side.',
      instance: `urn:uuid:${String(reply.headers['x-request-id'])}`,
    });
    const line = broken.logLines.find((one) => one.includes('request failed')) ?? '';
    expect(line).toContain('42P01');
    expect(line).toContain(String(reply.headers['x-request-id']));
    await broken.close();
  });

  it('has a status and words for every code', () => {
    expect(Object.keys(problemByCode).sort()).toEqual([...failureCodes].sort());
    for (const { status, title, detail } of Object.values(problemByCode)) {
      expect(status).toBeGreaterThanOrEqual(400);
      expect(`${title}${detail}`).not.toContain('!');
    }
  });
});

describe('the built client', () => {
  it('is index.html at every page’s address, never kept', async () => {
    for (const path of ['/', '/drills/01890000-0000-7000-8000-000000000000', '/course']) {
      const reply = await test.as().get(path);
      expect(reply.text).toContain('<title>Tankmark</title>');
      expect(reply.headers['cache-control']).toBe('no-cache');
    }
  });

  it('has its hashed files kept for a year, and compressed', async () => {
    const reply = await test.as().get('/assets/main-a1b2c3.js').set('Accept-Encoding', 'gzip');
    expect(reply.text).toBe(script);
    expect(reply.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(reply.headers['content-encoding']).toBe('gzip');
  });

  it('has no page for a file that is missing, nor for what lies beside it', async () => {
    for (const path of ['/assets/gone-000000.js', '/favicon.png', '/assets/..%2f..%2fetc/passwd.txt']) {
      expect((await test.as().get(path)).body, path).toMatchObject({ status: 404, code: 'not-found' });
    }
  });
});

describe('the log', () => {
  it('has a line a request with id, method, route, status and time, and nothing of anyone', async () => {
    const person = await signedInPerson(test, { name: 'Odalys Brennick' });
    test.logLines.length = 0;
    await test.as().post('/api/auth/request-password-reset', { email: person.email });
    await test.as().post('/api/auth/sign-in/email', { email: person.email, password: 'a wrong guess' });
    await test.as().post('/api/auth/sign-up/email', { email: person.email, name: 'Odalys', password: testPassword });
    await test.background.settled();
    const token = linkIn(
      test.mail.messages.findLast((one) => one.text.includes('/reset?')) ?? test.mail.latestTo(person.email),
    ).searchParams.get('token');
    await test.as().get(`/api/auth/verify-email?token=${token}`);
    await test.as().get(`/api/auth/reset-password/${token}`);
    await test.as().get(`/reset?token=${token}`);
    await test.as().get(`/${person.email}`);
    await test.as().get(`/api/${person.email}`);
    const listed = await test.as(person.cookie).get('/api/me/sessions');
    const [{ id = '' } = {}] = listed.body as { id?: string }[];
    const last = await test.as(person.cookie).delete(`/api/me/sessions/${id}`);
    await new Promise((resolve) => setImmediate(resolve));

    const all = test.logLines.join('');
    const told = [person.email, person.name, 'Odalys', person.id, id, token, testPassword, 'wrong guess', '127.0.0.1'];
    for (const secret of [...told, person.cookie.split('=')[1]?.slice(0, 16)]) {
      expect(secret?.length).toBeGreaterThan(5);
      expect(all).not.toContain(secret);
    }
    const lines = test.logLines.map((line) => JSON.parse(line) as Record<string, unknown>);
    const requests = lines.filter((line) => line.msg === 'request');
    expect(requests).toHaveLength(10);
    const ended = requests.find((line) => line.requestId === last.headers['x-request-id']);
    expect(ended).toMatchObject({ method: 'DELETE', route: '/api/me/sessions/:sessionId', status: 204 });
    expect(ended?.ms).toEqual(expect.any(Number));
    expect(requests.map((line) => line.route)).toContain('/api/auth/reset-password');
  });

  it('is silent about health checks', async () => {
    test.logLines.length = 0;
    await test.as().get('/healthz');
    await test.as().get('/readyz');
    expect(test.logLines).toEqual([]);
  });
});
