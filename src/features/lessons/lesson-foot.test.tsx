import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { LessonSummary } from '../../../shared/contracts/lessons.ts';
import { answerFetch } from '../../../tests/support/answer-fetch.ts';
import { LessonEnd, LessonSources } from './lesson-foot.tsx';

const lesson: LessonSummary = {
  slug: 'rectangles',
  topic: 'area',
  number: 1,
  title: 'Rectangles',
  minutes: 6,
  objectives: [],
  families: [],
  checkpoints: ['one', 'two'],
  progress: { state: 'reading', position: 0.5, startedAt: '2026-12-01T08:00:00Z', readAt: null },
};

let comeToEnd: () => void;

beforeEach(() => {
  class Watch {
    constructor(tell: (entries: { isIntersecting: boolean }[]) => void) {
      comeToEnd = () => tell([{ isIntersecting: true }]);
    }
    observe() {}
    disconnect() {}
  }
  vi.stubGlobal('IntersectionObserver', Watch);
});
afterEach(() => {
  vi.unstubAllGlobals();
});

function open() {
  const sent: unknown[] = [];
  let isUnfinished = true;
  answerFetch((path, body) => {
    sent.push([path, body]);
    return isUnfinished
      ? Response.json({ status: 409, code: 'lesson-unfinished', detail: '' }, { status: 409 })
      : Response.json({ ...lesson.progress, state: 'read', position: 1 });
  });
  const client = new QueryClient();
  const at = (done: number) => (
    <QueryClientProvider client={client}>
      <LessonEnd lesson={lesson} done={done} />
    </QueryClientProvider>
  );
  const { rerender } = render(at(0));
  return {
    sent,
    finish: (done: number) => {
      isUnfinished = done < 2;
      rerender(at(done));
    },
  };
}

test('nothing is marked before the end of the lesson was seen', async () => {
  const { sent } = open();
  expect(screen.getByText(/once you have come to its end/)).toBeVisible();
  expect(sent).toEqual([]);
});

test('at the end the open checkpoints are counted; once all are done the lesson is sent as read', async () => {
  const { sent, finish } = open();
  act(() => comeToEnd());
  expect(await screen.findByText(/^2 checkpoints are still open/)).toBeVisible();
  finish(1);
  expect(await screen.findByText(/^1 checkpoint is still open/)).toBeVisible();
  finish(2);
  await waitFor(() => expect(screen.queryByText(/still open/)).toBeNull());
  expect(sent).toHaveLength(3);
  expect(sent[2]).toEqual(['/api/lessons/rectangles/progress', { position: 1, state: 'read' }]);
});

test('the sources and the day of the last revision stand at the foot; without any it says so', () => {
  const sources = [{ title: 'Measuring a site', publisher: 'An extension service', year: 2019 }];
  const { rerender } = render(<LessonSources front={{ sources, revised: '2026-12-01' }} />);
  expect(screen.getByText('Measuring a site, An extension service, 2019')).toBeVisible();
  expect(screen.getByText('Revised December 1, 2026.')).toBeVisible();
  rerender(<LessonSources front={{}} />);
  expect(screen.getByText('Common practice, no source.')).toBeVisible();
});
