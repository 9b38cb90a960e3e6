import { oneOf128Acre, tradeTestPlot } from '../../../../shared/formulas/gallons-per-acre-from-128th.ts';
import { quantity, ratio, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, number, over, plus, struck, times, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { toTenth } from '../rate/measure-out.ts';
import { toWholeSteps } from '../to-whole-steps.ts';
import { toStep } from '../units/unit-steps.ts';
import { caughtOnPlot, hand128thSlips, perThousand, rate, ratePart, siteMix } from './hand-128th-slips.ts';
import { hand128thSituations, type Hand128thGiven } from './hand-128th-texts.ts';
import { plotFigure } from './plot-figure.ts';

type Given = Hand128thGiven;

/** Plots of 340 sq ft that a crew can mark, in feet. */
const plots = [
  [20, 17],
  [34, 10],
  [40, '8.5'],
  [68, 5],
] as const;

const seconds = (value: number) => quantity(value, 's');
const flOz = (value: number) => quantity(value, 'fl-oz');

function draw(rng: Rng, tier: Tier): Given {
  const scene = drawScene(rng, hand128thSituations.length);
  const [long, wide] = rng.pick(plots);
  const plot = { length: quantity(long, 'ft'), width: quantity(wide, 'ft') };
  const plotTime = seconds(rng.int(36, 75));
  if (tier === 1) return { ...scene, ...plot, plotTime, test: { as: 'caught', caught: flOz(rng.int(22, 64)) } };
  if (tier === 2) {
    const test = { as: 'quart-and-ounces', quarts: quantity(1, 'qt'), ounces: flOz(rng.int(4, 30)) } as const;
    return { ...scene, ...plot, plotTime, test };
  }
  const catchTime = seconds(rng.pick([15, 20, 30]));
  const caught = flOz(rng.int(9, 34));
  const site = quantity(rng.int(6, 60) * 250, 'sq-ft');
  return { ...scene, ...plot, plotTime, test: { as: 'short-catch', caught, catchTime, site } };
}

/** Numbers an operator would meet: 20 to 70 fl oz a minute from one nozzle, another time for the plot than for the catch. */
function drawBelievable(rng: Rng, tier: Tier): Given | null {
  const g = draw(rng, tier);
  const perMinute = caughtOnPlot(g).value.mul(60).div(g.plotTime.value);
  if (perMinute.compare(20) < 0 || perMinute.compare(70) > 0) return null;
  return g;
}

const tenth = rational('0.1');
const hundredth = rational('0.01');
/** What the exact 1/128 acre, 340.3125 sq ft, makes of an answer found on 340 sq ft. */
const byExactPlot = (answer: Quantity) => scale(answer, ratio(oneOf128Acre, tradeTestPlot));

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const answer = rate(g, earlier);
  const gallons: NumberPart = {
    kind: 'number',
    key: ratePart(g),
    topic: 'handheld',
    ask: both(
      'What is the rate in gallons (gal) per acre, to the nearest 0.1 gal per acre?',
      '¿Cuál es la dosis del rociador en galones (gal) por acre, redondeada a 0.1 gal por acre?',
    ),
    answer,
    step: tenth,
    units: ['gal/acre', 'gal/1000-sq-ft'],
    alsoRight: [byExactPlot(answer)],
  };
  if (g.test.as === 'caught') return [gallons];
  if (g.test.as === 'quart-and-ounces') {
    const ask = both(
      'What is that in gallons per 1,000 square feet (sq ft), to the nearest 0.01 gal?',
      '¿Cuánto es en galones por 1,000 pies cuadrados (pies²), redondeado a 0.01 gal?',
    );
    const thousand = perThousand(g, earlier);
    // 43.5 and 44 thousands of square feet in an acre are in use, too.
    const alsoRight = ['43.5', '44'].map((per) => scale(thousand, rational('43.56').div(per)));
    const units = ['gal/1000-sq-ft', 'gal/acre'] as const;
    return [
      gallons,
      { kind: 'number', key: 'b', topic: 'rate', ask, answer: thousand, step: hundredth, units, alsoRight },
    ];
  }
  const caught: NumberPart = {
    kind: 'number',
    key: 'a',
    topic: 'handheld',
    ask: both(
      'How much does the nozzle give in the time the plot takes, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
      '¿Cuánto da la boquilla en el tiempo que lleva la parcela, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
    ),
    answer: caughtOnPlot(g),
    step: tenth,
    units: ['fl-oz', 'qt', 'ml'],
  };
  const mix: NumberPart = {
    kind: 'number',
    key: 'c',
    topic: 'tank',
    ask: both(
      'How much mix does the whole job take, in gallons (gal), to the nearest 0.1 gal?',
      '¿Cuánta mezcla lleva todo el trabajo, en galones (gal), redondeada a 0.1 gal?',
    ),
    answer: siteMix(g, earlier),
    step: tenth,
    units: ['gal', 'qt', 'l'],
    alsoRight: [siteMix(g, { b: toWholeSteps(rate(g, {}), tenth) })],
  };
  return [caught, gallons, mix];
}

