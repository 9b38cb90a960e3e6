import { flowFromCatch } from '../../../../shared/formulas/flow-from-catch.ts';
import { gallonsPerAcreFromFlow } from '../../../../shared/formulas/gallons-per-acre-from-flow.ts';
import { speedOverCourse } from '../../../../shared/formulas/speed-over-course.ts';
import { quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { BoomGpaGiven } from './boom-gpa-texts.ts';

type Given = BoomGpaGiven;

const gpm = (value: Rational) => quantity(value, 'gal/min');
const mph = (value: Rational) => quantity(value, 'mph');

const parts = { flow: 'a', catch: 'b', 'whole-boom': 'c' } as const satisfies Record<Given['test']['as'], PartKey>;
export function ratePart({ test }: Given): PartKey {
  return parts[test.as];
}
/** Flow of one nozzle. */
export function nozzleFlow({ test, nozzles }: Given): Quantity {
  if (test.as === 'flow') return test.flow;
  return test.as === 'catch' ? flowFromCatch(test) : scale(test.flow, rational(1, nozzles));
}
export function travelSpeed({ test }: Given): Quantity {
  return test.as === 'whole-boom' ? speedOverCourse(test) : test.speed;
}
const flowUsed = (g: Given, earlier: Earlier) => (g.test.as !== 'flow' && earlier.a ? earlier.a : nozzleFlow(g));
const speedUsed = (g: Given, earlier: Earlier) =>
  g.test.as === 'whole-boom' && earlier.b ? earlier.b : travelSpeed(g);
export function rate(g: Given, earlier: Earlier): Quantity {
  return gallonsPerAcreFromFlow({ flow: flowUsed(g, earlier), speed: speedUsed(g, earlier), spacing: g.spacing });
}
const caught = (g: Given) => (g.test.as === 'catch' ? g.test : null);
const course = (g: Given) => (g.test.as === 'whole-boom' ? g.test : null);
const feetPerSecond = (g: Given): Rational | null => {
  const run = course(g);
  return run && run.course.value.div(run.time.value);
};

const flowSlips: readonly Slip<Given>[] = [
  {
    key: 'forgot-128',
    part: 'a',
    answer: (g) => {
      const test = caught(g);
      return test && gpm(test.caught.value.mul(60).div(test.time.value));
    },
    message: () => ({
      en: 'Those are fluid ounces per minute. A gallon is 128 fluid ounces, so divide by 128.',
      es: 'Esas son onzas líquidas por minuto. Un galón son 128 onzas líquidas, así que divida entre 128.',
    }),
  },
  {
    key: 'forgot-seconds',
    part: 'a',
    answer: (g) => {
      const test = caught(g);
      return test && gpm(test.caught.value.div(128));
    },
    message: (g) => ({
      en: en`You took the catch for a whole minute. It took ${caught(g)?.time ?? ''}; bring it to 60 s.`,
      es: es`Usted tomó lo recogido como de un minuto entero. Se recogió en ${caught(g)?.time ?? ''}; llévelo a 60 s.`,
    }),
  },
  {
    key: 'inverted',
    part: 'a',
    answer: (g) => {
      const test = caught(g);
      return test && gpm(test.caught.value.div(128).mul(test.time.value).div(60));
    },
    message: (g) => ({
      en: en`You turned the time over. ${caught(g)?.time ?? ''} is less than a minute, so a minute gives more than the catch.`,
      es: es`Usted invirtió el tiempo. ${caught(g)?.time ?? ''} es menos de un minuto, así que un minuto da más que lo recogido.`,
    }),
  },
  {
    key: 'total-flow-for-one-nozzle',
    part: 'a',
    answer: (g) => course(g)?.flow ?? null,
    message: (g) => ({
      en: en`That is the flow of the whole boom. It is shared by ${g.nozzles} nozzles.`,
      es: es`Ese es el caudal de todo el aguilón. Se reparte entre ${g.nozzles} boquillas.`,
    }),
  },
  {
    key: 'multiplied-for-divided',
    part: 'a',
    answer: (g) => {
      const test = course(g);
      return test && scale(test.flow, String(g.nozzles));
    },
    message: (g) => ({
      en: en`You multiplied by the nozzles. The flow given is of all ${g.nozzles}, so divide.`,
      es: es`Usted multiplicó por las boquillas. El caudal dado es de las ${g.nozzles}, así que divida.`,
    }),
  },
];

const speedSlips: readonly Slip<Given>[] = [
  {
    key: 'used-60-only',
    part: 'b',
    answer: (g) => {
      const pace = feetPerSecond(g);
      return pace && mph(pace.mul(60));
    },
    message: () => ({
      en: 'That is feet per minute. A mile per hour is 88 feet per minute, so divide by 88 as well.',
      es: 'Esos son pies por minuto. Una milla por hora son 88 pies por minuto, así que divida también entre 88.',
    }),
  },
  {
    key: 'feet-per-second-as-mph',
    part: 'b',
    answer: (g) => {
      const pace = feetPerSecond(g);
      return pace && mph(pace);
    },
    message: () => ({
      en: 'That is feet per second. A mile per hour is about 1.47 feet per second.',
      es: 'Esos son pies por segundo. Una milla por hora son unos 1.47 pies por segundo.',
    }),
  },
];

const rateSlips = slipsAt<Given>(['a', 'b', 'c'], ratePart, [
  {
    key: 'feet-for-inches',
    answer: (g, earlier) => scale(rate(g, earlier), 12),
    message: (g) => ({
      en: en`You put the spacing in feet. With 5,940 it goes in inches: ${g.spacing.value}.`,
      es: es`Usted puso la separación en pies. Con 5,940 va en pulgadas: ${g.spacing.value}.`,
    }),
  },
  {
    key: 'total-flow-for-one-nozzle',
    answer: (g, earlier) => scale(rate(g, earlier), String(g.nozzles)),
    message: (g) => ({
      en: en`You used the flow of all ${g.nozzles} nozzles with the spacing of one. Use one nozzle with one spacing, or the whole boom with its whole width.`,
      es: es`Usted usó el caudal de las ${g.nozzles} boquillas con la separación de una. Use una boquilla con una separación, o todo el aguilón con todo su ancho.`,
    }),
  },
  {
    key: 'left-out-speed',
    answer: (g, earlier) => quantity(rate(g, earlier).value.mul(speedUsed(g, earlier).value), 'gal/acre'),
    message: () => ({
      en: 'You left out the speed. The faster the sprayer goes, the less an acre gets: divide by mph times inches.',
      es: 'Le faltó la velocidad. Cuanto más rápido va el rociador, menos recibe un acre: divida entre mi/h por pulgadas.',
    }),
  },
  {
    key: 'left-out-spacing',
    answer: (g, earlier) => scale(rate(g, earlier), g.spacing.value),
    message: (g) => ({
      en: en`You left out the spacing. Each nozzle covers a strip of ${g.spacing}: divide by mph times inches.`,
      es: es`Le faltó la separación. Cada boquilla cubre una franja de ${g.spacing}: divida entre mi/h por pulgadas.`,
    }),
  },
  {
    key: 'inverted',
    answer: (g, earlier) => quantity(rate(g, earlier).value.inverse(), 'gal/acre'),
    message: () => ({
      en: 'You turned the sum over. 5,940 × gallons per minute stands on top, mph × inches below.',
      es: 'Usted invirtió la cuenta. Arriba van 5,940 × galones por minuto, abajo mi/h × pulgadas.',
    }),
  },
]);

export const boomGpaSlips: readonly Slip<Given>[] = [...flowSlips, ...speedSlips, ...rateSlips];
