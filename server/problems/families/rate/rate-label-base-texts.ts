import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { noneOf, obstacleName, siteName, type LawnWithObstacles } from '../area/obstacles.ts';
import { labelName, lineInWords, type DrawnLine } from './label-lines.ts';

/** What rate-label-base draws. */
export interface LabelBaseGiven extends Scene, LawnWithObstacles {
  readonly line: DrawnLine & { readonly water: NonNullable<DrawnLine['water']> };
  /** First tier: the statement tells the rate as well. */
  readonly rateTold: boolean;
}

function but(g: LabelBaseGiven): Text {
  if (g.obstacles.length === 0) return { en: '', es: '' };
  const names = noneOf(g.obstacles.map(obstacleName));
  return { en: en`, but not ${names}`, es: es`, pero no ${names}` };
}
/** The same in the middle of a sentence: ", but not the patio,". */
function aside(g: LabelBaseGiven): Text {
  const comma = g.obstacles.length === 0 ? '' : ',';
  return { en: but(g).en + comma, es: but(g).es + comma };
}
/** The sides, and on the first tier what the label says. */
function facts(g: LabelBaseGiven): Text {
  const told: Text = g.rateTold
    ? { en: en` The label says ${lineInWords(g.line)}.`, es: es` La etiqueta dice ${lineInWords(g.line)}.` }
    : { en: '', es: '' };
  return {
    en: en`${capital(siteName(g).the)} is ${firstUse(g.length)} by ${g.width}.${told}`,
    es: es`${capital(siteName(g).the)} mide ${firstUse(g.length)} por ${g.width}.${told}`,
  };
}

/** The ways of telling it. */
export const labelBaseSituations: readonly Situation<LabelBaseGiven>[] = [
  {
    heading: { en: 'Product and water for a lawn', es: 'Producto y agua para un césped' },
    statement: (g) => ({
      en: en`${g.person} sprays the whole lawn behind ${g.place.the}${but(g)}. ${facts(g)} Follow the practice label of ${labelName(g.line)}.`,
      es: es`${g.person} rocía todo el césped detrás ${g.place.of}${but(g)}. ${facts(g)} Siga la etiqueta de práctica de ${labelName(g.line)}.`,
    }),
  },
  {
    heading: { en: 'One treatment at the label rate', es: 'Un tratamiento con la dosis de la etiqueta' },
    statement: (g) => ({
      en: en`The crew leader ${g.place.at} wants all the turf${aside(g)} treated once with ${labelName(g.line)}. ${facts(g)} Work out what goes into the mix.`,
      es: es`El jefe de cuadrilla ${g.place.at} quiere que se trate una vez todo el césped${aside(g)} con ${labelName(g.line)}. ${facts(g)} Calcule qué lleva la mezcla.`,
    }),
  },
  {
    heading: { en: 'What goes into the tank', es: 'Qué va en el tanque' },
    statement: (g) => ({
      en: en`${capital(g.season)}, ${g.person} treats a lawn ${g.place.at}${aside(g)} with ${labelName(g.line)}. ${facts(g)} What goes into the tank?`,
      es: es`${capital(g.season)}, ${g.person} trata un césped ${g.place.at}${aside(g)} con ${labelName(g.line)}. ${facts(g)} ¿Qué va en el tanque?`,
    }),
  },
  {
    heading: { en: 'While no one is there', es: 'Cuando no hay nadie' },
    statement: (g) => ({
      en: en`${capital(g.place.the)} asks for its lawn${aside(g)} to be treated with ${labelName(g.line)} while no one is there. ${facts(g)} Find the area, then the product and the water.`,
      es: es`${capital(g.place.the)} pide que se trate su césped${aside(g)} con ${labelName(g.line)} cuando no haya nadie. ${facts(g)} Halle el área y después el producto y el agua.`,
    }),
  },
];
