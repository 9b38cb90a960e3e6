import type { PlanFigure } from '../../../../shared/contracts/figure.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, over, struck, times, type WorkingLine } from '../../working.ts';
import { rectangleSituations, type RectangleGiven } from './area-rectangle-situations.ts';
import { areaUnits, boxDimensions, drawn, oneSqFt, sqFt, toWholeSqFt } from './plan-parts.ts';

type Given = RectangleGiven;

function draw(rng: Rng, tier: Tier): Given {
  const form = tier === 1 ? 'feet' : rng.pick(['strip', 'yards'] as const);
  const scene = drawScene(rng, rectangleSituations(form).length);
  if (form === 'strip') {
    const width = quantity(rng.pick([18, 24, 30, 42, 48, 54]), 'in');
    return { ...scene, form, length: quantity(rng.int(8, 36) * 5, 'ft'), width };
  }
  if (form === 'yards') {
    return { ...scene, form, length: quantity(rng.int(14, 45), 'yd'), width: quantity(rng.int(20, 40), 'ft') };
  }
  const width = rng.int(22, 70);
  return { ...scene, form, length: quantity(width + rng.int(5, 60), 'ft'), width: quantity(width, 'ft') };
}

const inFeet = (side: Quantity) => convert(side, 'ft');
const sum = ({ length, width }: Given) => add(inFeet(length), inFeet(width));
/** A side's bare number taken as feet, times `times`: what a missed change of unit does. */
const asFeet = (side: Quantity, share = rational(1)) => quantity(side.value.mul(share), 'ft');
const tenth = rational('0.1');

