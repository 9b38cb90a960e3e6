import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';

/** What tank-loads draws. */
export interface TankLoadsGiven extends Scene {
  readonly tank: Quantity;
  readonly job:
    | { readonly as: 'mix'; readonly mix: Quantity }
    | { readonly as: 'area'; readonly area: Quantity; readonly rate: Quantity }
    | { readonly as: 'sides'; readonly length: Quantity; readonly width: Quantity; readonly rate: Quantity };
}

function tankName(g: TankLoadsGiven): Text {
  if (g.job.as === 'mix') return both('backpack sprayer', 'rociador de mochila');
  return g.job.as === 'area'
    ? both('walk-behind sprayer', 'rociador de empuje')
    : both('ride-on sprayer', 'rociador montado');
}
function facts(g: TankLoadsGiven): Text {
  const { job, tank } = g;
  // The unit is written out where it comes first: with the mix on the first tier, with the rate above.
  const full = both(
    en`The ${tankName(g)} holds ${tank}; every load but the last is full.`,
    es`El ${tankName(g)} tiene capacidad para ${tank}; todas las cargas van llenas, menos la última.`,
  );
  if (job.as === 'mix') {
    return both(
      en`The job takes ${firstUse(job.mix)} of mix. ${full.en}`,
      es`El trabajo lleva ${firstUse(job.mix)} de mezcla. ${full.es}`,
    );
  }
  if (job.as === 'area') {
    return both(
      en`The turf covers ${firstUse(job.area)}, and the sprayer puts out ${firstUse(job.rate)}. ${full.en}`,
      es`El césped cubre ${firstUse(job.area)} y el rociador aplica ${firstUse(job.rate)}. ${full.es}`,
    );
  }
  return both(
    en`The field is ${firstUse(job.length)} by ${job.width}, and the sprayer puts out ${firstUse(job.rate)}. ${full.en}`,
    es`El campo mide ${firstUse(job.length)} por ${job.width} y el rociador aplica ${firstUse(job.rate)}. ${full.es}`,
  );
}
function site(g: TankLoadsGiven): Text {
  if (g.job.as === 'mix') return both('shrub beds', 'arriates');
  return g.job.as === 'area' ? both('the turf', 'el césped') : both('a sports field', 'un campo deportivo');
}

/** The ways of telling it. */
export const tankLoadsSituations: readonly Situation<TankLoadsGiven>[] = [
  {
    heading: both('Loads and the last part load', 'Cargas y la última carga parcial'),
    statement: (g) =>
      both(
        en`${g.person} sprays ${site(g)} ${g.place.at}. ${facts(g)}`,
        es`${g.person} rocía ${site(g)} ${g.place.at}. ${facts(g)}`,
      ),
  },
  {
    heading: both('How often to fill', 'Cuántas veces se llena'),
    statement: (g) =>
      both(
        en`Water is far from ${g.place.the}, so ${g.person} plans the fills before spraying ${site(g)}. ${facts(g)}`,
        es`El agua queda lejos cuando se trabaja ${g.place.at}, así que ${g.person} planea las cargas antes de rociar ${site(g)}. ${facts(g)}`,
      ),
  },
  {
    heading: both('No mix left over', 'Que no sobre mezcla'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the crew sprays ${site(g)} ${g.place.at} and wants no mix left over. ${facts(g)}`,
        es`${capital(g.season)} la cuadrilla rocía ${site(g)} ${g.place.at} y no quiere que sobre mezcla. ${facts(g)}`,
      ),
  },
  {
    heading: both('A plan for the day', 'Un plan para el día'),
    statement: (g) =>
      both(
        en`The plan for the day is ${site(g)} ${g.place.at}, and ${g.person} does the mixing. ${facts(g)}`,
        es`El plan del día es rociar ${site(g)} ${g.place.at}, y ${g.person} prepara la mezcla. ${facts(g)}`,
      ),
  },
];
