import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter, Route, Routes, useLocation } from 'react-router';
import { expect, test } from 'vitest';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import SignUp from './sign-up.tsx';

function Elsewhere() {
  const { pathname, state } = useLocation();
  return <p>{`arrived at ${pathname} with ${JSON.stringify(state)}`}</p>;
}

/** The filled-in form, sent; what went to the server is given back. */
async function send(answer: () => Response) {
  const sent: unknown[] = [];
  answerFetch((path, body) => {
    sent.push([path, body]);
    return answer();
  });
  render(
    <QueryClientProvider client={new QueryClient()}>
      <MemoryRouter initialEntries={['/sign-up']}>
        <Routes>
          <Route path="/sign-up" element={<SignUp />} />
          <Route path="*" element={<Elsewhere />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('Your name'), 'Tove Lindqvale');
  await user.type(screen.getByLabelText('E-mail address'), 'tove@example.test');
  await user.type(screen.getByLabelText('Password'), 'three plain words');
  await user.click(screen.getByRole('button', { name: 'Create the account' }));
  return { sent, user };
}

test('a new account is asked for, and the page about its mail opens', async () => {
  const { sent } = await send(() => Response.json({}));
  expect(await screen.findByText('arrived at /look-in-your-mail with {"email":"tove@example.test"}')).toBeVisible();
  expect(sent).toEqual([
    [
      '/api/auth/sign-up/email',
      { name: 'Tove Lindqvale', email: 'tove@example.test', password: 'three plain words', language: 'en' },
    ],
  ]);
});

test('a field that the server refuses is marked and takes the focus', async () => {
  const errors = [{ field: 'email', message: 'Unreadable characters' }];
  const { user } = await send(() =>
    Response.json(
      { type: 'about:blank', title: 'Bad body', status: 400, code: 'bad-body', detail: 'Bad body', errors },
      { status: 400 },
    ),
  );
  const address = screen.getByLabelText('E-mail address');
  await waitFor(() => expect(address).toBeInvalid());
  expect(address).toHaveFocus();
  expect(address).toHaveAccessibleDescription('Enter an address like name@example.test.');
  expect(screen.getByLabelText('Your name')).toBeValid();
  await user.type(address, 's');
  await waitFor(() => expect(address).toBeValid());
});

test('the password can be looked at while typing', async () => {
  const { user } = await send(() => Response.json({}, { status: 500 }));
  const password = screen.getByLabelText('Password');
  expect(password).toHaveAttribute('type', 'password');
  await user.click(screen.getByRole('checkbox', { name: 'Show the password' }));
  expect(password).toHaveAttribute('type', 'text');
  expect(password).toHaveAttribute('autocomplete', 'new-password');
});
