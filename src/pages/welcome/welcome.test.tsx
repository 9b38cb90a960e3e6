import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter } from 'react-router';
import { beforeEach, expect, test, vi } from 'vitest';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import type { AttemptView, ProblemView, SampleReply } from '../../../shared/contracts/practice.ts';
import { sessionQuery } from '../../lib/session.ts';
import Welcome from './welcome.tsx';

const problem: ProblemView = {
  id: 'round-bed',
  topic: 'area',
  tier: 1,
  heading: 'A round bed',
  statement: 'From the center to the edge the bed is 10 feet (ft).',
  figure: null,
  label: null,
  parts: [
    {
      key: 'a',
      kind: 'number',
      topic: 'area',
      ask: 'What is its area in square feet?',
      state: 'open',
      attempts: [],
      hints: [],
      hintsLeft: 0,
      answerText: null,
      units: [
        { key: 'sq-ft', symbol: 'sq ft' },
        { key: 'acre', symbol: 'acre' },
      ],
      rounding: '',
    },
  ],
  working: null,
  state: 'open',
  drill: null,
  locale: 'en',
};
const attempt: AttemptView = {
  typed: '1256 sq ft',
  read: '1,256 sq ft',
  verdict: 'slip',
  slip: 'diameter-for-radius',
  headline: 'You used the diameter as the radius.',
  detail: 'The radius is 10 ft.',
  counts: false,
};
const unreadable: SampleReply = { unreadable: { code: 'no-number', message: 'Type a number.' }, attempt: null };

let answers: (SampleReply | 'down')[];
let sent: unknown[];

beforeEach(() => {
  answers = [];
  sent = [];
  Element.prototype.scrollIntoView = vi.fn<() => void>();
  answerFetch((path, body) => {
    if (path.startsWith('/api/sample?')) return Response.json(problem);
    sent.push([path, body]);
    const answer = answers.shift();
    if (answer === undefined || answer === 'down') throw new TypeError('Failed to fetch');
    return Response.json(answer);
  });
});

function open() {
  const client = new QueryClient();
  client.setQueryData(sessionQuery.queryKey, { me: null, mailbox: false });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter>
        <Welcome />
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return userEvent.setup();
}

test('a visitor is led to the sample, answers with the keyboard, and reads which mistake it was', async () => {
  answers = [{ unreadable: null, attempt }];
  const user = open();
  const field = await screen.findByRole('textbox');
  await user.click(screen.getByRole('button', { name: 'Work a problem now' }));
  expect(field).toHaveFocus();
  await user.keyboard('1256{Enter}');
  expect(await screen.findByText('You used the diameter as the radius.')).toBeVisible();
  expect(sent).toEqual([
    [
      '/api/sample/answers',
      { sample: 'round-bed', part: 'a', response: { kind: 'number', text: '1256', unit: 'sq-ft' } },
    ],
  ]);
});

test('the unit chosen goes with the number', async () => {
  answers = [{ unreadable: null, attempt }];
  const user = open();
  await user.type(await screen.findByRole('textbox'), '0.5');
  await user.selectOptions(screen.getByRole('combobox'), 'acre');
  await user.click(screen.getByRole('button', { name: 'Check' }));
  await waitFor(() => expect(sent).toHaveLength(1));
  expect(sent[0]).toMatchObject(['/api/sample/answers', { response: { kind: 'number', text: '0.5', unit: 'acre' } }]);
});

test('an entry that cannot be read is said at the field', async () => {
  answers = [unreadable];
  const user = open();
  const field = await screen.findByRole('textbox');
  await user.type(field, 'many{Enter}');
  await waitFor(() => expect(field).toHaveAccessibleDescription('Type a number.'));
  expect(field).toBeInvalid();
});

test('without a connection the answer stays, and a second try is graded', async () => {
  answers = ['down', { unreadable: null, attempt }];
  const user = open();
  const field = await screen.findByRole('textbox');
  await user.type(field, '1256{Enter}');
  expect(await screen.findByRole('alert')).toHaveTextContent('The server cannot be reached');
  expect(field).toHaveValue('1256');
  await user.click(screen.getByRole('button', { name: 'Check' }));
  expect(await screen.findByText('You used the diameter as the radius.')).toBeVisible();
});
