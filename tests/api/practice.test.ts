import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { ability, answer, slipCount, topicLevel } from '../../server/db/schema/practice.ts';
import type { LevelView, ProblemView, ProgressView } from '../../shared/contracts/practice.ts';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { partsGivenEarlier } from '../../server/problems/engine.ts';
import type { NumberPart } from '../../server/problems/family.ts';
import type { PartKey } from '../../shared/vocabulary.ts';
import { signedInPerson, type SignedIn } from '../support/factories.ts';
import { nextProblem, replyOf, rightResponse, secretProblem, send, startDrill } from '../support/practice.ts';
import { startApp, type TestApp, type TestClient } from '../support/start-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startApp();
});
afterAll(() => app.close());

async function trainee(): Promise<{ person: SignedIn; client: TestClient }> {
  const person = await signedInPerson(app);
  return { person, client: app.as(person.cookie) };
}
const rowsOf = (userId: string) =>
  app.database.db.select().from(answer).where(eq(answer.userId, userId)).orderBy(answer.id);

describe('working a problem', () => {
  test('a slip is named, a retry is recorded but does not count, and the level moves once', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 1);
    const problem = await secretProblem(app.database, person.id, shown.id);
    const slip = problem.slips[0];
    if (!slip) throw new Error('a tier-1 area problem without slips');
    const wrong = replyOf(
      await send(client, {
        id: shown.id,
        part: slip.part,
        response: { kind: 'number', text: slip.value.toFraction() },
      }),
    );
    const attempt = wrong.parts[0]?.attempts[0];
    expect(attempt).toMatchObject({ verdict: 'slip', slip: slip.key, counts: true });
    expect(attempt?.headline).not.toBe('');
    expect(wrong.level).toMatchObject({ topic: 'area', answers: 1, state: 'not-started', fill: null });
    const before = await app.database.db.select().from(ability).where(eq(ability.userId, person.id));

    const right = replyOf(
      await send(client, { id: shown.id, part: slip.part, response: rightResponse(problem, slip.part) }),
    );
    expect(right.parts[0]?.attempts[1]).toMatchObject({ verdict: 'right', counts: false });
    expect(right.state).toBe('done');
    const done = (await client.get(`/api/problems/${shown.id}`)).body as ProblemView;
    expect(done.working?.length).toBeGreaterThan(0);
    const after = await app.database.db.select().from(ability).where(eq(ability.userId, person.id));
    expect(after[0]).toMatchObject({ mean: before[0]?.mean, variance: before[0]?.variance });
    expect((await rowsOf(person.id)).map((row) => [row.verdict, row.isFirst, row.attempt])).toEqual([
      ['slip', true, 1],
      ['right', false, 2],
    ]);
    const slips = await app.database.db.select().from(slipCount).where(eq(slipCount.userId, person.id));
    expect(slips).toMatchObject([{ slip: slip.key, times: 1 }]);
  });

  test('the same press sent five times at once is one record, and every reply shows it', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 1);
    const problem = await secretProblem(app.database, person.id, shown.id);
    const key = randomUUID();
    const response = rightResponse(problem, 'a');
    const replies = await Promise.all(
      Array.from({ length: 5 }, () => send(client, { id: shown.id, part: 'a', response, key })),
    );
    expect(replies.map((reply) => reply.status)).toEqual([200, 200, 200, 200, 200]);
    for (const reply of replies) expect(replyOf(reply).parts[0]?.attempts).toHaveLength(1);
    expect(await rowsOf(person.id)).toHaveLength(1);
    const levels = await app.database.db.select().from(topicLevel).where(eq(topicLevel.userId, person.id));
    expect(levels).toMatchObject([{ topic: 'area', answers: 1, right: 1 }]);
  });

  test('five different presses at once on one part: one is first, none is lost', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 1);
    const texts = ['1', '2', '3', '4', '5'];
    const replies = await Promise.all(
      texts.map((text) => send(client, { id: shown.id, part: 'a', response: { kind: 'number', text } })),
    );
    expect(replies.map((reply) => reply.status)).toEqual([200, 200, 200, 200, 200]);
    const rows = await rowsOf(person.id);
    expect(rows.map((row) => row.attempt).sort((a, b) => a - b)).toEqual([1, 2, 3, 4, 5]);
    expect(rows.filter((row) => row.isFirst)).toHaveLength(1);
  });

  test('an entry that cannot be read gets the reason and is no attempt', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 1);
    for (const [text, code] of [
      ['', 'empty'],
      ['abc', 'no-number'],
      ['3/0', 'zero-denominator'],
      ['1 2', 'two-numbers'],
    ] as const) {
      const reply = replyOf(await send(client, { id: shown.id, part: 'a', response: { kind: 'number', text } }));
      expect(reply.unreadable).toMatchObject({ code });
      expect(reply.unreadable?.message).not.toBe('');
      expect(reply.level).toBeNull();
      expect(reply.parts[0]?.attempts).toEqual([]);
    }
    expect(await rowsOf(person.id)).toEqual([]);
  });

  test('hints come in order, are counted, and weaken what a right answer proves', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 1);
    expect((await client.post(`/api/problems/${shown.id}/parts/a/hints`, { number: 2 })).body).toMatchObject({
      code: 'out-of-turn',
    });
    for (const number of [1, 1, 2]) {
      const reply = await client.post(`/api/problems/${shown.id}/parts/a/hints`, { number });
      expect((reply.body as ProblemView).parts[0]?.hints.length).toBe(number);
    }
    const problem = await secretProblem(app.database, person.id, shown.id);
    await send(client, { id: shown.id, part: 'a', response: rightResponse(problem, 'a') });
    expect(await rowsOf(person.id)).toMatchObject([{ hints: 2, verdict: 'right' }]);
    const plain = await trainee();
    const other = await startDrill(plain.client, ['area'], 1);
    const secret = await secretProblem(app.database, plain.person.id, other.shown.id);
    await send(plain.client, { id: other.shown.id, part: 'a', response: rightResponse(secret, 'a') });
    const mean = async (userId: string) =>
      (await app.database.db.select().from(ability).where(eq(ability.userId, userId)))[0]?.mean ?? 0;
    expect(await mean(person.id)).toBeGreaterThan(0);
    expect(await mean(person.id)).toBeLessThan(await mean(plain.person.id));
  });

  test('showing the worked solution closes the open parts as not answered', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['rate'], 2);
    const reply = (await client.post(`/api/problems/${shown.id}/solution`)).body as ProblemView;
    expect(reply.state).toBe('done');
    expect(reply.working?.length).toBeGreaterThan(0);
    expect(reply.parts.every((part) => part.answerText !== null)).toBe(true);
    const rows = await rowsOf(person.id);
    expect(rows.length).toBe(shown.parts.length);
    expect(rows.every((row) => row.verdict === 'blank' && row.isFirst)).toBe(true);
    const again = await client.post(`/api/problems/${shown.id}/solution`);
    expect(again.status).toBe(200);
    expect(await rowsOf(person.id)).toHaveLength(rows.length);
    const late = await send(client, { id: shown.id, part: 'a', response: { kind: 'number', text: '5' } });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ code: 'part-closed' });
  });

  test('another like it has the same family and tier and other numbers', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['rate'], 2);
    const reply = await client.post(`/api/problems/${shown.id}/another`);
    expect(reply.status).toBe(201);
    const other = reply.body as ProblemView;
    const [one, two] = await Promise.all([shown.id, other.id].map((id) => secretProblem(app.database, person.id, id)));
    expect(two?.key).toMatchObject({ family: one?.key.family, tier: one?.key.tier });
    expect(two?.key.seed).not.toBe(one?.key.seed);
  });

  test('levels and progress tell what was done', async () => {
    const { person, client } = await trainee();
    const { drill } = await startDrill(client, ['area'], 1);
    for (let place = 1; place <= 5; place += 1) {
      const shown = await nextProblem(client, drill.id);
      expect(shown.drill).toEqual({ id: drill.id, position: place, length: 5 });
      const problem = await secretProblem(app.database, person.id, shown.id);
      for (const part of shown.parts)
        await send(client, { id: shown.id, part: part.key, response: rightResponse(problem, part.key) });
    }
    expect((await client.post(`/api/drills/${drill.id}/next`)).body).toMatchObject({ code: 'drill-done' });
    const levels = (await client.get('/api/levels')).body as LevelView[];
    expect(levels).toHaveLength(18);
    const area = levels.find((level) => level.topic === 'area');
    expect(area).toMatchObject({ state: 'filling', tiers: [1, 2, 3] });
    expect(area?.fill).toBeGreaterThan(0.6);
    expect(levels.find((level) => level.topic === 'law')).toMatchObject({
      state: 'not-started',
      fill: null,
      tiers: [],
    });
    const progress = (await client.get('/api/progress')).body as ProgressView;
    expect(progress).toMatchObject({ answered: 5, right: 5, slips: [] });
    expect(progress.days).toHaveLength(1);
    expect(progress.seconds).toBe(60);
  });
});

