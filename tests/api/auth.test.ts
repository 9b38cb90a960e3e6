import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildPerson, cookieOf, signedInPerson, signIn, testPassword } from '../support/factories.ts';
import { linkIn } from '../support/memory-mail.ts';
import { startApp, type TestApp } from '../support/start-app.ts';
import { createPerson } from '../../scripts/demo/create-person.ts';

let test: TestApp;
beforeAll(async () => {
  test = await startApp();
});
afterAll(() => test.close());

async function countOf(sql: string, values: unknown[] = []): Promise<number> {
  const { rows } = await test.database.pool.query<{ n: number }>(sql, values);
  return Number(rows[0]?.n);
}

async function signUp(overrides: Record<string, unknown> = {}) {
  const { name, email, password, language } = buildPerson();
  const body = { name, email, password, language, ...overrides };
  const reply = await test.as().post('/api/auth/sign-up/email', body);
  await test.background.settled();
  return { reply, ...body };
}

describe('signing up', () => {
  it('goes from sign-up through the message to a session, and out again', async () => {
    const { reply, email, name } = await signUp({ language: 'es' });
    expect(reply.status).toBe(200);
    expect(reply.headers['set-cookie']).toBeUndefined();

    const early = await test.as().post('/api/auth/sign-in/email', { email, password: testPassword });
    expect(early.status).toBe(403);
    expect(early.body).toMatchObject({ code: 'address-unconfirmed', status: 403 });

    await test.background.settled();
    const message = test.mail.latestTo(email);
    expect(message.subject).toBe('Confirme su dirección de correo');
    const link = linkIn(message);
    expect(link.pathname).toBe('/confirm');
    expect(link.searchParams.get('kind')).toBe('confirm');
    const token = link.searchParams.get('token') ?? '';
    const confirmed = await test.as().get(`/api/auth/verify-email?token=${token}`);
    expect(confirmed.status).toBe(200);
    const cookie = cookieOf(confirmed);
    const me = await test.as(cookie).get('/api/me');
    expect(me.body).toMatchObject({ name, email, language: 'es', roles: ['trainee'], full: true });

    const out = await test.as(cookie).post('/api/auth/sign-out', {});
    expect(out.status).toBe(200);
    expect((await test.as(cookie).get('/api/me')).status).toBe(401);
    const again = await signIn(test, { email, password: testPassword });
    expect((await test.as(again).get('/api/me')).status).toBe(200);
  });

  it('answers the same for an address that is taken, and writes to its owner', async () => {
    const owner = await signedInPerson(test);
    const { reply } = await signUp({ email: owner.email.toUpperCase(), name: 'Somebody else' });
    const fresh = await signUp();
    expect(reply.status).toBe(fresh.reply.status);
    expect(reply.body).toEqual(fresh.reply.body);
    expect(reply.headers['set-cookie']).toBeUndefined();
    expect(test.mail.latestTo(owner.email).subject).toBe('You already have an account');
    expect(await countOf('select count(*) n from "user" where email = $1', [owner.email])).toBe(1);
    expect(await signIn(test, owner)).not.toBe('');
  });

  it('lets the latest sign-up of an unconfirmed address count, and voids the earlier link', async () => {
    const first = await signUp({ password: 'the first password' });
    const firstToken = linkIn(test.mail.latestTo(first.email)).searchParams.get('token') ?? '';
    await signUp({ email: first.email, password: 'the second password' });
    const stale = await test.as().get(`/api/auth/verify-email?token=${firstToken}`);
    expect(stale.status).toBe(400);
    expect(stale.body).toMatchObject({ code: 'token-invalid' });
    const token = linkIn(test.mail.latestTo(first.email)).searchParams.get('token') ?? '';
    expect((await test.as().get(`/api/auth/verify-email?token=${token}`)).status).toBe(200);
    expect(await signIn(test, { email: first.email, password: 'the second password' })).not.toBe('');
  });

  it('names the fields at fault and writes nothing', async () => {
    const before = await countOf('select count(*) n from "user"');
    const reply = await test.as().post('/api/auth/sign-up/email', { name: ' ', email: 'no', password: 'short' });
    expect(reply.status).toBe(422);
    expect(reply.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(reply.body).toMatchObject({ code: 'bad-body', status: 422 });
    const fields = (reply.body as { errors: { field: string }[] }).errors.map((fault) => fault.field);
    expect(fields).toEqual(['name', 'email', 'password']);
    expect(await countOf('select count(*) n from "user"')).toBe(before);
  });

  it('refuses what only the server sets: roles, lock, confirmation', async () => {
    const { email } = await signUp({ emailVerified: true, lockedAt: '2020-01-01', roles: ['staff'], role: 'staff' });
    const { rows } = await test.database.pool.query(
      `select u.email_verified, u.locked_at, array(select role from user_role r where r.user_id = u.id) roles
       from "user" u where email = $1`,
      [email],
    );
    expect(rows).toEqual([{ email_verified: false, locked_at: null, roles: ['trainee'] }]);
  });

  it('writes no markup and no link of a stranger into a message', async () => {
    const { email } = await signUp({ name: '<b>x</b> http://evil.example' });
    const message = test.mail.latestTo(email);
    expect(message.html).not.toContain('<b>x');
    expect(message.text).not.toContain('evil.example');
  });
});

describe('a forgotten password', () => {
  it('is chosen anew once by the link, and ends every session', async () => {
    const person = await signedInPerson(test);
    const asked = await test.as().post('/api/auth/request-password-reset', { email: person.email });
    const unknown = await test.as().post('/api/auth/request-password-reset', { email: 'nobody@example.test' });
    expect(asked.status).toBe(200);
    expect(unknown.body).toEqual(asked.body);
    await test.background.settled();
    expect(test.mail.messages.some((message) => message.to === 'nobody@example.test')).toBe(false);
    const link = linkIn(test.mail.latestTo(person.email));
    expect(link.pathname).toBe('/reset');
    const token = link.searchParams.get('token');

    const short = await test.as().post('/api/auth/reset-password', { token, newPassword: 'short' });
    expect(short.status).toBe(422);
    expect(short.body).toMatchObject({ errors: [{ field: 'newPassword' }] });
    const done = await test.as().post('/api/auth/reset-password', { token, newPassword: 'quite another password' });
    expect(done.status).toBe(200);
    expect((await test.as(person.cookie).get('/api/me')).status).toBe(401);
    const twice = await test.as().post('/api/auth/reset-password', { token, newPassword: 'yet another password' });
    expect(twice.status).toBe(400);
    expect(twice.body).toMatchObject({ code: 'token-invalid' });
    const old = await test.as().post('/api/auth/sign-in/email', { email: person.email, password: testPassword });
    expect(old.status).toBe(401);
    expect(old.body).toMatchObject({ code: 'sign-in-wrong' });
    expect(await signIn(test, { email: person.email, password: 'quite another password' })).not.toBe('');
  });
});

describe('changing address and password', () => {
  it('asks the old address, then the new one', async () => {
    const person = await signedInPerson(test);
    const newEmail = `moved-${person.email}`;
    const asked = await test.as(person.cookie).post('/api/auth/change-email', { newEmail });
    expect(asked.status).toBe(200);
    await test.background.settled();
    const first = test.mail.latestTo(person.email);
    expect(first.text).toContain(newEmail);
    const step = async (email: string, kind: string) => {
      const link = linkIn(test.mail.latestTo(email));
      expect(link.searchParams.get('kind')).toBe(kind);
      const reply = await test.as(person.cookie).get(`/api/auth/verify-email${link.search.replace(/kind=[^&]*&/, '')}`);
      await test.background.settled();
      return reply.status;
    };
    expect(await step(person.email, 'address-old')).toBe(200);
    expect((await test.as(person.cookie).get('/api/me')).body).toMatchObject({ email: person.email });
    expect(await step(newEmail, 'address-new')).toBe(200);
    expect((await test.as(person.cookie).get('/api/me')).body).toMatchObject({ email: newEmail });
  });

  it('does not take an address that someone else took meanwhile', async () => {
    const person = await signedInPerson(test);
    const newEmail = `wanted-${person.email}`;
    await test.as(person.cookie).post('/api/auth/change-email', { newEmail });
    await test.background.settled();
    const search = linkIn(test.mail.latestTo(person.email)).search.replace(/kind=[^&]*&/, '');
    await test.as(person.cookie).get(`/api/auth/verify-email${search}`);
    await test.background.settled();
    await createPerson(test.database.db, buildPerson({ email: newEmail }));
    const last = linkIn(test.mail.latestTo(newEmail)).search.replace(/kind=[^&]*&/, '');
    const reply = await test.as(person.cookie).get(`/api/auth/verify-email${last}`);
    expect(reply.body).toMatchObject({ status: 400, code: 'token-invalid' });
    expect((await test.as(person.cookie).get('/api/me')).body).toMatchObject({ email: person.email });
  });

  it('changes the password with the old one, and signs out everywhere else', async () => {
    const person = await signedInPerson(test);
    const elsewhere = await signIn(test, person);
    const body = { currentPassword: 'not this one', newPassword: 'a password that is new' };
    const wrong = await test.as(person.cookie).post('/api/auth/change-password', body);
    expect(wrong.body).toMatchObject({ status: 422, code: 'password-wrong' });
    const right = await test
      .as(person.cookie)
      .post('/api/auth/change-password', { ...body, currentPassword: testPassword });
    expect(right.status).toBe(200);
    expect((await test.as(elsewhere).get('/api/me')).status).toBe(401);
    expect((await test.as(cookieOf(right)).get('/api/me')).status).toBe(200);
    expect(await signIn(test, { email: person.email, password: body.newPassword })).not.toBe('');
  });

  it('needs someone to be signed in', async () => {
    const reply = await test.as().post('/api/auth/change-email', { newEmail: 'x@example.test' });
    expect(reply.body).toMatchObject({ status: 401, code: 'not-signed-in' });
  });
});

describe('limits', () => {
  it('lets a class of forty sign in from one address', async () => {
    const people = Array.from({ length: 40 }, () => buildPerson());
    for (const person of people) await createPerson(test.database.db, person);
    const replies = await Promise.all(
      people.map(({ email, password }) => test.as().post('/api/auth/sign-in/email', { email, password })),
    );
    expect(replies.map((reply) => reply.status)).toEqual(people.map(() => 200));
  });

  it('stops guessing at one account, even with the right password at the end, and says when to come back', async () => {
    const person = await signedInPerson(test);
    const guess = (password: string) => test.as().post('/api/auth/sign-in/email', { email: person.email, password });
    const statuses: number[] = [];
    for (let index = 0; index < 10; index += 1) statuses.push((await guess(`wrong guess ${index}`)).status);
    expect(statuses).toEqual(Array.from({ length: 10 }, () => 401));
    const blocked = await guess(testPassword);
    expect(blocked.status).toBe(429);
    expect(blocked.body).toMatchObject({ code: 'too-many-requests' });
    expect(Number(blocked.headers['retry-after'])).toBeGreaterThan(60);
    expect((await test.as(person.cookie).get('/api/me')).status).toBe(200);

    // Whoever can read the mail is not kept out by a stranger's guesses.
    await test.as().post('/api/auth/request-password-reset', { email: person.email });
    await test.background.settled();
    const token = linkIn(test.mail.latestTo(person.email)).searchParams.get('token');
    await test.as().post('/api/auth/reset-password', { token, newPassword: 'chosen after the guesses' });
    expect((await guess('chosen after the guesses')).status).toBe(200);
  });

  it('sends only so many messages to one address', async () => {
    const email = 'flooded@example.test';
    const statuses: number[] = [];
    for (let index = 0; index < 7; index += 1) {
      statuses.push((await test.as().post('/api/auth/request-password-reset', { email })).status);
    }
    expect(statuses).toEqual([200, 200, 200, 200, 200, 200, 429]);
  });

  it('does not let a caller choose the address the limits count by', async () => {
    await test.as().post('/api/auth/sign-out', {}).set('X-Client-Address', '203.0.113.9');
    expect(await countOf(`select count(*) n from rate_limit where key like '203.0.113.9%'`)).toBe(0);
    expect(await countOf(`select count(*) n from rate_limit where key like '127.0.0.1%'`)).toBeGreaterThan(0);
  });
});

describe('a locked account', () => {
  it('is refused at sign-in and in every open session', async () => {
    const person = await signedInPerson(test);
    await test.database.pool.query('update "user" set locked_at = now() where id = $1', [person.id]);
    expect((await test.as(person.cookie).get('/api/me')).status).toBe(401);
    const reply = await test.as().post('/api/auth/sign-in/email', { email: person.email, password: testPassword });
    expect(reply.body).toMatchObject({ status: 403, code: 'account-locked' });
  });
});

describe('what is not opened', () => {
  it.each([
    ['post', '/api/auth/update-user'],
    ['post', '/api/auth/delete-user'],
    ['get', '/api/auth/list-sessions'],
    ['get', '/api/auth/get-session'],
    ['post', '/api/auth/sign-in/social'],
    ['get', '/api/auth/reset-password/some-token'],
    ['get', '/api/auth/ok'],
  ] as const)('%s %s is 404', async (method, path) => {
    const reply = await test.as()[method](path);
    expect(reply.body).toMatchObject({ status: 404, code: 'not-found' });
  });

  it('refuses sign-in from a foreign page', async () => {
    const person = await signedInPerson(test);
    const { email, password } = person;
    const reply = await test
      .as()
      .post('/api/auth/sign-in/email', { email, password })
      .set('Origin', 'https://evil.example');
    expect(reply.body).toMatchObject({ status: 403, code: 'foreign-origin' });
  });
});
