import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import type { AnswerReply, LevelView, ProblemView } from '../../../shared/contracts/practice.ts';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import {
  buildAttempt,
  buildNumberPart,
  buildOrderPart,
  buildProblemView,
} from '../../../tests/support/problem-view.ts';
import { ProblemWork } from './problem-work.tsx';
import { problemQuery } from './queries.ts';

interface Sent {
  key: string;
  response: unknown;
}

function reply(changes: Partial<AnswerReply>): Response {
  return Response.json({ unreadable: null, parts: [], state: 'open', level: null, ...changes });
}

/** A problem in front of a person; `answer` gives the server's reply to each answer sent, null for no connection. */
function open(problem: ProblemView, answer: (sent: Sent, times: number) => Response | null) {
  const sent: Sent[] = [];
  answerFetch((path, body) => {
    if (!path.endsWith('/answers')) return Response.json(problem);
    sent.push(body as Sent);
    const given = answer(body as Sent, sent.length);
    if (given === null) throw new TypeError('Failed to fetch');
    return given;
  });
  const client = new QueryClient({ defaultOptions: { queries: { staleTime: Infinity } } });
  client.setQueryData(problemQuery(problem.id).queryKey, problem);
  const page = (id: string) => (
    <QueryClientProvider client={client}>
      <ProblemWork problemId={id} />
    </QueryClientProvider>
  );
  const { rerender } = render(page(problem.id));
  return { sent, client, show: (id: string) => rerender(page(id)), user: userEvent.setup({ delay: null }) };
}

afterEach(() => {
  cleanup();
  sessionStorage.clear();
  vi.useRealTimers();
});

const field = () => screen.getByRole('textbox', { name: 'Your answer to part (a)' });

test('Enter checks the answer with its unit; the focus goes to the verdict, which names the slip', async () => {
  const { sent, user } = open(buildProblemView(), () =>
    reply({ parts: [buildNumberPart({ attempts: [buildAttempt()] })] }),
  );
  await user.type(field(), '1800');
  await user.selectOptions(screen.getByRole('combobox'), 'sq-ft');
  await user.type(field(), '{Enter}');
  const headline = await screen.findByText('The patio is still in your area.');
  expect(sent.map(({ response }) => response)).toEqual([{ kind: 'number', text: '1800', unit: 'sq-ft' }]);
  await waitFor(() => expect(document.activeElement).toContainElement(headline));
  expect(screen.getByText('Read as 1,800 sq ft.')).toBeInTheDocument();
  expect(field()).toHaveValue('1800');
});

test('an entry that cannot be read is kept, with the reason at the field', async () => {
  const unreadable = { code: 'no-number', message: 'There is no number in it.' };
  const { user } = open(buildProblemView(), () => reply({ unreadable }));
  await user.type(field(), 'about ten{Enter}');
  expect(await screen.findByRole('alert')).toHaveTextContent('There is no number in it.');
  expect(field()).toHaveValue('about ten');
  expect(field()).toBeInvalid();
  expect(field()).toHaveAccessibleDescription('There is no number in it.');
});

test('what was typed is still there after a reload', async () => {
  const { user } = open(buildProblemView(), () => null);
  await user.type(field(), '1,6');
  cleanup();
  open(buildProblemView(), () => null);
  expect(field()).toHaveValue('1,6');
});

test('the field opens the decimal keypad, and the signs it lacks can be pressed', async () => {
  const { user } = open(buildProblemView(), () => null);
  expect(field()).toHaveAttribute('inputmode', 'decimal');
  await user.type(field(), '2');
  await user.click(screen.getByRole('button', { name: '½' }));
  expect(field()).toHaveValue('2 ½');
});

test('without a connection the same answer is sent again under the same key, and recorded once', async () => {
  vi.useFakeTimers({ shouldAdvanceTime: true });
  const { sent, user } = open(buildProblemView(), (_answer, times) =>
    times < 3 ? null : reply({ parts: [buildNumberPart({ attempts: [buildAttempt()] })] }),
  );
  await user.type(field(), '1800{Enter}');
  expect(await screen.findByText('Not saved yet. Trying again …')).toBeInTheDocument();
  await vi.advanceTimersByTimeAsync(10_000);
  expect(await screen.findByText('The patio is still in your area.')).toBeInTheDocument();
  expect(sent).toHaveLength(3);
  expect(new Set(sent.map(({ key }) => key)).size).toBe(1);
});

test('pressing again after giving up waiting keeps the key; another entry gets another', async () => {
  vi.useFakeTimers({ shouldAdvanceTime: true });
  const { sent, user } = open(buildProblemView(), () => null);
  await user.type(field(), '1800{Enter}');
  await vi.advanceTimersByTimeAsync(15_000);
  expect(await screen.findByRole('alert')).toHaveTextContent('Your answer is kept here');
  const first = sent.length;
  await user.type(field(), '{Enter}');
  await vi.advanceTimersByTimeAsync(15_000);
  expect(new Set(sent.map(({ key }) => key)).size).toBe(1);
  expect(sent.length).toBeGreaterThan(first);
  await user.type(field(), '0{Enter}');
  await vi.advanceTimersByTimeAsync(15_000);
  expect(new Set(sent.map(({ key }) => key)).size).toBe(2);
});

