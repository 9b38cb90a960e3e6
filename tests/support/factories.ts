import { createPerson, type NewPerson } from '../../scripts/demo/create-person.ts';
import type { TestApp } from './start-app.ts';

export const testPassword = 'a long test password';
let made = 0;

export function buildPerson(overrides: Partial<NewPerson> = {}): NewPerson {
  made += 1;
  return {
    name: `Person ${made}`,
    email: `person-${made}@example.test`,
    password: testPassword,
    language: 'en',
    roles: ['trainee'],
    ...overrides,
  };
}

export interface SignedIn extends NewPerson {
  id: string;
  /** For the Cookie header. */
  cookie: string;
}

/** The Cookie header a browser would send back after this reply. */
export function cookieOf(reply: { headers: Record<string, unknown> }): string {
  const set = reply.headers['set-cookie'];
  const list = Array.isArray(set) ? set.map(String) : [];
  return list.map((cookie) => cookie.split(';')[0]).join('; ');
}

export async function signIn(test: TestApp, person: Pick<NewPerson, 'email' | 'password'>): Promise<string> {
  const { email, password } = person;
  const reply = await test.as().post('/api/auth/sign-in/email', { email, password });
  if (reply.status !== 200) throw new Error(`Signing in gave ${reply.status}: ${reply.text}`);
  return cookieOf(reply);
}

/** A person with an account, signed in the way anyone does. */
export async function signedInPerson(test: TestApp, overrides: Partial<NewPerson> = {}): Promise<SignedIn> {
  const person = buildPerson(overrides);
  const id = await createPerson(test.database.db, person);
  return { ...person, id, cookie: await signIn(test, person) };
}
