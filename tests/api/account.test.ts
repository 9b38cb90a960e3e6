import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 as uuidv7 } from 'uuid';
import { answer, problem, slipCount, topicLevel } from '../../server/db/schema/practice.ts';
import { cookieOf, signedInPerson, signIn, testPassword } from '../support/factories.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await startApp();
});
afterAll(() => test.close());

/** One graded answer with what follows from it, as the practice feature stores it. */
async function giveAnswer(userId: string): Promise<string> {
  const { db } = test.database;
  const problemId = uuidv7();
  const at = new Date();
  const family = { family: 'area-rectangle', version: 1, tier: 1 as const };
  await db.insert(problem).values({ ...family, userId, id: problemId, seed: 'secret-seed', context: 'single' });
  await db.insert(answer).values({
    ...family,
    userId,
    id: uuidv7(),
    problemId,
    part: 'a',
    topic: 'area',
    context: 'single',
    response: { kind: 'number', text: '1,600' },
    read: '1,600 sq ft',
    value: '1600',
    verdict: 'right',
    attempt: 1,
    isFirst: true,
    hints: 0,
    choices: 0,
    seconds: 30,
    key: uuidv7(),
    at,
  });
  const level = { mean: 0, variance: 1, answers: 1, right: 1, days: 1, lastDay: '2026-12-01', lastAt: at };
  await db.insert(topicLevel).values({ userId, topic: 'area', ...level });
  await db
    .insert(slipCount)
    .values({ userId, topic: 'area', family: 'area-rectangle', slip: 'perimeter', times: 2, lastAt: at });
  return problemId;
}

async function rowsOf(table: string, userId: string): Promise<number> {
  const { rows } = await test.database.pool.query<{ n: string }>(`select count(*) n from ${table} where user_id = $1`, [
    userId,
  ]);
  return Number(rows[0]?.n);
}

describe('who is here', () => {
  it('tells a visitor that nobody is signed in, without an error', async () => {
    const reply = await test.as().get('/api/session');
    expect(reply.status).toBe(200);
    expect(reply.body).toEqual({ me: null, mailbox: false });
    expect((await test.as().get('/api/me')).body).toMatchObject({ status: 401, code: 'not-signed-in' });
  });

  it('tells a person what they may do, and nothing of the tables behind it', async () => {
    const person = await signedInPerson(test, { roles: ['trainee', 'staff'] });
    const reply = await test.as(person.cookie).get('/api/session');
    const { id, name, email, language } = person;
    expect((reply.body as { me: object }).me).toEqual({
      id,
      name,
      email,
      language,
      roles: ['staff', 'trainee'],
      may: expect.arrayContaining(['course', 'own-account', 'platform', 'proof-sheet']) as string[],
      full: true,
    });
    expect(reply.headers['cache-control']).toBe('no-store');
  });

  it('keeps a session alive that is used, from one day after it began', async () => {
    const person = await signedInPerson(test);
    const fresh = await test.as(person.cookie).get('/api/session');
    expect(fresh.headers['set-cookie']).toBeUndefined();
    await test.database.pool.query(`update session set expires_at = now() + interval '10 days' where user_id = $1`, [
      person.id,
    ]);
    const extended = await test.as(person.cookie).get('/api/session');
    expect(cookieOf(extended)).toBe(person.cookie);
    const { rows } = await test.database.pool.query<{ days: number }>(
      `select extract(day from expires_at - now())::int days from session where user_id = $1`,
      [person.id],
    );
    expect(rows[0]?.days).toBe(29);
  });
});

describe('one own account', () => {
  it('changes name and language, at once', async () => {
    const person = await signedInPerson(test);
    const reply = await test.as(person.cookie).patch('/api/me', { name: '  Rosa Quill ', language: 'es' });
    expect(reply.status).toBe(200);
    expect(reply.body).toMatchObject({ name: 'Rosa Quill', language: 'es', email: person.email });
    expect((await test.as(person.cookie).get('/api/me')).body).toEqual(reply.body);
  });

  it.each([
    [{}, ['']],
    [{ name: '' }, ['name']],
    [{ name: 'x'.repeat(81) }, ['name']],
    [{ name: 'a\0b' }, ['name']],
    [{ name: 'half \ud83d' }, ['name']],
    [{ name: 'fine', language: 'de' }, ['language']],
    [{ name: 4, language: [] }, ['name', 'language']],
    [[], ['']],
  ])('refuses %j, names the field and changes nothing', async (body, fields) => {
    const person = await signedInPerson(test);
    const before = await test.as(person.cookie).get('/api/me');
    const reply = await test.as(person.cookie).patch('/api/me', body);
    expect(reply.status).toBe(422);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect((reply.body as { errors: { field: string }[] }).errors.map((fault) => fault.field)).toEqual(fields);
    expect((await test.as(person.cookie).get('/api/me')).body).toEqual(before.body);
  });

  it('does not let a person write what is not theirs to write', async () => {
    const person = await signedInPerson(test);
    const body = { name: 'Plain', roles: ['staff'], email: 'x@example.test', lockedAt: null, id: uuidv7() };
    await test.as(person.cookie).patch('/api/me', body);
    const me = await test.as(person.cookie).get('/api/me');
    expect(me.body).toMatchObject({ id: person.id, email: person.email, roles: ['trainee'], name: 'Plain' });
  });
});

