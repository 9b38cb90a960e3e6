import { acresOf } from '../../../../shared/formulas/acres-of.ts';
import { productForArea } from '../../../../shared/formulas/product-for-area.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, convert, quantity, ratio, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es, rounded } from '../../say.ts';
import type { PerThousandGiven } from './rate-per-1000-texts.ts';

type Given = PerThousandGiven;

/** The true area in square feet. */
export function siteArea({ known }: Given): Quantity {
  return known.as === 'sides' ? rectangleArea(known) : convert(known.area, 'sq-ft');
}
/** The part that asks for product: the only one where the area is given, else the second. */
export function productPart({ known }: Given): PartKey {
  return known.as === 'area' ? 'a' : 'b';
}
/** The area to work on with: the trainee's own where one was asked for and given. */
export function areaUsed(g: Given, earlier: Earlier): Quantity {
  return (productPart(g) === 'b' ? earlier.a : undefined) ?? siteArea(g);
}
export function productNeeded(g: Given, earlier: Earlier): Quantity {
  return productForArea({ amount: g.line.product, labelArea: g.line.labelArea, area: areaUsed(g, earlier) });
}
const product = (g: Given, value: Quantity['value']) => quantity(value, g.line.product.unit);

function productSlips(part: PartKey): Slip<Given>[] {
  const here = (answer: (g: Given, earlier: Earlier) => Quantity | null) => (g: Given, earlier: Earlier) =>
    productPart(g) === part ? answer(g, earlier) : null;
  return [
    {
      key: 'inverted-rate',
      part,
      answer: here((g, earlier) => product(g, ratio(areaUsed(g, earlier), g.line.labelArea).div(g.line.product.value))),
      message: (g) => ({
        en: en`You divided by the rate. Each ${g.line.labelArea} takes ${g.line.product}, so multiply the thousands by ${g.line.product}.`,
        es: es`Usted dividió entre la dosis. Cada ${g.line.labelArea} llevan ${g.line.product}, así que multiplique los miles por ${g.line.product}.`,
      }),
    },
    {
      key: 'full-label-amount',
      part,
      answer: here((g) => g.line.product),
      message: (g, earlier) => ({
        en: en`That is the label's amount for ${g.line.labelArea}. Your site is ${rounded(quantity(ratio(areaUsed(g, earlier), g.line.labelArea), 'count'), 2)} times that.`,
        es: es`Esa es la cantidad de la etiqueta para ${g.line.labelArea}. Su sitio es ${rounded(quantity(ratio(areaUsed(g, earlier), g.line.labelArea), 'count'), 2)} veces eso.`,
      }),
    },
    {
      key: 'thousands-as-product',
      part,
      answer: here((g, earlier) => product(g, ratio(areaUsed(g, earlier), g.line.labelArea))),
      message: (g) => ({
        en: en`That is how many thousands of square feet you have. Each of them takes ${g.line.product}: multiply once more.`,
        es: es`Eso es cuántos miles de pies cuadrados tiene. Cada uno lleva ${g.line.product}: multiplique una vez más.`,
      }),
    },
    {
      key: 'used-acre',
      part,
      answer: here((g, earlier) => product(g, g.line.product.value.mul(acresOf({ area: areaUsed(g, earlier) }).value))),
      message: (g) => ({
        en: en`You used acres. This rate is for each ${g.line.labelArea}, so divide the square feet by 1,000, not by 43,560.`,
        es: es`Usted usó acres. Esta dosis es por cada ${g.line.labelArea}, así que divida los pies cuadrados entre 1,000, no entre 43,560.`,
      }),
    },
    {
      key: 'forgot-to-divide-by-1000',
      part,
      answer: here((g, earlier) => product(g, g.line.product.value.mul(areaUsed(g, earlier).value))),
      message: (g, earlier) => ({
        en: en`You did not divide by 1,000. The label gives ${g.line.product} for each ${g.line.labelArea}, not for each square foot. Divide ${areaUsed(g, earlier)} by 1,000 first.`,
        es: es`Le faltó dividir entre 1,000. La etiqueta da ${g.line.product} por cada ${g.line.labelArea}, no por cada pie cuadrado. Divida primero ${areaUsed(g, earlier)} entre 1,000.`,
      }),
    },
  ];
}

function areaFromAcres(perAcre: number): (g: Given) => Quantity | null {
  return ({ known }) => (known.as === 'acres' ? quantity(known.area.value.mul(perAcre), 'sq-ft') : null);
}

const areaSlips: readonly Slip<Given>[] = [
  {
    key: 'used-5280',
    part: 'a',
    answer: areaFromAcres(5280),
    message: () => ({
      en: 'You used 5,280. That is the feet in a mile. An acre is 43,560 square feet.',
      es: 'Usted usó 5,280. Esos son los pies de una milla. Un acre tiene 43,560 pies cuadrados.',
    }),
  },
  {
    key: 'used-4356',
    part: 'a',
    answer: areaFromAcres(4356),
    message: () => ({
      en: 'You used 4,356. A digit is missing: an acre is 43,560 square feet.',
      es: 'Usted usó 4,356. Falta una cifra: un acre tiene 43,560 pies cuadrados.',
    }),
  },
  {
    key: 'used-1000',
    part: 'a',
    answer: areaFromAcres(1000),
    message: () => ({
      en: 'You used 1,000 square feet for an acre. An acre is 43,560 square feet.',
      es: 'Usted usó 1,000 pies cuadrados por acre. Un acre tiene 43,560 pies cuadrados.',
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: ({ known }) =>
      known.as === 'sides' ? quantity(add(known.length, known.width).value.mul(2), 'sq-ft') : null,
    message: () => ({
      en: 'That is the distance around. Area is length times width.',
      es: 'Esa es la distancia alrededor. El área es largo por ancho.',
    }),
  },
  {
    key: 'added-sides',
    part: 'a',
    answer: ({ known }) => (known.as === 'sides' ? quantity(add(known.length, known.width).value, 'sq-ft') : null),
    message: () => ({
      en: 'You added the two sides. For an area, multiply them.',
      es: 'Usted sumó los dos lados. Para un área, multiplíquelos.',
    }),
  },
];

export const perThousandSlips: readonly Slip<Given>[] = [...areaSlips, ...productSlips('a'), ...productSlips('b')];
