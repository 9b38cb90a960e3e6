import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';

/** What boom-gpa draws. */
export interface BoomGpaGiven extends Scene {
  readonly nozzles: number;
  readonly spacing: Quantity;
  readonly test:
    | { readonly as: 'flow'; readonly flow: Quantity; readonly speed: Quantity }
    | { readonly as: 'catch'; readonly caught: Quantity; readonly time: Quantity; readonly speed: Quantity }
    | { readonly as: 'whole-boom'; readonly flow: Quantity; readonly course: Quantity; readonly time: Quantity };
}

function facts(g: BoomGpaGiven): Text {
  const { test, spacing, nozzles } = g;
  const boom = both(
    en`The boom has ${nozzles} nozzles, ${firstUse(spacing)} apart.`,
    es`El aguilón tiene ${nozzles} boquillas, a ${firstUse(spacing)} una de otra.`,
  );
  if (test.as === 'flow') {
    return both(
      en`${boom.en} Each gives ${firstUse(test.flow)}. The speed is ${firstUse(test.speed)}.`,
      es`${boom.es} Cada una da ${firstUse(test.flow)}. La velocidad es de ${firstUse(test.speed)}.`,
    );
  }
  if (test.as === 'catch') {
    return both(
      en`${boom.en} In ${firstUse(test.time)} each gives ${firstUse(test.caught)}. The speed is ${firstUse(test.speed)}.`,
      es`${boom.es} En ${firstUse(test.time)} cada una da ${firstUse(test.caught)}. La velocidad es de ${firstUse(test.speed)}.`,
    );
  }
  return both(
    en`${boom.en} All together they give ${firstUse(test.flow)}. A course of ${firstUse(test.course)} takes ${firstUse(test.time)}.`,
    es`${boom.es} Entre todas dan ${firstUse(test.flow)}. Un tramo de ${firstUse(test.course)} lleva ${firstUse(test.time)}.`,
  );
}

/** The ways of telling it. */
export const boomGpaSituations: readonly Situation<BoomGpaGiven>[] = [
  {
    heading: both('Gallons per acre of a boom', 'Galones por acre de un aguilón'),
    statement: (g) =>
      both(
        en`${g.person} calibrates the ride-on sprayer before the turf ${g.place.at} is treated. ${facts(g)}`,
        es`${g.person} calibra el rociador montado antes de tratar el césped ${g.place.at}. ${facts(g)}`,
      ),
  },
  {
    heading: both('New nozzles on the boom', 'Boquillas nuevas en el aguilón'),
    statement: (g) =>
      both(
        en`The walk-behind sprayer gets a new set of nozzles, and ${g.person} tests it with water. ${facts(g)}`,
        es`El rociador de empuje recibe un juego nuevo de boquillas y ${g.person} lo prueba con agua. ${facts(g)}`,
      ),
  },
  {
    heading: both('First calibration of the year', 'Primera calibración del año'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the boom sprayer comes out of the shed. ${g.person} fills it with water. ${facts(g)}`,
        es`${capital(g.season)} el rociador de aguilón sale del cobertizo. ${g.person} lo llena de agua. ${facts(g)}`,
      ),
  },
  {
    heading: both('Does the rate match the label', 'La dosis contra la etiqueta'),
    statement: (g) =>
      both(
        en`Before mixing, ${g.person} wants to know what the sprayer puts on an acre of turf. ${facts(g)}`,
        es`Antes de preparar la mezcla, ${g.person} quiere saber cuánto aplica el rociador en un acre de césped. ${facts(g)}`,
      ),
  },
];