const slips: readonly Slip<Given>[] = [
  {
    key: 'one-side-in-inches',
    part: 'a',
    answer: (g) => (g.form === 'strip' ? rectangleArea({ length: g.length, width: asFeet(g.width) }) : null),
    message: (g) => ({
      en: en`One side is still in inches. Change ${g.width} to feet first: divide by 12.`,
      es: es`Un lado sigue en pulgadas. Cambie primero ${g.width} a pies: divida entre 12.`,
    }),
  },
  {
    key: 'yards-as-feet',
    part: 'a',
    answer: (g) => (g.form === 'yards' ? rectangleArea({ length: asFeet(g.length), width: g.width }) : null),
    message: (g) => ({
      en: en`One side is still in yards. Change ${g.length} to feet first: a yard is 3 feet.`,
      es: es`Un lado sigue en yardas. Cambie primero ${g.length} a pies: una yarda tiene 3 pies.`,
    }),
  },
  {
    key: 'inches-as-tenths',
    part: 'a',
    answer: (g) => (g.form === 'strip' ? rectangleArea({ length: g.length, width: asFeet(g.width, tenth) }) : null),
    message: (g) => ({
      en: en`You read ${g.width} as ${asFeet(g.width, tenth)}. A foot has 12 inches, not 10.`,
      es: es`Usted leyó ${g.width} como ${asFeet(g.width, tenth)}. Un pie tiene 12 pulgadas, no 10.`,
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => sqFt(sum(g).value.mul(2)),
    message: (g) => ({
      en: en`That is the distance around the site. All the way around is ${scale(sum(g), 2)}. For the area, multiply the length by the width.`,
      es: es`Esa es la distancia alrededor del sitio. El contorno mide ${scale(sum(g), 2)}. Para el área, multiplique el largo por el ancho.`,
    }),
  },
  {
    key: 'added-sides',
    part: 'a',
    answer: (g) => sqFt(sum(g).value),
    message: (g) => ({
      en: en`You added the two sides. ${inFeet(g.length)} plus ${inFeet(g.width)} is a length. For an area, multiply the sides.`,
      es: es`Usted sumó los dos lados. ${inFeet(g.length)} más ${inFeet(g.width)} es una longitud. Para un área, multiplique los lados.`,
    }),
  },
  {
    key: 'squared-one-side',
    part: 'a',
    answer: (g) => (g.form === 'feet' ? rectangleArea({ length: g.width, width: g.width }) : null),
    message: (g) => ({
      en: en`You multiplied ${g.width} by itself. That is a square. This site is ${g.length} long.`,
      es: es`Usted multiplicó ${g.width} por sí mismo. Eso es un cuadrado. Este sitio mide ${g.length} de largo.`,
    }),
  },
];

/** The change of a side to feet; nothing when it is in feet already. */
function toFeetLine({ form, length, width }: Given): WorkingLine[] {
  if (form === 'feet') return [];
  const strip = form === 'strip';
  const side = strip ? width : length;
  const factor = strip
    ? over(given(quantity(1, 'ft')), struck(quantity(12, 'in')))
    : over(given(quantity(3, 'ft')), struck(quantity(1, 'yd')));
  return [
    {
      name: strip ? { en: 'width in feet', es: 'ancho en pies' } : { en: 'length in feet', es: 'largo en pies' },
      expression: times(struck(side), factor),
      result: given(inFeet(side)),
      reason: {
        en: strip
          ? 'Both sides must be in feet. A foot is 12 inches.'
          : 'Both sides must be in feet. A yard is 3 feet.',
        es: strip
          ? 'Los dos lados deben estar en pies. Un pie tiene 12 pulgadas.'
          : 'Los dos lados deben estar en pies. Una yarda tiene 3 pies.',
      },
    },
  ];
}

function working(g: Given): readonly WorkingLine[] {
  return [
    ...toFeetLine(g),
    {
      name: { en: 'area', es: 'área' },
      ...toWholeSqFt(times(given(inFeet(g.length)), given(inFeet(g.width))), rectangleArea(g)),
      answers: true,
      reason: {
        en: 'Length times width; feet times feet gives square feet.',
        es: 'Largo por ancho; pies por pies da pies cuadrados.',
      },
    },
  ];
}

function figure(g: Given): PlanFigure<Text> {
  const box = { x: 0, y: 0, width: drawn(inFeet(g.length).value), height: drawn(inFeet(g.width).value) };
  const strip = g.form === 'strip';
  const texts = {
    width: { en: en`${g.length}`, es: es`${g.length}` },
    height: { en: en`${g.width}`, es: es`${g.width}` },
  };
  return {
    kind: 'plan',
    width: box.width,
    height: box.height,
    shapes: [
      {
        form: 'rect',
        ...box,
        ground: strip ? 'bed' : 'turf',
        name: strip ? { en: 'strip', es: 'franja' } : { en: 'lawn', es: 'césped' },
      },
    ],
    dimensions: boxDimensions(box, texts),
    alt: {
      en: en`Plan to scale of a rectangle, ${g.length} long and ${g.width} wide.`,
      es: es`Plano a escala de un rectángulo de ${g.length} de largo y ${g.width} de ancho.`,
    },
  };
}

function hints(g: Given): readonly [Text, Text, Text] {
  const mixed =
    g.form === 'feet'
      ? { en: '', es: '' }
      : { en: ' Both sides must be in feet.', es: ' Los dos lados deben estar en pies.' };
  return [
    {
      en: en`You are asked for the area. The two sides are given: ${g.length} and ${g.width}.`,
      es: es`Se pide el área. Se dan los dos lados: ${g.length} y ${g.width}.`,
    },
    { en: en`Area = length × width.${mixed}`, es: es`Área = largo × ancho.${mixed}` },
    g.form === 'feet'
      ? { en: en`Area = ${g.length} × ${g.width}.`, es: es`Área = ${g.length} × ${g.width}.` }
      : {
          en: en`In feet the sides are ${inFeet(g.length)} and ${inFeet(g.width)}.`,
          es: es`En pies, los lados miden ${inFeet(g.length)} y ${inFeet(g.width)}.`,
        },
  ];
}

export const areaRectangleFamily = defineFamily<Given>({
  key: 'area-rectangle',
  version: 1,
  topic: 'area',
  tiers: [1, 2],
  title: { en: 'Area of a rectangle', es: 'Área de un rectángulo' },
  sources: [
    {
      title: 'Pesticide Calculations for Small Acreages',
      publisher: 'University of Kentucky Cooperative Extension',
      year: null,
      ref: 'ENTFACT-800, eq. 1',
    },
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
  ],
  draw,
  heading: (g) => situationOf(rectangleSituations(g.form), g).heading,
  statement: (g) => situationOf(rectangleSituations(g.form), g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'area',
      ask: {
        en: 'What is the area in square feet (sq ft), to the nearest whole square foot?',
        es: '¿Cuál es el área en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
      },
      answer: rectangleArea(g),
      step: oneSqFt,
      units: areaUnits,
    },
  ],
  figure,
  hints,
  working,
  slips,
});
