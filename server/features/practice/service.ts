import { v7 as uuidv7 } from 'uuid';
import type { AnswerReply, ProblemView } from '../../../shared/contracts/practice.ts';
import { AppError } from '../../../shared/errors.ts';
import type { Context, Locale, PartKey, Tier, Topic } from '../../../shared/vocabulary.ts';
import { partOf, type Problem } from '../../problems/engine.ts';
import type { Part } from '../../problems/family.ts';
import { earnsMark, gradePart, isUnreadable, type Graded, type Response } from '../../problems/grade.ts';
import { familyByKey } from '../../problems/registry.ts';
import { blankMessage, unreadableMessages } from '../../problems/verdict-messages.ts';
import { dayIn, noLevels, withAnswer, type PersonLevels } from './levels.ts';
import { partViews, problemView, type Place } from './present.ts';
import { problemCache, randomSeed } from './problem-cache.ts';
import { earlierFor, isDone, replay, take, type LoggedAnswer, type Standing } from './replay.ts';
import type { AnswerWrite, Loaded, PracticeRepo, RecordWrite } from './repo.ts';

/** Who is working: the person and the language they read. */
export interface Worker {
  id: string;
  language: Locale;
}

/** Where a new problem belongs. */
export interface NewPlace {
  context: Context;
  drillId?: string;
  position?: number;
  lesson?: string;
  checkpoint?: string;
}

export interface PracticeDeps {
  repo: PracticeRepo;
  /** IANA zone in which days are counted. */
  zone: string;
  now: () => Date;
  /** Makes time-ordered identifiers; the demonstration's history makes them for its own times. */
  newId?: () => string;
}

/** The rows one press of Check adds to the log. */
interface Addition {
  part: Part;
  graded: Graded;
  response: Response | null;
  key: string;
  seconds: number;
}

const mostTries = 8;

function choicesOf(part: Part): number {
  return part.kind === 'choice' ? part.options.length : 0;
}

function placeOf(loaded: Loaded): Place {
  const { id, hints, drillId, position, drillLength } = loaded.problem;
  const drill =
    drillId !== null && position !== null && drillLength !== null
      ? { id: drillId, position, length: drillLength }
      : null;
  return { id, hints, drill };
}

function levelsOf(loaded: Loaded): PersonLevels {
  if (!loaded.ability) return noLevels();
  const { mean, variance } = loaded.ability;
  return { ability: { mean, variance }, topics: new Map(loaded.topics.map((row) => [row.topic, row])) };
}

function rowOf(addition: Addition, standing: Standing): LoggedAnswer {
  const before = standing.attempts.get(addition.part.key)?.length ?? 0;
  return {
    part: addition.part.key,
    response: addition.response,
    read: addition.graded.read.en,
    value: addition.graded.value?.value.toFraction() ?? null,
    verdict: addition.graded.verdict,
    slip: addition.graded.slip,
    attempt: before + 1,
    isFirst: before === 0,
    key: addition.key,
  };
}

function answerWrite(options: { id: string; row: LoggedAnswer; addition: Addition; hints: number }): AnswerWrite {
  const { id, row, addition, hints } = options;
  return {
    id,
    part: row.part,
    topic: addition.part.topic,
    response: row.response,
    read: row.read,
    value: row.value,
    verdict: row.verdict,
    slip: row.slip,
    attempt: row.attempt,
    is_first: row.isFirst,
    hints,
    choices: choicesOf(addition.part),
    seconds: addition.seconds,
    key: row.key,
  };
}

