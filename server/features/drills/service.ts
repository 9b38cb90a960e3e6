import { v7 as uuidv7 } from 'uuid';
import type { DrillView, NewDrillBody, ProblemView } from '../../../shared/contracts/practice.ts';
import { AppError } from '../../../shared/errors.ts';
import { tiers, type Tier } from '../../../shared/vocabulary.ts';
import { families } from '../../problems/registry.ts';
import type { PracticeService, Worker } from '../practice/service.ts';
import { chooseProblem } from './choose.ts';
import type { DrillProblem, DrillRepo, DrillRow } from './repo.ts';

const recentCount = 10;

function tierOf(text: DrillRow['tier']): Tier | 'rising' {
  return tiers.find((tier) => String(tier) === text) ?? 'rising';
}

function outcomeOf(problem: DrillProblem): DrillView['places'][number]['outcome'] {
  if (!problem.closed) return 'open';
  if (problem.right === 0) return 'wrong';
  return problem.right === problem.answered ? 'right' : 'partly';
}

function drillView(row: DrillRow, problems: readonly DrillProblem[]): DrillView {
  const places = Array.from({ length: row.length }, (_, index): DrillView['places'][number] => {
    const found = problems.find((problem) => problem.position === index + 1);
    return { position: index + 1, problemId: found?.id ?? null, outcome: found ? outcomeOf(found) : 'waiting' };
  });
  const done = places.every((place) => place.outcome !== 'waiting' && place.outcome !== 'open');
  const open = places.find((place) => place.outcome === 'open');
  return {
    id: row.id,
    topics: row.topics,
    tier: tierOf(row.tier),
    length: row.length,
    state: done ? 'done' : 'open',
    places,
    currentProblemId: open?.problemId ?? null,
  };
}

export function drillService(repo: DrillRepo, practice: Pick<PracticeService, 'create' | 'view'>) {
  async function load(userId: string, id: string): Promise<{ row: DrillRow; problems: DrillProblem[] }> {
    const row = await repo.find(userId, id);
    if (!row) throw new AppError('not-found');
    return { row, problems: await repo.problems(userId, [id]) };
  }

  return {
    async create(worker: Worker, wanted: NewDrillBody): Promise<DrillView> {
      const topics = [...new Set(wanted.topics)];
      if (!topics.some((topic) => families.some((family) => family.topic === topic)))
        throw new AppError('nothing-to-drill');
      const id = uuidv7();
      const row = {
        userId: worker.id,
        id,
        topics,
        tier: String(wanted.tier) as DrillRow['tier'],
        length: wanted.length,
      };
      await repo.create(row);
      const saved = await load(worker.id, id);
      return drillView(saved.row, saved.problems);
    },

    async view(worker: Worker, id: string): Promise<DrillView> {
      const { row, problems } = await load(worker.id, id);
      return drillView(row, problems);
    },

    async recent(worker: Worker): Promise<DrillView[]> {
      const rows = await repo.recent(worker.id, recentCount);
      const problems = await repo.problems(
        worker.id,
        rows.map((row) => row.id),
      );
      return rows.map((row) =>
        drillView(
          row,
          problems.filter((problem) => problem.drillId === row.id),
        ),
      );
    },

    /** The drill's open problem, or the next one; two presses at once get the same problem. */
    async next(worker: Worker, id: string): Promise<ProblemView> {
      const { row, problems } = await load(worker.id, id);
      const open = problems.find((problem) => !problem.closed);
      if (open) return practice.view(worker, open.id);
      const position = problems.length + 1;
      if (position > row.length) throw new AppError('drill-done');
      const choice = chooseProblem({
        drillId: id,
        topics: row.topics,
        tier: tierOf(row.tier),
        length: row.length,
        position,
        before: problems.map((problem) => problem.family),
      });
      if (!choice) throw new AppError('nothing-to-drill');
      try {
        return await practice.view(
          worker,
          await practice.create(worker, choice, { context: 'drill', drillId: id, position }),
        );
      } catch (error) {
        // The place was taken by the same press sent twice: what stands there is the answer to both.
        const there = (await repo.problems(worker.id, [id])).find((problem) => problem.position === position);
        if (!there) throw error;
        return practice.view(worker, there.id);
      }
    },
  };
}
export type DrillService = ReturnType<typeof drillService>;
