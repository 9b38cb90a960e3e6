import type { PlanFigure } from '../../../../shared/contracts/figure.ts';
import { quantity, scale } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, grouped, number, over, plus, struck, times, type WorkingLine } from '../../working.ts';
import { drawn, edge } from '../area/plan-parts.ts';
import { both } from '../both.ts';
import { toTenth } from '../rate/measure-out.ts';
import { toWholeSteps } from '../to-whole-steps.ts';
import { toStep } from '../units/unit-steps.ts';
import { boomSpeedSlips, meanTime, speed, speedPart, timeUsed, wantedTime } from './boom-speed-slips.ts';
import { boomSpeedSituations, type BoomSpeedGiven } from './boom-speed-texts.ts';

type Given = BoomSpeedGiven;

const tenth = rational('0.1');
const seconds = (value: number) => quantity(value, 's');

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, boomSpeedSituations.length);
  const course = quantity(rng.pick(tier === 1 ? [100, 200, 300] : [150, 200, 250, 300]), 'ft');
  const first = rng.int(12, 75);
  const second = first + rng.pick([-4, -3, -2, -1, 1, 2, 3, 4]);
  const runs = tier === 1 ? ([seconds(first)] as const) : ([seconds(first), seconds(second)] as const);
  const wanted = tier === 3 ? quantity(rng.step('2.5', '6', '0.5'), 'mph') : null;
  const g: Given = { ...scene, course, runs, wanted };
  const now = speed(g, {}).value;
  if (now.compare('2.5') < 0 || now.compare(6) > 0) return null;
  // The wanted speed is another one, but one the same gear could give.
  const apart = wanted ? wanted.value.div(now).sub(1).abs() : null;
  return apart && (apart.compare('0.1') < 0 || apart.compare('0.5') > 0) ? null : g;
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const answer = speed(g, earlier);
  const mph: NumberPart = {
    kind: 'number',
    key: speedPart(g),
    topic: 'boom',
    ask: both(
      'What is the speed in miles per hour (mph), to the nearest 0.1 mph?',
      '¿Cuál es la velocidad en millas por hora (mi/h), redondeada a 0.1 mi/h?',
    ),
    answer,
    step: tenth,
    units: ['mph', 'ft/min', 'km/h'],
    // The trade multiplies feet per second by 0.682, or divides them by 1.47 or 1.46.
    alsoRight: ['0.682', '1.47', '1.46'].map((constant) => {
      const feetPerSecond = g.course.value.div(timeUsed(g, earlier).value);
      return quantity(constant === '0.682' ? feetPerSecond.mul(constant) : feetPerSecond.div(constant), 'mph');
    }),
  };
  if (g.runs.length === 1) return [mph];
  const mean: NumberPart = {
    kind: 'number',
    key: 'a',
    topic: 'boom',
    ask: both(
      'What is the mean time of the two runs, in seconds (s), to the nearest 0.1 s?',
      '¿Cuál es el tiempo promedio de las dos pasadas, en segundos (s), redondeado a 0.1 s?',
    ),
    answer: meanTime(g),
    step: tenth,
    units: ['s', 'min'],
  };
  if (!g.wanted) return [mean, mph];
  const wanted: NumberPart = {
    kind: 'number',
    key: 'c',
    topic: 'boom',
    ask: both(
      en`How long should the course take at ${g.wanted}, to the nearest 0.1 s?`,
      es`¿Cuánto debe llevar el tramo a ${g.wanted}, redondeado a 0.1 s?`,
    ),
    answer: wantedTime(g),
    step: tenth,
    units: ['s', 'min'],
    alsoRight: [
      quantity(g.course.value.mul('0.682').div(g.wanted.value), 's'),
      // Found by proportion from the rounded speed.
      scale(meanTime(g), toWholeSteps(speed(g, {}), tenth).value.div(g.wanted.value)),
    ],
  };
  return [mean, mph, wanted];
}

