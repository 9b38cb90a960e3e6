import { productForArea } from '../../../../shared/formulas/product-for-area.ts';
import { add, quantity, ratio, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es, rounded } from '../../say.ts';
import { listed, obstacleArea, obstacleName, sumOf, treatedArea, wholeLawn } from '../area/obstacles.ts';
import type { LabelBaseGiven } from './rate-label-base-texts.ts';

type Given = LabelBaseGiven;

/** The area to work on with: the trainee's own where given, else the true one. */
export function areaUsed(g: Given, earlier: Earlier): Quantity {
  return earlier.a ?? treatedArea(g);
}
/** The label's amount scaled to the area. */
export function scaled(g: Given, amount: Quantity, earlier: Earlier): Quantity {
  return productForArea({ amount, labelArea: g.line.labelArea, area: areaUsed(g, earlier) });
}
function upsideDown(g: Given, amount: Quantity, earlier: Earlier): Quantity {
  return productForArea({ amount, labelArea: areaUsed(g, earlier), area: g.line.labelArea });
}
const names = (g: Given) => listed(g.obstacles.map(obstacleName));
const off = (g: Given) => sumOf(g.obstacles.map(obstacleArea));
const blocked = (g: Given) => g.obstacles.length > 0;
const times = (g: Given, earlier: Earlier) =>
  rounded(quantity(ratio(areaUsed(g, earlier), g.line.labelArea), 'count'), 2);
const moreOrLess = (g: Given, earlier: Earlier) =>
  ratio(areaUsed(g, earlier), g.line.labelArea).compare(1) > 0
    ? {
        en: "Your lawn is larger than the label's area, so you need more, not less.",
        es: 'Su césped es más grande que el área de la etiqueta, así que necesita más, no menos.',
      }
    : {
        en: "Your lawn is smaller than the label's area, so you need less, not more.",
        es: 'Su césped es más pequeño que el área de la etiqueta, así que necesita menos, no más.',
      };

const areaSlips: readonly Slip<Given>[] = [
  {
    key: 'left-in-obstacle',
    part: 'a',
    answer: (g) => (blocked(g) ? wholeLawn(g) : null),
    message: (g) => ({
      en: en`You left in ${names(g)}. Take off ${off(g)} that is not sprayed.`,
      es: es`En su área siguen ${names(g)}. Reste ${off(g)} que no se rocían.`,
    }),
  },
  {
    key: 'added-obstacle',
    part: 'a',
    answer: (g) => (blocked(g) ? add(wholeLawn(g), off(g)) : null),
    message: (g) => ({
      en: en`You added ${names(g)}. That ground is not sprayed, so ${off(g)} come off.`,
      es: es`Usted sumó ${names(g)}. Ese suelo no se rocía, así que se restan ${off(g)}.`,
    }),
  },
  {
    key: 'forgot-one',
    part: 'a',
    answer: (g) => {
      const last = g.obstacles.at(-1);
      return last && g.obstacles.length > 1 ? add(treatedArea(g), obstacleArea(last)) : null;
    },
    message: (g) => {
      const last = g.obstacles.at(-1);
      const name = last ? obstacleName(last) : names(g);
      return {
        en: en`You forgot ${name}. It is not sprayed either; take off ${last ? obstacleArea(last) : off(g)} more.`,
        es: es`Le faltó restar ${name}. Tampoco se rocía; reste ${last ? obstacleArea(last) : off(g)} más.`,
      };
    },
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => quantity(add(g.length, g.width).value.mul(2), 'sq-ft'),
    message: () => ({
      en: 'That is the distance around the lawn. Area is length times width.',
      es: 'Esa es la distancia alrededor del césped. El área es largo por ancho.',
    }),
  },
  {
    key: 'added-sides',
    part: 'a',
    answer: (g) => quantity(add(g.length, g.width).value, 'sq-ft'),
    message: (g) => ({
      en: en`You added the two sides. ${g.length} plus ${g.width} is a length; for an area, multiply.`,
      es: es`Usted sumó los dos lados. ${g.length} más ${g.width} es una longitud; para un área, multiplique.`,
    }),
  },
];

const productSlips: readonly Slip<Given>[] = [
  {
    key: 'full-label-amount',
    part: 'b',
    answer: (g) => g.line.product,
    message: (g, earlier) => ({
      en: en`That is the label's amount for ${g.line.labelArea}. Your area is ${times(g, earlier)} times as large.`,
      es: es`Esa es la cantidad de la etiqueta para ${g.line.labelArea}. Su área es ${times(g, earlier)} veces esa.`,
    }),
  },
  {
    key: 'inverted-share',
    part: 'b',
    answer: (g, earlier) => upsideDown(g, g.line.product, earlier),
    message: (g, earlier) => ({
      en: en`You divided the label's area by your area. ${moreOrLess(g, earlier)}`,
      es: es`Usted dividió el área de la etiqueta entre la suya. ${moreOrLess(g, earlier)}`,
    }),
  },
  {
    key: 'used-water-amount',
    part: 'b',
    answer: (g, earlier) => quantity(scaled(g, g.line.water, earlier).value, g.line.product.unit),
    message: (g) => ({
      en: en`You scaled the water instead of the product. The label has two amounts: ${g.line.product} of product in ${g.line.water} of water.`,
      es: es`Usted usó el agua en lugar del producto. La etiqueta da dos cantidades: ${g.line.product} de producto en ${g.line.water} de agua.`,
    }),
  },
  {
    key: 'forgot-to-divide-by-1000',
    part: 'b',
    answer: (g, earlier) => quantity(g.line.product.value.mul(areaUsed(g, earlier).value), g.line.product.unit),
    message: (g, earlier) => ({
      en: en`You did not divide by the label's area. The label gives ${g.line.product} for each ${g.line.labelArea}, not for each square foot. Divide ${areaUsed(g, earlier)} by ${g.line.labelArea} first.`,
      es: es`Le faltó dividir entre el área de la etiqueta. La etiqueta da ${g.line.product} por cada ${g.line.labelArea}, no por cada pie cuadrado. Divida primero ${areaUsed(g, earlier)} entre ${g.line.labelArea}.`,
    }),
  },
];

const waterSlips: readonly Slip<Given>[] = [
  {
    key: 'product-only',
    part: 'c',
    answer: (g) => g.line.water,
    message: (g) => ({
      en: en`You scaled the product but not the water. The label's ${g.line.water} is for ${g.line.labelArea}, too.`,
      es: es`Usted ajustó el producto, pero no el agua. Los ${g.line.water} de la etiqueta también son para ${g.line.labelArea}.`,
    }),
  },
  {
    key: 'inverted-share',
    part: 'c',
    answer: (g, earlier) => upsideDown(g, g.line.water, earlier),
    message: (g, earlier) => ({
      en: en`You divided the label's area by your area. ${moreOrLess(g, earlier)}`,
      es: es`Usted dividió el área de la etiqueta entre la suya. ${moreOrLess(g, earlier)}`,
    }),
  },
  {
    key: 'forgot-to-divide-by-1000',
    part: 'c',
    answer: (g, earlier) => quantity(g.line.water.value.mul(areaUsed(g, earlier).value), 'gal'),
    message: (g) => ({
      en: en`You did not divide by the label's area. The label's ${g.line.water} is for each ${g.line.labelArea}, not for each square foot.`,
      es: es`Le faltó dividir entre el área de la etiqueta. Los ${g.line.water} son por cada ${g.line.labelArea}, no por cada pie cuadrado.`,
    }),
  },
];

export const labelBaseSlips: readonly Slip<Given>[] = [...areaSlips, ...productSlips, ...waterSlips];
