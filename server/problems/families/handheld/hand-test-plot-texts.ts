import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';

/** What hand-test-plot draws. */
export interface TestPlotGiven extends Scene {
  readonly length: Quantity;
  readonly width: Quantity;
  readonly test:
    | { readonly as: 'area-told' | 'refill'; readonly used: Quantity }
    | { readonly as: 'left-over'; readonly start: Quantity; readonly left: Quantity };
}

/** "a plot of 500 square feet (sq ft)" on the first tier, else its sides. */
function plot(g: TestPlotGiven): Text {
  const { length, width, test } = g;
  if (test.as === 'area-told') {
    const area: Quantity = { value: length.value.mul(width.value), unit: 'sq-ft' };
    return both(en`a test plot of ${firstUse(area)}`, es`una parcela de prueba de ${firstUse(area)}`);
  }
  return both(
    en`a test plot ${firstUse(length)} by ${width}`,
    es`una parcela de prueba de ${firstUse(length)} por ${width}`,
  );
}
function water({ test }: TestPlotGiven): Text {
  return test.as === 'left-over'
    ? both(
        en`The tank holds ${firstUse(test.start)} of water before and ${firstUse(test.left)} after.`,
        es`El tanque tiene ${firstUse(test.start)} de agua antes y ${firstUse(test.left)} después.`,
      )
    : both(
        en`Filling the tank back to its mark takes ${firstUse(test.used)} of water.`,
        es`Volver a llenar el tanque hasta su marca lleva ${firstUse(test.used)} de agua.`,
      );
}

/** The ways of telling it. */
export const testPlotSituations: readonly Situation<TestPlotGiven>[] = [
  {
    heading: both('A test plot with water', 'Una parcela de prueba con agua'),
    statement: (g) =>
      both(
        en`${g.person} sprays ${plot(g)} with plain water, at the pace of the job. ${water(g)}`,
        es`${g.person} rocía ${plot(g)} con agua sola, al paso del trabajo. ${water(g)}`,
      ),
  },
  {
    heading: both('How much does this sprayer put out', 'Cuánto aplica este rociador'),
    statement: (g) =>
      both(
        en`Nobody knows the rate of the backpack sprayer from the shed. ${g.person} tries it with water on ${plot(g)}. ${water(g)}`,
        es`Nadie sabe cuánto aplica el rociador de mochila del cobertizo. ${g.person} lo prueba con agua en ${plot(g)}. ${water(g)}`,
      ),
  },
  {
    heading: both('Calibration day', 'Día de calibración'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the crew calibrates every hand sprayer. At ${g.place.the}, ${g.person} sprays water on ${plot(g)}. ${water(g)}`,
        es`${capital(g.season)} la cuadrilla calibra todos los rociadores de mano. Cuando trabaja ${g.place.at}, ${g.person} rocía agua en ${plot(g)}. ${water(g)}`,
      ),
  },
  {
    heading: both('Before the first tank', 'Antes del primer tanque'),
    statement: (g) =>
      both(
        en`Before mixing for the job ${g.place.at}, ${g.person} calibrates the sprayer with water on ${plot(g)}. ${water(g)}`,
        es`Antes de preparar la mezcla para el trabajo ${g.place.at}, ${g.person} calibra el rociador con agua en ${plot(g)}. ${water(g)}`,
      ),
  },
];