describe('parts in their order', () => {
  test('a later part waits for the first; going on closes the one before, and the own wrong answer is carried', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['rate'], 2);
    const problem = await secretProblem(app.database, person.id, shown.id);
    const early = await send(client, { id: shown.id, part: 'b', response: rightResponse(problem, 'b') });
    expect(early.status).toBe(409);
    expect(early.body).toMatchObject({ code: 'out-of-turn' });
    expect(await rowsOf(person.id)).toEqual([]);
    const slip = problem.slips.find((live) => live.part === 'a');
    if (!slip) throw new Error('no slip in part a');
    await send(client, { id: shown.id, part: 'a', response: { kind: 'number', text: slip.value.toFraction() } });
    const own = partsGivenEarlier(problem, {
      a: { value: slip.value, unit: (problem.parts[0] as NumberPart).answer.unit },
    })[1] as NumberPart;
    const response = { kind: 'number' as const, text: roundedAnswer(own).en };
    const reply = replyOf(await send(client, { id: shown.id, part: 'b', response }));
    expect(reply.parts[1]?.attempts).toMatchObject([{ verdict: 'carried' }]);
    expect(reply.parts[0]).toMatchObject({
      state: 'closed',
      answerText: roundedAnswer(problem.parts[0] as NumberPart).en,
    });
    const late = await send(client, { id: shown.id, part: 'a', response: rightResponse(problem, 'a') });
    expect(late.body).toMatchObject({ code: 'part-closed' });
  });
});

