import { rateFromTestPlot } from '../../../../shared/formulas/rate-from-test-plot.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, convert, inUnit, quantity, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { TestPlotGiven } from './hand-test-plot-texts.ts';

type Given = TestPlotGiven;

export function plotArea(g: Given): Quantity {
  return rectangleArea(g);
}
/** The water that went on the plot. */
export function waterUsed({ test }: Given): Quantity {
  return test.as === 'left-over' ? subtract(convert(test.start, 'fl-oz'), test.left) : test.used;
}
export function ratePart({ test }: Given): PartKey {
  return test.as === 'area-told' ? 'a' : 'b';
}
const told = (g: Given) => g.test.as === 'area-told';
const leftOver = (g: Given) => (g.test.as === 'left-over' ? g.test : null);
/** What part a gave: the area, or the water where that is asked. */
const areaUsed = (g: Given, earlier: Earlier) => (g.test.as === 'refill' && earlier.a ? earlier.a : plotArea(g));
const usedWater = (g: Given, earlier: Earlier) => (leftOver(g) && earlier.a ? earlier.a : waterUsed(g));

export function perThousand(g: Given, earlier: Earlier): Quantity {
  return rateFromTestPlot({ used: usedWater(g, earlier), area: areaUsed(g, earlier), unit: 'gal/1000-sq-ft' });
}
export function perAcre(g: Given, earlier: Earlier): Quantity {
  return convert(earlier.b ?? perThousand(g, earlier), 'gal/acre');
}
const thousand = (value: Rational) => quantity(value, 'gal/1000-sq-ft');
const acre = (value: Rational) => quantity(value, 'gal/acre');

const areaSlips: readonly Slip<Given>[] = [
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => (g.test.as === 'refill' ? quantity(add(g.length, g.width).value.mul(2), 'sq-ft') : null),
    message: () => ({
      en: 'That is the distance around the plot. Area is length times width.',
      es: 'Esa es la distancia alrededor de la parcela. El área es largo por ancho.',
    }),
  },
  {
    key: 'added-sides',
    part: 'a',
    answer: (g) => (g.test.as === 'refill' ? quantity(add(g.length, g.width).value, 'sq-ft') : null),
    message: (g) => ({
      en: en`You added the two sides. ${g.length} plus ${g.width} is a length; for an area, multiply.`,
      es: es`Usted sumó los dos lados. ${g.length} más ${g.width} es una longitud; para un área, multiplique.`,
    }),
  },
];

const waterSlips: readonly Slip<Given>[] = [
  {
    key: 'left-as-used',
    part: 'a',
    answer: (g) => leftOver(g)?.left ?? null,
    message: () => ({
      en: 'That is what stayed in the tank. What went on the plot is the start less what is left.',
      es: 'Eso es lo que quedó en el tanque. Lo que fue a la parcela es lo del principio menos lo que quedó.',
    }),
  },
  {
    key: 'used-tank-size',
    part: 'a',
    answer: (g) => {
      const test = leftOver(g);
      return test && convert(test.start, 'fl-oz');
    },
    message: (g) => ({
      en: en`You took the whole start. ${leftOver(g)?.left ?? ''} were still in the tank.`,
      es: es`Usted tomó todo lo del principio. En el tanque aún quedaban ${leftOver(g)?.left ?? ''}.`,
    }),
  },
  {
    key: 'added-left-over',
    part: 'a',
    answer: (g) => {
      const test = leftOver(g);
      return test && add(convert(test.start, 'fl-oz'), test.left);
    },
    message: () => ({
      en: 'You added what was left. It did not go on the plot, so take it off.',
      es: 'Usted sumó lo que quedó. Eso no fue a la parcela, así que réstelo.',
    }),
  },
];

