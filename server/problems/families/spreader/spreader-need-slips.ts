import { productForArea } from '../../../../shared/formulas/product-for-area.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, inUnit, quantity, ratio, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { SpreaderNeedGiven } from './spreader-need-texts.ts';

type Given = SpreaderNeedGiven;

export const thousand = quantity(1000, 'sq-ft');

export function siteArea({ known }: Given): Quantity {
  return known.as === 'area' ? known.area : rectangleArea(known);
}
export function productPart({ known }: Given): PartKey {
  return known.as === 'area' ? 'a' : 'b';
}
const areaUsed = (g: Given, earlier: Earlier) => (g.known.as === 'sides' && earlier.a ? earlier.a : siteArea(g));
export function pounds(g: Given, earlier: Earlier): Quantity {
  return productForArea({ amount: g.line.product, labelArea: thousand, area: areaUsed(g, earlier) });
}
const poundsUsed = (g: Given, earlier: Earlier) => earlier.b ?? pounds(g, earlier);
export function bags(g: Given, earlier: Earlier): Quantity {
  return quantity(ratio(poundsUsed(g, earlier), g.bag).ceil(), 'count');
}
const sides = ({ known }: Given) => (known.as === 'sides' ? known : null);
const lb = (value: Quantity['value']) => quantity(value, 'lb');

const areaSlips: readonly Slip<Given>[] = [
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => {
      const known = sides(g);
      return known && quantity(add(known.length, known.width).value.mul(2), 'sq-ft');
    },
    message: () => ({
      en: 'That is the distance around the site. Area is length times width.',
      es: 'Esa es la distancia alrededor del sitio. El área es largo por ancho.',
    }),
  },
  {
    key: 'added-sides',
    part: 'a',
    answer: (g) => {
      const known = sides(g);
      return known && quantity(add(known.length, known.width).value, 'sq-ft');
    },
    message: () => ({
      en: 'You added the two sides. That is a length; for an area, multiply them.',
      es: 'Usted sumó los dos lados. Eso es una longitud; para un área, multiplíquelos.',
    }),
  },
];

const poundSlips = slipsAt<Given>(['a', 'b'], productPart, [
  {
    key: 'forgot-to-divide-by-1000',
    answer: (g, earlier) => lb(g.line.product.value.mul(inUnit(areaUsed(g, earlier), 'sq-ft'))),
    message: (g) => ({
      en: en`You did not divide by 1,000. The label gives ${g.line.product} for each 1,000 sq ft, not for each square foot.`,
      es: es`Le faltó dividir entre 1,000. La etiqueta da ${g.line.product} por cada 1,000 pies², no por cada pie cuadrado.`,
    }),
  },
  {
    key: 'inverted-rate',
    answer: (g, earlier) => lb(inUnit(areaUsed(g, earlier), '1000-sq-ft').div(g.line.product.value)),
    message: (g) => ({
      en: en`You divided by the rate. Each 1,000 sq ft takes ${g.line.product}, so multiply the thousands by it.`,
      es: es`Usted dividió entre la dosis. Cada 1,000 pies² llevan ${g.line.product}, así que multiplique los miles por ella.`,
    }),
  },
  {
    key: 'one-dose-only',
    answer: (g) => g.line.product,
    message: (g, earlier) => ({
      en: en`That is the label's amount for 1,000 sq ft. The site is ${areaUsed(g, earlier)}.`,
      es: es`Esa es la cantidad de la etiqueta para 1,000 pies². El sitio tiene ${areaUsed(g, earlier)}.`,
    }),
  },
  {
    key: 'bags-not-pounds',
    answer: (g, earlier) => lb(ratio(pounds(g, earlier), g.bag)),
    message: (g) => ({
      en: en`That is a number of bags. The question asks for pounds; a bag holds ${g.bag}.`,
      es: es`Ese es un número de bolsas. Se piden libras; una bolsa trae ${g.bag}.`,
    }),
  },
  {
    key: 'used-acre',
    answer: (g, earlier) => lb(g.line.product.value.mul(inUnit(areaUsed(g, earlier), 'acre'))),
    message: () => ({
      en: 'You divided by an acre. This rate is for 1,000 sq ft, not for 43,560.',
      es: 'Usted dividió entre un acre. Esta dosis es por 1,000 pies², no por 43,560.',
    }),
  },
]);

const bagSlips: readonly Slip<Given>[] = [
  {
    key: 'rounded-down',
    part: 'c',
    answer: (g, earlier) => (g.bagsAsked ? quantity(ratio(poundsUsed(g, earlier), g.bag).floor(), 'count') : null),
    message: (g) => ({
      en: en`You rounded down. Full bags of ${g.bag} are not enough; part of one more is needed.`,
      es: es`Usted redondeó hacia abajo. Las bolsas enteras de ${g.bag} no alcanzan; hace falta parte de otra.`,
    }),
  },
  {
    key: 'one-bag-a-thousand',
    part: 'c',
    answer: (g, earlier) => (g.bagsAsked ? quantity(inUnit(areaUsed(g, earlier), '1000-sq-ft').ceil(), 'count') : null),
    message: () => ({
      en: 'That is one bag for each 1,000 sq ft. Divide the pounds by what a bag holds.',
      es: 'Eso es una bolsa por cada 1,000 pies². Divida las libras entre lo que trae una bolsa.',
    }),
  },
];

export const spreaderNeedSlips: readonly Slip<Given>[] = [...areaSlips, ...poundSlips, ...bagSlips];
