import { quantity, scale } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, grouped, minus, over, struck, times, type WorkingLine } from '../../working.ts';
import { areaUnits, oneSqFt } from '../area/plan-parts.ts';
import { both } from '../both.ts';
import { toTenth } from '../rate/measure-out.ts';
import { toWholeSteps } from '../to-whole-steps.ts';
import { factorOver, toStep } from '../units/unit-steps.ts';
import { perAcre, perThousand, plotArea, ratePart, testPlotSlips, waterUsed } from './hand-test-plot-slips.ts';
import { testPlotSituations, type TestPlotGiven } from './hand-test-plot-texts.ts';
import { plotFigure } from './plot-figure.ts';

type Given = TestPlotGiven;

const ft = (value: number) => quantity(value, 'ft');
const flOz = (value: number) => quantity(value, 'fl-oz');
const tenth = rational('0.1');
const hundredth = rational('0.01');

/** Plots of an even area, in feet. */
const evenPlots = [
  [20, 10],
  [25, 10],
  [20, 20],
  [25, 20],
  [30, 20],
  [30, 25],
  [40, 20],
] as const;

function drawTest(rng: Rng, tier: Tier): Omit<Given, 'situation' | 'person' | 'place' | 'season'> {
  if (tier === 1) {
    const [length, width] = rng.pick(evenPlots);
    const used = quantity(rng.pick(['0.25', '0.5', '0.75', '1', '1.25', '1.5']), 'gal');
    return { length: ft(length), width: ft(width), test: { as: 'area-told', used } };
  }
  const width = rng.int(10, 24);
  const sides = { length: ft(width + rng.int(2, 26)), width: ft(width) };
  if (tier === 2) return { ...sides, test: { as: 'refill', used: flOz(rng.int(30, 180)) } };
  const start = quantity(rng.pick([1, 2, 3]), 'gal');
  return { ...sides, test: { as: 'left-over', start, left: flOz(rng.int(40, 300)) } };
}

function draw(rng: Rng, tier: Tier): Given | null {
  const g: Given = { ...drawScene(rng, testPlotSituations.length), ...drawTest(rng, tier) };
  if (waterUsed(g).value.compare(tier === 1 ? 0 : 25) <= 0) return null;
  // A round plot of 1,000 sq ft would leave nothing to work out.
  const rate = perThousand(g, {}).value;
  return rate.compare('0.5') < 0 || rate.compare(4) > 0 || plotArea(g).value.compare(1000) === 0 ? null : g;
}

function firstPart(g: Given): NumberPart | null {
  if (g.test.as === 'area-told') return null;
  if (g.test.as === 'refill') {
    const ask = both(
      'What is the area of the plot in square feet (sq ft), to the nearest whole square foot?',
      '¿Cuál es el área de la parcela en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
    );
    return { kind: 'number', key: 'a', topic: 'area', ask, answer: plotArea(g), step: oneSqFt, units: areaUnits };
  }
  const ask = both(
    'How much water went on the plot, in fluid ounces (fl oz), to the nearest whole fluid ounce?',
    '¿Cuánta agua fue a la parcela, en onzas líquidas (oz líq), redondeada a la onza entera?',
  );
  const units = ['fl-oz', 'qt', 'gal', 'ml'] as const;
  return { kind: 'number', key: 'a', topic: 'handheld', ask, answer: waterUsed(g), step: rational(1), units };
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const rate: NumberPart = {
    kind: 'number',
    key: ratePart(g),
    topic: 'handheld',
    ask: both(
      'What is the rate in gallons (gal) per 1,000 square feet (sq ft), to the nearest 0.01 gal?',
      '¿Cuál es la dosis del rociador en galones (gal) por 1,000 pies cuadrados (pies²), redondeada a 0.01 gal?',
    ),
    answer: perThousand(g, earlier),
    step: hundredth,
    units: ['gal/1000-sq-ft', 'fl-oz/1000-sq-ft', 'gal/acre'],
  };
  const first = firstPart(g);
  if (!first) return [rate];
  const answer = perAcre(g, earlier);
  const acre: NumberPart = {
    kind: 'number',
    key: 'c',
    topic: 'handheld',
    ask: both('And in gallons per acre, to the nearest 0.1 gal?', '¿Y en galones por acre, redondeada a 0.1 gal?'),
    answer,
    step: tenth,
    units: ['gal/acre', 'gal/1000-sq-ft'],
    // 43.5 and 44 thousands of square feet in an acre are in use, and so is the rounded rate.
    alsoRight: [
      ...['43.5', '44'].map((per) => scale(answer, rational(per).div('43.56'))),
      perAcre(g, { b: toWholeSteps(perThousand(g, {}), hundredth) }),
    ],
  };
  return [first, rate, acre];
}