function working(g: Given): readonly WorkingLine[] {
  const time = meanTime(g);
  const [first, second] = g.runs;
  const mean: WorkingLine[] = second
    ? [
        {
          name: both('mean time', 'tiempo promedio'),
          expression: over(grouped(plus(given(first), given(second))), number(2)),
          result: given(time, { places: 1 }),
          answers: true,
          reason: both(
            'There and back evens out slope and wind.',
            'La ida y la vuelta compensan la pendiente y el viento.',
          ),
        },
      ]
    : [];
  const mph: WorkingLine = {
    name: both('speed', 'velocidad'),
    expression: over(times(given(g.course), number(60)), grouped(times(given(time), number(88)))),
    result: toTenth(speed(g, {})),
    answers: true,
    reason: both(
      'Times 60 gives feet per minute; 88 feet per minute are 1 mile per hour.',
      'Por 60 da pies por minuto; 88 pies por minuto son 1 milla por hora.',
    ),
  };
  if (!g.wanted) return [...mean, mph];
  return [
    ...mean,
    mph,
    {
      name: both('time wanted', 'tiempo que se busca'),
      expression: over(times(struck(g.course), number(60)), grouped(times(given(g.wanted), number(88)))),
      result: toStep(wantedTime(g), tenth, 1),
      answers: true,
      reason: both(
        'The same relation turned round. Change the throttle or gear until the course takes this long.',
        'La misma relación al revés. Cambie el acelerador o la marcha hasta que el tramo lleve ese tiempo.',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const [first, second] = g.runs;
  return [
    g.wanted
      ? both(
          en`You are asked for the speed now, and for the time the course takes at ${g.wanted}. You have the course of ${g.course} and two times.`,
          es`Se piden la velocidad actual y el tiempo del tramo a ${g.wanted}. Se tienen el tramo de ${g.course} y dos tiempos.`,
        )
      : both(
          en`You are asked for miles per hour. You have the course of ${g.course} and the seconds it takes.`,
          es`Se piden millas por hora. Se tienen el tramo de ${g.course} y los segundos que lleva.`,
        ),
    both(
      'Miles per hour = feet × 60 ÷ (seconds × 88), since 1 mph is 88 feet per minute.',
      'Millas por hora = pies × 60 ÷ (segundos × 88), porque 1 mi/h son 88 pies por minuto.',
    ),
    second
      ? both(en`Begin with (${first} + ${second}) ÷ 2.`, es`Empiece con (${first} + ${second}) ÷ 2.`)
      : both(
          en`Begin with ${g.course.value} × 60 ÷ ${first.value}.`,
          es`Empiece con ${g.course.value} × 60 ÷ ${first.value}.`,
        ),
  ];
}

function figure(g: Given): PlanFigure<Text> {
  const length = drawn(g.course.value);
  const height = length / 12;
  const course = both(en`${g.course}`, es`${g.course}`);
  const times = g.runs.map((run) => both(en`${run}`, es`${run}`));
  const [there, back] = [times[0] ?? course, times[1]];
  const arrows = [
    { from: [length * 0.06, height / 3] as const, to: [length * 0.94, height / 3] as const, text: there },
    ...(back
      ? [
          {
            from: [length * 0.94, (height * 2) / 3] as const,
            to: [length * 0.06, (height * 2) / 3] as const,
            text: back,
          },
        ]
      : []),
  ];
  return {
    kind: 'plan',
    width: length,
    height,
    shapes: [{ form: 'rect', x: 0, y: 0, width: length, height, ground: 'turf' }],
    dimensions: [edge([0, 0], [length, 0], course)],
    arrows,
    alt: back
      ? both(
          en`A straight course, ${g.course} long. One way takes ${there}, the way back ${back}.`,
          es`Un tramo recto de ${g.course}. La ida lleva ${there} y la vuelta ${back}.`,
        )
      : both(
          en`A straight course, ${g.course} long, covered once in ${there}.`,
          es`Un tramo recto de ${g.course}, recorrido una vez en ${there}.`,
        ),
  };
}

export const boomSpeedFamily = defineFamily<Given>({
  key: 'boom-speed',
  version: 1,
  topic: 'boom',
  tiers: [1, 2, 3],
  title: both('Speed from a timed course', 'Velocidad según un tramo cronometrado'),
  sources: [
    {
      title: 'Math for Pesticide Applicators: useful measurement conversions',
      publisher: 'University of Nebraska-Lincoln Pesticide Education',
      year: null,
    },
    { title: 'How to Calibrate Herbicide Application Equipment', publisher: 'T&D World magazine', year: 2014 },
  ],
  draw,
  heading: (g) => situationOf(boomSpeedSituations, g).heading,
  statement: (g) => situationOf(boomSpeedSituations, g).statement(g),
  parts,
  figure,
  hints,
  working,
  slips: boomSpeedSlips,
});