function rateLine(g: Given): WorkingLine {
  const caught = caughtOnPlot(g);
  return {
    name: both('rate', 'dosis del rociador'),
    expression: times(struck(caught, 2), number(128), over(given(quantity(1, 'gal')), struck(quantity(128, 'fl-oz')))),
    result: toTenth(rate(g, {})),
    answers: true,
    reason: both(
      'An acre is 128 plots. The two 128s cancel: ounces on the plot are gallons on an acre.',
      'Un acre son 128 parcelas. Los dos 128 se cancelan: las onzas en la parcela son los galones en un acre.',
    ),
  };
}

function working(g: Given): readonly WorkingLine[] {
  const { test, plotTime } = g;
  if (test.as === 'caught') return [rateLine(g)];
  if (test.as === 'quart-and-ounces') {
    return [
      {
        name: both('caught', 'recogido'),
        expression: plus(
          times(struck(test.quarts), over(given(quantity(32, 'fl-oz')), struck(quantity(1, 'qt')))),
          given(test.ounces),
        ),
        result: given(caughtOnPlot(g)),
        reason: both('A quart is 32 fluid ounces.', 'Un cuarto de galón tiene 32 onzas líquidas.'),
      },
      rateLine(g),
      {
        name: both('rate for 1,000 sq ft', 'dosis por 1,000 pies²'),
        expression: over(given(rate(g, {})), number('43.56')),
        result: toStep(perThousand(g, {}), hundredth, 2),
        answers: true,
        reason: both(
          'An acre is 43,560 sq ft, 43.56 areas of 1,000 sq ft.',
          'Un acre son 43,560 pies², 43.56 áreas de 1,000 pies².',
        ),
      },
    ];
  }
  return [
    {
      name: both('caught in the time of the plot', 'recogido en el tiempo de la parcela'),
      expression: times(given(test.caught), over(struck(plotTime), struck(test.catchTime))),
      result: toTenth(caughtOnPlot(g)),
      answers: true,
      reason: both(
        'The flow is steady, so the catch grows with the time.',
        'El caudal es parejo: lo recogido crece con el tiempo.',
      ),
    },
    rateLine(g),
    {
      name: both('mix for the job', 'mezcla para el trabajo'),
      expression: times(
        over(given(quantity(rate(g, {}).value, 'gal'), { maxPlaces: 2 }), struck(quantity(43560, 'sq-ft'))),
        struck(test.site),
      ),
      result: toTenth(siteMix(g, {})),
      answers: true,
      reason: both(
        'The gallons per acre, for the share of an acre the job has. Mix no more than the job takes.',
        'Los galones por acre, para la parte de un acre que tiene el trabajo. No prepare más de lo que lleva.',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { test, plotTime } = g;
  const short = test.as === 'short-catch';
  const first = short
    ? both(
        en`You are asked for the catch in ${plotTime}, the rate for an acre and the mix for the job. The catch you have took ${test.catchTime}.`,
        es`Se piden lo recogido en ${plotTime}, la dosis por acre y la mezcla para el trabajo. Lo que se tiene se recogió en ${test.catchTime}.`,
      )
    : both(
        'You are asked for gallons per acre. You have the ounces the nozzle gives while the plot is sprayed.',
        'Se piden galones por acre. Se tienen las onzas que da la boquilla mientras se rocía la parcela.',
      );
  const begin =
    test.as === 'short-catch'
      ? both(
          en`Begin with ${test.caught} ÷ ${test.catchTime} × ${plotTime}.`,
          es`Empiece con ${test.caught} ÷ ${test.catchTime} × ${plotTime}.`,
        )
      : test.as === 'caught'
        ? both(
            'An acre is 128 such plots; a gallon is 128 fluid ounces. Multiply by 128 and divide by 128: what is left?',
            'Un acre son 128 parcelas así; un galón son 128 onzas líquidas. Multiplique por 128 y divida entre 128: ¿qué queda?',
          )
        : both(
            en`Begin with the catch: 32 fl oz plus ${test.ounces}.`,
            es`Empiece con lo recogido: 32 oz líq más ${test.ounces}.`,
          );
  return [
    first,
    both('Fluid ounces on 1/128 acre = gallons per acre.', 'Onzas líquidas en 1/128 de acre = galones por acre.'),
    begin,
  ];
}

export const hand128thFamily = defineFamily<Given>({
  key: 'hand-128th',
  version: 1,
  topic: 'handheld',
  tiers: [1, 2, 3],
  title: both('Rate by the 1/128-acre method', 'Dosis por el método de 1/128 de acre'),
  sources: [
    {
      title: 'Calibrating Turfgrass Chemical Application Equipment',
      publisher: 'Ohio State University Extension',
      year: 2000,
      ref: 'Bulletin 817-00, section 7',
    },
    {
      title: 'Backpack and hand-held sprayer calibration, 128th-acre method',
      publisher: 'SportsTurf magazine (Sports Turf Managers Association)',
      year: 2014,
    },
  ],
  draw: drawBelievable,
  heading: (g) => situationOf(hand128thSituations, g).heading,
  statement: (g) => situationOf(hand128thSituations, g).statement(g),
  parts,
  figure: (g) =>
    plotFigure({
      length: g.length,
      width: g.width,
      more: both(en`It takes ${g.plotTime} to spray.`, es`Rociarla lleva ${g.plotTime}.`),
    }),
  hints,
  working,
  slips: hand128thSlips,
});
