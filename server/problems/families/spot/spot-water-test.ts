import { quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import { roundToStep } from '../../../../shared/quantity/round.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es, unitFirst } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, number, over, struck, times, type Expression, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { measuredOut, toTenth } from '../rate/measure-out.ts';
import { factorOver, toStep } from '../units/unit-steps.ts';
import { labelUse, lineHeading, mixLines, stepOf } from './mix-lines.ts';
import { askedUnit, mixForAll, plants, productNeeded, waterTestSlips } from './spot-water-test-slips.ts';
import { plantsOf, waterTestSituations, type WaterTestGiven } from './spot-water-test-texts.ts';

type Given = WaterTestGiven;

/** Lines for plants that stand one by one. */
const lines = mixLines.filter(({ site }) => site === 'ornamentals' || site === 'trees' || site === 'bed');
const tenth = rational('0.1');

/** Water that a trial takes, by tier: how it is measured and on how many plants. */
const trials: Record<Tier, readonly (readonly [used: Quantity, tried: number])[]> = {
  1: [
    [quantity(1, 'gal'), 4],
    [quantity(1, 'gal'), 5],
    [quantity(1, 'gal'), 8],
    [quantity(2, 'gal'), 8],
    [quantity(2, 'gal'), 10],
  ],
  2: [
    [quantity(2, 'qt'), 4],
    [quantity(2, 'qt'), 5],
    [quantity(3, 'qt'), 4],
    [quantity(3, 'qt'), 6],
    [quantity(1, 'qt'), 3],
  ],
  3: [],
};

function drawTrial(rng: Rng, tier: Tier): Pick<Given, 'used' | 'tried' | 'rows'> {
  if (tier === 3) {
    const tried = rng.int(3, 6);
    // 14 to 34 fl oz a plant: a pint to a quart for a shrub.
    const used = quantity(tried * rng.int(14, 34) + rng.int(0, 2), 'fl-oz');
    const first = rng.int(9, 24);
    return { used, tried, rows: [first, first + rng.int(2, 12)] };
  }
  const [used, tried] = rng.pick(trials[tier]);
  return { used, tried, rows: [rng.int(2 * tried + 1, tier === 1 ? 40 : 48)] };
}

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, waterTestSituations.length);
  const g: Given = { ...scene, line: rng.pick(lines), rateTold: tier === 1, ...drawTrial(rng, tier) };
  const mix = mixForAll(g).value;
  if (mix.compare('1.5') < 0 || mix.compare(16) > 0) return null;
  // The first tiers come out even, so that their rounding never matters.
  if (tier < 3 && mix.mul(4).d !== 1n && mix.mul(10).d !== 1n) return null;
  const product = productNeeded(g, {}).value;
  if (askedUnit(g) === 'tbsp' && product.div(stepOf('tbsp')).d !== 1n) return null;
  return product.compare(askedUnit(g) === 'tbsp' ? 24 : 60) > 0 ? null : g;
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const unit = askedUnit(g);
  const step = stepOf(unit);
  const rounded = quantity(roundToStep(mixForAll(g).value, tenth), 'gal');
  return [
    {
      kind: 'number',
      key: 'a',
      topic: 'spot',
      ask: both(
        en`How much mix do all the ${plantsOf(g)} take, in gallons (gal), to the nearest 0.1 gal?`,
        es`¿Cuánta mezcla llevan todos los ${plantsOf(g)}, en galones (gal), redondeada a 0.1 gal?`,
      ),
      answer: mixForAll(g),
      step: tenth,
      units: ['gal', 'qt', 'fl-oz', 'l'],
    },
    {
      kind: 'number',
      key: 'b',
      topic: 'spot',
      ask: both(
        en`How much product goes into that mix, in ${unitFirst(unit)}, to the nearest ${quantity(step, unit)}?`,
        es`¿Cuánto producto lleva esa mezcla, en ${unitFirst(unit)}, redondeado a ${quantity(step, unit)}?`,
      ),
      answer: productNeeded(g, earlier),
      step,
      units: unit === 'tbsp' ? ['tbsp', 'tsp', 'fl-oz', 'ml'] : ['fl-oz', 'tbsp', 'cup', 'ml'],
      alsoRight: [productNeeded(g, { a: rounded })],
    },
  ];
}

function toGallons(g: Given): Expression {
  const share = over(number(plants(g)), number(g.tried));
  return g.used.unit === 'gal'
    ? times(given(g.used), share)
    : times(struck(g.used), share, factorOver(g.used.unit, 'gal'));
}

function working(g: Given): readonly WorkingLine[] {
  const mix = mixForAll(g);
  const product = productNeeded(g, {});
  const gallons = over(given(g.line.product), struck(quantity(1, 'gal')));
  const changed = askedUnit(g) !== g.line.product.unit;
  const perGallon = over(struck(g.line.product), struck(quantity(1, 'gal')));
  const mixShown = given(mix, { cancel: true, maxPlaces: 3 });
  const rows: WorkingLine[] =
    g.rows.length === 1
      ? []
      : [
          {
            name: plantsOf(g),
            expression: { is: 'joined', sign: '+', items: g.rows.map((row) => number(row)) },
            result: number(plants(g)),
            reason: both('Both rows are sprayed.', 'Se rocían las dos hileras.'),
          },
        ];
  return [
    ...rows,
    {
      name: both('mix', 'mezcla'),
      expression: toGallons(g),
      result: toTenth(mix),
      answers: true,
      reason: both(
        en`${g.used} for ${g.tried} plants, and there are ${plants(g)}.`,
        es`${g.used} para ${g.tried} plantas, y son ${plants(g)}.`,
      ),
    },
    {
      name: both('product', 'producto'),
      expression: changed ? times(mixShown, perGallon, factorOver('tbsp', 'fl-oz')) : times(mixShown, gallons),
      result: toStep(product, stepOf(askedUnit(g)), 1),
      answers: true,
      reason:
        askedUnit(g) === 'fl-oz'
          ? measuredOut(product)
          : both(
              'Use level spoons from a set that is kept for pesticides.',
              'Use cucharadas al ras, de un juego reservado para plaguicidas.',
            ),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  return [
    both(
      en`You are asked for the mix for all the ${plantsOf(g)} and then the product. The label line "${lineHeading(g.line)}" gives the product for one gallon.`,
      es`Se pide la mezcla para todos los ${plantsOf(g)} y después el producto. La línea «${lineHeading(g.line)}» de la etiqueta da el producto por galón.`,
    ),
    both(
      'Mix = water of the trial × all plants ÷ plants in the trial. Product = gallons of mix × product for one gallon.',
      'Mezcla = agua de la prueba × todas las plantas ÷ plantas de la prueba. Producto = galones de mezcla × producto por galón.',
    ),
    both(en`Begin with one plant: ${g.used} ÷ ${g.tried}.`, es`Empiece con una planta: ${g.used} ÷ ${g.tried}.`),
  ];
}

export const spotWaterTestFamily = defineFamily<Given>({
  key: 'spot-water-test',
  version: 1,
  topic: 'spot',
  tiers: [1, 2, 3],
  title: both('Mix from a trial with water, then product', 'Mezcla según una prueba con agua y después producto'),
  sources: [
    {
      title: 'How do I calibrate a hose-end sprayer?',
      publisher: 'Pesticide Environmental Stewardship (land-grant university consortium)',
      year: null,
    },
    {
      title: 'Guidelines for Spot Spraying (calibration and mixing card)',
      publisher: 'herbicide manufacturer guidance',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(waterTestSituations, g).heading,
  statement: (g) => situationOf(waterTestSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: waterTestSlips,
});
