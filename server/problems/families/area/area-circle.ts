import type { PlanDimension, PlanFigure, Point } from '../../../../shared/contracts/figure.ts';
import { circleArea, tradePi } from '../../../../shared/formulas/circle-area.ts';
import { quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { dividedBy, given, number, times, type WorkingLine } from '../../working.ts';
import { circleSituations, measureName, type CircleGiven } from './area-circle-situations.ts';
import { across, areaUnits, drawn, edge, oneSqFt, sqFt, toWholeSqFt } from './plan-parts.ts';

type Given = CircleGiven;

function draw(rng: Rng, tier: Tier): Given {
  const size = tier === 3 ? 'bed' : rng.pick(['bed', 'lawn'] as const);
  const scene = drawScene(rng, circleSituations({ size, half: tier === 3 }).length);
  if (tier === 1) {
    const radius = quantity(size === 'bed' ? rng.int(5, 18) : rng.int(20, 60), 'ft');
    return { ...scene, size, half: false, measured: 'radius', radius };
  }
  const diameterFt = tier === 3 ? rng.int(8, 50) : size === 'bed' ? rng.int(9, 40) : rng.int(41, 120);
  return { ...scene, size, half: tier === 3, measured: 'diameter', radius: quantity(rational(diameterFt, 2), 'ft') };
}

const diameter = (g: Given) => scale(g.radius, 2);
const share = (g: Given) => rational(1, g.half ? 2 : 1);
const answer = (g: Given) => scale(circleArea(g), share(g));
/** pi × so many feet, by the share of the circle asked for, as square feet. */
const piTimes = (g: Given, lengthFt: Quantity) => sqFt(tradePi.mul(lengthFt.value).mul(share(g)));

const slips: readonly Slip<Given>[] = [
  {
    key: 'diameter-as-radius',
    part: 'a',
    answer: (g) => (g.measured === 'diameter' ? scale(circleArea({ radius: diameter(g) }), share(g)) : null),
    message: (g) => ({
      en: en`You used the full width as the radius. The tape went all the way across: ${diameter(g)}. The radius is half of that.`,
      es: es`Usted usó todo el ancho como radio. La cinta cruzó de lado a lado: ${diameter(g)}. El radio es la mitad.`,
    }),
  },
  {
    key: 'radius-as-diameter',
    part: 'a',
    answer: (g) => (g.measured === 'radius' ? circleArea({ radius: scale(g.radius, rational(1, 2)) }) : null),
    message: (g) => ({
      en: en`You halved the radius. ${g.radius} already runs from the center to the edge, so use it as it is.`,
      es: es`Usted dividió el radio entre dos. Los ${g.radius} ya van del centro al borde, así que úselos tal cual.`,
    }),
  },
  {
    key: 'forgot-half',
    part: 'a',
    answer: (g) => (g.half ? circleArea(g) : null),
    message: () => ({
      en: 'That is the whole circle. The bed is only half of one, so halve the area.',
      es: 'Ese es el círculo entero. El arriate es solo la mitad, así que divida el área entre dos.',
    }),
  },
  {
    key: 'circumference',
    part: 'a',
    answer: (g) => piTimes(g, diameter(g)),
    message: (g) => ({
      en: en`That is a distance around: pi times ${diameter(g)}. For the area, multiply pi by the radius twice.`,
      es: es`Esa es una distancia alrededor: pi por ${diameter(g)}. Para el área, multiplique pi por el radio dos veces.`,
    }),
  },
  {
    key: 'forgot-square',
    part: 'a',
    answer: (g) => piTimes(g, g.radius),
    message: (g) => ({
      en: en`You used the radius only once. Multiply 3.14 by ${g.radius}, and by ${g.radius} again.`,
      es: es`Usted usó el radio solo una vez. Multiplique 3.14 por ${g.radius}, y otra vez por ${g.radius}.`,
    }),
  },
  {
    key: 'forgot-pi',
    part: 'a',
    answer: (g) => sqFt(g.radius.value.mul(g.radius.value).mul(share(g))),
    message: (g) => ({
      en: en`You left out pi. The radius times itself, ${g.radius} × ${g.radius}, still has to be multiplied by 3.14.`,
      es: es`Le faltó pi. El radio por sí mismo, ${g.radius} × ${g.radius}, todavía hay que multiplicarlo por 3.14.`,
    }),
  },
];

function working(g: Given): readonly WorkingLine[] {
  const radiusLine: WorkingLine = {
    name: { en: 'radius', es: 'radio' },
    expression: dividedBy(given(diameter(g)), number(2)),
    result: given(g.radius),
    reason: {
      en: 'The radius is half of the distance across.',
      es: 'El radio es la mitad de la distancia de lado a lado.',
    },
  };
  const squaring = times(number('3.14'), given(g.radius), given(g.radius));
  const whole: WorkingLine = {
    name: g.half ? { en: 'whole circle', es: 'círculo entero' } : { en: 'area', es: 'área' },
    ...(g.half ? { expression: squaring, result: given(circleArea(g)) } : toWholeSqFt(squaring, circleArea(g))),
    answers: !g.half,
    reason: { en: 'Pi times the radius times the radius.', es: 'Pi por el radio por el radio.' },
  };
  const half: WorkingLine = {
    name: { en: 'area', es: 'área' },
    ...toWholeSqFt(dividedBy(given(circleArea(g)), number(2)), answer(g)),
    answers: true,
    reason: { en: 'The bed is half of the circle.', es: 'El arriate es la mitad del círculo.' },
  };
  return [...(g.measured === 'diameter' ? [radiusLine] : []), whole, ...(g.half ? [half] : [])];
}

/** A half circle as a polygon, its flat side at the top. */
function halfCircle(radius: number): Point[] {
  const steps = 32;
  return Array.from({ length: steps + 1 }, (_, at): Point => {
    const angle = (Math.PI * at) / steps;
    return [radius + radius * Math.cos(angle), radius * Math.sin(angle)];
  });
}

function figure(g: Given): PlanFigure<Text> {
  const r = drawn(g.radius.value);
  const ground = g.size === 'bed' ? 'bed' : 'turf';
  const shown = g.measured === 'radius' ? g.radius : diameter(g);
  const text = { en: en`${shown}`, es: es`${shown}` };
  const name = measureName(g);
  const dimension: PlanDimension<Text> = g.half
    ? edge([0, 0], [2 * r, 0], text)
    : across(g.measured === 'radius' ? [r, r] : [0, r], [2 * r, r], text);
  return {
    kind: 'plan',
    width: 2 * r,
    height: g.half ? r : 2 * r,
    shapes: [
      g.half ? { form: 'polygon', points: halfCircle(r), ground } : { form: 'circle', x: r, y: r, radius: r, ground },
    ],
    dimensions: [dimension],
    alt: g.half
      ? {
          en: en`Plan to scale of a half circle. Its straight side, the full width across, is ${shown}.`,
          es: es`Plano a escala de un semicírculo. Su lado recto, el ancho total, mide ${shown}.`,
        }
      : {
          en: en`Plan to scale of a circle. ${name.en} is ${shown}.`,
          es: es`Plano a escala de un círculo. ${name.es} mide ${shown}.`,
        },
  };
}

export const areaCircleFamily = defineFamily<Given>({
  key: 'area-circle',
  version: 1,
  topic: 'area',
  tiers: [1, 2, 3],
  title: { en: 'Area of a circle', es: 'Área de un círculo' },
  sources: [
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
    {
      title: 'How Big is Your Lawn? (Purdue Turf Tips)',
      publisher: 'Purdue University Turf Program',
      year: 2014,
      ref: 'Figures 1-2 (part circle)',
    },
  ],
  draw,
  heading: (g) => situationOf(circleSituations(g), g).heading,
  statement: (g) => situationOf(circleSituations(g), g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'area',
      ask: {
        en: 'What is the area in square feet (sq ft)? Use 3.14 for pi and round to the nearest whole square foot.',
        es: '¿Cuál es el área en pies cuadrados (pies²)? Use 3.14 como pi y redondee al pie cuadrado entero.',
      },
      answer: answer(g),
      step: oneSqFt,
      units: areaUnits,
    },
  ],
  figure,
  hints: (g) => [
    g.measured === 'radius'
      ? {
          en: en`You are asked for the area of a circle. The radius, from the center to the edge, is ${g.radius}.`,
          es: es`Se pide el área de un círculo. El radio, del centro al borde, mide ${g.radius}.`,
        }
      : {
          en: en`You are asked for the area of ${g.half ? 'half a circle' : 'a circle'}. The distance all the way across is ${diameter(g)}.`,
          es: es`Se pide el área de ${g.half ? 'medio círculo' : 'un círculo'}. La distancia de lado a lado es ${diameter(g)}.`,
        },
    g.half
      ? {
          en: 'Area = 3.14 × radius × radius ÷ 2. Radius = distance across ÷ 2.',
          es: 'Área = 3.14 × radio × radio ÷ 2. Radio = ancho total ÷ 2.',
        }
      : {
          en: 'Area = 3.14 × radius × radius. Radius = distance across ÷ 2.',
          es: 'Área = 3.14 × radio × radio. Radio = ancho total ÷ 2.',
        },
    {
      en: en`The radius is ${g.radius}, so begin with 3.14 × ${g.radius} × ${g.radius}.`,
      es: es`El radio es ${g.radius}, así que empiece con 3.14 × ${g.radius} × ${g.radius}.`,
    },
  ],
  working,
  slips,
});
