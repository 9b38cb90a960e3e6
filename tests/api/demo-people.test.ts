import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword, demoPeople } from '../../scripts/demo/people.ts';
import { seedPeople } from '../../scripts/demo/seed-people.ts';
import { roles } from '../../shared/vocabulary.ts';
import { signIn } from '../support/factories.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await startApp();
});
afterAll(() => test.close());

describe('the people of the demonstration', () => {
  it('are made once, confirmed, with their roles, and can sign in', async () => {
    const first = await seedPeople(test.database.db);
    const again = await seedPeople(test.database.db);
    expect([...again.values()]).toEqual([...first.values()]);
    expect(first.size).toBe(demoPeople.length);
    for (const person of demoPeople) {
      const cookie = await signIn(test, { email: person.email, password: demoPassword });
      const me = await test.as(cookie).get('/api/me');
      expect(me.body).toMatchObject({ name: person.name, language: person.language, roles: [...person.roles].sort() });
    }
  });

  it('hold every role between them, some several, at addresses that lead nowhere', () => {
    for (const role of roles) expect(demoPeople.some((person) => person.roles.includes(role))).toBe(true);
    expect(demoPeople.some((person) => person.roles.length > 1)).toBe(true);
    expect(demoPeople.map((person) => person.name)).toEqual(
      expect.arrayContaining(['Odalys Brennick', 'Imre Tollund']),
    );
    expect(demoPeople.every((person) => person.email.endsWith('@example.test'))).toBe(true);
  });
});
