import type { Text } from '../../shared/vocabulary.ts';
import { generate } from './engine.ts';
import { familyByKey } from './registry.ts';
import { asMessage } from './verdict-messages.ts';

const shared: Readonly<Record<string, Text>> = {
  'unit-kind': { en: 'A weight for a volume, or the like.', es: 'Un peso por un volumen, o algo así.' },
  'unit-name': { en: 'The number belongs to another unit.', es: 'El número es de otra unidad.' },
  'decimal-place': { en: 'The decimal point is in the wrong place.', es: 'El punto decimal está en otro lugar.' },
  rounding: { en: 'The rounding is wrong.', es: 'El redondeo está mal.' },
};
const names = new Map<string, Text>();
/** Seeds tried to find a problem that shows the slip. */
const seedsTried = 40;

function find(familyKey: string, slipKey: string): Text {
  const plain = slipKey.replaceAll('-', ' ');
  const fallback: Text = { en: plain, es: plain };
  const family = familyByKey(familyKey);
  if (!family) return fallback;
  for (let seed = 1; seed <= seedsTried; seed += 1) {
    for (const tier of family.tiers) {
      const problem = generate(family, { seed: `name-${seed}`, tier });
      const live = problem.slips.find((one) => one.key === slipKey);
      if (live) return asMessage(live.slip.message(problem.given, {})).headline;
      const order = family.slips.find((one) => one.key === slipKey && one.inOrder);
      if (order) return asMessage(order.message(problem.given, {})).headline;
      for (const part of problem.parts) {
        if (part.kind !== 'choice') continue;
        const option = part.options.find((one) => !one.right && (one.slip ?? one.key) === slipKey);
        if (option) return asMessage(option.reason).headline;
      }
    }
  }
  return fallback;
}

/** A slip in a few words, for lists: the first sentence of its message on a sample problem. */
export function slipName(family: string, slip: string): Text {
  const general = shared[slip];
  if (general) return general;
  const name = `${family}/${slip}`;
  const known = names.get(name) ?? find(family, slip);
  names.set(name, known);
  return known;
}