function firstLine(g: Given): WorkingLine[] {
  if (g.test.as === 'area-told') return [];
  const area: WorkingLine = {
    name: both('area of the plot', 'área de la parcela'),
    expression: times(given(g.length), given(g.width)),
    result: given(plotArea(g)),
    answers: g.test.as === 'refill',
    reason: both('Length times width.', 'Largo por ancho.'),
  };
  if (g.test.as !== 'left-over') return [area];
  const { start, left } = g.test;
  const water: WorkingLine = {
    name: both('water used', 'agua usada'),
    expression: minus(times(struck(start), factorOver('gal', 'fl-oz')), given(left)),
    result: given(waterUsed(g)),
    answers: true,
    reason: both('What was there before, less what is left.', 'Lo que había antes menos lo que quedó.'),
  };
  return [water, area];
}

function working(g: Given): readonly WorkingLine[] {
  const used = waterUsed(g);
  const share = over(given(quantity(1000, 'sq-ft')), struck(plotArea(g)));
  const gallons = used.unit === 'gal' ? given(used) : grouped(times(struck(used), factorOver('fl-oz', 'gal')));
  const rate: WorkingLine = {
    name: both('rate for 1,000 sq ft', 'dosis por 1,000 pies²'),
    expression: times(gallons, over(given(quantity(1000, 'sq-ft'), { cancel: true }), struck(plotArea(g)))),
    result: toStep(perThousand(g, {}), hundredth, 2),
    answers: true,
    reason: both(
      'What the plot took, for 1,000 sq ft instead of the plot.',
      'Lo que llevó la parcela, para 1,000 pies² en lugar de la parcela.',
    ),
  };
  if (g.test.as === 'area-told') {
    return [{ ...rate, expression: times(given(used), share) }];
  }
  return [
    ...firstLine(g),
    rate,
    {
      name: both('rate for an acre', 'dosis por acre'),
      expression: times(given(perThousand(g, {}), { maxPlaces: 4 }), {
        is: 'number',
        value: rational('43.56'),
        maxPlaces: 2,
      }),
      result: toTenth(perAcre(g, {})),
      answers: true,
      reason: both(
        'An acre is 43,560 sq ft, 43.56 areas of 1,000 sq ft.',
        'Un acre son 43,560 pies², 43.56 áreas de 1,000 pies².',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const acre = g.test.as === 'area-told' ? both('', '') : both(' and per acre', ' y por acre');
  const begin =
    g.test.as === 'left-over'
      ? both(
          en`Begin with the water: ${g.test.start} less ${g.test.left}, both in fluid ounces.`,
          es`Empiece con el agua: ${g.test.start} menos ${g.test.left}, todo en onzas líquidas.`,
        )
      : g.test.as === 'refill'
        ? both(en`Begin with the area: ${g.length} × ${g.width}.`, es`Empiece con el área: ${g.length} × ${g.width}.`)
        : both(en`Begin with ${g.test.used} ÷ ${plotArea(g)}.`, es`Empiece con ${g.test.used} ÷ ${plotArea(g)}.`);
  return [
    both(
      en`You are asked for gallons per 1,000 sq ft${acre}. You know the plot and the water it took.`,
      es`Se piden galones por 1,000 pies²${acre}. Se conocen la parcela y el agua que llevó.`,
    ),
    both(
      'Rate per 1,000 sq ft = gallons used ÷ area of the plot × 1,000. An acre is 43.56 times 1,000 sq ft; a gallon is 128 fl oz.',
      'Dosis por 1,000 pies² = galones usados ÷ área de la parcela × 1,000. Un acre son 43.56 veces 1,000 pies²; un galón, 128 oz líq.',
    ),
    begin,
  ];
}

export const handTestPlotFamily = defineFamily<Given>({
  key: 'hand-test-plot',
  version: 1,
  topic: 'handheld',
  tiers: [1, 2, 3],
  title: both('Rate from a test plot', 'Dosis según una parcela de prueba'),
  sources: [
    {
      title: 'Turf resource: boom and backpack sprayer calibration',
      publisher: 'herbicide manufacturer guidance',
      year: null,
    },
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
  ],
  draw,
  heading: (g) => situationOf(testPlotSituations, g).heading,
  statement: (g) => situationOf(testPlotSituations, g).statement(g),
  parts,
  figure: (g) =>
    plotFigure({
      length: g.length,
      width: g.width,
      more:
        g.test.as === 'left-over'
          ? both(en`Water left in the tank: ${g.test.left}.`, es`Agua que queda en el tanque: ${g.test.left}.`)
          : both(en`Water used: ${g.test.used}.`, es`Agua usada: ${g.test.used}.`),
    }),
  hints,
  working,
  slips: testPlotSlips,
});
