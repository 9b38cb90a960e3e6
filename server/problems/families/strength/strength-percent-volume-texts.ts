import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import type { Scene, Situation } from '../../situations.ts';
import { both } from '../both.ts';
import { productName } from '../spot/mix-lines.ts';
import { percentTarget, type PercentLine } from './percent-lines.ts';

/** What strength-percent-volume draws. */
export interface PercentVolumeGiven extends Scene {
  readonly line: PercentLine;
  readonly job:
    | { readonly as: 'told' | 'cylinder'; readonly mix: Quantity }
    | { readonly as: 'loads'; readonly mix: Quantity; readonly fullLoads: number; readonly lastLoad: Quantity };
}

function facts({ job, line }: PercentVolumeGiven): Text {
  if (job.as === 'loads') {
    return both(
      en`The job takes ${job.fullLoads} full tanks of ${firstUse(job.mix)} and a last one of ${job.lastLoad}. The label gives the percent by volume of the finished spray.`,
      es`El trabajo lleva ${job.fullLoads} tanques llenos de ${firstUse(job.mix)} y uno último de ${job.lastLoad}. La etiqueta da el porcentaje por volumen de la mezcla terminada.`,
    );
  }
  return job.as === 'told'
    ? both(
        en`The label asks for ${line.percent} product by volume of the finished spray. The tank is made up to ${firstUse(job.mix)}.`,
        es`La etiqueta pide ${line.percent} de producto por volumen de la mezcla terminada. El tanque se completa hasta ${firstUse(job.mix)}.`,
      )
    : both(
        en`The tank is made up to ${firstUse(job.mix)}. The practice label gives the percent by volume of the finished spray.`,
        es`El tanque se completa hasta ${firstUse(job.mix)}. La etiqueta de práctica da el porcentaje por volumen de la mezcla terminada.`,
      );
}

const name = (g: PercentVolumeGiven) => productName(g.line);
const target = (g: PercentVolumeGiven) => percentTarget(g.line);

/** The ways of telling it. No season: some lines hold for dormant plants only. */
export const percentVolumeSituations: readonly Situation<PercentVolumeGiven>[] = [
  {
    heading: both('A percent mix', 'Una mezcla por porcentaje'),
    statement: (g) =>
      both(
        en`${g.person} sprays ${target(g)} ${g.place.at} with ${name(g)}. ${facts(g)}`,
        es`${g.person} rocía ${target(g)} ${g.place.at} con ${name(g)}. ${facts(g)}`,
      ),
  },
  {
    heading: both('The rate is a percent', 'La dosis es un porcentaje'),
    statement: (g) =>
      both(
        en`The next stop is ${g.place.the}, where ${target(g)} get ${name(g)}. ${facts(g)}`,
        es`La próxima parada es ${g.place.the}, donde se tratan ${target(g)} con ${name(g)}. ${facts(g)}`,
      ),
  },
  {
    heading: both('Percent of the tank', 'Porcentaje del tanque'),
    statement: (g) =>
      both(
        en`${g.person} is new on the crew and mixes ${name(g)} for ${target(g)} ${g.place.at}. ${facts(g)}`,
        es`${g.person}, que empieza en la cuadrilla, prepara ${name(g)} para ${target(g)} ${g.place.at}. ${facts(g)}`,
      ),
  },
  {
    heading: both('A mix for today', 'Una mezcla para hoy'),
    statement: (g) =>
      both(
        en`Today ${target(g)} ${g.place.at} are sprayed with ${name(g)}. ${facts(g)} Work out the product before opening it.`,
        es`Hoy se rocían ${target(g)} ${g.place.at} con ${name(g)}. ${facts(g)} Calcule el producto antes de abrirlo.`,
      ),
  },
];
