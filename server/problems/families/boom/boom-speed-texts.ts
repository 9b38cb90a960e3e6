import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';

/** What boom-speed draws. */
export interface BoomSpeedGiven extends Scene {
  readonly course: Quantity;
  /** One run, or one each way. */
  readonly runs: readonly [Quantity] | readonly [Quantity, Quantity];
  /** Third tier: the speed that the job wants. */
  readonly wanted: Quantity | null;
}

function facts(g: BoomSpeedGiven): Text {
  const [first, second] = g.runs;
  if (!second) {
    return both(en`The sprayer covers it in ${firstUse(first)}.`, es`El rociador lo recorre en ${firstUse(first)}.`);
  }
  const wish: Text = g.wanted
    ? both(en` The job wants ${firstUse(g.wanted)}.`, es` El trabajo pide ${firstUse(g.wanted)}.`)
    : both('', '');
  return both(
    en`One way takes ${firstUse(first)}, the way back ${second}; use their mean.${wish}`,
    es`La ida lleva ${firstUse(first)} y la vuelta ${second}; use el promedio.${wish}`,
  );
}

/** The ways of telling it. */
export const boomSpeedSituations: readonly Situation<BoomSpeedGiven>[] = [
  {
    heading: both('Speed over a course', 'Velocidad en un tramo medido'),
    statement: (g) =>
      both(
        en`${g.person} checks the speed of the ride-on sprayer on a course of ${firstUse(g.course)}, with the tank half full. ${facts(g)}`,
        es`${g.person} revisa la velocidad del rociador montado en un tramo de ${firstUse(g.course)}, con el tanque a la mitad. ${facts(g)}`,
      ),
  },
  {
    heading: both('The dial is not to be trusted', 'El indicador no es de fiar'),
    statement: (g) =>
      both(
        en`The speed dial of the boom sprayer is broken. ${g.person} marks ${firstUse(g.course)} on the turf ${g.place.at} and times the machine. ${facts(g)}`,
        es`El indicador de velocidad del rociador de aguilón está roto. ${g.person} marca ${firstUse(g.course)} en el césped ${g.place.at} y mide el tiempo. ${facts(g)}`,
      ),
  },
  {
    heading: both('Before calibrating the boom', 'Antes de calibrar el aguilón'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the crew calibrates the boom sprayer on the kind of ground it sprays. The course is ${firstUse(g.course)} long. ${facts(g)}`,
        es`${capital(g.season)} la cuadrilla calibra el rociador de aguilón en el tipo de suelo donde rocía. El tramo mide ${firstUse(g.course)}. ${facts(g)}`,
      ),
  },
  {
    heading: both('New tires on the machine', 'Llantas nuevas en la máquina'),
    statement: (g) =>
      both(
        en`The sprayer has new tires, so its speed must be checked again. Near ${g.place.the}, ${g.person} times it over ${firstUse(g.course)}. ${facts(g)}`,
        es`El rociador tiene llantas nuevas y hay que revisar otra vez su velocidad. Durante el trabajo ${g.place.at}, ${g.person} mide el tiempo en ${firstUse(g.course)}. ${facts(g)}`,
      ),
  },
];
