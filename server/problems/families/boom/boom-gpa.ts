import type { BoomFigure } from '../../../../shared/contracts/figure.ts';
import { quantity, scale } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, grouped, number, over, struck, times, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { toTenth } from '../rate/measure-out.ts';
import { toWholeSteps } from '../to-whole-steps.ts';
import { factorOver, toStep } from '../units/unit-steps.ts';
import { boomGpaSlips, nozzleFlow, rate, ratePart, travelSpeed } from './boom-gpa-slips.ts';
import { boomGpaSituations, type BoomGpaGiven } from './boom-gpa-texts.ts';

type Given = BoomGpaGiven;

const tenth = rational('0.1');
const hundredth = rational('0.01');
const spacings = [10, 15, 20, 30];

function drawTest(rng: Rng, tier: Tier, nozzles: number): Given['test'] {
  const speed = quantity(rng.step('2.5', '6', '0.5'), 'mph');
  if (tier === 1) return { as: 'flow', flow: quantity(rng.step('0.15', '0.7', '0.05'), 'gal/min'), speed };
  if (tier === 2) {
    const time = quantity(rng.pick([15, 20, 30]), 's');
    return { as: 'catch', caught: quantity(rng.int(7, 42), 'fl-oz'), time, speed };
  }
  const each = rng.step('0.15', '0.7', '0.05');
  const time = quantity(rng.int(23, 80), 's');
  return {
    as: 'whole-boom',
    flow: quantity(each.mul(nozzles), 'gal/min'),
    course: quantity(rng.pick([200, 300]), 'ft'),
    time,
  };
}

function draw(rng: Rng, tier: Tier): Given | null {
  const nozzles = rng.int(6, 14);
  const spacing = quantity(rng.pick(spacings), 'in');
  const g: Given = {
    ...drawScene(rng, boomGpaSituations.length),
    nozzles,
    spacing,
    test: drawTest(rng, tier, nozzles),
  };
  const [flow, speed, perAcre] = [nozzleFlow(g).value, travelSpeed(g).value, rate(g, {}).value];
  if (flow.compare('0.1') < 0 || flow.compare('0.8') > 0) return null;
  if (speed.compare('2.5') < 0 || speed.compare(6) > 0) return null;
  return perAcre.compare(15) < 0 || perAcre.compare(100) > 0 ? null : g;
}

function flowPart(g: Given): NumberPart {
  return {
    kind: 'number',
    key: 'a',
    topic: 'boom',
    ask: both(
      'What does one nozzle give in gallons per minute (gal per min), to the nearest 0.01 gal per min?',
      '¿Cuánto da una boquilla en galones por minuto (gal por min), redondeado a 0.01 gal por min?',
    ),
    answer: nozzleFlow(g),
    step: hundredth,
    units: ['gal/min', 'fl-oz/min', 'l/min'],
  };
}
function speedPart(g: Given): NumberPart {
  return {
    kind: 'number',
    key: 'b',
    topic: 'boom',
    ask: both(
      'What is the speed in miles per hour (mph), to the nearest 0.1 mph?',
      '¿Cuál es la velocidad en millas por hora (mi/h), redondeada a 0.1 mi/h?',
    ),
    answer: travelSpeed(g),
    step: tenth,
    units: ['mph', 'ft/min'],
    // The trade's 0.682 is 60/88 rounded.
    alsoRight: [scale(travelSpeed(g), rational('0.682').mul(88).div(60))],
  };
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const roundedFlow = toWholeSteps(nozzleFlow(g), hundredth);
  const roundedSpeed = toWholeSteps(travelSpeed(g), tenth);
  const gallons: NumberPart = {
    kind: 'number',
    key: ratePart(g),
    topic: 'boom',
    ask: both(
      'What is the rate in gallons (gal) per acre, to the nearest 0.1 gal per acre?',
      '¿Cuál es la dosis del rociador en galones (gal) por acre, redondeada a 0.1 gal por acre?',
    ),
    answer: rate(g, earlier),
    step: tenth,
    units: ['gal/acre', 'gal/1000-sq-ft'],
    // Whoever rounds the flow or the speed as asked goes on with the rounded figure.
    alsoRight: [
      rate(g, { a: roundedFlow }),
      rate(g, { a: roundedFlow, b: roundedSpeed }),
      rate(g, { b: roundedSpeed }),
    ],
  };
  if (g.test.as === 'flow') return [gallons];
  return g.test.as === 'catch' ? [flowPart(g), gallons] : [flowPart(g), speedPart(g), gallons];
}

function firstLines(g: Given): WorkingLine[] {
  const { test, nozzles } = g;
  const name = both('flow of one nozzle', 'caudal de una boquilla');
  const result = toStep(nozzleFlow(g), hundredth, 2);
  if (test.as === 'flow') return [];
  if (test.as === 'catch') {
    return [
      {
        name,
        expression: times(
          over(struck(test.caught), struck(test.time)),
          over(struck(quantity(60, 's')), given(quantity(1, 'min'))),
          factorOver('fl-oz', 'gal'),
        ),
        result,
        answers: true,
        reason: both(
          'Bring the catch to a minute, then to gallons.',
          'Lleve lo recogido a un minuto y luego a galones.',
        ),
      },
    ];
  }
  return [
    {
      name,
      expression: over(given(test.flow), number(nozzles)),
      result,
      answers: true,
      reason: both(
        'The boom’s flow is shared by its nozzles.',
        'El caudal del aguilón se reparte entre sus boquillas.',
      ),
    },
    {
      name: both('speed', 'velocidad'),
      expression: over(times(given(test.course), number(60)), grouped(times(given(test.time), number(88)))),
      result: toTenth(travelSpeed(g)),
      answers: true,
      reason: both('88 feet per minute are 1 mile per hour.', '88 pies por minuto son 1 milla por hora.'),
    },
  ];
}

