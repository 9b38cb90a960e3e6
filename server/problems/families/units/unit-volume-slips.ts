import { convert, quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import type { Scene } from '../../situations.ts';
import type { UnitPair } from './unit-pairs.ts';
import { fact, perUnit } from './unit-steps.ts';

/** What unit-volume draws. */
export interface UnitVolumeGiven extends Scene {
  readonly pair: UnitPair;
  readonly amount: Quantity;
}
type Given = UnitVolumeGiven;

/** The amount with one of the two units taken for another; in the asked unit's number. */
function takenAs(g: Given, of: 'from' | 'to', as: UnitKey): Quantity {
  const { from, to } = g.pair;
  const wrong = of === 'from' ? convert(quantity(g.amount.value, as), to) : convert(quantity(g.amount.value, from), as);
  return quantity(wrong.value, to);
}

/** The spoon of the pair and the spoon it may be taken for. */
function spoon({ pair }: Given): { of: 'from' | 'to'; as: UnitKey } | null {
  const other = (unit: UnitKey): UnitKey | null => (unit === 'tbsp' ? 'tsp' : unit === 'tsp' ? 'tbsp' : null);
  const [from, to] = [other(pair.from), other(pair.to)];
  if (from) return { of: 'from', as: from };
  return to ? { of: 'to', as: to } : null;
}

export const unitVolumeSlips: readonly Slip<Given>[] = [
  {
    key: 'inverted-factor',
    part: 'a',
    answer: (g) => quantity(g.amount.value.div(perUnit(g.pair.from, g.pair.to)), g.pair.to),
    message: (g) => {
      const grows = perUnit(g.pair.from, g.pair.to).compare(1) > 0;
      return grows
        ? {
            en: en`You divided where you should multiply. ${fact(g.pair.from, g.pair.to)}, so the number has to get larger.`,
            es: es`Usted dividió donde debía multiplicar. ${fact(g.pair.from, g.pair.to)}, así que el número tiene que crecer.`,
          }
        : {
            en: en`You multiplied where you should divide. ${fact(g.pair.from, g.pair.to)}, so the number has to get smaller.`,
            es: es`Usted multiplicó donde debía dividir. ${fact(g.pair.from, g.pair.to)}, así que el número tiene que bajar.`,
          };
    },
  },
  {
    key: 'tsp-for-tbsp',
    part: 'a',
    answer: (g) => {
      const mixed = spoon(g);
      return mixed && takenAs(g, mixed.of, mixed.as);
    },
    message: () => ({
      en: 'You took one spoon for the other. A tablespoon (Tbsp) holds 3 teaspoons (tsp); 2 tablespoons are a fluid ounce.',
      es: 'Usted confundió las cucharas. Una cucharada (cda) tiene 3 cucharaditas (cdta); 2 cucharadas son una onza líquida.',
    }),
  },
  {
    key: 'wrong-neighbour',
    part: 'a',
    answer: ({ pair, ...g }) => (pair.mixUp ? takenAs({ ...g, pair }, pair.mixUp.of, pair.mixUp.as) : null),
    message: ({ pair }) => {
      const right = pair.mixUp?.of === 'to' ? pair.to : pair.from;
      const other = pair.mixUp?.of === 'to' ? pair.from : pair.to;
      const as = pair.mixUp?.as ?? right;
      return {
        en: en`You used the neighbor's number. ${fact(as, other)} is another measure; here ${fact(right, other)}.`,
        es: es`Usted usó el número de la medida vecina. ${fact(as, other)} es otra medida; aquí ${fact(right, other)}.`,
      };
    },
  },
  {
    key: 'liter-as-quart',
    part: 'a',
    answer: (g) => {
      if (g.pair.from === 'l') return takenAs(g, 'from', 'qt');
      return g.pair.to === 'l' ? takenAs(g, 'to', 'qt') : null;
    },
    message: () => ({
      en: 'You took a liter for a quart. They are close, but a liter is about 6% larger: 33.8 fl oz against 32.',
      es: 'Usted tomó un litro por un cuarto de galón. Se parecen, pero el litro es un 6% mayor: 33.8 oz líq contra 32.',
    }),
  },
  {
    key: 'one-step-only',
    part: 'a',
    answer: ({ pair, amount }) => (pair.through ? quantity(convert(amount, pair.through).value, pair.to) : null),
    message: ({ pair }) => {
      const through = pair.through ?? pair.from;
      return {
        en: en`You stopped after the first step. That number still has to be changed once more: ${fact(through, pair.to)}.`,
        es: es`Usted se quedó en el primer paso. A ese número le falta otro cambio: ${fact(through, pair.to)}.`,
      };
    },
  },
  {
    key: 'second-step-only',
    part: 'a',
    answer: ({ pair, amount }) =>
      pair.through ? quantity(amount.value.mul(perUnit(pair.through, pair.to)), pair.to) : null,
    message: ({ pair }) => {
      const through = pair.through ?? pair.from;
      return {
        en: en`You made only the second step. First comes ${fact(pair.from, through)}; then ${fact(through, pair.to)}.`,
        es: es`Usted hizo solo el segundo paso. Primero va ${fact(pair.from, through)}; después ${fact(through, pair.to)}.`,
      };
    },
  },
  {
    key: 'kept-number',
    part: 'a',
    answer: ({ pair, amount }) => quantity(amount.value, pair.to),
    message: ({ pair }) => ({
      en: en`You kept the number and changed only the unit. ${fact(pair.from, pair.to)}, so the number changes too.`,
      es: es`Usted dejó el número y cambió solo la unidad. ${fact(pair.from, pair.to)}, así que el número también cambia.`,
    }),
  },
];
