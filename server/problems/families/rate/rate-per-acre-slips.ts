import { acresOf } from '../../../../shared/formulas/acres-of.ts';
import { productForArea } from '../../../../shared/formulas/product-for-area.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es, inWords } from '../../say.ts';
import type { PerAcreGiven } from './rate-per-acre-texts.ts';

type Given = PerAcreGiven;

/** The true area in square feet. */
export function siteArea({ known }: Given): Quantity {
  return known.as === 'sides' ? rectangleArea(known) : known.area;
}
export function productPart({ asks }: Given): PartKey {
  return asks === 'product' ? 'a' : 'b';
}
/** The area to work on with: the trainee's own acres where they were asked for and given. */
export function areaUsed(g: Given, earlier: Earlier): Quantity {
  return (g.asks === 'product' ? undefined : earlier.a) ?? siteArea(g);
}
/** The label's amount for an acre, scaled to the area; product in fluid ounces, water in gallons. */
export function scaled(g: Given, amount: Quantity, earlier: Earlier): Quantity {
  return productForArea({ amount, labelArea: g.line.labelArea, area: areaUsed(g, earlier) });
}
/** The label's product for an acre in fluid ounces. */
export function doseFlOz(g: Given): Quantity {
  return convert(g.line.product, 'fl-oz');
}
const flOz = (value: Quantity['value']) => quantity(value, 'fl-oz');
const acres = (g: Given, earlier: Earlier) => convert(areaUsed(g, earlier), 'acre').value;
const sqFt = (g: Given, earlier: Earlier) => convert(areaUsed(g, earlier), 'sq-ft').value;
/** What one unit of the label is taken for by someone who mixes it up with its neighbor: a quart for a pint. */
const neighbor = (g: Given) => (g.line.product.unit === 'qt' ? flOz(doseFlOz(g).value.div(2)) : scale(doseFlOz(g), 2));

function productSlips(part: PartKey): Slip<Given>[] {
  const here = (answer: (g: Given, earlier: Earlier) => Quantity | null) => (g: Given, earlier: Earlier) =>
    productPart(g) === part ? answer(g, earlier) : null;
  return [
    {
      key: 'full-acre-dose',
      part,
      answer: here(doseFlOz),
      message: (g) => ({
        en: en`That is the amount for a whole acre. ${g.line.product} is for 43,560 sq ft; take your share of it.`,
        es: es`Esa es la cantidad para un acre entero. Los ${g.line.product} son para 43,560 pies²; tome la parte que le toca.`,
      }),
    },
    {
      key: 'inverted-share',
      part,
      answer: here((g, earlier) => flOz(doseFlOz(g).value.div(acres(g, earlier)))),
      message: (g) => ({
        en: en`You divided by your share of an acre. Your site is less than an acre, so it needs less than ${doseFlOz(g)}, not more.`,
        es: es`Usted dividió entre su parte de un acre. Su sitio es menos de un acre, así que necesita menos de ${doseFlOz(g)}, no más.`,
      }),
    },
    {
      key: 'wrong-neighbour',
      part,
      answer: here((g, earlier) => scale(neighbor(g), acres(g, earlier))),
      message: (g) => ({
        en: en`You mixed up pints and quarts. ${g.line.product} is ${doseFlOz(g)}: a pint is 16 fl oz, a quart 32 fl oz.`,
        es: es`Usted confundió pintas y cuartos. ${g.line.product} son ${doseFlOz(g)}: una pinta son 16 oz líq, un cuarto 32 oz líq.`,
      }),
    },
    {
      key: 'forgot-fl-oz',
      part,
      answer: here((g, earlier) => flOz(g.line.product.value.mul(acres(g, earlier)))),
      message: (g) => ({
        en: en`Your number is in ${word(g)}, not in fluid ounces. Change it: ${inWords(quantity(1, g.line.product.unit))} is ${convert(quantity(1, g.line.product.unit), 'fl-oz')}.`,
        es: es`Su número está en ${word(g)}, no en onzas líquidas. Cámbielo: ${inWords(quantity(1, g.line.product.unit))} son ${convert(quantity(1, g.line.product.unit), 'fl-oz')}.`,
      }),
    },
    {
      key: 'used-1000',
      part,
      answer: here((g, earlier) => flOz(doseFlOz(g).value.mul(sqFt(g, earlier)).div(1000))),
      message: () => ({
        en: 'You divided by 1,000. This rate is for an acre, so divide the square feet by 43,560.',
        es: 'Usted dividió entre 1,000. Esta dosis es por acre, así que divida los pies cuadrados entre 43,560.',
      }),
    },
    {
      key: 'treated-sqft-as-acres',
      part,
      answer: here((g, earlier) => flOz(doseFlOz(g).value.mul(sqFt(g, earlier)))),
      message: (g, earlier) => ({
        en: en`You took square feet for acres. ${convert(areaUsed(g, earlier), 'sq-ft')} is less than one acre; divide by 43,560 first.`,
        es: es`Usted tomó pies cuadrados por acres. ${convert(areaUsed(g, earlier), 'sq-ft')} es menos de un acre; divida primero entre 43,560.`,
      }),
    },
    {
      key: 'multiplied-by-43560',
      part,
      answer: here((g, earlier) => flOz(doseFlOz(g).value.mul(sqFt(g, earlier)).mul(43560))),
      message: () => ({
        en: 'You multiplied by 43,560. To turn square feet into acres, divide by it.',
        es: 'Usted multiplicó por 43,560. Para pasar de pies cuadrados a acres, divida.',
      }),
    },
  ];
}
function word(g: Given) {
  return g.line.product.unit === 'qt' ? { en: 'quarts', es: 'cuartos de galón' } : { en: 'pints', es: 'pintas' };
}

