import { quantity, ratio } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart, type Part } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, number, over, struck, times, type WorkingLine } from '../../working.ts';
import { areaUnits, oneSqFt } from '../area/plan-parts.ts';
import { both } from '../both.ts';
import { toTenth } from '../rate/measure-out.ts';
import { placesWithField } from '../places-with-field.ts';
import { labelUse } from '../spot/mix-lines.ts';
import { granuleHeading, granuleLines } from './granule-lines.ts';
import { bags, pounds, productPart, siteArea, spreaderNeedSlips, thousand } from './spreader-need-slips.ts';
import { spreaderNeedSituations, type SpreaderNeedGiven } from './spreader-need-texts.ts';

type Given = SpreaderNeedGiven;

const tenth = rational('0.1');
const ft = (value: number) => quantity(value, 'ft');

/** Sides of a site, in feet, and the step they are measured in. */
const ranges = {
  bed: { width: [12, 30], longer: [15, 60] },
  lawn: { width: [40, 90], longer: [10, 70] },
  turf: { width: [110, 160], longer: [40, 120] },
} as const;
const areas = { bed: [6, 28], lawn: [25, 140], turf: [180, 400] } as const;

function draw(rng: Rng, tier: Tier): Given | null {
  const line = rng.pick(granuleLines);
  const drawnScene = drawScene(rng, spreaderNeedSituations.length);
  const scene = line.site === 'turf' ? { ...drawnScene, place: rng.pick(placesWithField) } : drawnScene;
  // On the third tier several bags are needed, so a small site comes with small ones.
  const small = tier === 3 && line.site !== 'turf';
  const bag = quantity(rng.pick(small ? [10, 15, 20] : [20, 25, 40, 50]), 'lb');
  if (tier === 1) {
    const [least, most] = areas[line.site];
    const area = quantity(rng.int(least, most) * 100, 'sq-ft');
    if (area.value.compare(1000) === 0) return null;
    return { ...scene, line, bag, known: { as: 'area', area }, bagsAsked: false };
  }
  const { width, longer } = ranges[line.site];
  const wide = rng.int(width[0], width[1]);
  const known = { as: 'sides', length: ft(wide + rng.int(longer[0], longer[1])), width: ft(wide) } as const;
  const g: Given = { ...scene, line, bag, known, bagsAsked: tier === 3 };
  // On 1,000 sq ft there is nothing to scale.
  if (siteArea(g).value.compare(1000) === 0) return null;
  if (tier === 2) return g;
  // Whole bags must not hang on how the pounds were rounded, and a job of one bag asks nothing.
  const needed = ratio(pounds(g, {}), bag);
  const over = needed.sub(needed.floor());
  const clear = over.compare('0.06') > 0 && over.compare('0.94') < 0;
  return clear && needed.compare('1.4') > 0 && needed.compare(16) < 0 ? g : null;
}

function parts(g: Given, earlier: Earlier): readonly Part[] {
  const product: NumberPart = {
    kind: 'number',
    key: productPart(g),
    topic: 'spreader',
    ask: both(
      'How much product, in pounds (lb), to the nearest 0.1 lb?',
      '¿Cuánto producto, en libras (lb), redondeado a 0.1 lb?',
    ),
    answer: pounds(g, earlier),
    step: tenth,
    units: ['lb', 'oz', 'kg'],
  };
  if (g.known.as === 'area') return [product];
  const area: NumberPart = {
    kind: 'number',
    key: 'a',
    topic: 'area',
    ask: both(
      'What is the area in square feet (sq ft), to the nearest whole square foot?',
      '¿Cuál es el área en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
    ),
    answer: siteArea(g),
    step: oneSqFt,
    units: areaUnits,
  };
  if (!g.bagsAsked) return [area, product];
  return [
    area,
    product,
    {
      kind: 'count',
      key: 'c',
      topic: 'spreader',
      ask: both('How many bags must be on the truck?', '¿Cuántas bolsas deben ir en la camioneta?'),
      answer: bags(g, earlier),
      thing: both('bags', 'bolsas'),
    },
  ];
}

function working(g: Given): readonly WorkingLine[] {
  const { known, line } = g;
  const needed = pounds(g, {});
  const area: WorkingLine[] =
    known.as === 'area'
      ? []
      : [
          {
            name: both('area', 'área'),
            expression: times(given(known.length), given(known.width)),
            result: given(siteArea(g)),
            answers: true,
            reason: both('Length times width.', 'Largo por ancho.'),
          },
        ];
  const product: WorkingLine = {
    name: both('product', 'producto'),
    expression: times(struck(siteArea(g)), over(given(line.product), struck(thousand))),
    result: toTenth(needed),
    answers: true,
    reason: both(
      'Weigh it out on a scale; granules are not measured with a cup.',
      'Péselo en una balanza; los gránulos no se miden con taza.',
    ),
  };
  if (!g.bagsAsked) return [...area, product];
  const exact = ratio(needed, g.bag);
  return [
    ...area,
    product,
    {
      name: both('bags in pounds', 'bolsas según las libras'),
      expression: over(struck(needed, 2), struck(g.bag)),
      result: number(exact, 2),
      reason: both('Pounds needed by pounds in a bag.', 'Libras que se necesitan entre libras por bolsa.'),
    },
    {
      name: both('bags', 'bolsas'),
      result: number(bags(g, {}).value),
      answers: true,
      reason: both(
        'Bags come whole, so round up. Close the open one and store it dry.',
        'Las bolsas van enteras, así que redondee hacia arriba. Cierre la que quede abierta y guárdela en seco.',
      ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { known, line } = g;
  return [
    both(
      en`You are asked for pounds of product. The label line "${granuleHeading(line)}" gives pounds for each 1,000 sq ft.`,
      es`Se piden libras de producto. La línea «${granuleHeading(line)}» de la etiqueta da libras por cada 1,000 pies².`,
    ),
    both(
      en`Product = (area ÷ 1,000 sq ft) × the rate.${g.bagsAsked ? ' Bags = pounds ÷ pounds in a bag, rounded up.' : ''}`,
      es`Producto = (área ÷ 1,000 pies²) × la dosis.${g.bagsAsked ? ' Bolsas = libras ÷ libras por bolsa, hacia arriba.' : ''}`,
    ),
    known.as === 'area'
      ? both(en`Begin with ${known.area} ÷ 1,000 sq ft.`, es`Empiece con ${known.area} ÷ 1,000 pies².`)
      : both(
          en`Begin with the area: ${known.length} × ${known.width}.`,
          es`Empiece con el área: ${known.length} × ${known.width}.`,
        ),
  ];
}

export const spreaderNeedFamily = defineFamily<Given>({
  key: 'spreader-need',
  version: 1,
  topic: 'spreader',
  tiers: [1, 2, 3],
  title: both('Granules for a site', 'Gránulos para un sitio'),
  sources: [
    { title: 'Broadcast Spreader Calibration (Louisiana Home Lawn Series)', publisher: 'LSU AgCenter', year: null },
    { title: 'Rotary Spreader Calibration Procedures', publisher: 'UMass Extension Turf Program', year: null },
  ],
  draw,
  heading: (g) => situationOf(spreaderNeedSituations, g).heading,
  statement: (g) => situationOf(spreaderNeedSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: spreaderNeedSlips,
});
