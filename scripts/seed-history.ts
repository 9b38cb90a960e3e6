import { v7 as uuidv7 } from 'uuid';
import { drillRepo } from '../server/features/drills/repo.ts';
import { drillService } from '../server/features/drills/service.ts';
import { practiceRepo } from '../server/features/practice/repo.ts';
import { practiceService, type PracticeService } from '../server/features/practice/service.ts';
import type { Database } from '../server/db/client.ts';
import { sigmoid } from '../server/learning/estimate.ts';
import { roundedAnswer } from '../server/problems/answer-text.ts';
import { generate, type Problem } from '../server/problems/engine.ts';
import type { Part } from '../server/problems/family.ts';
import type { Response } from '../server/problems/grade.ts';
import { families, familyVersion } from '../server/problems/registry.ts';
import { makeRng, type Rng } from '../server/problems/rng.ts';
import { formatQuantity } from '../shared/quantity/format.ts';
import { topics, type Locale, type Topic } from '../shared/vocabulary.ts';

// Twelve weeks of believable work for the demonstration's trainees: invented people with different strengths, simulated
// from a seed and worked through the product's own services, so that every figure shown follows from real records.

/** One demonstration trainee: how strong (logits), and what is hard for them. */
export interface HistoryPerson {
  id: string;
  language: Locale;
  /** Name of the seed; the same name gives the same history. */
  seed: string;
  /** Logits above (or below) an average newcomer at the start. */
  strength: number;
  weak: readonly Topic[];
  strong: readonly Topic[];
  /** Working days in the twelve weeks. */
  days: number;
}

const weeks = 12;
const msPerDay = 86_400_000;
const drillTopics = topics.filter((topic) => families.some((family) => family.topic === topic));
const tierCost = { 1: -0.7, 2: 0, 3: 0.9 } as const;
/** Logits gained over the twelve weeks. */
const gain = 1.4;

function chanceRight(options: { person: HistoryPerson; topic: Topic; tier: 1 | 2 | 3; share: number }): number {
  const { person, topic, tier, share } = options;
  const own = person.weak.includes(topic) ? -1.3 : person.strong.includes(topic) ? 1.1 : 0;
  return sigmoid(0.8 + person.strength + own + gain * share - tierCost[tier]);
}

function rightResponse(part: Part): Response {
  if (part.kind === 'choice') return { kind: 'choice', option: part.options.find((option) => option.right)?.key ?? '' };
  if (part.kind === 'order') return { kind: 'order', steps: part.steps.map((step) => step.key) };
  return { kind: 'number', text: roundedAnswer(part).en };
}

function wrongResponse(rng: Rng, problem: Problem, part: Part): Response {
  if (part.kind === 'choice')
    return { kind: 'choice', option: rng.pick(part.options.filter((option) => !option.right)).key };
  if (part.kind === 'order') {
    const [first, ...rest] = part.steps.map((step) => step.key);
    return { kind: 'order', steps: [...rest, first as string] };
  }
  const slips = problem.slips.filter((live) => live.part === part.key);
  if (slips.length === 0 || rng.chance(1, 6)) {
    return {
      kind: 'number',
      text: formatQuantity({ value: part.answer.value.mul('1.37'), unit: part.answer.unit }, { maxPlaces: 2 }),
    };
  }
  // People have habits: the first slip of a family is made more often than the last.
  const slip = rng.chance(1, 2) ? (slips[0] as (typeof slips)[number]) : rng.pick(slips);
  return { kind: 'number', text: formatQuantity({ value: slip.value, unit: part.answer.unit }, { maxPlaces: 4 }) };
}

interface Clock {
  at: number;
}

async function workProblem(options: {
  rng: Rng;
  practice: PracticeService;
  person: HistoryPerson;
  problemId: string;
  problem: Problem;
  clock: Clock;
  share: number;
}): Promise<void> {
  const { rng, practice, person, problemId, problem, clock, share } = options;
  const worker = { id: person.id, language: person.language };
  for (const part of problem.parts) {
    const chance = chanceRight({ person, topic: part.topic, tier: problem.key.tier, share });
    const right = rng.int(1, 1000) <= chance * 1000;
    if (!right && rng.chance(1, 5)) await practice.hint(worker, problemId, 1).catch(() => undefined);
    const seconds = rng.int(20, 140);
    clock.at += seconds * 1000;
    const response = right ? rightResponse(part) : wrongResponse(rng, problem, part);
    const target = { problemId, part: part.key };
    const reply = await practice.answer(worker, target, { key: uuidv7({ msecs: clock.at }), response, seconds });
    const open = reply.parts.find((one) => one.key === part.key)?.state === 'open';
    if (open && rng.chance(2, 3)) {
      clock.at += 30_000;
      await practice.answer(worker, target, {
        key: uuidv7({ msecs: clock.at }),
        response: rightResponse(part),
        seconds: 30,
      });
    }
  }
  const view = await practice.view(worker, problemId);
  if (view.state === 'open') await practice.giveUp(worker, problemId);
}

async function workDay(options: {
  rng: Rng;
  database: Database;
  zone: string;
  person: HistoryPerson;
  clock: Clock;
  share: number;
}) {
  const { rng, database, zone, person, clock, share } = options;
  const now = () => new Date(clock.at);
  const newId = () => uuidv7({ msecs: (clock.at += 1) });
  const repo = practiceRepo(database.db, database.pool);
  const practice = practiceService({ repo, zone, now, newId });
  const drills = drillService(drillRepo(database.db), practice);
  const worker = { id: person.id, language: person.language };
  const chosen = rng.sample(drillTopics, 2);
  const tier = share < 0.25 ? 1 : rng.pick([1, 2, 2, 'rising'] as const);
  const drill = await drills.create(worker, { topics: chosen, tier, length: 5 });
  const problems = rng.chance(1, 8) ? 3 : 5;
  for (let place = 0; place < problems; place += 1) {
    const shown = await drills.next(worker, drill.id);
    const row = await repo.find(person.id, shown.id);
    const family = row && familyVersion(row.family, row.version);
    if (!row || !family) throw new Error(`the demonstration's problem ${shown.id} is not there`);
    const problem = generate(family, { seed: row.seed, tier: row.tier });
    await workProblem({ rng, practice, person, problemId: shown.id, problem, clock, share });
  }
}

/** Writes one person's history, ending today. */
async function seedPerson(options: {
  database: Database;
  zone: string;
  person: HistoryPerson;
  today: Date;
}): Promise<void> {
  const { database, zone, person, today } = options;
  const rng = makeRng(`history/${person.seed}`);
  const span = weeks * 7;
  const days = rng
    .sample(
      Array.from({ length: span }, (_, index) => index + 1),
      person.days,
    )
    .sort((a, b) => b - a);
  for (const daysAgo of days) {
    const clock = { at: today.getTime() - daysAgo * msPerDay - rng.int(0, 4 * 3600) * 1000 };
    await workDay({ rng, database, zone, person, clock, share: 1 - daysAgo / span });
  }
}

/** Writes the history of the demonstration's trainees, a few people at a time. */
export async function seedHistory(options: {
  database: Database;
  zone: string;
  people: readonly HistoryPerson[];
  today: Date;
}): Promise<void> {
  const { people, ...rest } = options;
  const waiting = [...people];
  const lane = async () => {
    for (let person = waiting.shift(); person; person = waiting.shift()) await seedPerson({ ...rest, person });
  };
  await Promise.all(Array.from({ length: 4 }, lane));
}
