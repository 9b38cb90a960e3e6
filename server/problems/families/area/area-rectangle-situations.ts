import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import type { Scene, Situation } from '../../situations.ts';

/** What area-rectangle draws. */
export interface RectangleGiven extends Scene {
  /** Both sides in feet; a strip whose width is in inches; a lawn whose length is in yards. */
  readonly form: 'feet' | 'strip' | 'yards';
  readonly length: Quantity;
  readonly width: Quantity;
}

/** The sides in words, each unit written out at first use: "62 feet (ft) by 35 ft". */
function sides({ form, length, width }: RectangleGiven): Text {
  if (form === 'strip') {
    return {
      en: en`${firstUse(length)} long and ${firstUse(width)} wide`,
      es: es`${firstUse(length)} de largo y ${firstUse(width)} de ancho`,
    };
  }
  if (form === 'yards') {
    return {
      en: en`${firstUse(length)} by ${firstUse(width)}`,
      es: es`${firstUse(length)} por ${firstUse(width)}`,
    };
  }
  return { en: en`${firstUse(length)} by ${width}`, es: es`${firstUse(length)} por ${width}` };
}

const lawns: readonly Situation<RectangleGiven>[] = [
  {
    heading: { en: 'A lawn to measure', es: 'Un césped por medir' },
    statement: (g) => ({
      en: en`${g.person} measures the lawn behind ${g.place.the}. It is a rectangle, ${sides(g)}. The whole lawn gets treated.`,
      es: es`${g.person} mide el césped detrás ${g.place.of}. Es un rectángulo de ${sides(g)}. Se trata todo el césped.`,
    }),
  },
  {
    heading: { en: 'A panel of turf', es: 'Un tramo de césped' },
    statement: (g) => ({
      en: en`A new panel of turf ${g.place.at} gets its first treatment ${g.season}. It is a rectangle, ${sides(g)}.`,
      es: es`Un tramo nuevo de césped ${g.place.at} recibe su primer tratamiento ${g.season}. Es un rectángulo de ${sides(g)}.`,
    }),
  },
  {
    heading: { en: 'Area for a work order', es: 'El área para una orden de trabajo' },
    statement: (g) => ({
      en: en`A work order for ${g.place.the} leaves the area blank. ${g.person} tapes the front lawn, a rectangle: ${sides(g)}. The area has to go on the order.`,
      es: es`Una orden de trabajo para ${g.place.the} no trae el área. ${g.person} mide con cinta el césped del frente, un rectángulo de ${sides(g)}. El área tiene que ir en la orden.`,
    }),
  },
  {
    heading: { en: 'Before the tank is filled', es: 'Antes de llenar el tanque' },
    statement: (g) => ({
      en: en`${g.person} plans to treat a rectangular lawn ${g.place.at} ${g.season}. The tape reads ${sides(g)}. Before anything goes in the tank, the area has to be known.`,
      es: es`${g.person} va a tratar un césped rectangular ${g.place.at} ${g.season}. La cinta marca ${sides(g)}. Antes de poner algo en el tanque, hay que saber el área.`,
    }),
  },
];

const strips: readonly Situation<RectangleGiven>[] = [
  {
    heading: { en: 'A strip along a fence', es: 'Una franja junto a la cerca' },
    statement: (g) => ({
      en: en`${g.person} keeps a strip along the fence ${g.place.at} free of weeds. The strip is ${sides(g)}.`,
      es: es`${g.person} mantiene sin malezas una franja junto a la cerca ${g.place.at}. La franja mide ${sides(g)}.`,
    }),
  },
  {
    heading: { en: 'A bed along a wall', es: 'Un arriate junto al muro' },
    statement: (g) => ({
      en: en`A narrow bed runs along the wall ${g.place.of}. It is treated ${g.season} to keep weeds from coming up. The bed is ${sides(g)}.`,
      es: es`Un arriate angosto corre junto al muro ${g.place.of}. Se trata ${g.season} para que no broten malezas. El arriate mide ${sides(g)}.`,
    }),
  },
  {
    heading: { en: 'The edge of a parking lot', es: 'El borde de un estacionamiento' },
    statement: (g) => ({
      en: en`${g.person} treats the planted edge of the parking lot ${g.place.at}. The edge is ${sides(g)}.`,
      es: es`${g.person} trata el borde plantado del estacionamiento ${g.place.at}. El borde mide ${sides(g)}.`,
    }),
  },
  {
    heading: { en: 'A hedge line', es: 'Una línea de seto' },
    statement: (g) => ({
      en: en`The soil under a long hedge ${g.place.at} gets treated. ${g.person} tapes it: ${sides(g)}.`,
      es: es`Se trata el suelo bajo un seto largo ${g.place.at}. ${g.person} lo mide con cinta: ${sides(g)}.`,
    }),
  },
];

/** The ways of telling a rectangle of this form. */
export function rectangleSituations(form: RectangleGiven['form']): readonly Situation<RectangleGiven>[] {
  return form === 'strip' ? strips : lawns;
}