const sides = (g: Given) => (g.known.as === 'sides' ? g.known : null);
const acreSlip = (divisor: number) => (g: Given) =>
  sides(g) ? quantity(siteArea(g).value.div(divisor), 'acre') : null;

const acreSlips: readonly Slip<Given>[] = [
  {
    key: 'inverted-share',
    part: 'a',
    answer: (g) => (sides(g) ? quantity(acresOf({ area: siteArea(g) }).value.inverse(), 'acre') : null),
    message: (g) => ({
      en: en`You divided the acre by the site. It goes the other way: ${siteArea(g)} ÷ 43,560.`,
      es: es`Usted dividió el acre entre el sitio. Es al revés: ${siteArea(g)} ÷ 43,560.`,
    }),
  },
  {
    key: 'used-5280',
    part: 'a',
    answer: acreSlip(5280),
    message: () => ({
      en: 'You used 5,280. That is the feet in a mile. An acre is 43,560 square feet.',
      es: 'Usted usó 5,280. Esos son los pies de una milla. Un acre tiene 43,560 pies cuadrados.',
    }),
  },
  {
    key: 'used-4356',
    part: 'a',
    answer: acreSlip(4356),
    message: () => ({
      en: 'You used 4,356. A digit is missing: an acre is 43,560 square feet.',
      es: 'Usted usó 4,356. Falta una cifra: un acre tiene 43,560 pies cuadrados.',
    }),
  },
  {
    key: 'used-1000',
    part: 'a',
    answer: acreSlip(1000),
    message: () => ({
      en: 'Those are thousands of square feet. For acres, divide by 43,560.',
      es: 'Esos son miles de pies cuadrados. Para acres, divida entre 43,560.',
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => {
      const known = sides(g);
      return known ? quantity(add(known.length, known.width).value.mul(2).div(43560), 'acre') : null;
    },
    message: () => ({
      en: 'You used the distance around the field. Area is length times width.',
      es: 'Usted usó la distancia alrededor del campo. El área es largo por ancho.',
    }),
  },
];

const withWater = (g: Given) => g.asks === 'acres-product-and-water';
const waterSlips: readonly Slip<Given>[] = [
  {
    key: 'product-only',
    part: 'c',
    answer: (g) => (withWater(g) ? g.line.water : null),
    message: (g) => ({
      en: en`You scaled the product but not the water. The label's ${g.line.water} is for a whole acre, too.`,
      es: es`Usted ajustó el producto, pero no el agua. Los ${g.line.water} de la etiqueta también son para un acre entero.`,
    }),
  },
  {
    key: 'inverted-share',
    part: 'c',
    answer: (g, earlier) => (withWater(g) ? quantity(g.line.water.value.div(acres(g, earlier)), 'gal') : null),
    message: (g) => ({
      en: en`You divided by your share of an acre. Your site is less than an acre, so it needs less than ${g.line.water}, not more.`,
      es: es`Usted dividió entre su parte de un acre. Su sitio es menos de un acre, así que necesita menos de ${g.line.water}, no más.`,
    }),
  },
  {
    key: 'used-1000',
    part: 'c',
    answer: (g, earlier) => (withWater(g) ? quantity(g.line.water.value.mul(sqFt(g, earlier)).div(1000), 'gal') : null),
    message: (g) => ({
      en: en`You divided by 1,000. The ${g.line.water} is for an acre, so divide the square feet by 43,560.`,
      es: es`Usted dividió entre 1,000. Los ${g.line.water} son por acre, así que divida los pies cuadrados entre 43,560.`,
    }),
  },
];

export const perAcreSlips: readonly Slip<Given>[] = [
  ...acreSlips,
  ...productSlips('a'),
  ...productSlips('b'),
  ...waterSlips,
];
