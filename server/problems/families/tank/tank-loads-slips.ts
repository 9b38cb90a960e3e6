import { acresOf } from '../../../../shared/formulas/acres-of.ts';
import { lastLoad } from '../../../../shared/formulas/last-load.ts';
import { mixForArea } from '../../../../shared/formulas/mix-for-area.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { tankLoads } from '../../../../shared/formulas/tank-loads.ts';
import { inUnit, quantity, ratio, scale, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { TankLoadsGiven } from './tank-loads-texts.ts';

type Given = TankLoadsGiven;

interface Keys {
  readonly mix: PartKey;
  readonly loads: PartKey;
  readonly last: PartKey;
}
const keys = {
  mix: { mix: 'f', loads: 'a', last: 'b' },
  area: { mix: 'a', loads: 'b', last: 'c' },
  sides: { mix: 'b', loads: 'c', last: 'd' },
} as const satisfies Record<Given['job']['as'], Keys>;

/** Which part asks what; the mix is not asked on the first tier. */
export function partsOf({ job }: Given): Keys {
  return keys[job.as];
}
export function siteArea({ job }: Given): Quantity {
  if (job.as === 'mix') throw new RangeError('the first tier gives the mix, not an area');
  return job.as === 'area' ? job.area : rectangleArea(job);
}
export function siteAcres(g: Given): Quantity {
  return acresOf({ area: siteArea(g) });
}
/** Mix for the job, from the trainee's own acres where given. */
export function mixNeeded(g: Given, earlier: Earlier): Quantity {
  const { job } = g;
  if (job.as === 'mix') return job.mix;
  return mixForArea({ rate: job.rate, area: job.as === 'sides' && earlier.a ? earlier.a : siteArea(g) });
}
/** The mix to go on with: the trainee's own where given. */
function mixUsed(g: Given, earlier: Earlier): Quantity {
  const own = earlier[partsOf(g).mix];
  return own ?? mixNeeded(g, earlier);
}
export function loads(g: Given, earlier: Earlier): Quantity {
  return tankLoads({ mix: mixUsed(g, earlier), tank: g.tank });
}
export function last(g: Given, earlier: Earlier): Quantity {
  return lastLoad({ mix: mixUsed(g, earlier), tank: g.tank });
}
/** Loads before rounding up. */
export function exactLoads(g: Given, earlier: Earlier = {}): Quantity['value'] {
  return ratio(mixUsed(g, earlier), g.tank);
}

const gal = (value: Quantity['value']) => quantity(value, 'gal');
const acres = (value: Quantity['value']) => quantity(value, 'acre');
const count = (value: Quantity['value']) => quantity(value, 'count');

function acreSlip(key: string, change: (g: Given) => Quantity['value'], message: Slip<Given>['message']): Slip<Given> {
  return { key, part: 'a', answer: (g) => (g.job.as === 'sides' ? acres(change(g)) : null), message };
}
const acreSlips: readonly Slip<Given>[] = [
  acreSlip(
    'inverted-share',
    (g) => siteAcres(g).value.inverse(),
    (g) => ({
      en: en`You divided the acre by the site. It goes the other way: ${siteArea(g)} ÷ 43,560.`,
      es: es`Usted dividió el acre entre el sitio. Es al revés: ${siteArea(g)} ÷ 43,560.`,
    }),
  ),
  acreSlip(
    'used-5280',
    (g) => siteArea(g).value.div(5280),
    () => ({
      en: 'You used 5,280. That is the feet in a mile. An acre is 43,560 square feet.',
      es: 'Usted usó 5,280. Esos son los pies de una milla. Un acre tiene 43,560 pies cuadrados.',
    }),
  ),
  acreSlip(
    'used-1000',
    (g) => siteArea(g).value.div(1000),
    () => ({
      en: 'Those are thousands of square feet. For acres, divide by 43,560.',
      es: 'Esos son miles de pies cuadrados. Para acres, divida entre 43,560.',
    }),
  ),
];

const mixSlips = slipsAt<Given>(['a', 'b'], (g) => partsOf(g).mix, [
  {
    key: 'forgot-to-divide-by-1000',
    answer: ({ job }) => (job.as === 'area' ? gal(job.area.value.mul(job.rate.value)) : null),
    message: ({ job }) => ({
      en: en`You did not divide by 1,000. The rate is ${job.as === 'mix' ? '' : job.rate}, not for each square foot.`,
      es: es`Le faltó dividir entre 1,000. La dosis es de ${job.as === 'mix' ? '' : job.rate}, no por cada pie cuadrado.`,
    }),
  },
  {
    key: 'one-dose-only',
    answer: ({ job }) => (job.as === 'mix' ? null : gal(job.rate.value)),
    message: ({ job }) =>
      job.as === 'sides'
        ? {
            en: 'That is the mix for one acre. Multiply by the acres of the field.',
            es: 'Esa es la mezcla para un acre. Multiplique por los acres del campo.',
          }
        : {
            en: 'That is the mix for 1,000 sq ft. Multiply by the thousands of square feet.',
            es: 'Esa es la mezcla para 1,000 pies². Multiplique por los miles de pies cuadrados.',
          },
  },
  {
    key: 'inverted-rate',
    answer: (g, earlier) => {
      const { job } = g;
      if (job.as === 'mix') return null;
      const size = job.as === 'area' ? inUnit(job.area, '1000-sq-ft') : (earlier.a ?? siteAcres(g)).value;
      return gal(size.div(job.rate.value));
    },
    message: ({ job }) => ({
      en: en`You divided by the rate. At ${job.as === 'mix' ? '' : job.rate}, more ground takes more mix: multiply.`,
      es: es`Usted dividió entre la dosis. Con ${job.as === 'mix' ? '' : job.rate}, más suelo lleva más mezcla: multiplique.`,
    }),
  },
  {
    key: 'used-1000',
    answer: (g) => (g.job.as === 'sides' ? gal(inUnit(siteArea(g), '1000-sq-ft').mul(g.job.rate.value)) : null),
    message: () => ({
      en: 'You multiplied the thousands of square feet. The rate is for an acre, so multiply the acres.',
      es: 'Usted multiplicó los miles de pies cuadrados. La dosis es por acre, así que multiplique los acres.',
    }),
  },
]);

const loadSlips = slipsAt<Given>(['a', 'b', 'c'], (g) => partsOf(g).loads, [
  {
    key: 'rounded-down',
    answer: (g, earlier) => count(exactLoads(g, earlier).floor()),
    message: () => ({
      en: 'You counted the full loads only. What is left over after them needs a load of its own.',
      es: 'Usted contó solo las cargas llenas. Lo que falta después necesita su propia carga.',
    }),
  },
  {
    key: 'counted-last-twice',
    answer: (g, earlier) => count(loads(g, earlier).value.add(1)),
    message: () => ({
      en: 'You counted one load too many. The part load is already in when you round up.',
      es: 'Usted contó una carga de más. La carga parcial ya está incluida al redondear hacia arriba.',
    }),
  },
  {
    key: 'not-rounded-up',
    answer: (g, earlier) => {
      const exact = exactLoads(g, earlier);
      return exact.mul(100).d === 1n ? count(exact) : null;
    },
    message: (g, earlier) => ({
      en: en`You left a fraction of a load. Nobody fills ${exactLoads(g, earlier)} times: count the part load as one.`,
      es: es`Usted dejó una fracción de carga. Nadie llena ${exactLoads(g, earlier)} veces: cuente la carga parcial como una.`,
    }),
  },
]);

const lastSlips = slipsAt<Given>(['b', 'c', 'd'], (g) => partsOf(g).last, [
  {
    key: 'full-last-load',
    answer: (g) => g.tank,
    message: (g) => ({
      en: en`You filled the last load, too. Take the full loads of ${g.tank} off the mix; the rest is the last load.`,
      es: es`Usted también llenó la última carga. Reste de la mezcla las cargas llenas de ${g.tank}; el resto es la última.`,
    }),
  },
  {
    key: 'space-left',
    answer: (g, earlier) => subtract(g.tank, last(g, earlier)),
    message: () => ({
      en: 'That is the room that stays empty in the last load. The question asks what goes in.',
      es: 'Ese es el espacio que queda vacío en la última carga. Se pregunta cuánto va adentro.',
    }),
  },
  {
    key: 'evened-out',
    answer: (g, earlier) => scale(mixUsed(g, earlier), loads(g, earlier).value.inverse()),
    message: (g) => ({
      en: en`You shared the mix evenly among the loads. Here every load but the last is a full ${g.tank}.`,
      es: es`Usted repartió la mezcla por igual. Aquí todas las cargas menos la última son de ${g.tank}.`,
    }),
  },
  {
    key: 'fraction-as-gallons',
    answer: (g, earlier) => {
      const exact = exactLoads(g, earlier);
      return gal(exact.sub(exact.floor()));
    },
    message: (g) => ({
      en: en`That is a share of a tank, not gallons. Multiply it by ${g.tank}.`,
      es: es`Esa es una parte de un tanque, no galones. Multiplíquela por ${g.tank}.`,
    }),
  },
]);

export const tankLoadsSlips: readonly Slip<Given>[] = [...acreSlips, ...mixSlips, ...loadSlips, ...lastSlips];
