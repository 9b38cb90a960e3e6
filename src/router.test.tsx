import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter, useLocation } from 'react-router';
import { afterEach, expect, test } from 'vitest';
import type { AccessKey } from '../shared/contracts/access.ts';
import type { MeView } from '../shared/contracts/account.ts';
import { answerFetch } from '../tests/support/answer-fetch.ts';
import { buildProblemView } from '../tests/support/problem-view.ts';
import { chooseLocale } from './i18n/i18n.ts';
import { queryClient } from './lib/query-client.ts';
import { Pages } from './router.tsx';

function person(changes: Partial<MeView> = {}): MeView {
  return {
    id: '0197f0a0-0000-7000-8000-000000000001',
    name: 'Tove Lindqvale',
    email: 'tove.lindqvale@example.test',
    language: 'en',
    roles: ['trainee'],
    may: ['course', 'own-account', 'mailbox'],
    full: true,
    ...changes,
  };
}

function json(status: number, body: unknown): Response {
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });
}

function Address() {
  const { pathname, search } = useLocation();
  return <p data-testid="address">{pathname + search}</p>;
}

/** The whole client at an address, with what the server says of each path. */
function open(address: string, me: MeView | null, answers: Readonly<Record<string, () => Response>> = {}) {
  answerFetch((path) => {
    if (path === '/api/session') return json(200, { me, mailbox: false });
    return answers[path]?.() ?? json(404, { status: 404, code: 'not-found', detail: '', title: '', type: '' });
  });
  render(
    <QueryClientProvider client={queryClient}>
      <MemoryRouter initialEntries={[address]}>
        <Pages />
        <Address />
      </MemoryRouter>
    </QueryClientProvider>,
    // What a page throws is caught by its boundary, as it should be; React's report of it is no fault.
    { onCaughtError: () => undefined },
  );
}

afterEach(() => {
  cleanup();
  queryClient.clear();
  chooseLocale('en');
});

test('a visitor who asks for a page of people signed in is led to sign in, and back afterwards', async () => {
  open('/drills?topic=area', null);
  expect(await screen.findByRole('heading', { level: 1, name: 'Sign in' })).toBeInTheDocument();
  expect(screen.getByTestId('address')).toHaveTextContent('/sign-in?next=%2Fdrills%3Ftopic%3Darea');
});

test('a page of a role the person lacks says so, and is not in the way through the product', async () => {
  open('/staff/families', person());
  expect(await screen.findByRole('heading', { name: 'This page is not for your account' })).toBeInTheDocument();
  expect(screen.queryByRole('link', { name: 'Families' })).not.toBeInTheDocument();
});

test('whoever may see the proof sheets finds them', async () => {
  const may: AccessKey[] = ['course', 'own-account', 'proof-sheet'];
  open('/staff/families', person({ roles: ['staff'], may }), { '/api/staff/families': () => json(200, []) });
  expect(await screen.findByRole('heading', { name: 'Problem families' })).toBeInTheDocument();
  expect(screen.getByRole('link', { name: 'Families' })).toHaveAttribute('aria-current', 'page');
});

test('an address that leads nowhere says so and offers a way on', async () => {
  open('/no/such/page', person());
  expect(await screen.findByRole('heading', { name: 'There is nothing at this address' })).toBeInTheDocument();
  expect(screen.getByRole('link', { name: 'Go to Today' })).toHaveAttribute('href', '/today');
  await waitFor(() => expect(document.title).toBe('There is nothing at this address · Tankmark'));
});

test('a problem that is not there reads as an address that leads nowhere', async () => {
  open('/problems/0197f0a0-0000-7000-8000-00000000000f', person(), { '/api/levels': () => json(200, []) });
  expect(await screen.findByRole('heading', { name: 'There is nothing at this address' })).toBeInTheDocument();
});

test('a person who reads Spanish gets the product in Spanish', async () => {
  open('/no/such/page', person({ language: 'es' }));
  expect(await screen.findByRole('heading', { name: 'No hay nada en esta dirección' })).toBeInTheDocument();
  expect(document.documentElement.lang).toBe('es');
});

test('a visitor can change the language, and it is kept', async () => {
  open('/no/such/page', null);
  await userEvent.setup().click(await screen.findByRole('button', { name: 'Español' }));
  expect(await screen.findByRole('heading', { name: 'No hay nada en esta dirección' })).toBeInTheDocument();
  expect(localStorage.getItem('tankmark.language')).toBe('es');
});

test('the first thing the keyboard reaches is the way past the navigation', async () => {
  open('/no/such/page', person());
  await screen.findByRole('heading', { level: 1 });
  await userEvent.setup().tab();
  expect(screen.getByRole('link', { name: 'Skip to the content' })).toHaveFocus();
});

test('a problem belongs to the drills in the way through the product', async () => {
  const problem = buildProblemView();
  open(`/problems/${problem.id}`, person(), {
    '/api/levels': () => json(200, []),
    [`/api/problems/${problem.id}`]: () => json(200, problem),
  });
  expect(await screen.findByRole('heading', { level: 1, name: problem.heading })).toBeInTheDocument();
  expect(screen.getByRole('link', { name: 'Drills' })).toHaveAttribute('aria-current', 'page');
  expect(screen.getByRole('link', { name: 'Today' })).not.toHaveAttribute('aria-current');
});
