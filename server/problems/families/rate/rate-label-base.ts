import { quantity, ratio, scale } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import { labelsWithRate, oneFigure } from '../../labels/pick.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, over, struck, times, type WorkingLine } from '../../working.ts';
import {
  lawnFigure,
  lawnWorking,
  obstacleArea,
  obstacleSides,
  placeObstacles,
  siteName,
  treatedArea,
  wholeLawn,
  type Obstacle,
} from '../area/obstacles.ts';
import { areaUnits, oneSqFt } from '../area/plan-parts.ts';
import { drawnLine, labelUse, lineHeading } from './label-lines.ts';
import { measuredOut, toTenth } from './measure-out.ts';
import { labelBaseSlips, scaled } from './rate-label-base-slips.ts';
import { labelBaseSituations, type LabelBaseGiven } from './rate-label-base-texts.ts';

type Given = LabelBaseGiven;

const lawnLines = labelsWithRate(
  'area',
  (rate) =>
    rate.site === 'lawn' &&
    rate.area.unit === 'sq-ft' &&
    !!rate.water &&
    !!oneFigure(rate.product) &&
    !!oneFigure(rate.water),
).map(drawnLine);

const layouts: Record<Tier, readonly (readonly Obstacle['kind'][])[]> = {
  1: [[]],
  2: [['patio'], ['terrace'], ['shed'], ['playground'], ['bed'], ['pond']],
  3: [
    ['playground', 'shed'],
    ['patio', 'bed'],
    ['terrace', 'shed'],
    ['playground', 'patio'],
    ['bed', 'pond'],
  ],
};
const lengthFt: Record<Tier, readonly [number, number]> = { 1: [30, 90], 2: [45, 90], 3: [62, 95] };
const widthFt: Record<Tier, readonly [number, number]> = { 1: [20, 60], 2: [28, 60], 3: [38, 60] };
const leastShare = rational(25, 1000);
const tenth = rational('0.1');

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, labelBaseSituations.length);
  const line = rng.pick(lawnLines);
  const [length, width] = [rng.int(...lengthFt[tier]), rng.int(...widthFt[tier])];
  if (width >= length) return null;
  const obstacles = placeObstacles(rng, { lengthFt: length, widthFt: width }, rng.pick(layouts[tier]));
  if (!obstacles || !line.water) return null;
  const g: Given = {
    ...scene,
    line: { ...line, water: line.water },
    rateTold: tier === 1,
    length: quantity(length, 'ft'),
    width: quantity(width, 'ft'),
    obstacles,
  };
  const least = wholeLawn(g).value.mul(leastShare);
  if (!obstacles.every((one) => obstacleArea(one).value.compare(least) >= 0)) return null;
  // Close to the label's own area nothing would show whether the amounts were scaled.
  const share = ratio(treatedArea(g), line.labelArea);
  return share.compare(rational('1.2')) < 0 ? null : g;
}

function ask(g: Given): { product: Text; water: Text } {
  const dry = g.line.product.unit === 'oz';
  return {
    product: dry
      ? {
          en: 'How much product, in ounces by weight (oz), to the nearest 0.1 oz?',
          es: '¿Cuánto producto, en onzas de peso (oz), redondeado a 0.1 oz?',
        }
      : {
          en: 'How much product, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
          es: '¿Cuánto producto, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
        },
    water: {
      en: 'How much water, in gallons (gal), to the nearest 0.1 gal?',
      es: '¿Cuánta agua, en galones (gal), redondeada a 0.1 gal?',
    },
  };
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const asks = ask(g);
  return [
    {
      kind: 'number',
      key: 'a',
      topic: 'area',
      ask: {
        en: 'What area is sprayed, in square feet (sq ft), to the nearest whole square foot?',
        es: '¿Qué área se rocía, en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
      },
      answer: treatedArea(g),
      step: oneSqFt,
      units: areaUnits,
    },
    {
      kind: 'number',
      key: 'b',
      topic: 'rate',
      ask: asks.product,
      answer: scaled(g, g.line.product, earlier),
      step: tenth,
      units: g.line.product.unit === 'oz' ? ['oz', 'lb', 'g'] : ['fl-oz', 'tbsp', 'pt', 'qt', 'ml'],
    },
    {
      kind: 'number',
      key: 'c',
      topic: 'rate',
      ask: asks.water,
      answer: scaled(g, g.line.water, earlier),
      step: tenth,
      units: ['gal', 'qt', 'fl-oz', 'l'],
    },
  ];
}

