import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { labelName, lineInWords, type DrawnLine } from './label-lines.ts';

/** What rate-per-1000 draws. The site comes as an area, as two sides, or in acres. */
export interface PerThousandGiven extends Scene {
  readonly line: DrawnLine;
  readonly site: 'lawn' | 'bed';
  readonly known:
    | { readonly as: 'area' | 'acres'; readonly area: Quantity }
    | { readonly as: 'sides'; readonly length: Quantity; readonly width: Quantity };
}

const siteNames = {
  lawn: { en: 'lawn', es: 'césped' },
  bed: { en: 'flower bed', es: 'arriate de flores' },
} as const satisfies Record<PerThousandGiven['site'], Text>;

function site(g: PerThousandGiven): Text {
  return siteNames[g.site];
}

/** "The lawn covers 4,500 square feet (sq ft)." and on the first tier what the label says. */
function facts(g: PerThousandGiven): Text {
  const { known } = g;
  if (known.as === 'sides') {
    return {
      en: en`The ${site(g)} is ${firstUse(known.length)} by ${known.width}.`,
      es: es`El ${site(g)} mide ${firstUse(known.length)} por ${known.width}.`,
    };
  }
  const told: Text =
    known.as === 'area'
      ? { en: en` The label says ${lineInWords(g.line)}.`, es: es` La etiqueta dice ${lineInWords(g.line)}.` }
      : { en: '', es: '' };
  return {
    en: en`The ${site(g)} covers ${firstUse(known.area)}.${told}`,
    es: es`El ${site(g)} cubre ${firstUse(known.area)}.${told}`,
  };
}

/** The ways of telling it. */
export const perThousandSituations: readonly Situation<PerThousandGiven>[] = [
  {
    heading: { en: 'Product for one site', es: 'Producto para un sitio' },
    statement: (g) => ({
      en: en`${g.person} treats a ${site(g)} ${g.place.at} with ${labelName(g.line)}. ${facts(g)} Follow the practice label.`,
      es: es`${g.person} trata un ${site(g)} ${g.place.at} con ${labelName(g.line)}. ${facts(g)} Siga la etiqueta de práctica.`,
    }),
  },
  {
    heading: { en: 'Before leaving the yard', es: 'Antes de salir de la bodega' },
    statement: (g) => ({
      en: en`${g.person} loads the truck for ${g.place.the}. One job there is a ${site(g)}, to be treated once with ${labelName(g.line)}. ${facts(g)}`,
      es: es`${g.person} carga la camioneta para ir ${g.place.to}. Un trabajo allí es un ${site(g)}, que se trata una vez con ${labelName(g.line)}. ${facts(g)}`,
    }),
  },
  {
    heading: { en: 'A treatment on the calendar', es: 'Un tratamiento en el calendario' },
    statement: (g) => ({
      en: en`${capital(g.season)} the ${site(g)} ${g.place.at} is due for ${labelName(g.line)}. ${facts(g)} Work out the product from the label.`,
      es: es`${capital(g.season)} le toca ${labelName(g.line)} al ${site(g)} ${g.place.at}. ${facts(g)} Calcule el producto según la etiqueta.`,
    }),
  },
  {
    heading: { en: 'An amount for the record', es: 'Una cantidad para el registro' },
    statement: (g) => ({
      en: en`Before spraying at ${g.place.the}, ${g.person} writes down how much ${labelName(g.line)} the job takes. ${facts(g)} Go by the practice label.`,
      es: es`Antes de rociar ${g.place.at}, ${g.person} anota cuánto ${labelName(g.line)} lleva el trabajo. ${facts(g)} Guíese por la etiqueta de práctica.`,
    }),
  },
];
