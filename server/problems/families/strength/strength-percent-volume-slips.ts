import { productForPercentVolume } from '../../../../shared/formulas/product-for-percent-volume.ts';
import { add, convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { PercentVolumeGiven } from './strength-percent-volume-texts.ts';

type Given = PercentVolumeGiven;

/** Product in so much finished mix, in fluid ounces. */
export function productIn(g: Given, mix: Quantity): Quantity {
  return convert(productForPercentVolume({ percent: g.line.percent, mix }), 'fl-oz');
}
export function productForTank(g: Given): Quantity {
  return productIn(g, g.job.mix);
}
export function lastLoad({ job }: Given): Quantity {
  return job.as === 'loads' ? job.lastLoad : job.mix;
}
export function allMix({ job }: Given): Quantity {
  return job.as === 'loads' ? add(scale(job.mix, job.fullLoads), job.lastLoad) : job.mix;
}
/** The tank's product in milliliters, from the trainee's own fluid ounces where given. */
export function inMilliliters(g: Given, earlier: Earlier): Quantity {
  return convert(earlier.a ?? productForTank(g), 'ml');
}
/** Product for the whole job in quarts, from the trainee's own loads where given. */
export function inQuarts(g: Given, earlier: Earlier): Quantity {
  const full = earlier.a ?? productForTank(g);
  const last = earlier.b ?? productIn(g, lastLoad(g));
  return g.job.as === 'loads' ? convert(add(scale(full, g.job.fullLoads), last), 'qt') : convert(full, 'qt');
}

const flOz = (value: Rational) => quantity(value, 'fl-oz');
/** The percent as a bare decimal, written wrongly by one place: 2% as 0.2. */
const share = (g: Given) => g.line.percent.value.div(100);

/** Slips of a percent mix, for the load that the part asks about. */
function loadSlips(part: PartKey, mixOf: (g: Given) => Quantity | null) {
  const of = (g: Given) => mixOf(g) ?? g.job.mix;
  return slipsAt<Given>([part], (g) => (mixOf(g) ? part : 'f'), [
    {
      key: 'percent-as-fraction-wrong',
      answer: (g) => scale(productIn(g, of(g)), 10),
      message: (g) => ({
        en: en`You slipped a place in the percent. ${g.line.percent} is ${share(g)}, not ${share(g).mul(10)}.`,
        es: es`Usted corrió un lugar el porcentaje. ${g.line.percent} es ${share(g)}, no ${share(g).mul(10)}.`,
      }),
    },
    {
      key: 'forgot-128',
      answer: (g) => flOz(share(g).mul(of(g).value)),
      message: (g) => ({
        en: en`Your number is in gallons. ${share(g)} × ${of(g).value} gives gallons; a gallon is 128 fluid ounces.`,
        es: es`Su número está en galones. ${share(g)} × ${of(g).value} da galones; un galón tiene 128 onzas líquidas.`,
      }),
    },
    {
      key: 'used-100-for-128',
      answer: (g) => flOz(g.line.percent.value.mul(of(g).value)),
      message: () => ({
        en: 'You took a gallon for 100 fluid ounces. It holds 128.',
        es: 'Usted tomó el galón como 100 onzas líquidas. Tiene 128.',
      }),
    },
    {
      key: 'one-gallon-only',
      answer: (g) => productIn(g, quantity(1, 'gal')),
      message: (g) => ({
        en: en`That is the product for one gallon. The tank is made up to ${of(g)}.`,
        es: es`Ese es el producto para un galón. El tanque se completa hasta ${of(g)}.`,
      }),
    },
    {
      key: 'percent-of-water-only',
      answer: (g) => {
        const { value } = g.line.percent;
        return scale(convert(of(g), 'fl-oz'), value.div(value.add(100)));
      },
      message: (g) => ({
        en: en`You took the percent of the water only. The label means ${g.line.percent} of the finished spray, product and water together.`,
        es: es`Usted tomó el porcentaje solo del agua. La etiqueta se refiere al ${g.line.percent} de la mezcla terminada, producto y agua juntos.`,
      }),
    },
  ]);
}

const cylinder = (g: Given) => g.job.as === 'cylinder';
const loads = (g: Given) => g.job.as === 'loads';

const sameForLast: Slip<Given> = {
  key: 'same-for-last',
  part: 'b',
  answer: (g) => (loads(g) ? productForTank(g) : null),
  message: (g) => ({
    en: en`You gave the last tank a full tank's product. It holds only ${lastLoad(g)}.`,
    es: es`Usted le dio al último tanque el producto de uno lleno. Solo lleva ${lastLoad(g)}.`,
  }),
};

const milliliterSlips: readonly Slip<Given>[] = [
  {
    key: 'used-label-number',
    part: 'b',
    answer: (g, earlier) => (cylinder(g) ? quantity(inMilliliters(g, earlier).value.div('29.5735295625'), 'ml') : null),
    message: () => ({
      en: 'Your number is in fluid ounces. A fluid ounce is about 29.57 mL, so the number gets larger.',
      es: 'Su número está en onzas líquidas. Una onza líquida son unos 29.57 mL, así que el número crece.',
    }),
  },
  {
    key: 'wrong-neighbour',
    part: 'b',
    answer: (g, earlier) => (cylinder(g) ? scale(inMilliliters(g, earlier), rational(1, 2)) : null),
    message: () => ({
      en: 'You used the milliliters of a tablespoon. A tablespoon is about 14.79 mL, a fluid ounce about 29.57 mL.',
      es: 'Usted usó los mililitros de una cucharada. Una cucharada son unos 14.79 mL, una onza líquida unos 29.57 mL.',
    }),
  },
];

const quartSlips: readonly Slip<Given>[] = [
  {
    key: 'one-load-only',
    part: 'c',
    answer: (g, earlier) => (loads(g) ? convert(earlier.a ?? productForTank(g), 'qt') : null),
    message: (g) => ({
      en: en`That is one full tank. The job is ${allMix(g)} of mix in all.`,
      es: es`Eso es un tanque lleno. El trabajo son ${allMix(g)} de mezcla en total.`,
    }),
  },
  {
    key: 'forgot-last-fill',
    part: 'c',
    answer: (g, earlier) =>
      g.job.as === 'loads' ? convert(scale(earlier.a ?? productForTank(g), g.job.fullLoads), 'qt') : null,
    message: (g) => ({
      en: en`You left out the last tank. Its ${lastLoad(g)} need product, too.`,
      es: es`Le faltó el último tanque. Sus ${lastLoad(g)} también llevan producto.`,
    }),
  },
  {
    key: 'wrong-neighbour',
    part: 'c',
    answer: (g, earlier) => (loads(g) ? scale(inQuarts(g, earlier), 2) : null),
    message: () => ({
      en: 'You divided by a pint. A pint is 16 fluid ounces, a quart 32.',
      es: 'Usted dividió entre una pinta. Una pinta tiene 16 onzas líquidas, un cuarto 32.',
    }),
  },
];

export const percentVolumeSlips: readonly Slip<Given>[] = [
  ...loadSlips('a', (g) => g.job.mix),
  ...milliliterSlips,
  sameForLast,
  ...loadSlips('b', (g) => (loads(g) ? lastLoad(g) : null)),
  ...quartSlips,
];
