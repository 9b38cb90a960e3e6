import type { Problem } from './engine.ts';
import type { ChoiceOption, ChoicePart, OrderPart } from './family.ts';
import { makeRng } from './rng.ts';

function rngFor(problem: Problem, part: string) {
  const { family, version, tier, seed } = problem.key;
  return makeRng(`order/${family}/${version}/${tier}/${seed}/${part}`);
}

/** A choice part's options in the order this problem shows them. */
export function shuffledOptions(problem: Problem, part: ChoicePart): readonly ChoiceOption[] {
  return rngFor(problem, part.key).shuffle(part.options);
}

/** An order part's steps as first shown: never in the right order already. */
export function shuffledSteps(problem: Problem, part: OrderPart): OrderPart['steps'] {
  const rng = rngFor(problem, part.key);
  for (;;) {
    const steps = rng.shuffle(part.steps);
    if (part.steps.length < 2 || steps.some((step, index) => step.key !== part.steps[index]?.key)) return steps;
  }
}
