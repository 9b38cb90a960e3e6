import { quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, grouped, number, over, plus, struck, times, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { measuredOut } from '../rate/measure-out.ts';
import { labelUse } from '../spot/mix-lines.ts';
import { toWholeSteps } from '../to-whole-steps.ts';
import { byThirtyMl, factorOver, toStep } from '../units/unit-steps.ts';
import { percentHeading, percentLines } from './percent-lines.ts';
import {
  inMilliliters,
  inQuarts,
  lastLoad,
  percentVolumeSlips,
  productForTank,
  productIn,
} from './strength-percent-volume-slips.ts';
import { percentVolumeSituations, type PercentVolumeGiven } from './strength-percent-volume-texts.ts';

type Given = PercentVolumeGiven;

const tenth = rational('0.1');
const gal = (value: number | string) => quantity(value, 'gal');

function draw(rng: Rng, tier: Tier): Given {
  const scene = drawScene(rng, percentVolumeSituations.length);
  const line = rng.pick(percentLines);
  if (tier === 1) return { ...scene, line, job: { as: 'told', mix: gal(rng.int(2, 4)) } };
  if (tier === 2) return { ...scene, line, job: { as: 'cylinder', mix: gal(rng.pick(['1.5', '2', '3', '4'])) } };
  const size = rng.pick([2, 3, 4]);
  const last = gal(rng.int(2, 2 * size - 1) / 2);
  return { ...scene, line, job: { as: 'loads', mix: gal(size), fullLoads: rng.int(2, 6), lastLoad: last } };
}

function productPart(part: { key: 'a' | 'b'; ask: Text; answer: Quantity }): NumberPart {
  return { ...part, kind: 'number', topic: 'strength', step: tenth, units: ['fl-oz', 'tbsp', 'cup', 'qt', 'ml'] };
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const full = productPart({
    key: 'a',
    ask:
      g.job.as === 'loads'
        ? both(
            'How much product goes into each full tank, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
            '¿Cuánto producto lleva cada tanque lleno, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
          )
        : both(
            'How much product goes into the tank, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
            '¿Cuánto producto va en el tanque, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
          ),
    answer: productForTank(g),
  });
  if (g.job.as === 'told') return [full];
  if (g.job.as === 'cylinder') {
    const answer = inMilliliters(g, earlier);
    const ask = both(
      'The cylinder is marked in milliliters (mL). How much is that, to the nearest 1 mL?',
      'La probeta está marcada en mililitros (mL). ¿Cuánto es, redondeado a 1 mL?',
    );
    const fromRounded = inMilliliters(g, { a: toWholeSteps(productForTank(g), tenth) });
    const alsoRight = [...byThirtyMl(answer, 'fl-oz'), fromRounded, ...byThirtyMl(fromRounded, 'fl-oz')];
    return [
      full,
      { kind: 'number', key: 'b', topic: 'units', ask, answer, step: rational(1), units: ['ml', 'l'], alsoRight },
    ];
  }
  const last = productPart({
    key: 'b',
    ask: both(
      'How much product goes into the last tank, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
      '¿Cuánto producto lleva el último tanque, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
    ),
    answer: productIn(g, lastLoad(g)),
  });
  const ask = both(
    'How much product does the whole job take, in quarts (qt), to the nearest 0.01 qt?',
    '¿Cuánto producto lleva todo el trabajo, en cuartos de galón (cuartos), redondeado a 0.01 cuarto?',
  );
  const answer = inQuarts(g, earlier);
  const whole: NumberPart = {
    kind: 'number',
    key: 'c',
    topic: 'units',
    ask,
    answer,
    step: rational('0.01'),
    units: ['qt', 'pt', 'fl-oz', 'gal'],
  };
  return [full, last, whole];
}

function loadLine(g: Given, name: Text, mix: Quantity): WorkingLine {
  const product = productIn(g, mix);
  return {
    name,
    expression: times(
      number(g.line.percent.value.div(100)),
      struck(mix),
      over(given(quantity(128, 'fl-oz')), struck(gal(1))),
    ),
    result: toStep(product, tenth, 1),
    answers: true,
    reason: measuredOut(product),
  };
}

function working(g: Given): readonly WorkingLine[] {
  const { job, line } = g;
  const percent: WorkingLine = {
    name: both('percent as a decimal', 'porcentaje como decimal'),
    expression: over(given(line.percent), number(100)),
    result: number(line.percent.value.div(100)),
    reason: both(
      en`Out of 100 parts of finished spray, ${line.percent.value} ${line.percent.value.compare(1) > 0 ? 'are' : 'is'} product.`,
      es`De cada 100 partes de mezcla terminada, ${line.percent.value} ${line.percent.value.compare(1) > 0 ? 'son' : 'es'} de producto.`,
    ),
  };
  const full = productForTank(g);
  if (job.as !== 'loads') {
    const one = [percent, loadLine(g, both('product', 'producto'), job.mix)];
    if (job.as === 'told') return one;
    return [
      ...one,
      {
        name: both('in the cylinder', 'en la probeta'),
        expression: times(struck(full), factorOver('fl-oz', 'ml')),
        result: toStep(inMilliliters(g, {}), rational(1), 0),
        answers: true,
        reason: both(
          'Read the cylinder at eye level, at the bottom of the curve.',
          'Lea la probeta a la altura de los ojos, en el fondo de la curva.',
        ),
      },
    ];
  }
  const last = productIn(g, job.lastLoad);
  return [
    percent,
    loadLine(g, both('each full tank', 'cada tanque lleno'), job.mix),
    loadLine(g, both('last tank', 'último tanque'), job.lastLoad),
    {
      name: both('whole job', 'todo el trabajo'),
      expression: times(
        grouped(plus(times(number(job.fullLoads), struck(full)), struck(last))),
        over(given(quantity(1, 'qt')), struck(quantity(32, 'fl-oz'))),
      ),
      result: toStep(inQuarts(g, {}), rational('0.01'), 2),
      answers: true,
      reason: both('A quart is 32 fluid ounces.', 'Un cuarto de galón tiene 32 onzas líquidas.'),
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  return [
    both(
      en`You are asked for the product in a tank of ${g.job.mix}. The label line "${percentHeading(g.line)}" gives a percent by volume.`,
      es`Se pide el producto para un tanque de ${g.job.mix}. La línea «${percentHeading(g.line)}» de la etiqueta da un porcentaje por volumen.`,
    ),
    both(
      'Product = percent ÷ 100 × gallons of finished spray × 128 fl oz.',
      'Producto = porcentaje ÷ 100 × galones de mezcla terminada × 128 oz líq.',
    ),
    both(
      en`Begin with ${g.line.percent.value} ÷ 100 × ${g.job.mix.value}, which is in gallons.`,
      es`Empiece con ${g.line.percent.value} ÷ 100 × ${g.job.mix.value}, que da galones.`,
    ),
  ];
}

export const strengthPercentVolumeFamily = defineFamily<Given>({
  key: 'strength-percent-volume',
  version: 1,
  topic: 'strength',
  tiers: [1, 2, 3],
  title: both('Product for a percent mix by volume', 'Producto para una mezcla por porcentaje de volumen'),
  sources: [
    {
      title: 'How Much Product to Add in Handheld Sprayers?',
      publisher: 'University of Illinois Extension',
      year: 2006,
      ref: 'the Bulletin 2006 Issue 10, Article 5',
    },
    { title: 'Calibrate sprayer', publisher: 'University of Georgia Cooperative Extension', year: null },
  ],
  draw,
  heading: (g) => situationOf(percentVolumeSituations, g).heading,
  statement: (g) => situationOf(percentVolumeSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: percentVolumeSlips,
});
