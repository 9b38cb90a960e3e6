import { gallonsPerAcreFrom128th } from '../../../../shared/formulas/gallons-per-acre-from-128th.ts';
import { mixForArea } from '../../../../shared/formulas/mix-for-area.ts';
import { add, convert, quantity, ratio, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { Hand128thGiven } from './hand-128th-texts.ts';

type Given = Hand128thGiven;

const gpa = (value: Rational) => quantity(value, 'gal/acre');
const catchAgain = (g: Given) => (g.test.as === 'short-catch' ? g.test : null);

/** What the nozzle gives in the time that the plot takes. */
export function caughtOnPlot({ test, plotTime }: Given): Quantity {
  if (test.as === 'caught') return test.caught;
  if (test.as === 'quart-and-ounces') return add(test.ounces, test.quarts);
  return scale(test.caught, ratio(plotTime, test.catchTime));
}
/** The part that asks for gallons per acre. */
export function ratePart({ test }: Given): PartKey {
  return test.as === 'short-catch' ? 'b' : 'a';
}
const ounces = (g: Given, earlier: Earlier) => (catchAgain(g) && earlier.a ? earlier.a : caughtOnPlot(g));
export function rate(g: Given, earlier: Earlier): Quantity {
  return gallonsPerAcreFrom128th({ caught: ounces(g, earlier) });
}
/** The rate for 1,000 sq ft, from the trainee's own rate for an acre where given. */
export function perThousand(g: Given, earlier: Earlier): Quantity {
  return convert(earlier.a ?? rate(g, {}), 'gal/1000-sq-ft');
}
/** Mix for the site, from the trainee's own rate where given. */
export function siteMix(g: Given, earlier: Earlier): Quantity {
  const site = catchAgain(g)?.site ?? quantity(1, 'acre');
  return mixForArea({ rate: earlier.b ?? rate(g, earlier), area: site });
}

const catchSlips: readonly Slip<Given>[] = [
  {
    key: 'forgot-seconds',
    part: 'a',
    answer: (g) => catchAgain(g)?.caught ?? null,
    message: (g) => ({
      en: en`You used the catch as it is. It took ${catchAgain(g)?.catchTime ?? g.plotTime}, and the plot takes ${g.plotTime}.`,
      es: es`Usted usó lo recogido tal cual. Se recogió en ${catchAgain(g)?.catchTime ?? g.plotTime}, y la parcela lleva ${g.plotTime}.`,
    }),
  },
  {
    key: 'inverted-share',
    part: 'a',
    answer: (g) => {
      const short = catchAgain(g);
      return short && scale(short.caught, ratio(short.catchTime, g.plotTime));
    },
    message: (g) => ({
      en: en`You turned the times round. Divide the catch by its ${catchAgain(g)?.catchTime ?? g.plotTime}, then multiply by the plot's ${g.plotTime}.`,
      es: es`Usted invirtió los tiempos. Divida lo recogido entre sus ${catchAgain(g)?.catchTime ?? g.plotTime} y multiplique por los ${g.plotTime} de la parcela.`,
    }),
  },
  {
    key: 'per-minute',
    part: 'a',
    answer: (g) => {
      const short = catchAgain(g);
      return short && scale(short.caught, ratio(quantity(60, 's'), short.catchTime));
    },
    message: (g) => ({
      en: en`That is what the nozzle gives in a minute. The plot takes ${g.plotTime}.`,
      es: es`Eso da la boquilla en un minuto. La parcela lleva ${g.plotTime}.`,
    }),
  },
];

const rateSlips = slipsAt<Given>(['a', 'b'], ratePart, [
  {
    key: 'forgot-quart',
    answer: ({ test }) => (test.as === 'quart-and-ounces' ? gpa(test.ounces.value) : null),
    message: () => ({
      en: 'You left out the quart. It is 32 fluid ounces on top of the loose ones.',
      es: 'Le faltó el cuarto. Son 32 onzas líquidas más, además de las sueltas.',
    }),
  },
  {
    key: 'wrong-neighbour',
    answer: ({ test }) =>
      test.as === 'quart-and-ounces' ? gpa(test.quarts.value.mul(16).add(test.ounces.value)) : null,
    message: () => ({
      en: 'You took the quart for a pint. A pint is 16 fluid ounces, a quart 32.',
      es: 'Usted tomó el cuarto por una pinta. Una pinta tiene 16 onzas líquidas, un cuarto 32.',
    }),
  },
  {
    key: 'multiplied-by-128',
    answer: (g, earlier) => gpa(ounces(g, earlier).value.mul(128)),
    message: () => ({
      en: 'You multiplied by 128. The plot already does that: ounces on 1/128 acre are gallons on an acre, one for one.',
      es: 'Usted multiplicó por 128. La parcela ya lo hace: las onzas en 1/128 de acre son los galones en un acre, una por uno.',
    }),
  },
  {
    key: 'divided-by-128',
    answer: (g, earlier) => gpa(ounces(g, earlier).value.div(128)),
    message: () => ({
      en: 'That is the gallons on the plot. An acre is 128 such plots, so the ounces stand for gallons as they are.',
      es: 'Esos son los galones en la parcela. Un acre son 128 parcelas así, de modo que las onzas valen como galones.',
    }),
  },
  {
    key: 'used-1000-sq-ft',
    answer: (g, earlier) => gpa(ounces(g, earlier).value.div(128).mul('43.56')),
    message: () => ({
      en: 'You took the plot for 1,000 sq ft. It is 340 sq ft, 1/128 of an acre.',
      es: 'Usted tomó la parcela por 1,000 pies². Tiene 340 pies², 1/128 de acre.',
    }),
  },
]);

const thousandSlips: readonly Slip<Given>[] = [
  {
    key: 'multiplied-for-divided',
    part: 'b',
    answer: (g, earlier) =>
      catchAgain(g) ? null : quantity((earlier.a ?? rate(g, {})).value.mul('43.56'), 'gal/1000-sq-ft'),
    message: () => ({
      en: 'You multiplied by 43.56. 1,000 sq ft is a small part of an acre, so divide.',
      es: 'Usted multiplicó por 43.56. 1,000 pies² son una parte pequeña de un acre, así que divida.',
    }),
  },
  {
    key: 'used-1000',
    part: 'b',
    answer: (g, earlier) =>
      catchAgain(g) ? null : quantity((earlier.a ?? rate(g, {})).value.div(1000), 'gal/1000-sq-ft'),
    message: () => ({
      en: 'You divided by 1,000. An acre holds 43.56 areas of 1,000 sq ft, so divide by 43.56.',
      es: 'Usted dividió entre 1,000. Un acre tiene 43.56 áreas de 1,000 pies², así que divida entre 43.56.',
    }),
  },
];

const siteSlips: readonly Slip<Given>[] = [
  {
    key: 'full-acre-dose',
    part: 'c',
    answer: (g, earlier) => (catchAgain(g) ? quantity((earlier.b ?? rate(g, earlier)).value, 'gal') : null),
    message: (g) => ({
      en: en`That is the mix for a whole acre. The job is ${catchAgain(g)?.site ?? ''}, out of 43,560 sq ft.`,
      es: es`Esa es la mezcla para un acre entero. El trabajo son ${catchAgain(g)?.site ?? ''}, de 43,560 pies².`,
    }),
  },
  {
    key: 'used-1000',
    part: 'c',
    answer: (g, earlier) => {
      const short = catchAgain(g);
      return short && quantity((earlier.b ?? rate(g, earlier)).value.mul(short.site.value).div(1000), 'gal');
    },
    message: () => ({
      en: 'You divided the area by 1,000. The rate is for an acre, so divide by 43,560.',
      es: 'Usted dividió el área entre 1,000. La dosis es por acre, así que divida entre 43,560.',
    }),
  },
  {
    key: 'inverted-share',
    part: 'c',
    answer: (g, earlier) => {
      const short = catchAgain(g);
      return short && quantity((earlier.b ?? rate(g, earlier)).value.mul(43560).div(short.site.value), 'gal');
    },
    message: () => ({
      en: 'You divided the acre by the site. The site is less than an acre, so it takes less than the acre does.',
      es: 'Usted dividió el acre entre el sitio. El sitio es menos de un acre, así que lleva menos que el acre.',
    }),
  },
];

export const hand128thSlips: readonly Slip<Given>[] = [...catchSlips, ...rateSlips, ...thousandSlips, ...siteSlips];
