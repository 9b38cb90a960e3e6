import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter, Route, Routes } from 'react-router';
import { expect, test } from 'vitest';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import { sessionQuery } from '../../lib/session.ts';
import Account from './account.tsx';

const me = {
  id: '0197f0a0-0000-7000-8000-000000000001',
  name: 'Tove Lindqvale',
  email: 'tove.lindqvale@example.test',
  language: 'en' as const,
  roles: ['trainee' as const],
  may: ['own-account' as const],
  full: true,
};
const at = '2026-11-30T10:00:00.000Z';
const here = { id: 'here', current: true, browser: 'Firefox', system: 'Android', since: at, lastSeen: at };
const there = { id: 'there', current: false, browser: null, system: 'Windows', since: at, lastSeen: at };

interface Sent {
  path: string;
  body: unknown;
}

function json(status: number, body: unknown): Response {
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });
}

/** The account page; `answer` gives the server's reply to what the page sends. */
function open(answer: (sent: Sent) => Response = () => json(200, {})) {
  const sent: Sent[] = [];
  answerFetch((path, body) => {
    if (path === '/api/session') return json(200, { me, mailbox: false });
    if (path === '/api/me/sessions') return json(200, [here, there]);
    sent.push({ path, body });
    return answer({ path, body });
  });
  const client = new QueryClient();
  client.setQueryData(sessionQuery.queryKey, { me, mailbox: false });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={['/account']}>
        <Routes>
          <Route path="/account" element={<Account />} />
          <Route path="/" element={<p>the welcome page</p>} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return { sent, user: userEvent.setup() };
}

test('deleting asks once, names the account, and wants the password', async () => {
  const { sent, user } = open(() => new Response(null, { status: 204 }));
  await user.click(screen.getByRole('button', { name: 'Delete my account' }));
  expect(screen.getByText(/the account of Tove Lindqvale, tove\.lindqvale@example\.test/)).toBeInTheDocument();
  expect(sent).toEqual([]);
  const form = within(screen.getByRole('region', { name: 'Delete the account' }));
  await user.click(form.getByRole('button', { name: 'Delete it for good' }));
  expect(form.getByLabelText('Password you have now')).toHaveAccessibleDescription('Enter the password you have now.');
  await user.type(form.getByLabelText('Password you have now'), 'three plain words{Enter}');
  expect(await screen.findByText('the welcome page')).toBeInTheDocument();
  expect(sent).toEqual([{ path: '/api/me', body: { password: 'three plain words' } }]);
});

test('a wrong password deletes nothing and says so', async () => {
  const refusal = { status: 422, code: 'password-wrong', detail: '', title: '', type: '' };
  const { user } = open(() => json(422, refusal));
  await user.click(screen.getByRole('button', { name: 'Delete my account' }));
  const form = within(screen.getByRole('region', { name: 'Delete the account' }));
  await user.type(form.getByLabelText('Password you have now'), 'guess{Enter}');
  expect(await form.findByRole('alert')).toHaveTextContent('The password is not right.');
});

test('another session can be ended by name, this one cannot', async () => {
  const { sent, user } = open(() => new Response(null, { status: 204 }));
  await user.click(await screen.findByRole('button', { name: 'End the session on Windows' }));
  await waitFor(() => expect(sent.map(({ path }) => path)).toEqual(['/api/me/sessions/there']));
  expect(screen.queryByRole('button', { name: /Firefox/ })).not.toBeInTheDocument();
});

test('a name is saved, and an empty one is refused where it stands', async () => {
  const { sent, user } = open(({ body }) => json(200, { ...me, ...(body as object) }));
  const name = screen.getByLabelText('Name');
  await user.clear(name);
  await user.click(screen.getByRole('button', { name: 'Save' }));
  expect(name).toHaveAccessibleDescription('Enter your name, 80 letters at most.');
  await user.type(name, 'Tove L.');
  await user.click(screen.getByRole('button', { name: 'Save' }));
  expect(await screen.findByText('Saved.')).toBeInTheDocument();
  expect(sent).toEqual([{ path: '/api/me', body: { name: 'Tove L.', language: 'en' } }]);
});

test('signing out leads to the page for everyone, not to the sign-in form', async () => {
  const { user } = open();
  await user.click(screen.getByRole('button', { name: 'Sign out' }));
  expect(await screen.findByText('the welcome page')).toBeInTheDocument();
});

test('the look is kept on this device', async () => {
  const { user } = open();
  await user.click(screen.getByRole('radio', { name: 'Dark' }));
  expect(document.documentElement.dataset.scheme).toBe('dark');
  expect(localStorage.getItem('tankmark.scheme')).toBe('dark');
  await user.click(screen.getByRole('radio', { name: 'As the device is set' }));
  expect(document.documentElement.dataset.scheme).toBeUndefined();
});