export function practiceService({ repo, zone, now, newId = () => uuidv7() }: PracticeDeps) {
  const problems = problemCache();

  async function open(
    worker: Worker,
    problemId: string,
  ): Promise<{ loaded: Loaded; problem: Problem; standing: Standing }> {
    const loaded = await repo.load(worker.id, problemId, problems.topicsOf(problemId));
    if (!loaded) throw new AppError('not-found');
    const problem = problems.get(loaded.problem);
    problems.remember(problemId, problem);
    return { loaded, problem, standing: replay(problem, loaded.answers, worker.language) };
  }

  /** Takes additions into the standing and makes the one write that records them all. */
  function writeFor(options: {
    worker: Worker;
    loaded: Loaded;
    problem: Problem;
    standing: Standing;
    additions: readonly Addition[];
  }): { write: RecordWrite; levels: PersonLevels } {
    const { worker, loaded, problem, standing, additions } = options;
    const { id, family, version, tier, context, hints } = loaded.problem;
    const at = now();
    const day = dayIn(zone, at);
    let levels = levelsOf(loaded);
    const touched = new Set<Topic>();
    const write: RecordWrite = {
      userId: worker.id,
      sequence: loaded.ability?.sequence ?? 0,
      ability: levels.ability,
      problem: { id, family, version, tier, context },
      answers: [],
      topics: [],
      slips: [],
      day: { day, answered: 0, right: 0, seconds: 0 },
      closed: false,
      at,
    };
    for (const addition of additions) {
      const row = rowOf(addition, standing);
      write.answers.push(answerWrite({ id: newId(), row, addition, hints }));
      write.day.seconds += addition.seconds;
      if (row.isFirst) {
        const right = earnsMark(row.verdict);
        const { topic } = addition.part;
        levels = withAnswer(levels, { topic, tier, right, hints, choices: choicesOf(addition.part), at, day });
        touched.add(topic);
        write.day.answered += 1;
        if (right) write.day.right += 1;
        if (row.slip !== null) write.slips.push({ topic, family, slip: row.slip });
      }
      take(standing, { row, graded: addition.graded });
    }
    write.ability = levels.ability;
    write.closed = isDone(problem, standing);
    write.topics = [...touched].flatMap((topic) => {
      const row = levels.topics.get(topic);
      if (!row) return [];
      const { lastDay, lastAt: _at, reachedAt, ...rest } = row;
      return [{ ...rest, last_day: lastDay, reached_at: reachedAt }];
    });
    return { write, levels };
  }

  /**
   * Reads, decides and records; reads again when another answer of the same person came in between.
   * `decide` returns null when there is nothing to record.
   */
  async function recording(
    worker: Worker,
    problemId: string,
    decide: (at: { loaded: Loaded; problem: Problem; standing: Standing }) => readonly Addition[] | null,
  ): Promise<{ loaded: Loaded; problem: Problem; standing: Standing; levels: PersonLevels | null }> {
    for (let attempt = 0; attempt < mostTries; attempt += 1) {
      const at = await open(worker, problemId);
      const additions = decide(at);
      if (!additions || additions.length === 0) return { ...at, levels: null };
      if (!at.loaded.ability) {
        await repo.ensureAbility(worker.id, noLevels().ability);
        continue;
      }
      const { write, levels } = writeFor({ worker, ...at, additions });
      if (await repo.record(write)) return { ...at, levels };
    }
    throw new AppError('busy');
  }

  async function create(worker: Worker, choice: { family: string; tier: Tier }, place: NewPlace): Promise<string> {
    const family = familyByKey(choice.family);
    if (!family || !family.tiers.includes(choice.tier)) throw new AppError('not-found');
    const id = newId();
    const { version } = family;
    const seed = randomSeed();
    problems.get({ family: family.key, version, seed, tier: choice.tier });
    await repo.create({
      userId: worker.id,
      id,
      family: family.key,
      version,
      seed,
      tier: choice.tier,
      shownAt: now(),
      ...place,
    });
    return id;
  }

  async function view(worker: Worker, problemId: string): Promise<ProblemView> {
    const { loaded, problem, standing } = await open(worker, problemId);
    return problemView({ problem, standing, place: placeOf(loaded), locale: worker.language });
  }

  return {
    create,
    view,

    /** Grades one answer and records it once, however often it is sent with the same key. */
    async answer(
      worker: Worker,
      target: { problemId: string; part: PartKey },
      sent: { key: string; response: Response; seconds: number },
    ): Promise<Omit<AnswerReply, 'level'> & { levels: PersonLevels | null; topic: Topic }> {
      let unreadable: AnswerReply['unreadable'] = null;
      let topic: Topic | null = null;
      const result = await recording(worker, target.problemId, ({ loaded, problem, standing }) => {
        const part = partOf(problem, target.part);
        if (!part) throw new AppError('not-found');
        topic = part.topic;
        const known = loaded.answers.find((row) => row.key === sent.key);
        if (known) {
          if (known.part !== part.key) throw new AppError('key-reused');
          return null;
        }
        if (standing.closed.has(part.key)) throw new AppError('part-closed');
        const skipped = problem.parts.some((one) => one.key < part.key && !standing.attempts.has(one.key));
        if (skipped) throw new AppError('out-of-turn');
        const earlier = earlierFor(standing, part.key);
        const graded = gradePart({
          problem,
          part: part.key,
          response: sent.response,
          earlier,
          locale: worker.language,
        });
        if (isUnreadable(graded)) {
          unreadable = { code: graded.unreadable, message: unreadableMessages[graded.unreadable][worker.language] };
          return null;
        }
        return [{ part, graded, response: sent.response, key: sent.key, seconds: sent.seconds }];
      });
      if (!topic) throw new AppError('not-found');
      const { problem, standing, loaded, levels } = result;
      const parts = partViews({ problem, standing, place: placeOf(loaded), locale: worker.language });
      return { unreadable, parts, state: isDone(problem, standing) ? 'done' : 'open', levels, topic };
    },

    /** Shows the next hint; asking again for one already shown changes nothing. */
    async hint(worker: Worker, problemId: string, number: number): Promise<ProblemView> {
      const { loaded } = await open(worker, problemId);
      if (number > loaded.problem.hints + 1) throw new AppError('out-of-turn');
      await repo.showHints(worker.id, problemId, number);
      return view(worker, problemId);
    },

    /** Gives the problem up: parts never answered count as wrong, every part closes, the worked solution is shown. */
    async giveUp(worker: Worker, problemId: string): Promise<ProblemView> {
      const { loaded, problem, standing } = await recording(worker, problemId, (at) =>
        at.problem.parts
          .filter((part) => !at.standing.closed.has(part.key))
          .map((part) => ({
            part,
            graded: { verdict: 'blank', slip: null, read: { en: '', es: '' }, value: null, message: blankMessage },
            response: null,
            key: newId(),
            seconds: 0,
          })),
      );
      return problemView({ problem, standing, place: placeOf(loaded), locale: worker.language });
    },

    /** A fresh problem of the same family and tier, on its own. */
    async another(worker: Worker, problemId: string): Promise<ProblemView> {
      const row = await repo.find(worker.id, problemId);
      if (!row) throw new AppError('not-found');
      return view(worker, await create(worker, { family: row.family, tier: row.tier }, { context: 'single' }));
    },

    /** The checkpoint's problem: the latest one, or a new one when there is none or a fresh one is asked for. */
    async checkpoint(
      worker: Worker,
      at: { lesson: string; checkpoint: string },
      wanted: { family: string; tier: Tier; fresh: boolean },
    ): Promise<ProblemView> {
      const latest = wanted.fresh ? null : await repo.latestCheckpoint(worker.id, at.lesson, at.checkpoint);
      const id =
        latest?.family === wanted.family ? latest.id : await create(worker, wanted, { context: 'checkpoint', ...at });
      return view(worker, id);
    },

    closedCheckpoints: (userId: string, lesson: string) => repo.closedCheckpoints(userId, lesson),
  };
}
export type PracticeService = ReturnType<typeof practiceService>;