/** The check at the end: between which amounts of water the answer must lie. */
function sensible(g: Given): Text {
  const share = ratio(treatedArea(g), g.line.labelArea);
  const [least, most] = [share.floor(), share.ceil()];
  if (least.compare(most) === 0) {
    return {
      en: en`Check: the area is exactly ${least} times the label's, so the water is ${least} times ${g.line.water}.`,
      es: es`Compruebe: el área es exactamente ${least} veces la de la etiqueta, así que el agua es ${least} veces ${g.line.water}.`,
    };
  }
  return {
    en: en`Check: the area is between ${least} and ${most} times the label's, so the water must lie between ${scale(g.line.water, least)} and ${scale(g.line.water, most)}. It does.`,
    es: es`Compruebe: el área está entre ${least} y ${most} veces la de la etiqueta, así que el agua debe estar entre ${scale(g.line.water, least)} y ${scale(g.line.water, most)}. Así es.`,
  };
}

function working(g: Given): readonly WorkingLine[] {
  const area = treatedArea(g);
  const line = (name: Text, amount: Given['line']['product'], reason: Text): WorkingLine => ({
    name,
    expression: times(struck(area), over(given(amount), struck(g.line.labelArea))),
    result: toTenth(scaled(g, amount, {})),
    answers: true,
    reason,
  });
  return [
    ...lawnWorking(g),
    line({ en: 'product', es: 'producto' }, g.line.product, measuredOut(scaled(g, g.line.product, {}))),
    line({ en: 'water', es: 'agua' }, g.line.water, sensible(g)),
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const less = g.obstacles.length > 0;
  return [
    {
      en: en`You are asked for three things: the area that gets sprayed, the product for it and the water for it. The label line "${lineHeading(g.line)}" gives both amounts for ${g.line.labelArea}.`,
      es: es`Se piden tres cosas: el área que se rocía, el producto y el agua para esa área. La línea «${lineHeading(g.line)}» de la etiqueta da las dos cantidades para ${g.line.labelArea}.`,
    },
    {
      en: en`${less ? 'Area sprayed = whole site − what is not sprayed.' : 'Area = length × width.'} Then: product = label product × (your area ÷ label area). Water works the same way.`,
      es: es`${less ? 'Área rociada = todo el sitio − lo que no se rocía.' : 'Área = largo × ancho.'} Después: producto = producto de la etiqueta × (su área ÷ área de la etiqueta). Con el agua es igual.`,
    },
    less
      ? {
          en: en`${g.length} × ${g.width} is the ${siteName(g).whole}. Then ${obstacleSides(g)}.`,
          es: es`${g.length} × ${g.width} es ${siteName(g).whole}. Luego, ${obstacleSides(g)}.`,
        }
      : { en: en`Begin with ${g.length} × ${g.width}.`, es: es`Empiece con ${g.length} × ${g.width}.` },
  ];
}

export const rateLabelBaseFamily = defineFamily<Given>({
  key: 'rate-label-base',
  version: 1,
  topic: 'rate',
  tiers: [1, 2, 3],
  title: { en: "Product and water from the label's own area", es: 'Producto y agua según el área de la etiqueta' },
  sources: [
    {
      title: 'Pesticides in the Military, Subcourse MD0173, Edition 100',
      publisher: 'U.S. Army Medical Department Center and School',
      year: 2006,
      ref: 'Application calculations',
    },
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
  ],
  draw,
  heading: (g) => situationOf(labelBaseSituations, g).heading,
  statement: (g) => situationOf(labelBaseSituations, g).statement(g),
  parts,
  figure: lawnFigure,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: labelBaseSlips,
});