function working(g: Given): readonly WorkingLine[] {
  return [
    ...firstLines(g),
    {
      name: both('rate', 'dosis del rociador'),
      expression: over(
        times(number(5940), given(nozzleFlow(g), { maxPlaces: 4 })),
        grouped(times(given(travelSpeed(g), { maxPlaces: 3 }), given(g.spacing))),
      ),
      result: toTenth(rate(g, {})),
      answers: true,
      reason: both(
        '5,940 is 43,560 sq ft × 12 in ÷ 88 ft per minute: it brings gallons a minute, mph and inches to gallons an acre.',
        '5,940 es 43,560 pies² × 12 pulg ÷ 88 pies por minuto: lleva galones por minuto, mi/h y pulgadas a galones por acre.',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { test } = g;
  const relation = both(
    'Gallons per acre = 5,940 × gallons per minute of one nozzle ÷ (mph × inches between nozzles).',
    'Galones por acre = 5,940 × galones por minuto de una boquilla ÷ (mi/h × pulgadas entre boquillas).',
  );
  if (test.as === 'flow') {
    return [
      both(
        'You are asked for gallons per acre. You have the flow of one nozzle, the speed and the spacing.',
        'Se piden galones por acre. Se tienen el caudal de una boquilla, la velocidad y la separación.',
      ),
      relation,
      both(
        en`Begin below the line: ${test.speed.value} × ${g.spacing.value}.`,
        es`Empiece por lo que va abajo: ${test.speed.value} × ${g.spacing.value}.`,
      ),
    ];
  }
  const first = both(
    'You are asked for gallons per acre. First find what one nozzle gives in a minute.',
    'Se piden galones por acre. Primero halle cuánto da una boquilla en un minuto.',
  );
  return test.as === 'catch'
    ? [
        first,
        relation,
        both(
          en`Begin with ${test.caught} × 60 ÷ ${test.time.value}, then divide by 128.`,
          es`Empiece con ${test.caught} × 60 ÷ ${test.time.value} y divida entre 128.`,
        ),
      ]
    : [
        first,
        {
          en: `${relation.en} mph = feet × 60 ÷ (seconds × 88).`,
          es: `${relation.es} mi/h = pies × 60 ÷ (segundos × 88).`,
        },
        both(en`Begin with ${test.flow} ÷ ${g.nozzles}.`, es`Empiece con ${test.flow} ÷ ${g.nozzles}.`),
      ];
}

function figure(g: Given): BoomFigure<Text> {
  const { test, spacing, nozzles } = g;
  const base = { kind: 'boom', nozzles, spacing: both(en`${spacing}`, es`${spacing}`) } as const;
  const boom = both(
    en`A boom with ${nozzles} nozzles, ${spacing} apart.`,
    es`Un aguilón con ${nozzles} boquillas, a ${spacing} una de otra.`,
  );
  if (test.as === 'whole-boom') {
    return {
      ...base,
      alt: both(
        en`${boom.en} The whole boom gives ${test.flow}; ${test.course} take ${test.time}.`,
        es`${boom.es} Todo el aguilón da ${test.flow}; ${test.course} llevan ${test.time}.`,
      ),
    };
  }
  const speed = both(en`${test.speed}`, es`${test.speed}`);
  if (test.as === 'flow') {
    const flow = both(en`${test.flow}`, es`${test.flow}`);
    const alt = both(
      en`${boom.en} Each gives ${flow}; the speed is ${speed}.`,
      es`${boom.es} Cada una da ${flow}; la velocidad es ${speed}.`,
    );
    return { ...base, flow, speed, alt };
  }
  const flow = both(en`${test.caught} in ${test.time}`, es`${test.caught} en ${test.time}`);
  const alt = both(
    en`${boom.en} Each gives ${flow}; the speed is ${speed}.`,
    es`${boom.es} Cada una da ${flow}; la velocidad es ${speed}.`,
  );
  return { ...base, flow, speed, alt };
}

export const boomGpaFamily = defineFamily<Given>({
  key: 'boom-gpa',
  version: 1,
  topic: 'boom',
  tiers: [1, 2, 3],
  title: both('Gallons per acre of a boom', 'Galones por acre de un aguilón'),
  sources: [
    {
      title: 'Tow-behind sprayer owner manual, Appendix A, boom spray calibration tables',
      publisher: 'equipment manual',
      year: null,
    },
    {
      title: 'Calibrating Your Sprayer',
      publisher: 'Albany County (Wyoming) Weed and Pest Control District',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(boomGpaSituations, g).heading,
  statement: (g) => situationOf(boomGpaSituations, g).statement(g),
  parts,
  figure,
  hints,
  working,
  slips: boomGpaSlips,
});