describe('what never leaves', () => {
  test('before a part is closed the reply holds no answer, slip, seed, family or reason', async () => {
    const { person, client } = await trainee();
    for (const topic of ['area', 'rate', 'units'] as const) {
      const { shown } = await startDrill(client, [topic], 2);
      const problem = await secretProblem(app.database, person.id, shown.id);
      const text = JSON.stringify(shown);
      expect(text).not.toContain(problem.key.seed);
      expect(text).not.toContain(problem.key.family);
      for (const live of problem.slips) expect(text).not.toContain(live.key);
      for (const part of shown.parts) expect(part).toMatchObject({ answerText: null, state: 'open', attempts: [] });
      expect(shown.working).toBeNull();
    }
  });
  test('after a slip in the first part, the answers of all parts are still kept back', async () => {
    const { person, client } = await trainee();
    const { shown } = await startDrill(client, ['area'], 2);
    const problem = await secretProblem(app.database, person.id, shown.id);
    const slip = problem.slips.find((live) => live.part === 'a');
    if (!slip) throw new Error('no slip in part a');
    const reply = await send(client, {
      id: shown.id,
      part: 'a',
      response: { kind: 'number', text: slip.value.toFraction() },
    });
    const right = rightResponse(problem, 'a');
    if (right.kind !== 'number') throw new Error('an area is a number');
    expect(reply.text).not.toContain(right.text);
    expect(reply.text).not.toContain(problem.key.seed);
  });
});