describe('where one is signed in', () => {
  it('lists sessions, ends one at once, then all others', async () => {
    const person = await signedInPerson(test);
    const phone = await test
      .as()
      .post('/api/auth/sign-in/email', { email: person.email, password: testPassword })
      .set('User-Agent', 'Mozilla/5.0 (Linux; Android 14) AppleWebKit/537.36 Chrome/140.0 Mobile Safari/537.36');
    const third = await signIn(test, person);
    const list = (await test.as(person.cookie).get('/api/me/sessions')).body as {
      id: string;
      current: boolean;
      browser: string | null;
      system: string | null;
    }[];
    expect(list).toHaveLength(3);
    expect(list.filter((one) => one.current)).toHaveLength(1);
    const onPhone = list.find((one) => one.system === 'Android');
    expect(onPhone).toMatchObject({ current: false, browser: 'Chrome' });

    const ended = await test.as(person.cookie).delete(`/api/me/sessions/${onPhone?.id}`);
    expect(ended.status).toBe(204);
    expect((await test.as(cookieOf(phone)).get('/api/me')).status).toBe(401);
    expect((await test.as(third).get('/api/me')).status).toBe(200);
    const rest = await test.as(person.cookie).delete('/api/me/sessions');
    expect(rest.body).toEqual({ ended: 1 });
    expect((await test.as(third).get('/api/me')).status).toBe(401);
    expect((await test.as(person.cookie).get('/api/me')).status).toBe(200);
  });

  it("says nothing of someone else's session, and leaves it alone", async () => {
    const [one, other] = [await signedInPerson(test), await signedInPerson(test)];
    const list = (await test.as(other.cookie).get('/api/me/sessions')).body as { id: string }[];
    const theirs = await test.as(one.cookie).delete(`/api/me/sessions/${list[0]?.id}`);
    const nobodys = await test.as(one.cookie).delete(`/api/me/sessions/${uuidv7()}`);
    expect(theirs.body).toMatchObject({ status: 404, code: 'not-found' });
    expect({ ...(theirs.body as object), instance: '' }).toEqual({ ...(nobodys.body as object), instance: '' });
    expect((await test.as(other.cookie).get('/api/me')).status).toBe(200);
  });
});

describe('the export of own data', () => {
  it('holds the account and every answer, and no secret', async () => {
    const person = await signedInPerson(test);
    const stranger = await signedInPerson(test);
    const problemId = await giveAnswer(person.id);
    await giveAnswer(stranger.id);
    const reply = await test.as(person.cookie).get('/api/me/export');
    expect(reply.status).toBe(200);
    expect(reply.headers['content-disposition']).toContain('attachment');
    expect(reply.body).toMatchObject({
      account: { email: person.email, name: person.name },
      roles: [{ role: 'trainee' }],
      problems: [{ id: problemId, family: 'area-rectangle' }],
      answers: [{ problemId, read: '1,600 sq ft', verdict: 'right' }],
      slips: [{ slip: 'perimeter', times: 2 }],
      lessons: [],
    });
    for (const secret of ['secret-seed', 'password', person.cookie.split('=')[1]?.slice(0, 20), stranger.email]) {
      expect(reply.text).not.toContain(secret);
    }
  });
});

describe('deletion', () => {
  it('needs the password', async () => {
    const person = await signedInPerson(test);
    const reply = await test.as(person.cookie).delete('/api/me', { password: 'not the one' });
    expect(reply.body).toMatchObject({ status: 422, code: 'password-wrong', errors: [{ field: 'password' }] });
    expect((await test.as(person.cookie).delete('/api/me', {})).body).toMatchObject({ code: 'bad-body' });
    expect((await test.as(person.cookie).get('/api/me')).status).toBe(200);
  });

  it('removes the person, keeps the answers under an id that leads to nobody, and signs out', async () => {
    const person = await signedInPerson(test);
    const elsewhere = await signIn(test, person);
    const problemId = await giveAnswer(person.id);
    const gone = await test.as(person.cookie).delete('/api/me', { password: testPassword });
    expect(gone.status).toBe(204);
    expect(cookieOf(gone)).toMatch(/=$/);
    for (const cookie of [person.cookie, elsewhere]) expect((await test.as(cookie).get('/api/me')).status).toBe(401);
    const again = await test.as().post('/api/auth/sign-in/email', { email: person.email, password: testPassword });
    expect(again.body).toMatchObject({ code: 'sign-in-wrong' });

    for (const table of ['session', 'account', 'user_role', 'problem', 'answer', 'topic_level', 'slip_count']) {
      expect(await rowsOf(table, person.id), table).toBe(0);
    }
    const { rows } = await test.database.pool.query<{ owner: string; same: boolean }>(
      `select a.user_id owner, a.user_id = p.user_id same from answer a join problem p on p.id = a.problem_id where p.id = $1`,
      [problemId],
    );
    expect(rows).toHaveLength(1);
    expect(rows[0]?.same).toBe(true);
    expect(rows[0]?.owner).not.toBe(person.id);
    const { rowCount } = await test.database.pool.query('select 1 from "user" where id = $1 or email = $2', [
      rows[0]?.owner,
      person.email,
    ]);
    expect(rowCount).toBe(0);
  });

  it('cannot be guessed at', async () => {
    const person = await signedInPerson(test);
    const statuses: number[] = [];
    for (let index = 0; index < 11; index += 1) {
      statuses.push((await test.as(person.cookie).delete('/api/me', { password: `guess ${index}` })).status);
    }
    expect(statuses).toEqual([...Array.from({ length: 10 }, () => 422), 429]);
  });
});
