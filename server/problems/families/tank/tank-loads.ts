import type { TankFigure } from '../../../../shared/contracts/figure.ts';
import { quantity, scale } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart, type Part } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, minus, number, over, struck, times, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { placesWithField } from '../places-with-field.ts';
import { toTenth } from '../rate/measure-out.ts';
import { toStep } from '../units/unit-steps.ts';
import {
  exactLoads,
  last,
  loads,
  mixNeeded,
  partsOf,
  siteAcres,
  siteArea,
  tankLoadsSlips,
} from './tank-loads-slips.ts';
import { tankLoadsSituations, type TankLoadsGiven } from './tank-loads-texts.ts';

type Given = TankLoadsGiven;

const tenth = rational('0.1');
const thousandth = rational('0.001');
const gal = (value: number | string) => quantity(value, 'gal');
function drawJob(rng: Rng, tier: Tier): Pick<Given, 'tank' | 'job'> {
  if (tier === 1) return { tank: gal(rng.pick([2, 3, 4])), job: { as: 'mix', mix: gal(rng.int(9, 34) / 2) } };
  if (tier === 2) {
    const area = quantity(rng.int(24, 96) * 500, 'sq-ft');
    const rate = quantity(rng.pick(['0.8', '1', '1.2', '1.5', '2']), 'gal/1000-sq-ft');
    return { tank: gal(rng.pick([10, 12, 15, 20, 25])), job: { as: 'area', area, rate } };
  }
  // Sides in steps of 33 ft: their products are whole fortieths of an acre, so nothing hangs on how acres are rounded.
  const width = rng.int(4, 8) * 33;
  const length = width + rng.int(1, 8) * 33;
  const rate = quantity(rng.int(4, 12) * 5, 'gal/acre');
  const job = { as: 'sides', length: quantity(length, 'ft'), width: quantity(width, 'ft'), rate } as const;
  return { tank: gal(rng.pick([15, 20, 25, 30, 50])), job };
}

function draw(rng: Rng, tier: Tier): Given | null {
  const drawnScene = drawScene(rng, tankLoadsSituations.length);
  const scene = tier === 3 ? { ...drawnScene, place: rng.pick(placesWithField) } : drawnScene;
  const g: Given = { ...scene, ...drawJob(rng, tier) };
  if (g.job.as === 'sides' && siteAcres(g).value.compare(1) === 0) return null;
  const exact = exactLoads(g);
  const part = exact.sub(exact.floor());
  if (exact.compare(1) <= 0 || exact.compare(7) >= 0) return null;
  return part.compare('0.08') < 0 || part.compare('0.92') > 0 ? null : g;
}

function mixPart(g: Given, earlier: Earlier): NumberPart {
  return {
    kind: 'number',
    key: partsOf(g).mix,
    topic: 'rate',
    ask: both(
      'How much mix does the job take, in gallons (gal), to the nearest 0.1 gal?',
      '¿Cuánta mezcla lleva el trabajo, en galones (gal), redondeada a 0.1 gal?',
    ),
    answer: mixNeeded(g, earlier),
    step: tenth,
    units: ['gal', 'qt', 'l'],
  };
}
function acresPart(g: Given): NumberPart {
  return {
    kind: 'number',
    key: 'a',
    topic: 'area',
    ask: both(
      'How many acres is the field, to the nearest 0.001 acre?',
      '¿Cuántos acres tiene el campo, redondeado a 0.001 acre?',
    ),
    answer: siteAcres(g),
    step: thousandth,
    units: ['acre', 'sq-ft'],
    // Bulletins round an acre to 43,500 or 44,000 sq ft.
    alsoRight: [43500, 44000].map((sqFt) => scale(siteAcres(g), rational(43560, sqFt))),
  };
}

function parts(g: Given, earlier: Earlier): readonly Part[] {
  const key = partsOf(g);
  const count: Part = {
    kind: 'count',
    key: key.loads,
    topic: 'tank',
    ask: both(
      'How many loads is that, the last part load counted as one?',
      '¿Cuántas cargas son, contando la última carga parcial como una?',
    ),
    answer: loads(g, earlier),
    thing: both('loads', 'cargas'),
  };
  const rest: NumberPart = {
    kind: 'number',
    key: key.last,
    topic: 'tank',
    ask: both(
      'How many gallons (gal) go into the last load, to the nearest 0.1 gal?',
      '¿Cuántos galones (gal) lleva la última carga, redondeado a 0.1 gal?',
    ),
    answer: last(g, earlier),
    step: tenth,
    units: ['gal', 'qt', 'l'],
  };
  if (g.job.as === 'mix') return [count, rest];
  return g.job.as === 'area' ? [mixPart(g, earlier), count, rest] : [acresPart(g), mixPart(g, earlier), count, rest];
}

