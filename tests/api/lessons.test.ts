import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 as uuidv7 } from 'uuid';
import type { LessonSummary } from '../../shared/contracts/lessons.ts';
import { problem } from '../../server/db/schema/practice.ts';
import { signedInPerson } from '../support/factories.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

function lessonText(title: string, options: { topic: string; checkpoints: string[] }): string {
  const tags = options.checkpoints.map((id) => `<Checkpoint family="area-circle" tier={1} id="${id}" />`);
  const front = [
    `title: ${title}`,
    `topic: ${options.topic}`,
    'minutes: 6',
    'objectives: [Measure a bed]',
    'families: [area-circle]',
    'sources: [{ title: A bulletin, publisher: An extension service, year: null }]',
    'revised: 2026-12-01',
  ];
  return ['---', ...front, '---', '', `# ${title}`, ...tags].join('\n');
}

let test: TestApp;
let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'tankmark-lessons-'));
  const files: [string, string][] = [
    ['en/units/01-spoons.mdx', lessonText('Spoons', { topic: 'units', checkpoints: [] })],
    ['en/area/02-circles.mdx', lessonText('Circles', { topic: 'area', checkpoints: ['round-bed', 'ring'] })],
    ['en/area/01-rectangles.mdx', lessonText('Rectangles', { topic: 'area', checkpoints: [] })],
    ['es/area/02-circles.mdx', lessonText('Círculos', { topic: 'area', checkpoints: ['round-bed', 'ring'] })],
    ['en/area/notes.txt', 'not a lesson'],
  ];
  for (const [path, text] of files) {
    const target = join(folder, 'lessons', path);
    await mkdir(join(target, '..'), { recursive: true });
    await writeFile(target, text);
  }
  test = await startApp({ contentFolder: folder });
});
afterAll(async () => {
  await test.close();
  await rm(folder, { recursive: true });
});

async function listFor(cookie?: string): Promise<LessonSummary[]> {
  return (await test.as(cookie).get('/api/lessons')).body as LessonSummary[];
}

describe('the list of lessons', () => {
  it('is open to visitors, in the order of the course, without progress', async () => {
    const list = await listFor();
    expect(list.map((lesson) => lesson.slug)).toEqual(['rectangles', 'circles', 'spoons']);
    expect(list[1]).toEqual({
      slug: 'circles',
      topic: 'area',
      number: 2,
      title: 'Circles',
      minutes: 6,
      objectives: ['Measure a bed'],
      families: ['area-circle'],
      checkpoints: ['round-bed', 'ring'],
      progress: null,
    });
  });

  it('is in the reader’s language where there is a translation', async () => {
    const { cookie } = await signedInPerson(test, { language: 'es' });
    expect((await listFor(cookie)).map((lesson) => lesson.title)).toEqual(['Rectangles', 'Círculos', 'Spoons']);
    const asked = await test.as().get('/api/lessons').set('Accept-Language', 'es-MX,es;q=0.9,en;q=0.5');
    expect((asked.body as LessonSummary[])[1]?.title).toBe('Círculos');
  });
});

describe('progress in a lesson', () => {
  const put = (cookie: string, slug: string, body: object) =>
    test.as(cookie).put(`/api/lessons/${slug}/progress`, body);

  it('is kept, each person’s own, and once read stays read', async () => {
    const [one, other] = [await signedInPerson(test), await signedInPerson(test)];
    const started = await put(one.cookie, 'spoons', { position: 0.25, state: 'reading' });
    expect(started.body).toMatchObject({ state: 'reading', position: 0.25, readAt: null });
    const read = await put(one.cookie, 'spoons', { position: 1, state: 'read' });
    expect(read.body).toMatchObject({ state: 'read', position: 1 });
    const later = await put(one.cookie, 'spoons', { position: 0.5, state: 'reading' });
    expect(later.body).toEqual({ ...(read.body as object), position: 0.5 });
    expect((await listFor(one.cookie))[2]?.progress).toEqual(later.body);
    expect((await listFor(other.cookie))[2]?.progress).toMatchObject({ state: 'not-started', position: 0 });
  });

  it('counts a lesson as read only once its checkpoints are done', async () => {
    const person = await signedInPerson(test);
    const done = (checkpoint: string) =>
      test.database.db.insert(problem).values({
        userId: person.id,
        id: uuidv7(),
        family: 'area-circle',
        version: 1,
        seed: 's',
        tier: 1,
        context: 'checkpoint',
        lesson: 'circles',
        checkpoint,
        closedAt: new Date(),
      });
    await done('ring');
    const early = await put(person.cookie, 'circles', { position: 1, state: 'read' });
    expect(early.body).toMatchObject({ status: 409, code: 'lesson-unfinished' });
    expect((await listFor(person.cookie))[1]?.progress?.state).toBe('not-started');
    await done('round-bed');
    const read = await put(person.cookie, 'circles', { position: 1, state: 'read' });
    expect(read.body).toMatchObject({ state: 'read' });
  });

  it.each([
    [{ position: 1.2, state: 'reading' }, ['position']],
    [{ position: 0.5, state: 'done' }, ['state']],
    [{ position: '0.5' }, ['position', 'state']],
  ])('refuses %j and writes nothing', async (body, fields) => {
    const person = await signedInPerson(test);
    const reply = await put(person.cookie, 'spoons', body);
    expect(reply.status).toBe(422);
    expect((reply.body as { errors: { field: string }[] }).errors.map((fault) => fault.field)).toEqual(fields);
    expect((await listFor(person.cookie))[2]?.progress?.state).toBe('not-started');
  });

  it('is 404 for a lesson that is not there, 401 for a visitor', async () => {
    const { cookie } = await signedInPerson(test);
    const body = { position: 0, state: 'reading' };
    expect((await put(cookie, 'no-such', body)).body).toMatchObject({ status: 404, code: 'not-found' });
    expect((await put(cookie, 'No%20Such', body)).body).toMatchObject({ status: 404, code: 'not-found' });
    const visitor = await test.as().put('/api/lessons/spoons/progress', body);
    expect(visitor.body).toMatchObject({ status: 401, code: 'not-signed-in' });
  });
});