describe('bad requests', () => {
  const own = async () => {
    const { person, client } = await trainee();
    const { shown, drill } = await startDrill(client, ['area'], 1);
    return { person, client, shown, drill };
  };
  test("another person's problem and drill are not there", async () => {
    const { shown, drill } = await own();
    const { client } = await trainee();
    const body = { key: randomUUID(), response: { kind: 'number', text: '1' } };
    for (const reply of [
      await client.get(`/api/problems/${shown.id}`),
      await client.post(`/api/problems/${shown.id}/parts/a/answers`, body),
      await client.post(`/api/problems/${shown.id}/parts/a/hints`, { number: 1 }),
      await client.post(`/api/problems/${shown.id}/solution`),
      await client.post(`/api/problems/${shown.id}/another`),
      await client.get(`/api/drills/${drill.id}`),
      await client.post(`/api/drills/${drill.id}/next`),
    ]) {
      expect(reply.status).toBe(404);
      expect(reply.headers['content-type']).toContain('application/problem+json');
    }
  });
  test('visitors are asked to sign in', async () => {
    const { shown } = await own();
    expect((await app.as().get(`/api/problems/${shown.id}`)).status).toBe(401);
    expect((await app.as().post('/api/drills', { topics: ['area'], tier: 1, length: 5 })).status).toBe(401);
  });
  test.each([
    [{ key: 'x', response: { kind: 'number', text: '1' } }, 'key'],
    [{ response: { kind: 'number', text: '1' } }, 'key'],
    [{ key: randomUUID(), response: { kind: 'number', text: 'x'.repeat(201) } }, 'response.text'],
    [{ key: randomUUID(), response: { kind: 'essay', text: '1' } }, 'response.kind'],
    [{ key: randomUUID(), response: { kind: 'number', text: '1' }, seconds: -4 }, 'seconds'],
    [{ key: randomUUID() }, 'response'],
  ])('an answer like %j is refused and names the field %s', async (body, field) => {
    const { person, client, shown } = await own();
    const reply = await client.post(`/api/problems/${shown.id}/parts/a/answers`, body);
    expect(reply.status).toBe(422);
    expect((reply.body as { errors: { field: string }[] }).errors.map((error) => error.field)).toContain(field);
    expect(await rowsOf(person.id)).toEqual([]);
  });
  test.each([
    [{ topics: [], tier: 1, length: 5 }, 'topics'],
    [{ topics: ['gardening'], tier: 1, length: 5 }, 'topics.0'],
    [{ topics: ['area'], tier: 4, length: 5 }, 'tier'],
    [{ topics: ['area'], tier: 1, length: 7 }, 'length'],
  ])('a drill like %j is refused and names the field %s', async (body, field) => {
    const { client } = await own();
    const reply = await client.post('/api/drills', body);
    expect(reply.status).toBe(422);
    expect((reply.body as { errors: { field: string }[] }).errors.map((error) => error.field)).toContain(field);
  });
  test('a drill of topics without problems says so', async () => {
    const { client } = await own();
    expect((await client.post('/api/drills', { topics: ['law'], tier: 1, length: 5 })).body).toMatchObject({
      code: 'nothing-to-drill',
    });
  });
  test('a key of one part cannot be used for another problem', async () => {
    const { client, shown, drill } = await own();
    const key = randomUUID();
    await send(client, { id: shown.id, part: 'a', response: { kind: 'number', text: '1' }, key });
    await client.post(`/api/problems/${shown.id}/solution`);
    const next = await nextProblem(client, drill.id);
    const reply = await send(client, { id: next.id, part: 'a', response: { kind: 'number', text: '1' }, key });
    expect(reply.status).toBe(409);
    expect(reply.body).toMatchObject({ code: 'key-reused' });
  });
  test('unknown problems, parts, families and lessons are 404', async () => {
    const { client, shown } = await own();
    const body = { key: randomUUID(), response: { kind: 'number', text: '1' } };
    expect((await client.get('/api/problems/not-an-id')).status).toBe(404);
    expect((await client.post(`/api/problems/${shown.id}/parts/z/answers`, body)).status).toBe(404);
    expect((await client.post(`/api/problems/${shown.id}/parts/e/answers`, body)).status).toBe(404);
    const checkpoint = await client.post('/api/lessons/any/checkpoints/one', { family: 'no-such-family', tier: 1 });
    expect(checkpoint.status).toBe(404);
  });
});

describe('checkpoints, the sample and the proof sheet', () => {
  test('a checkpoint keeps its problem until a fresh one is asked for', async () => {
    const { client } = await trainee();
    const ask = (fresh: boolean) =>
      client.post('/api/lessons/rectangles/checkpoints/one', { family: 'area-rectangle', tier: 1, fresh });
    const first = (await ask(false)).body as ProblemView;
    expect(((await ask(false)).body as ProblemView).id).toBe(first.id);
    expect(((await ask(true)).body as ProblemView).id).not.toBe(first.id);
  });
  test('a visitor works the sample and is told the slip; nothing is kept', async () => {
    const visitor = app.as();
    const shown = (await visitor.get('/api/sample')).body as ProblemView;
    expect(shown.parts[0]?.answerText).toBeNull();
    const answered = await visitor.post('/api/sample/answers', {
      sample: shown.id,
      part: 'a' satisfies PartKey,
      response: { kind: 'number', text: '1' },
    });
    expect(answered.body).toMatchObject({ unreadable: null, attempt: { verdict: 'unrecognised' } });
    expect((await visitor.get('/api/sample?sample=other')).status).toBe(404);
  });
  test('the proof sheet is for staff only and shows answers, slips and options', async () => {
    const staff = app.as((await signedInPerson(app, { roles: ['staff'] })).cookie);
    const sheet = await staff.get('/api/staff/families/area-circle?tier=1&count=2');
    expect(sheet.status).toBe(200);
    expect(sheet.body).toMatchObject({ family: { key: 'area-circle' }, samples: [{ tier: 1 }, { tier: 1 }] });
    expect((await staff.get('/api/staff/families/no-such')).status).toBe(404);
    expect((await staff.get('/api/staff/families/area-circle?count=999')).status).toBe(400);
    const { client } = await trainee();
    expect((await client.get('/api/staff/families')).status).toBe(403);
    expect((await app.as().get('/api/staff/families')).status).toBe(401);
  });
});
