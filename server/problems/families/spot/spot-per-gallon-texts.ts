import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import type { Scene, Situation } from '../../situations.ts';
import { both } from '../both.ts';
import { productName, targetOf, type MixLine } from './mix-lines.ts';

/** What spot-per-gallon draws. */
export interface PerGallonGiven extends Scene {
  readonly line: MixLine;
  readonly job:
    | { readonly as: 'mix'; readonly mix: Quantity }
    | { readonly as: 'part-tank'; readonly tank: Quantity; readonly mix: Quantity }
    | { readonly as: 'fills'; readonly tank: Quantity; readonly fullFills: number; readonly lastFill: Quantity };
}

function facts({ job, line }: PerGallonGiven): Text {
  if (job.as === 'mix') {
    return both(
      en`The job takes ${firstUse(job.mix)} of mix. The label says ${firstUse(line.product)} in each gallon of finished spray.`,
      es`El trabajo lleva ${firstUse(job.mix)} de mezcla. La etiqueta dice ${firstUse(line.product)} por cada galón de mezcla terminada.`,
    );
  }
  if (job.as === 'part-tank') {
    return both(
      en`The tank holds ${firstUse(job.tank)}, but the job takes only ${job.mix} of mix.`,
      es`El tanque tiene capacidad para ${firstUse(job.tank)}, pero el trabajo solo lleva ${job.mix} de mezcla.`,
    );
  }
  return both(
    en`The job takes ${job.fullFills} full tanks of ${firstUse(job.tank)} and a last one of ${job.lastFill}.`,
    es`El trabajo lleva ${job.fullFills} tanques llenos de ${firstUse(job.tank)} y uno último de ${job.lastFill}.`,
  );
}

const name = (g: PerGallonGiven) => productName(g.line);
const target = (g: PerGallonGiven) => targetOf(g.line.site);

/** The ways of telling it. */
export const perGallonSituations: readonly Situation<PerGallonGiven>[] = [
  {
    heading: both('Mixing for spot treatment', 'Mezcla para un tratamiento localizado'),
    statement: (g) =>
      both(
        en`${g.person} sprays ${target(g)} ${g.place.at} with ${name(g)}. ${facts(g)} Follow the practice label.`,
        es`${g.person} rocía ${target(g)} ${g.place.at} con ${name(g)}. ${facts(g)} Siga la etiqueta de práctica.`,
      ),
  },
  {
    heading: both('A job on the work order', 'Un trabajo de la orden'),
    statement: (g) =>
      both(
        en`The work order for ${g.place.the} lists ${target(g)}, to be sprayed with ${name(g)} ${g.season}. ${facts(g)} Use the rate on the practice label.`,
        es`La orden de trabajo para ${g.place.the} incluye ${target(g)}, que se rocían con ${name(g)} ${g.season}. ${facts(g)} Use la dosis de la etiqueta de práctica.`,
      ),
  },
  {
    heading: both('Mixing at the truck', 'Mezcla junto a la camioneta'),
    statement: (g) =>
      both(
        en`At the truck, ${g.person} mixes ${name(g)} for ${target(g)} ${g.place.at}. ${facts(g)} The rate is on the practice label.`,
        es`Junto a la camioneta, ${g.person} prepara ${name(g)} para ${target(g)} ${g.place.at}. ${facts(g)} La dosis está en la etiqueta de práctica.`,
      ),
  },
  {
    heading: both('Enough and no more', 'Lo justo y nada más'),
    statement: (g) =>
      both(
        en`The crew leader wants no mix left over after ${target(g)} ${g.place.at} are sprayed with ${name(g)}. ${facts(g)} Find the product from the practice label.`,
        es`El jefe de cuadrilla no quiere que sobre mezcla después de rociar ${target(g)} ${g.place.at} con ${name(g)}. ${facts(g)} Halle el producto según la etiqueta de práctica.`,
      ),
  },
];
