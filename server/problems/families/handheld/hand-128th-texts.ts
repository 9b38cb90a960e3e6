import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';

/** What hand-128th draws. */
export interface Hand128thGiven extends Scene {
  /** Sides of a plot of 340 sq ft. */
  readonly length: Quantity;
  readonly width: Quantity;
  /** Time to spray the plot. */
  readonly plotTime: Quantity;
  readonly test:
    | { readonly as: 'caught'; readonly caught: Quantity }
    | { readonly as: 'quart-and-ounces'; readonly quarts: Quantity; readonly ounces: Quantity }
    | { readonly as: 'short-catch'; readonly caught: Quantity; readonly catchTime: Quantity; readonly site: Quantity };
}

/** The plot, its time and the catch. */
function facts(g: Hand128thGiven): Text {
  const { test, plotTime } = g;
  if (test.as === 'short-catch') {
    return both(
      en`Spraying the plot takes ${firstUse(plotTime)}. In ${test.catchTime} the nozzle sprays ${firstUse(test.caught)} into a bucket.`,
      es`Rociar la parcela lleva ${firstUse(plotTime)}. En ${test.catchTime} la boquilla echa ${firstUse(test.caught)} en una cubeta.`,
    );
  }
  const caught: Text =
    test.as === 'caught'
      ? both(en`${firstUse(test.caught)}`, es`${firstUse(test.caught)}`)
      : both(
          en`${firstUse(test.quarts)} and ${firstUse(test.ounces)}`,
          es`${firstUse(test.quarts)} y ${firstUse(test.ounces)}`,
        );
  return both(
    en`Spraying the plot takes ${firstUse(plotTime)}. In the same time the nozzle sprays ${caught} into a bucket.`,
    es`Rociar la parcela lleva ${firstUse(plotTime)}. En el mismo tiempo la boquilla echa ${caught} en una cubeta.`,
  );
}
/** "a plot of 340 square feet (sq ft), 1/128 of an acre" */
const plot: Text = both(
  'a plot of 340 square feet (sq ft), which is 1/128 of an acre',
  'una parcela de 340 pies cuadrados (pies²), que es 1/128 de acre',
);
function job({ test }: Hand128thGiven): Text {
  return test.as === 'short-catch'
    ? both(en` The job covers ${test.site}.`, es` El trabajo cubre ${test.site}.`)
    : both('', '');
}

/** The ways of telling it. */
export const hand128thSituations: readonly Situation<Hand128thGiven>[] = [
  {
    heading: both('Ounces caught, gallons an acre', 'Onzas recogidas, galones por acre'),
    statement: (g) =>
      both(
        en`${g.person} calibrates a backpack sprayer with water on ${plot}. ${facts(g)}${job(g)}`,
        es`${g.person} calibra un rociador de mochila con agua en ${plot}. ${facts(g)}${job(g)}`,
      ),
  },
  {
    heading: both('A new nozzle on the wand', 'Una boquilla nueva en la lanza'),
    statement: (g) =>
      both(
        en`The wand has a new nozzle, so ${g.person} checks it with water on ${plot}. ${facts(g)}${job(g)}`,
        es`La lanza tiene una boquilla nueva y ${g.person} la revisa con agua en ${plot}. ${facts(g)}${job(g)}`,
      ),
  },
  {
    heading: both('The 1/128-acre method', 'El método de 1/128 de acre'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the crew marks ${plot}, ${g.place.at}. ${g.person} sprays water at a steady pace. ${facts(g)}${job(g)}`,
        es`${capital(g.season)} la cuadrilla marca ${plot}, ${g.place.at}. ${g.person} rocía agua a paso parejo. ${facts(g)}${job(g)}`,
      ),
  },
  {
    heading: both('A new person on the sprayer', 'Otra persona con el rociador'),
    statement: (g) =>
      both(
        en`${g.person} takes over a compressed-air sprayer and calibrates it with water on ${plot}. ${facts(g)}${job(g)}`,
        es`${g.person} recibe un rociador de aire comprimido y lo calibra con agua en ${plot}. ${facts(g)}${job(g)}`,
      ),
  },
];