const rateSlips = slipsAt<Given>(['a', 'b'], ratePart, [
  {
    key: 'inverted-share',
    answer: (g, earlier) => {
      const share = inUnit(areaUsed(g, earlier), '1000-sq-ft');
      return thousand(inUnit(usedWater(g, earlier), 'gal').mul(share));
    },
    message: (g, earlier) => {
      const small = inUnit(areaUsed(g, earlier), '1000-sq-ft').compare(1) < 0;
      return small
        ? {
            en: 'You turned the share round. The plot is smaller than 1,000 sq ft, so 1,000 sq ft takes more than the plot did.',
            es: 'Usted invirtió la proporción. La parcela es menor que 1,000 pies², así que 1,000 pies² llevan más que la parcela.',
          }
        : {
            en: 'You turned the share round. The plot is larger than 1,000 sq ft, so 1,000 sq ft takes less than the plot did.',
            es: 'Usted invirtió la proporción. La parcela es mayor que 1,000 pies², así que 1,000 pies² llevan menos que la parcela.',
          };
    },
  },
  {
    key: 'plot-as-1000',
    answer: (g, earlier) => thousand(inUnit(usedWater(g, earlier), 'gal')),
    message: (g) => ({
      en: en`That is what the plot took. It covers ${told(g) ? plotArea(g) : en`${g.length} × ${g.width}`}; the question is about 1,000 sq ft.`,
      es: es`Eso es lo que llevó la parcela. Mide ${told(g) ? plotArea(g) : es`${g.length} × ${g.width}`}; se pregunta por 1,000 pies².`,
    }),
  },
  {
    key: 'forgot-fl-oz',
    answer: (g, earlier) => {
      const used = usedWater(g, earlier);
      return used.unit === 'fl-oz' ? thousand(used.value.div(inUnit(areaUsed(g, earlier), '1000-sq-ft'))) : null;
    },
    message: () => ({
      en: 'Your number is in fluid ounces. The question asks for gallons, and a gallon is 128 fluid ounces.',
      es: 'Su número está en onzas líquidas. Se piden galones, y un galón tiene 128 onzas líquidas.',
    }),
  },
  {
    key: 'per-square-foot',
    answer: (g, earlier) => thousand(inUnit(usedWater(g, earlier), 'gal').mul(inUnit(areaUsed(g, earlier), 'sq-ft'))),
    message: () => ({
      en: 'You multiplied the water by the whole area. Divide by the area first, then take 1,000 times as much.',
      es: 'Usted multiplicó el agua por toda el área. Divida primero entre el área y luego tome 1,000 veces eso.',
    }),
  },
]);

const acreSlips: readonly Slip<Given>[] = [
  {
    key: 'used-1000-for-acre',
    part: 'c',
    answer: (g, earlier) => (told(g) ? null : acre((earlier.b ?? perThousand(g, earlier)).value)),
    message: () => ({
      en: 'That is the rate for 1,000 sq ft again. An acre is 43,560 sq ft, so it takes 43.56 times as much.',
      es: 'Esa es otra vez la dosis por 1,000 pies². Un acre son 43,560 pies², así que lleva 43.56 veces eso.',
    }),
  },
  {
    key: 'divided-for-multiplied',
    part: 'c',
    answer: (g, earlier) => (told(g) ? null : acre((earlier.b ?? perThousand(g, earlier)).value.div('43.56'))),
    message: () => ({
      en: 'You divided by 43.56. An acre is larger than 1,000 sq ft, so it takes more, not less.',
      es: 'Usted dividió entre 43.56. Un acre es mayor que 1,000 pies², así que lleva más, no menos.',
    }),
  },
  {
    key: 'used-5280',
    part: 'c',
    answer: (g, earlier) => (told(g) ? null : acre((earlier.b ?? perThousand(g, earlier)).value.mul('5.28'))),
    message: () => ({
      en: 'You used 5,280. That is the feet in a mile. An acre is 43,560 square feet.',
      es: 'Usted usó 5,280. Esos son los pies de una milla. Un acre tiene 43,560 pies cuadrados.',
    }),
  },
];

export const testPlotSlips: readonly Slip<Given>[] = [...areaSlips, ...waterSlips, ...rateSlips, ...acreSlips];
