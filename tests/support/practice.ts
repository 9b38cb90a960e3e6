import { randomUUID } from 'node:crypto';
import type { AnswerReply, DrillView, ProblemView } from '../../shared/contracts/practice.ts';
import type { PartKey, Topic } from '../../shared/vocabulary.ts';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { generate, type Problem } from '../../server/problems/engine.ts';
import type { Response } from '../../server/problems/grade.ts';
import { familyVersion } from '../../server/problems/registry.ts';
import type { Database } from '../../server/db/client.ts';
import { problem as problemTable } from '../../server/db/schema/practice.ts';
import { and, eq } from 'drizzle-orm';
import type { TestClient } from './start-app.ts';

/** Starts a drill and shows its first problem. */
export async function startDrill(client: TestClient, topics: Topic[], tier: 1 | 2 | 3 | 'rising' = 2) {
  const made = await client.post('/api/drills', { topics, tier, length: 5 });
  if (made.status !== 201) throw new Error(`A drill gave ${made.status}: ${made.text}`);
  const drill = made.body as DrillView;
  return { drill, shown: await nextProblem(client, drill.id) };
}

export async function nextProblem(client: TestClient, drillId: string): Promise<ProblemView> {
  const reply = await client.post(`/api/drills/${drillId}/next`);
  if (reply.status !== 200) throw new Error(`The next problem gave ${reply.status}: ${reply.text}`);
  return reply.body as ProblemView;
}

/** What the server alone knows of a shown problem: the problem itself, with its answers. */
export async function secretProblem(database: Database, userId: string, id: string): Promise<Problem> {
  const [row] = await database.db
    .select()
    .from(problemTable)
    .where(and(eq(problemTable.userId, userId), eq(problemTable.id, id)));
  const family = row && familyVersion(row.family, row.version);
  if (!row || !family) throw new Error(`There is no problem ${id}.`);
  return generate(family, { seed: row.seed, tier: row.tier });
}

export function rightResponse(problem: Problem, key: PartKey): Response {
  const part = problem.parts.find((one) => one.key === key);
  if (!part) throw new Error(`There is no part ${key}.`);
  if (part.kind === 'choice') return { kind: 'choice', option: part.options.find((option) => option.right)?.key ?? '' };
  if (part.kind === 'order') return { kind: 'order', steps: part.steps.map((step) => step.key) };
  return { kind: 'number', text: roundedAnswer(part).en };
}

export function send(
  client: TestClient,
  at: { id: string; part: PartKey; response: Response; key?: string; seconds?: number },
) {
  const { id, part, response, key = randomUUID(), seconds = 12 } = at;
  return client.post(`/api/problems/${id}/parts/${part}/answers`, { key, response, seconds });
}

export function replyOf(response: { body: unknown }): AnswerReply {
  return response.body as AnswerReply;
}
