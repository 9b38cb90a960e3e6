import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sessionCookieName } from '../../server/http/cookie.ts';
import { sessionFinder } from '../../server/http/session.ts';
import { signedInPerson, type SignedIn } from '../support/factories.ts';
import { startApp, testSecret, type TestApp } from '../support/start-app.ts';

// The look-up is ours, the cookies are better-auth's own: each case signs in through it and reads what it set.
describe.each([
  ['http://tankmark.test', 'tankmark.session_token'],
  ['https://tankmark.test', '__Secure-tankmark.session_token'],
])('sessions under %s', (appUrl, name) => {
  let test: TestApp;
  let person: SignedIn;
  beforeAll(async () => {
    test = await startApp({ env: { APP_URL: appUrl } });
    person = await signedInPerson(test, { roles: ['trainee', 'manager'], language: 'es' });
  });
  afterAll(() => test.close());
  const find = (cookie: string | undefined, secret = testSecret) =>
    sessionFinder({ pool: test.database.pool, secret, appUrl }).find(cookie);

  it('finds the person with roles and language by the real cookie', async () => {
    expect(sessionCookieName(appUrl)).toBe(name);
    expect(person.cookie).toContain(`${name}=`);
    expect(await find(person.cookie)).toMatchObject({
      id: person.id,
      name: person.name,
      email: person.email,
      language: 'es',
      roles: ['manager', 'trainee'],
    });
    expect((await find(`other=1; ${person.cookie}; last=2`))?.id).toBe(person.id);
  });

  it('sets cookies that scripts and other sites do not get', async () => {
    const { email, password } = person;
    const reply = await test.as().post('/api/auth/sign-in/email', { email, password });
    const cookie = (reply.headers['set-cookie'] as unknown as string[])[0] ?? '';
    expect(cookie).toMatch(/; HttpOnly/);
    expect(cookie).toMatch(/; SameSite=Lax/);
    expect(cookie).toMatch(/; Max-Age=2592000/);
    expect(/; Secure/.test(cookie)).toBe(appUrl.startsWith('https'));
  });

  it('takes no cookie that is missing, cut, changed or signed with another secret', async () => {
    const [, value = ''] = person.cookie.split('=');
    const token = decodeURIComponent(value).split('.')[0] ?? '';
    const changed = `${value[0] === 'a' ? 'b' : 'a'}${value.slice(1)}`;
    const refused = [
      undefined,
      '',
      `${name}=`,
      `${name}=${token}`,
      `${name}=${changed}`,
      `${name}=%E0%A4%A`,
      `${name}=.`,
    ];
    for (const cookie of refused) expect(await find(cookie), String(cookie)).toBeNull();
    expect(await find(person.cookie.slice(0, -6))).toBeNull();
    expect(await find(person.cookie.replace(name, `x${name}`))).toBeNull();
    expect(await find(person.cookie, `${testSecret}!`)).toBeNull();
  });

  it('sees a changed role, an ended session and one that ran out at once', async () => {
    const own = await signedInPerson(test);
    const { pool } = test.database;
    await pool.query(`insert into user_role (user_id, role) values ($1, 'staff')`, [own.id]);
    expect((await find(own.cookie))?.roles).toEqual(['staff', 'trainee']);
    await pool.query(`update session set expires_at = now() - interval '1 second' where user_id = $1`, [own.id]);
    expect(await find(own.cookie)).toBeNull();
    await pool.query(`update session set expires_at = now() + interval '1 day' where user_id = $1`, [own.id]);
    expect((await find(own.cookie))?.id).toBe(own.id);
    await pool.query('delete from session where user_id = $1', [own.id]);
    expect(await find(own.cookie)).toBeNull();
  });
});
