import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { labelName, lineInWords, type DrawnLine } from './label-lines.ts';

/** What rate-per-acre draws. */
export interface PerAcreGiven extends Scene {
  readonly line: DrawnLine & { readonly water: NonNullable<DrawnLine['water']> };
  /** First tier: the area is given and the rate told. Third: the water is asked for as well. */
  readonly asks: 'product' | 'acres-and-product' | 'acres-product-and-water';
  readonly known:
    | { readonly as: 'area'; readonly area: Quantity }
    | { readonly as: 'sides'; readonly length: Quantity; readonly width: Quantity };
}

/** "It covers 24,000 square feet (sq ft)." and on the first tier what the label says. */
function facts(g: PerAcreGiven): Text {
  const { known } = g;
  if (known.as === 'sides') {
    return {
      en: en`It is ${firstUse(known.length)} by ${known.width}.`,
      es: es`Mide ${firstUse(known.length)} por ${known.width}.`,
    };
  }
  return {
    en: en`It covers ${firstUse(known.area)}. The label says ${lineInWords(g.line)}.`,
    es: es`Cubre ${firstUse(known.area)}. La etiqueta dice ${lineInWords(g.line)}.`,
  };
}

/** The ways of telling it. */
export const perAcreSituations: readonly Situation<PerAcreGiven>[] = [
  {
    heading: { en: 'A sports field', es: 'Un campo deportivo' },
    statement: (g) => ({
      en: en`${g.person} sprays a sports field with ${labelName(g.line)}. ${facts(g)} The practice label gives the rate for an acre.`,
      es: es`${g.person} rocía un campo deportivo con ${labelName(g.line)}. ${facts(g)} La etiqueta de práctica da la dosis por acre.`,
    }),
  },
  {
    heading: { en: 'Park turf', es: 'El césped de un parque' },
    statement: (g) => ({
      en: en`${capital(g.season)} a stretch of park turf is treated with ${labelName(g.line)}. ${facts(g)} Follow the line for parks and sports turf.`,
      es: es`${capital(g.season)} se trata un tramo de césped de un parque con ${labelName(g.line)}. ${facts(g)} Siga la línea para parques y campos deportivos.`,
    }),
  },
  {
    heading: { en: 'The ride-on sprayer', es: 'El rociador montado' },
    statement: (g) => ({
      en: en`${g.person} takes the ride-on sprayer to the turf ${g.place.at} and applies ${labelName(g.line)} once. ${facts(g)} The rate on the practice label is for an acre.`,
      es: es`${g.person} lleva el rociador montado al césped ${g.place.at} y aplica ${labelName(g.line)} una vez. ${facts(g)} La dosis de la etiqueta de práctica es por acre.`,
    }),
  },
  {
    heading: { en: 'A rate for a whole acre', es: 'Una dosis para un acre entero' },
    statement: (g) => ({
      en: en`The label rate of ${labelName(g.line)} is for a whole acre of turf. ${g.person} has one field to spray ${g.place.at}. ${facts(g)}`,
      es: es`La dosis de ${labelName(g.line)} es para un acre entero de césped. ${g.person} tiene un solo campo por rociar ${g.place.at}. ${facts(g)}`,
    }),
  },
];
