import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { accessKeys, type AccessKey } from '../../shared/contracts/access.ts';
import { roles } from '../../shared/vocabulary.ts';
import { access, may, scopesOf, type Column } from '../../server/http/access.ts';
import type { Route } from '../../server/http/route.ts';
import { signedInPerson } from '../support/factories.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

// The table of who may do what, copied from the product's definition cell by cell ("-" there is null here), and below the
// line what the definition leaves to the pages: the authors' proof sheet, and the demonstration's mailbox.
const table: Record<AccessKey, [string | null, string | null, string | null, string | null, string | null]> = {
  // capability            visitor  trainee  instructor  manager    staff
  welcome: /*          */ ['see', 'see', 'see', 'see', 'see'],
  course: /*           */ ['free', 'seat', 'preview', 'seat', 'preview'],
  'own-work': /*       */ [null, 'own', 'members', 'summary', 'audited'],
  'answers-of-others': [null, null, 'members', null, 'audited'],
  cohort: /*           */ [null, 'join', 'members', 'people', 'all'],
  teaching: /*         */ [null, null, 'members', null, 'all'],
  'questions-write': /**/ [null, null, 'all', null, 'all'],
  'questions-publish': [null, null, null, null, 'all'],
  company: /*          */ [null, 'seat', null, 'people', 'all'],
  platform: /*         */ [null, null, null, null, 'all'],
  'own-account': /*    */ [null, 'own', 'own', 'own', 'own'],
  // ---
  'proof-sheet': /*    */ [null, null, null, null, 'all'],
  mailbox: /*          */ ['see', 'see', 'see', 'see', 'see'],
};
const columns: Column[] = ['visitor', 'trainee', 'instructor', 'manager', 'staff'];

describe('the access table', () => {
  it.each(accessKeys)('has the row "%s" as defined', (key) => {
    expect(columns.map((column) => access[key][column])).toEqual(table[key]);
    expect(may(null, key)).toBe(table[key][0] !== null);
    roles.forEach((role, index) => {
      expect(may({ roles: [role] }, key)).toBe(table[key][index + 1] !== null);
    });
  });

  it('gives a person of several roles the reach of each, and one of none nothing', () => {
    expect(scopesOf({ roles: ['trainee', 'manager'] }, 'company')).toEqual(['seat', 'people']);
    expect(may({ roles: ['trainee', 'staff'] }, 'platform')).toBe(true);
    expect(accessKeys.filter((key) => may({ roles: [] }, key))).toEqual([]);
  });
});

const nobodysId = '01890000-0000-7000-8000-000000000000';

function pathOf(route: Route): string {
  return route.path.replace(/:(\w+)/g, (_all, name: string) => {
    if (name.endsWith('Id')) return nobodysId;
    return name === 'part' ? 'a' : 'nothing-of-this-name';
  });
}

describe('every route with every role', () => {
  let test: TestApp;
  const cookies = new Map<Column, string | undefined>([['visitor', undefined]]);
  beforeAll(async () => {
    test = await startApp();
    for (const role of roles) {
      cookies.set(role, (await signedInPerson(test, { roles: [role] })).cookie);
    }
  });
  afterAll(() => test.close());

  it('there are routes, each declared once', () => {
    const keys = test.routes.map((route) => `${route.method} ${route.path}`);
    expect(keys.length).toBeGreaterThan(20);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys).toContain('get /api/me');
  });

  it.each(columns)('lets a %s in exactly where the table says', async (column) => {
    const wrong: string[] = [];
    for (const route of test.routes) {
      // A body no contract takes: past the door it is refused as such, so nothing is changed by this walk.
      const body = route.method === 'get' ? undefined : { nothing: 'of the kind' };
      // Ending all other sessions takes no body and would be harmless but for the person's own: there are none here.
      const reply = await test.as(cookies.get(column))[route.method](pathOf(route), body);
      const allowed = access[route.access][column] !== null && (column !== 'visitor' || route.visitors);
      const expected = allowed ? 'past the door' : column === 'visitor' ? 'not-signed-in' : 'role-missing';
      const { code } = (reply.body ?? {}) as { code?: string };
      const got = code === 'not-signed-in' || code === 'role-missing' ? code : 'past the door';
      if (got !== expected || reply.status >= 500) wrong.push(`${route.method} ${route.path}: ${got}, ${reply.status}`);
      if (!allowed) expect(reply.status).toBe(column === 'visitor' ? 401 : 403);
    }
    expect(wrong).toEqual([]);
  });

  it('someone without any role gets no further than a visitor with an account', async () => {
    const { cookie } = await signedInPerson(test, { roles: [] });
    expect((await test.as(cookie).get('/api/me')).body).toMatchObject({ status: 403, code: 'role-missing' });
  });

  it('every change is refused from a foreign page, before anything else', async () => {
    const changing = test.routes.filter((route) => route.method !== 'get');
    for (const route of changing) {
      for (const origin of ['https://evil.example', 'null']) {
        const reply = await test.as(cookies.get('staff'))[route.method](pathOf(route)).set('Origin', origin);
        expect(reply.body, `${route.method} ${route.path}`).toMatchObject({ status: 403, code: 'foreign-origin' });
      }
    }
  });

  it('a path that can be no id is 404 like one that leads to nothing', async () => {
    for (const route of test.routes.filter((one) => /:\w+Id/.test(one.path))) {
      const path = route.path.replace(/:\w+/g, 'not-an-id');
      const column = access[route.access].trainee === null ? 'staff' : 'trainee';
      const reply = await test.as(cookies.get(column))[route.method](path, route.method === 'get' ? undefined : {});
      expect(reply.body, `${route.method} ${path}`).toMatchObject({ status: 404, code: 'not-found' });
    }
  });
});
