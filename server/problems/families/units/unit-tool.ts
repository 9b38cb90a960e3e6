import type { MeasuresFigure } from '../../../../shared/contracts/figure.ts';
import { convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily } from '../../family.ts';
import { labelByKey, labelsWithRate, oneFigure, rateByKey } from '../../labels/pick.ts';
import type { Rng } from '../../rng.ts';
import { en, es, unitFirst } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, struck, times, type WorkingLine } from '../../working.ts';
import { unitToolSlips } from './unit-tool-slips.ts';
import { toolMeasures, toolSituations, type ToolUnit, type UnitToolGiven } from './unit-tool-texts.ts';
import { byThirtyMl, fact, factorOver, toStep } from './unit-steps.ts';

type Given = UnitToolGiven;

/** Lines per gallon that give one figure in fluid ounces or tablespoons. */
const lines = labelsWithRate(
  'mix',
  ({ product, mix }) =>
    (product.least.unit === 'fl-oz' || product.least.unit === 'tbsp') &&
    mix.value.compare(1) === 0 &&
    !!oneFigure(product),
).map(([label, rate]) => ({ labelKey: label.key, rateKey: rate.key, product: rate.product.least }));

const toolsFor: Partial<Record<UnitKey, Record<Tier, readonly ToolUnit[]>>> = {
  'fl-oz': { 1: ['tbsp', 'tsp'], 2: ['tbsp', 'tsp'], 3: ['ml'] },
  tbsp: { 1: ['tsp', 'fl-oz'], 2: ['tsp', 'fl-oz'], 3: ['ml'] },
};
const steps: Record<ToolUnit, string> = { tsp: '0.5', tbsp: '0.5', 'fl-oz': '0.1', ml: '1' };
/** Nobody counts out more than this with the tool. */
const most: Record<ToolUnit, number> = { tsp: 18, tbsp: 32, 'fl-oz': 32, ml: 1000 };

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, toolSituations.length);
  const line = rng.pick(lines);
  const tool = rng.pick(toolsFor[line.product.unit]?.[tier] ?? []);
  const gallons = quantity(tier === 1 ? 1 : rng.pick(['1.5', '2', '3', '4']), 'gal');
  const g: Given = { ...scene, ...line, tool, gallons, rateTold: tier === 1 };
  return answer(g).value.compare(most[tool]) > 0 ? null : g;
}

/** The product the mix takes, in the label's unit. */
const productNeeded = (g: Given): Quantity => scale(g.product, g.gallons.value);
const answer = (g: Given): Quantity => convert(productNeeded(g), g.tool);
const step = (g: Given) => rational(steps[g.tool]);
const line = (g: Given) => rateByKey(labelByKey(g.labelKey), g.rateKey, 'mix');

function working(g: Given): readonly WorkingLine[] {
  const needed = productNeeded(g);
  const whole: WorkingLine = {
    name: { en: 'product in the mix', es: 'producto en la mezcla' },
    expression: times(given(g.product), given(quantity(g.gallons.value, 'count'))),
    result: given(needed),
    reason: {
      en: en`The label gives ${g.product} for each gallon, and there are ${g.gallons}.`,
      es: es`La etiqueta da ${g.product} por cada galón, y son ${g.gallons}.`,
    },
  };
  const places = g.tool === 'ml' ? 0 : 1;
  const measured: WorkingLine = {
    name: { en: 'with your measure', es: 'con su medida' },
    expression: times(struck(needed), factorOver(g.product.unit, g.tool)),
    result: toStep(answer(g), step(g), places),
    answers: true,
    reason: {
      en: en`${fact(g.product.unit, g.tool)}. Use only measures that are kept for pesticides.`,
      es: es`${fact(g.product.unit, g.tool)}. Use solo medidas reservadas para plaguicidas.`,
    },
  };
  return g.gallons.value.compare(1) === 0 ? [measured] : [whole, measured];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const several = g.gallons.value.compare(1) > 0;
  return [
    {
      en: en`The label line "${line(g).heading}" gives the product for a gallon. You mix ${g.gallons} and measure in ${unitFirst(g.tool)}.`,
      es: es`La línea «${line(g).heading}» de la etiqueta da el producto por galón. Usted mezcla ${g.gallons} y mide en ${unitFirst(g.tool)}.`,
    },
    {
      en: en`${several ? 'Product = rate × gallons. Then change the unit: ' : 'Change the unit: '}${fact(g.product.unit, g.tool)}.`,
      es: es`${several ? 'Producto = dosis × galones. Después cambie la unidad: ' : 'Cambie la unidad: '}${fact(g.product.unit, g.tool)}.`,
    },
    several
      ? {
          en: en`Begin with ${g.product} × ${g.gallons.value}.`,
          es: es`Empiece con ${g.product} × ${g.gallons.value}.`,
        }
      : {
          en: en`The label's amount is ${g.product}. Change that to ${unitFirst(g.tool)}.`,
          es: es`La cantidad de la etiqueta es ${g.product}. Cámbiela a ${unitFirst(g.tool)}.`,
        },
  ];
}

function figure(g: Given): MeasuresFigure<Text> {
  const { tool, name } = toolMeasures[g.tool];
  return {
    kind: 'measures',
    tools: [{ tool, name }],
    alt: { en: en`The only measure in the kit: ${name}.`, es: es`La única medida del equipo: ${name}.` },
  };
}

export const unitToolFamily = defineFamily<Given>({
  key: 'unit-tool',
  version: 1,
  topic: 'units',
  tiers: [1, 2, 3],
  title: { en: "The label's unit and your measure", es: 'La unidad de la etiqueta y su medida' },
  sources: [
    { title: 'NIST Handbook 44, Appendix C', publisher: 'National Institute of Standards and Technology', year: 2012 },
    {
      title: 'Math for Pesticide Applicators: useful measurement conversions',
      publisher: 'University of Nebraska-Lincoln Pesticide Education',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(toolSituations, g).heading,
  statement: (g) => situationOf(toolSituations, g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'units',
      ask: {
        en: en`How much product, in ${unitFirst(g.tool)}, to the nearest ${quantity(step(g), g.tool)}?`,
        es: es`¿Cuánto producto, en ${unitFirst(g.tool)}, redondeado a ${quantity(step(g), g.tool)}?`,
      },
      answer: answer(g),
      step: step(g),
      units: [g.tool],
      alsoRight: byThirtyMl(answer(g), g.product.unit),
    },
  ],
  figure,
  label: (g) => ({ label: labelByKey(g.labelKey), rate: g.rateKey }),
  hints,
  working,
  slips: unitToolSlips,
});
