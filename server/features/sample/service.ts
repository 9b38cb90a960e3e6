import type { ProblemView, SampleReply } from '../../../shared/contracts/practice.ts';
import { AppError } from '../../../shared/errors.ts';
import type { Locale, PartKey, Tier } from '../../../shared/vocabulary.ts';
import { generate, partOf, type Problem } from '../../problems/engine.ts';
import { gradePart, isUnreadable, type Response } from '../../problems/grade.ts';
import { familyByKey } from '../../problems/registry.ts';
import { unreadableMessages } from '../../problems/verdict-messages.ts';
import { attemptView, problemView } from '../practice/present.ts';
import { newStanding } from '../practice/replay.ts';

/** The samples a visitor may work: a few fixed problems, so that nothing a visitor sends can reach another. */
const samples: readonly { id: string; family: string; seed: string; tier: Tier }[] = [
  { id: 'round-bed', family: 'area-circle', seed: 'welcome-1', tier: 1 },
  { id: 'back-lawn', family: 'area-rectangle-less', seed: 'welcome-1', tier: 1 },
  { id: 'label-rate', family: 'rate-per-1000', seed: 'welcome-1', tier: 1 },
];

function problemFor(id: string): Problem {
  const sample = samples.find((one) => one.id === id);
  const family = sample && familyByKey(sample.family);
  if (!sample || !family) throw new AppError('not-found');
  return generate(family, { seed: sample.seed, tier: sample.tier });
}

/** The visitor's sample problem. Nothing is stored: the reply to an answer is all there is. */
export function sampleService() {
  return {
    view(id: string, locale: Locale): ProblemView {
      const place = { id, hints: 0, drill: null };
      return problemView({ problem: problemFor(id), standing: newStanding(), place, locale });
    },

    answer(id: string, sent: { part: PartKey; response: Response }, locale: Locale): SampleReply {
      const problem = problemFor(id);
      if (!partOf(problem, sent.part)) throw new AppError('not-found');
      const graded = gradePart({ problem, part: sent.part, response: sent.response, earlier: {}, locale });
      if (isUnreadable(graded)) {
        return {
          unreadable: { code: graded.unreadable, message: unreadableMessages[graded.unreadable][locale] },
          attempt: null,
        };
      }
      const row = {
        part: sent.part,
        response: sent.response,
        read: graded.read.en,
        value: null,
        verdict: graded.verdict,
        slip: graded.slip,
        attempt: 1,
        isFirst: true,
        key: '',
      };
      return { unreadable: null, attempt: attemptView({ row, graded }, locale) };
    },
    ids: samples.map((sample) => sample.id),
  };
}
export type SampleService = ReturnType<typeof sampleService>;