function mixLines(g: Given): WorkingLine[] {
  const { job } = g;
  if (job.as === 'mix') return [];
  const name = both('mix', 'mezcla');
  const result = toTenth(mixNeeded(g, {}));
  const dose = gal(job.rate.value.toFraction());
  if (job.as === 'area') {
    return [
      {
        name,
        expression: times(struck(job.area), over(given(dose), struck(quantity(1000, 'sq-ft')))),
        result,
        answers: true,
        reason: both('The rate is for each 1,000 sq ft.', 'La dosis es por cada 1,000 pies².'),
      },
    ];
  }
  const acres = siteAcres(g);
  return [
    {
      name: both('area', 'área'),
      expression: times(given(job.length), given(job.width)),
      result: given(siteArea(g)),
      reason: both('Length times width.', 'Largo por ancho.'),
    },
    {
      name: both('acres', 'acres'),
      expression: times(struck(siteArea(g)), over(given(quantity(1, 'acre')), struck(quantity(43560, 'sq-ft')))),
      result: given(acres, { places: 3 }),
      answers: true,
      reason: both('An acre is 43,560 square feet.', 'Un acre tiene 43,560 pies cuadrados.'),
    },
    {
      name,
      expression: times(struck(acres), over(given(dose), struck(quantity(1, 'acre')))),
      result,
      answers: true,
      reason: both('The rate is for each acre.', 'La dosis es por cada acre.'),
    },
  ];
}

function working(g: Given): readonly WorkingLine[] {
  const mix = mixNeeded(g, {});
  const full = exactLoads(g).floor();
  return [
    ...mixLines(g),
    {
      name: both('tanks of mix', 'tanques de mezcla'),
      expression: over(struck(mix), struck(g.tank)),
      result: number(exactLoads(g), 2),
      reason: both('Mix by what a tank holds.', 'Mezcla entre lo que cabe en un tanque.'),
    },
    {
      name: both('loads', 'cargas'),
      result: number(loads(g, {}).value),
      answers: true,
      reason: both(
        'The part of a tank is a load, too, so round up.',
        'La parte de un tanque también es una carga: redondee hacia arriba.',
      ),
    },
    {
      name: both('last load', 'última carga'),
      expression: minus(given(mix), times(number(full), given(g.tank))),
      result: toStep(last(g, {}), tenth, 1),
      answers: true,
      reason: both(
        'What is left after the full loads. Measure the product for this load by itself.',
        'Lo que queda después de las cargas llenas. Mida aparte el producto para esta carga.',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { job, tank } = g;
  const first = both(
    en`You are asked for the loads and for the last one. A tank holds ${tank}.`,
    es`Se piden las cargas y la última de ellas. En un tanque caben ${tank}.`,
  );
  const relation = both(
    'Loads = mix ÷ tank, rounded up. Last load = mix − full loads × tank.',
    'Cargas = mezcla ÷ tanque, redondeado hacia arriba. Última carga = mezcla − cargas llenas × tanque.',
  );
  if (job.as === 'mix') {
    return [first, relation, both(en`Begin with ${job.mix} ÷ ${tank}.`, es`Empiece con ${job.mix} ÷ ${tank}.`)];
  }
  const mix = both('Mix = area × rate. ', 'Mezcla = área × dosis. ');
  const begin =
    job.as === 'area'
      ? both(
          en`Begin with the mix: ${job.area} ÷ 1,000, times ${job.rate.value}.`,
          es`Empiece con la mezcla: ${job.area} ÷ 1,000, por ${job.rate.value}.`,
        )
      : both(
          en`Begin with the area: ${job.length} × ${job.width}, then divide by 43,560.`,
          es`Empiece con el área: ${job.length} × ${job.width} y divida entre 43,560.`,
        );
  return [first, { en: mix.en + relation.en, es: mix.es + relation.es }, begin];
}

function figure({ tank }: Given): TankFigure<Text> {
  return {
    kind: 'tank',
    level: 1,
    capacity: both(en`${tank}`, es`${tank}`),
    alt: both(
      en`A sprayer tank that holds ${tank} when full.`,
      es`Un tanque de rociador donde caben ${tank} cuando está lleno.`,
    ),
  };
}

export const tankLoadsFamily = defineFamily<Given>({
  key: 'tank-loads',
  version: 1,
  topic: 'tank',
  tiers: [1, 2, 3],
  title: both('Tank loads and the last part load', 'Cargas del tanque y la última carga parcial'),
  sources: [
    {
      title: 'Agrochemical and Pesticide Safety (handbook; mixing chapter)',
      publisher: 'M. F. Waxman, CRC/Lewis, 1998 (author, publisher and year from memory)',
      year: 1998,
      ref: 'Example 4',
    },
    {
      title: 'Turf resource: boom and backpack sprayer calibration',
      publisher: 'herbicide manufacturer guidance',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(tankLoadsSituations, g).heading,
  statement: (g) => situationOf(tankLoadsSituations, g).statement(g),
  parts,
  figure,
  hints,
  working,
  slips: tankLoadsSlips,
});
