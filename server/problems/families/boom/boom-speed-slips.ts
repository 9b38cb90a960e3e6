import { secondsOverCourse } from '../../../../shared/formulas/seconds-over-course.ts';
import { speedOverCourse } from '../../../../shared/formulas/speed-over-course.ts';
import { quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey } from '../../../../shared/vocabulary.ts';
import type { Earlier, Slip } from '../../family.ts';
import { en, es } from '../../say.ts';
import { slipsAt } from '../slips-at.ts';
import type { BoomSpeedGiven } from './boom-speed-texts.ts';

type Given = BoomSpeedGiven;

const mph = (value: Rational) => quantity(value, 'mph');
const seconds = (value: Rational) => quantity(value, 's');
const total = (g: Given): Rational => g.runs.reduce((sum, run) => sum.add(run.value), quantity(0, 's').value);

export function meanTime(g: Given): Quantity {
  return seconds(total(g).div(g.runs.length));
}
export function speedPart(g: Given): PartKey {
  return g.runs.length === 1 ? 'a' : 'b';
}
export function timeUsed(g: Given, earlier: Earlier): Quantity {
  return g.runs.length === 2 && earlier.a ? earlier.a : meanTime(g);
}
export function speed(g: Given, earlier: Earlier): Quantity {
  return speedOverCourse({ course: g.course, time: timeUsed(g, earlier) });
}
export function wantedTime(g: Given): Quantity {
  return g.wanted ? secondsOverCourse({ course: g.course, speed: g.wanted }) : meanTime(g);
}
const feetPerSecond = (g: Given, earlier: Earlier) => g.course.value.div(timeUsed(g, earlier).value);

const meanSlips: readonly Slip<Given>[] = [
  {
    key: 'total-not-mean',
    part: 'a',
    answer: (g) => (g.runs.length === 2 ? seconds(total(g)) : null),
    message: () => ({
      en: 'That is both runs together. The mean is their sum divided by two.',
      es: 'Eso son las dos pasadas juntas. El promedio es la suma dividida entre dos.',
    }),
  },
  {
    key: 'one-run-only',
    part: 'a',
    answer: (g) => (g.runs.length === 2 ? g.runs[0] : null),
    message: (g) => ({
      en: en`You used one run only. The way back took ${g.runs[1] ?? g.runs[0]}; take the mean of the two.`,
      es: es`Usted usó una sola pasada. La vuelta llevó ${g.runs[1] ?? g.runs[0]}; tome el promedio de las dos.`,
    }),
  },
  {
    key: 'difference-of-runs',
    part: 'a',
    answer: (g) => (g.runs.length === 2 ? seconds(g.runs[0].value.sub(g.runs[1].value).abs()) : null),
    message: () => ({
      en: 'That is how far apart the two runs are. The mean lies between them.',
      es: 'Esa es la diferencia entre las dos pasadas. El promedio está entre ellas.',
    }),
  },
];

const speedSlips = slipsAt<Given>(['a', 'b'], speedPart, [
  {
    key: 'used-60-only',
    answer: (g, earlier) => mph(feetPerSecond(g, earlier).mul(60)),
    message: () => ({
      en: 'That is feet per minute. A mile per hour is 88 feet per minute, so divide by 88 as well.',
      es: 'Esos son pies por minuto. Una milla por hora son 88 pies por minuto, así que divida también entre 88.',
    }),
  },
  {
    key: 'minutes-for-seconds',
    answer: (g, earlier) => mph(feetPerSecond(g, earlier).div(88)),
    message: (g, earlier) => ({
      en: en`You took the seconds for minutes. The run took ${timeUsed(g, earlier)}, not that many minutes: multiply by 60.`,
      es: es`Usted tomó los segundos por minutos. La pasada llevó ${timeUsed(g, earlier)}, no esa cantidad de minutos: multiplique por 60.`,
    }),
  },
  {
    key: 'inverted',
    answer: (g, earlier) => mph(feetPerSecond(g, earlier).inverse().mul(88).div(60)),
    message: () => ({
      en: 'You turned the sum over. Feet stand on top and seconds below: more seconds is slower.',
      es: 'Usted invirtió la cuenta. Los pies van arriba y los segundos abajo: más segundos es más lento.',
    }),
  },
  {
    key: 'feet-per-second-as-mph',
    answer: (g, earlier) => mph(feetPerSecond(g, earlier)),
    message: () => ({
      en: 'That is feet per second. A mile per hour is about 1.47 feet per second.',
      es: 'Esos son pies por segundo. Una milla por hora son unos 1.47 pies por segundo.',
    }),
  },
  {
    key: 'total-not-mean',
    answer: (g) => (g.runs.length === 2 ? speedOverCourse({ course: g.course, time: seconds(total(g)) }) : null),
    message: (g) => ({
      en: en`You used the time of both runs for one course. One course of ${g.course} takes the mean time.`,
      es: es`Usted usó el tiempo de las dos pasadas para un solo tramo. Un tramo de ${g.course} lleva el tiempo promedio.`,
    }),
  },
]);

const wantedSlips: readonly Slip<Given>[] = [
  {
    key: 'used-60-only',
    part: 'c',
    answer: (g) => g.wanted && seconds(g.course.value.mul(60).div(g.wanted.value)),
    message: () => ({
      en: 'You left out the 88. A mile per hour is 88 feet per minute.',
      es: 'Le faltó el 88. Una milla por hora son 88 pies por minuto.',
    }),
  },
  {
    key: 'feet-per-second-as-mph',
    part: 'c',
    answer: (g) => g.wanted && seconds(g.course.value.div(g.wanted.value)),
    message: (g) => ({
      en: en`You took ${g.wanted ?? ''} for feet per second. It is miles per hour: 88 feet a minute for each.`,
      es: es`Usted tomó ${g.wanted ?? ''} como pies por segundo. Son millas por hora: 88 pies por minuto cada una.`,
    }),
  },
  {
    key: 'proportional-for-inverse',
    part: 'c',
    answer: (g) => g.wanted && seconds(meanTime(g).value.mul(g.wanted.value).div(speed(g, {}).value)),
    message: () => ({
      en: 'You changed the time the same way as the speed. Faster takes fewer seconds, slower takes more.',
      es: 'Usted cambió el tiempo igual que la velocidad. Más rápido lleva menos segundos; más lento, más.',
    }),
  },
];

export const boomSpeedSlips: readonly Slip<Given>[] = [...meanSlips, ...speedSlips, ...wantedSlips];