test('another problem in the same place begins with an empty field', async () => {
  const first = buildProblemView();
  const second = buildProblemView({ id: '0197f0a0-0000-7000-8000-0000000000bb', heading: 'Another lawn' });
  const { client, show, user } = open(first, () => null);
  await user.type(field(), '1800');
  client.setQueryData(problemQuery(second.id).queryKey, second);
  show(second.id);
  expect(field()).toHaveValue('');
});

test('an answer that counts tells where its topic now stands', async () => {
  const range = { low: 0.4, high: 0.8 };
  const level: LevelView = { topic: 'area', state: 'filling', answers: 3, fill: 0.6, range, tiers: [1] };
  const { user } = open(buildProblemView(), () =>
    reply({ parts: [buildNumberPart({ attempts: [buildAttempt()] })], level }),
  );
  await user.type(field(), '1800{Enter}');
  expect(await screen.findByText('Measuring the site: filling')).toBeInTheDocument();
});

test('a hint that cannot be fetched says why', async () => {
  const { user } = open(buildProblemView(), () => null);
  answerFetch(() => {
    throw new TypeError('Failed to fetch');
  });
  await user.click(screen.getByRole('button', { name: 'Hint 1 of 3' }));
  expect(await screen.findByRole('alert')).toHaveTextContent(/cannot be reached/);
});

test('earlier answers are folded under the newest', () => {
  const attempts = [buildAttempt(), buildAttempt({ headline: 'You added the patio.', counts: false })];
  open(buildProblemView({ parts: [buildNumberPart({ attempts })] }), () => null);
  expect(screen.getByText('You added the patio.')).toBeVisible();
  expect(screen.getByText('Your earlier answer')).toBeInTheDocument();
  expect(screen.getByText('The patio is still in your area.').closest('details')).not.toHaveAttribute('open');
});

test('a later part waits for the one before it', async () => {
  const parts = [buildNumberPart(), buildNumberPart({ key: 'b', ask: 'How much product?' })];
  const { sent, user } = open(buildProblemView({ parts }), () => null);
  await user.type(screen.getByRole('textbox', { name: 'Your answer to part (b)' }), '2.4{Enter}');
  expect(await screen.findByRole('alert')).toHaveTextContent('(a)');
  expect(sent).toEqual([]);
});

test('the worked solution is asked for once more, and says what it costs', async () => {
  const { user } = open(buildProblemView(), () => null);
  await user.click(screen.getByRole('button', { name: 'Show the worked solution' }));
  expect(screen.getByRole('region', { name: 'Show the worked solution' })).toHaveFocus();
  expect(screen.getByText(/will count as not answered/)).toBeInTheDocument();
  await user.click(screen.getByRole('button', { name: 'No, keep working' }));
  expect(screen.getByRole('button', { name: 'Show the worked solution' })).toHaveFocus();
});

test('a worked solution that was asked for takes the focus', async () => {
  const blank = buildAttempt({ verdict: 'blank', slip: null, headline: 'Left open.' });
  const line = { html: '', plain: '60 ft × 30 ft = 1,800 sq ft', reason: 'Length times width.', answers: false };
  const { user } = open(buildProblemView(), () => null);
  answerFetch(() =>
    Response.json(
      buildProblemView({
        parts: [buildNumberPart({ state: 'closed', attempts: [blank], answerText: '1,600 sq ft' })],
        working: [line],
        state: 'done',
      }),
    ),
  );
  await user.click(screen.getByRole('button', { name: 'Show the worked solution' }));
  await user.click(screen.getByRole('button', { name: 'Yes, show it' }));
  await waitFor(() => expect(screen.getByRole('heading', { name: 'Worked solution' })).toHaveFocus());
  expect(await screen.findByText('Length times width.')).toBeInTheDocument();
});

test('steps are put in order by keyboard alone, and each move is told', async () => {
  const { sent, user } = open(buildProblemView({ parts: [buildOrderPart()] }), () =>
    reply({ parts: [buildOrderPart({ attempts: [buildAttempt({ verdict: 'unrecognised', slip: null })] })] }),
  );
  (await screen.findByRole('button', { name: 'Move down: Add the product' })).focus();
  await user.keyboard('{Enter}');
  expect(screen.getByText('Add the product is now step 2 of 3.')).toBeInTheDocument();
  await waitFor(() => expect(screen.getByRole('button', { name: 'Move down: Add the product' })).toHaveFocus());
  expect(screen.getByRole('button', { name: 'Move up: Fill half with water' })).toBeDisabled();
  await user.click(screen.getByRole('button', { name: 'Check' }));
  await waitFor(() =>
    expect(sent.map(({ response }) => response)).toEqual([{ kind: 'order', steps: ['water', 'product', 'rest'] }]),
  );
});
