import { mixFromWaterTrial } from '../../../../shared/formulas/mix-from-water-trial.ts';
import { productForMix } from '../../../../shared/formulas/product-for-mix.ts';
import { convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { plantsOf, type WaterTestGiven } from './spot-water-test-texts.ts';

type Given = WaterTestGiven;

const gallon = quantity(1, 'gal');
const count = (value: number) => quantity(value, 'count');

export function plants(g: Given): number {
  return g.rows.reduce((sum, row) => sum + row, 0);
}
/** Mix for so many plants at what the trial took. */
function mixFor(g: Given, many: number): Quantity {
  return convert(mixFromWaterTrial({ used: g.used, tried: count(g.tried), all: count(many) }), 'gal');
}
export function mixForAll(g: Given): Quantity {
  return mixFor(g, plants(g));
}
/** Several rows are measured for with a cup; else the label's own unit serves. */
export function askedUnit(g: Given): 'tbsp' | 'fl-oz' {
  return g.rows.length > 1 || g.line.product.unit === 'fl-oz' ? 'fl-oz' : 'tbsp';
}
const mixUsed = (g: Given, earlier: Earlier) => earlier.a ?? mixForAll(g);
function productIn(g: Given, mix: Quantity): Quantity {
  return convert(productForMix({ amount: g.line.product, perMix: gallon, mix }), askedUnit(g));
}
export function productNeeded(g: Given, earlier: Earlier): Quantity {
  return productIn(g, mixUsed(g, earlier));
}

const mixSlips: readonly Slip<Given>[] = [
  {
    key: 'trial-volume-as-total',
    part: 'a',
    answer: (g) => convert(g.used, 'gal'),
    message: (g) => ({
      en: en`That is what the trial alone took. It wetted ${g.tried} ${plantsOf(g)}; the job is ${plants(g)}.`,
      es: es`Eso es lo que llevó la prueba sola. Mojó ${g.tried} ${plantsOf(g)}; el trabajo es de ${plants(g)}.`,
    }),
  },
  {
    key: 'per-plant-forgotten',
    part: 'a',
    answer: (g) => convert(scale(g.used, String(plants(g))), 'gal'),
    message: (g) => ({
      en: en`You took the whole trial for one plant. ${g.used} wetted ${g.tried} of them, so divide by ${g.tried} first.`,
      es: es`Usted tomó toda la prueba para una sola planta. Con ${g.used} se mojaron ${g.tried}, así que divida primero entre ${g.tried}.`,
    }),
  },
  {
    key: 'one-plant-only',
    part: 'a',
    answer: (g) => mixFor(g, 1),
    message: (g) => ({
      en: en`That is the spray for one plant. There are ${plants(g)} ${plantsOf(g)} to spray.`,
      es: es`Esa es la mezcla para una planta. Hay que rociar ${plants(g)} ${plantsOf(g)}.`,
    }),
  },
  {
    key: 'inverted-share',
    part: 'a',
    answer: (g) => convert(scale(g.used, rational(g.tried, plants(g))), 'gal'),
    message: (g) => ({
      en: en`You turned the share round. ${plants(g)} plants need more than ${g.tried} do, not less: multiply by ${plants(g)} and divide by ${g.tried}.`,
      es: es`Usted invirtió la proporción. ${plants(g)} plantas llevan más que ${g.tried}, no menos: multiplique por ${plants(g)} y divida entre ${g.tried}.`,
    }),
  },
  {
    key: 'wrong-neighbour',
    part: 'a',
    answer: (g) => (g.used.unit === 'qt' ? scale(mixForAll(g), 4) : null),
    message: (g) => ({
      en: en`You read the quarts as gallons. The trial took ${g.used}, and a gallon is 4 quarts.`,
      es: es`Usted leyó los cuartos como galones. La prueba llevó ${g.used}, y un galón tiene 4 cuartos.`,
    }),
  },
  {
    key: 'forgot-128',
    part: 'a',
    answer: (g) => (g.used.unit === 'fl-oz' ? scale(mixForAll(g), 128) : null),
    message: () => ({
      en: 'Your number is in fluid ounces. A gallon is 128 fluid ounces, so divide by 128.',
      es: 'Su número está en onzas líquidas. Un galón tiene 128 onzas líquidas, así que divida entre 128.',
    }),
  },
  {
    key: 'forgot-one',
    part: 'a',
    answer: (g) => (g.rows.length > 1 ? mixFor(g, g.rows[0] ?? 0) : null),
    message: (g) => ({
      en: en`You counted one row only. The second row of ${g.rows[1] ?? 0} is sprayed, too.`,
      es: es`Usted contó una sola hilera. La segunda, de ${g.rows[1] ?? 0}, también se rocía.`,
    }),
  },
];

const productSlips: readonly Slip<Given>[] = [
  {
    key: 'one-gallon-only',
    part: 'b',
    answer: (g) => convert(g.line.product, askedUnit(g)),
    message: (g) => ({
      en: en`That is the product for one gallon. The label's ${g.line.product} goes into each gallon you mix.`,
      es: es`Ese es el producto para un galón. La cantidad de la etiqueta, ${g.line.product}, va en cada galón que prepare.`,
    }),
  },
  {
    key: 'trial-volume-as-total',
    part: 'b',
    answer: (g) => productIn(g, convert(g.used, 'gal')),
    message: (g) => ({
      en: en`That is the product for the water of the trial. Use the mix for all ${plants(g)} ${plantsOf(g)}.`,
      es: es`Ese es el producto para el agua de la prueba. Use la mezcla para todos: ${plants(g)} ${plantsOf(g)}.`,
    }),
  },
  {
    key: 'divided-for-multiplied',
    part: 'b',
    answer: (g, earlier) => scale(convert(g.line.product, askedUnit(g)), mixUsed(g, earlier).value.inverse()),
    message: (g) => ({
      en: en`You divided by the gallons. Each gallon needs ${g.line.product}, so multiply.`,
      es: es`Usted dividió entre los galones. Cada galón lleva ${g.line.product}, así que multiplique.`,
    }),
  },
  {
    key: 'tsp-for-tbsp',
    part: 'b',
    answer: (g, earlier) => (g.line.product.unit === 'tbsp' ? scale(productNeeded(g, earlier), rational(1, 3)) : null),
    message: (g) => ({
      en: en`You used teaspoons for tablespoons. The label says ${g.line.product}, and a tablespoon (Tbsp) holds 3 teaspoons (tsp).`,
      es: es`Usted usó cucharaditas por cucharadas. La etiqueta dice ${g.line.product}, y una cucharada (cda) tiene 3 cucharaditas (cdta).`,
    }),
  },
  {
    key: 'used-label-number',
    part: 'b',
    answer: (g, earlier) =>
      g.line.product.unit === askedUnit(g)
        ? null
        : quantity(g.line.product.value.mul(mixUsed(g, earlier).value), askedUnit(g)),
    message: (g) => ({
      en: en`Your number is in tablespoons. The label says ${g.line.product}; the answer is asked in fluid ounces, and 2 Tbsp are 1 fl oz.`,
      es: es`Su número está en cucharadas. La etiqueta dice ${g.line.product}; se piden onzas líquidas, y 2 cdas son 1 oz líq.`,
    }),
  },
];

export const waterTestSlips: readonly Slip<Given>[] = [...mixSlips, ...productSlips];
