import type { FamilySummary, ProofSample, ProofSheet } from '../../../shared/contracts/families.ts';
import type { Figure } from '../../../shared/contracts/figure.ts';
import { AppError } from '../../../shared/errors.ts';
import type { Locale, Tier } from '../../../shared/vocabulary.ts';
import { describe, type DescribedPart } from '../../problems/describe.ts';
import { generate } from '../../problems/engine.ts';
import type { Family } from '../../problems/family.ts';
import { labelView } from '../../problems/labels/label-view.ts';
import { localize } from '../../problems/localize.ts';
import { families, familyByKey } from '../../problems/registry.ts';
import { workingView } from '../practice/working-view.ts';

function summary(family: Family<unknown>, locale: Locale): FamilySummary {
  const { key, topic, version, tiers, title } = family;
  const slips = new Set(family.slips.map((slip) => slip.key)).size;
  return { key, topic, version, tiers: [...tiers], title: title[locale], slips };
}

function answerText(part: DescribedPart): string {
  if (typeof part.answer === 'string') return part.options.find((option) => option.right)?.text ?? part.answer;
  if (Array.isArray(part.answer)) return part.answer.join(' → ');
  return part.rounding?.text ?? `${part.answer.decimal} ${part.answer.unit}`.trim();
}

function sample(family: Family<unknown>, options: { seed: string; tier: Tier; locale: Locale }): ProofSample {
  const { seed, tier, locale } = options;
  const problem = generate(family, { seed, tier });
  const told = describe(problem, locale);
  const use = family.label?.(problem.given);
  return {
    seed,
    tier,
    heading: told.heading,
    statement: told.statement,
    figure: family.figure ? (localize(family.figure(problem.given), locale) as Figure) : null,
    label: use ? labelView(use.label, locale) : null,
    parts: problem.parts.map((part, index) => {
      const described = told.parts[index] as DescribedPart;
      return {
        key: part.key,
        topic: part.topic,
        ask: described.ask,
        answer: answerText(described),
        options: described.options.map((option) => ({ ...option, reason: option.reason ?? null })),
      };
    }),
    slips: told.slips.map(({ key, part, answer, message }) => ({
      key,
      part,
      answer: `${answer.decimal} ${answer.unit}`.trim(),
      message,
    })),
    hints: told.hints,
    working: workingView(problem, locale),
  };
}

/** The problem families as their authors look at them. */
export function familyService() {
  return {
    list: (locale: Locale): FamilySummary[] => families.map((family) => summary(family, locale)),

    proof(key: string, query: { tier?: number | undefined; seed: string; count: number }, locale: Locale): ProofSheet {
      const family = familyByKey(key);
      if (!family) throw new AppError('not-found');
      const chosen = family.tiers.filter((tier) => query.tier === undefined || tier === query.tier);
      if (chosen.length === 0) throw new AppError('not-found');
      const seeds = Array.from({ length: query.count }, (_, index) =>
        index === 0 ? query.seed : `${query.seed}-${index + 1}`,
      );
      return {
        family: summary(family, locale),
        sources: family.sources.map(({ title, publisher, year, ref }) => ({
          title,
          publisher,
          year,
          ref: ref ?? null,
        })),
        samples: chosen.flatMap((tier) => seeds.map((seed) => sample(family, { seed, tier, locale }))),
      };
    },
  };
}
export type FamilyService = ReturnType<typeof familyService>;
