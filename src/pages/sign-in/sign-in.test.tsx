import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter, Route, Routes, useLocation } from 'react-router';
import { expect, test } from 'vitest';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import { sessionQuery } from '../../lib/session.ts';
import SignIn, { safeNext } from './sign-in.tsx';

function Elsewhere() {
  const { pathname, search } = useLocation();
  return <p>{`arrived at ${pathname}${search}`}</p>;
}

function reply(status: number, body: unknown): Response {
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });
}
const refusal = (status: number, code: string) =>
  reply(status, { type: 'about:blank', title: code, status, code, detail: code });

const me = {
  id: '0197f0a0-0000-7000-8000-000000000001',
  name: 'Tove Lindqvale',
  email: 'tove@example.test',
  language: 'en',
  roles: ['trainee'],
  may: ['own-account', 'course'],
  full: true,
};

/** The page at an address, with the server's answer to the form. */
function open(address: string, answer: () => Response) {
  const sent: unknown[] = [];
  answerFetch((path, body) => {
    if (path === '/api/session') return reply(200, { me: sent.length > 0 ? me : null, mailbox: true });
    sent.push(body);
    return answer();
  });
  const client = new QueryClient();
  client.setQueryData(sessionQuery.queryKey, { me: null, mailbox: true });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={[address]}>
        <Routes>
          <Route path="/sign-in" element={<SignIn />} />
          <Route path="*" element={<Elsewhere />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return { sent, user: userEvent.setup() };
}

async function fillIn(user: ReturnType<typeof userEvent.setup>) {
  await user.type(screen.getByLabelText('E-mail address'), 'tove@example.test');
  await user.type(screen.getByLabelText('Password'), 'three plain words{Enter}');
}

test('only addresses of this site are gone back to', () => {
  expect(safeNext('/drills?topic=area')).toBe('/drills?topic=area');
  const others = [
    '//other.test/',
    '/\\other.test',
    '/\t/other.test',
    '/\n/other.test',
    '/..//other.test',
    'https://other.test',
    'javascript:alert(1)',
    '',
    'drills',
    null,
  ];
  for (const other of others) expect(safeNext(other), String(other)).toBe('/today');
});

test('an empty form is not sent: each field says what it wants, and the first one has the focus', async () => {
  const { sent, user } = open('/sign-in', () => reply(200, {}));
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  const address = screen.getByLabelText('E-mail address');
  await waitFor(() => expect(address).toHaveAccessibleDescription('Enter an address like name@example.test.'));
  expect(address).toHaveFocus();
  expect(address).toBeInvalid();
  expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Enter your password.');
  expect(sent).toEqual([]);
});

test.each([
  ['sign-in-wrong', 401, 'The address or the password is not right.'],
  ['account-locked', 403, 'This account is locked. Ask the office of your school.'],
  ['too-many-requests', 429, 'That was too often in a short time. Wait a little, then try again.'],
])('a refusal (%s) is announced in plain words, and what was typed stays', async (code, status, words) => {
  const { user } = open('/sign-in', () => refusal(status, code));
  await fillIn(user);
  expect(await screen.findByRole('alert')).toHaveTextContent(words);
  expect(screen.getByLabelText('E-mail address')).toHaveValue('tove@example.test');
  expect(screen.getByLabelText('Password')).toHaveValue('three plain words');
});

test('whoever has not confirmed the address is led to the page about that message', async () => {
  const { user } = open('/sign-in', () => refusal(403, 'address-unconfirmed'));
  await fillIn(user);
  expect(await screen.findByText('arrived at /look-in-your-mail')).toBeVisible();
});

test('after signing in the page that was asked for opens', async () => {
  const { sent, user } = open('/sign-in?next=%2Fdrills%3Ftopic%3Darea', () => reply(200, {}));
  await fillIn(user);
  expect(await screen.findByText('arrived at /drills?topic=area')).toBeVisible();
  expect(sent).toEqual([{ email: 'tove@example.test', password: 'three plain words', rememberMe: true }]);
});

test('a foreign page is never gone to', async () => {
  const { user } = open('/sign-in?next=%2F%2Fother.test', () => reply(200, {}));
  await fillIn(user);
  expect(await screen.findByText('arrived at /today')).toBeVisible();
});
