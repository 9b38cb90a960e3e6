import { spawn } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { v7 as uuidv7 } from 'uuid';
import { openDatabase, type Database } from '../../server/db/client.ts';
import { problem as problemTable } from '../../server/db/schema/practice.ts';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { generate } from '../../server/problems/engine.ts';
import type { Part } from '../../server/problems/family.ts';
import type { Response } from '../../server/problems/grade.ts';
import { families } from '../../server/problems/registry.ts';
import { projectRoot } from '../../server/project-root.ts';
import { createPerson } from '../demo/create-person.ts';
import { median, type BenchFigure } from './figure.ts';
import { throughput, type LoadRequest } from './load.ts';

const people = 20;
const rounds = 5;
/** Answers of one person in one round; all their problems together stay in the server's memory, as those in hand do. */
const answersARound = 100;
const bareARound = 250;
const problemsEach = 6 * answersARound;
const leastRatio = 0.25;
const password = 'a password of the benchmark';

function rightResponse(part: Part): Response {
  if (part.kind === 'choice') return { kind: 'choice', option: part.options.find((option) => option.right)?.key ?? '' };
  if (part.kind === 'order') return { kind: 'order', steps: part.steps.map((step) => step.key) };
  return { kind: 'number', text: roundedAnswer(part).en };
}

/** Problems put before one person, and the requests that answer their first parts: two of three right. */
async function prepare(database: Database, userId: string, person: number): Promise<Omit<LoadRequest, 'cookie'>[]> {
  const rows: (typeof problemTable.$inferInsert)[] = [];
  const requests: Omit<LoadRequest, 'cookie'>[] = [];
  const kinds = families.flatMap((family) => family.tiers.map((tier) => ({ family, tier })));
  for (let index = 0; index < problemsEach; index += 1) {
    const { family, tier } = kinds[(index * 7 + person) % kinds.length] as (typeof kinds)[number];
    const seed = `bench-${person}-${index}`;
    const id = uuidv7();
    const part = generate(family, { seed, tier }).parts[0] as Part;
    const response =
      index % 3 === 2 && part.kind === 'number' ? { kind: 'number', text: '123456' } : rightResponse(part);
    rows.push({ userId, id, family: family.key, version: family.version, seed, tier, context: 'single' });
    requests.push({
      path: `/api/problems/${id}/parts/${part.key}/answers`,
      body: JSON.stringify({ key: randomUUID(), response, seconds: 30 }),
    });
  }
  for (let from = 0; from < rows.length; from += 500)
    await database.db.insert(problemTable).values(rows.slice(from, from + 500));
  return requests;
}

async function signIn(port: number, email: string): Promise<string> {
  const reply = await fetch(`http://127.0.0.1:${port}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: `http://127.0.0.1:${port}` },
    body: JSON.stringify({ email, password }),
  });
  if (!reply.ok) throw new Error(`signing in answered ${reply.status}: ${await reply.text()}`);
  return reply.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}

/** The request that shows the problem an answer belongs to. */
function looking({ path, cookie }: LoadRequest): LoadRequest {
  return { path: path.replace(/\/parts\/.*/, ''), cookie };
}

async function startServer(databaseUrl: string, port: number) {
  const child = spawn(process.execPath, ['--import', 'tsx', 'scripts/bench/answer-server.ts', String(port)], {
    cwd: projectRoot,
    stdio: ['ignore', 'pipe', 'inherit'],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      DATABASE_URL: databaseUrl,
      PORT: String(port),
      APP_URL: `http://127.0.0.1:${port}`,
      AUTH_SECRET: 'a secret of the benchmark, long enough',
      SMTP_URL: 'smtp://127.0.0.1:9',
      MAIL_FROM: 'Tankmark <office@example.test>',
    },
  });
  await once(child.stdout, 'data');
  return child;
}

/** A graded answer over HTTP against a bare route that does one INSERT, in one run and one Express. */
export async function benchAnswer(options: {
  databaseUrl: string;
  port: number;
  verbose: boolean;
}): Promise<BenchFigure[]> {
  const { databaseUrl, port, verbose } = options;
  const server = await startServer(databaseUrl, port);
  const database = openDatabase({ url: databaseUrl, connections: 4, onIdleError: () => undefined });
  try {
    const lanes: LoadRequest[][] = [];
    for (let person = 0; person < people; person += 1) {
      const email = `bench-${randomUUID()}@example.test`;
      const userId = await createPerson(database.db, {
        name: 'Bench',
        email,
        password,
        language: 'en',
        roles: ['trainee'],
      });
      const requests = await prepare(database, userId, person);
      const cookie = await signIn(port, email);
      lanes.push(requests.map((request) => ({ ...request, cookie })));
    }
    const bareLanes = (path: string) => {
      const lane = Array.from({ length: bareARound }, () => ({ path, body: '{"typed":"2.4 fl oz"}' }));
      return lanes.map(() => lane);
    };
    const ratios: number[] = [];
    const ratiosToEmpty: number[] = [];
    const answers: number[] = [];
    for (let round = 0; round <= rounds; round += 1) {
      const own = lanes.map((lane) => lane.slice(round * answersARound, (round + 1) * answersARound));
      // A problem is looked at before it is answered; looking is not what is measured.
      await throughput(
        port,
        own.map((lane) => lane.map(looking)),
      );
      const bare = await throughput(port, bareLanes('/api/bare'));
      const empty = await throughput(port, bareLanes('/empty'));
      const answered = await throughput(port, own);
      if (verbose)
        console.log(
          `  round ${round}: bare ${bare.toFixed(0)}/s, graded answers ${answered.toFixed(0)}/s, ratio ${(answered / bare).toFixed(3)}`,
        );
      // The first round warms both up and fills the tables; then the planner is told, as autovacuum does within a minute.
      if (round === 0) await database.pool.query('analyze');
      else {
        ratios.push(answered / bare);
        ratiosToEmpty.push(answered / empty);
        answers.push(answered);
      }
    }
    return [
      {
        name: 'answer',
        figure: median(ratios),
        unit: 'of a bare INSERT route in the same Express',
        bar: leastRatio,
        atLeast: true,
      },
      {
        name: 'answer-to-empty-express',
        figure: median(ratiosToEmpty),
        unit: 'of the same route in an empty Express (no bar)',
        bar: 0,
        atLeast: true,
      },
      { name: 'answer-throughput', figure: median(answers), unit: 'answers/s (no bar)', bar: 0, atLeast: true },
    ];
  } finally {
    server.kill('SIGTERM');
    await once(server, 'exit');
    await database.close();
  }
}
