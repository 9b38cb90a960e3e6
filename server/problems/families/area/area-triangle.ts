import type { PlanDimension, PlanFigure, Point } from '../../../../shared/contracts/figure.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { triangleArea } from '../../../../shared/formulas/triangle-area.ts';
import { add, quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf, type Scene, type Situation } from '../../situations.ts';
import { dividedBy, given, number, times, type WorkingLine } from '../../working.ts';
import { across, areaUnits, drawn, edge, oneSqFt, sqFt, toWholeSqFt } from './plan-parts.ts';

interface Given extends Scene {
  /** A square corner; the height inside; the height outside, beyond one end of the base. */
  readonly form: 'right' | 'inside' | 'outside';
  readonly base: Quantity;
  readonly height: Quantity;
  /** The two sides that are not the base, the one at the far end of the base first. */
  readonly slant: Quantity;
  readonly otherSlant: Quantity;
  /** How far the height stands from the near end of the base; beyond it when the height is outside. */
  readonly footFt: number;
}

const corner = (g: Given): Text =>
  g.form === 'right'
    ? { en: en` Two sides meet at a square corner.`, es: es` Dos lados forman una esquina recta.` }
    : { en: en` The height is measured square to the base.`, es: es` La altura se mide a escuadra con la base.` };
const sides = (g: Given): Text => ({
  en: en`base ${g.base}, height ${g.height}, long sloping side ${g.slant}`,
  es: es`base ${g.base}, altura ${g.height}, lado inclinado largo ${g.slant}`,
});

const situations: readonly Situation<Given>[] = [
  {
    heading: { en: 'A three-sided bed', es: 'Un arriate de tres lados' },
    statement: (g) => ({
      en: en`A bed ${g.place.at} has three straight sides. ${g.person} tapes it in feet (ft): ${sides(g)}.${corner(g)}`,
      es: es`Un arriate ${g.place.at} tiene tres lados rectos. ${g.person} lo mide en pies: ${sides(g)}.${corner(g)}`,
    }),
  },
  {
    heading: { en: 'Where two walks meet', es: 'Donde se juntan dos andadores' },
    statement: (g) => ({
      en: en`Walks ${g.place.at} cut off a triangle of grass, measured in feet (ft): ${sides(g)}.${corner(g)} It gets treated ${g.season}.`,
      es: es`Los andadores ${g.place.at} dejan un triángulo de pasto, medido en pies: ${sides(g)}.${corner(g)} Se trata ${g.season}.`,
    }),
  },
  {
    heading: { en: 'The corner of a lot', es: 'La esquina de un terreno' },
    statement: (g) => ({
      en: en`${g.person} treats a triangle of turf at the corner of a lot. The plan is in feet (ft): ${sides(g)}.${corner(g)}`,
      es: es`${g.person} trata un triángulo de césped en la esquina de un terreno. El plano está en pies: ${sides(g)}.${corner(g)}`,
    }),
  },
  {
    heading: { en: 'A slope beside the road', es: 'Un talud junto al camino' },
    statement: (g) => ({
      en: en`The strip beside the road ${g.place.at} ends in a triangle of grass. Taped in feet (ft): ${sides(g)}.${corner(g)}`,
      es: es`La franja junto al camino ${g.place.at} termina en un triángulo de pasto. Medido en pies: ${sides(g)}.${corner(g)}`,
    }),
  },
];

/** A right triangle with whole sides: how far it reaches along the base, its height, its sloping side. */
interface Leg {
  readonly reachFt: number;
  readonly slantFt: number;
}

/** For each height, the whole-foot right triangles a tape would give, so that every side on the plan is true. */
const legsByHeight = new Map<number, readonly Leg[]>();
for (let heightFt = 12; heightFt <= 60; heightFt += 1) {
  const legs: Leg[] = [];
  for (let reachFt = 6; reachFt <= 72; reachFt += 1) {
    const slantFt = Math.round(Math.sqrt(heightFt * heightFt + reachFt * reachFt));
    if (slantFt * slantFt === heightFt * heightFt + reachFt * reachFt) legs.push({ reachFt, slantFt });
  }
  if (legs.length > 0) legsByHeight.set(heightFt, legs);
}
const heightsWith = (count: number) => [...legsByHeight].filter(([, legs]) => legs.length >= count);
const oneLeg = heightsWith(1);
const twoLegs = heightsWith(2);

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, situations.length);
  const ft = (value: number) => quantity(value, 'ft');
  if (tier === 1) {
    const [heightFt, legs] = rng.pick(oneLeg);
    const leg = rng.pick(legs);
    const height = ft(heightFt);
    return {
      ...scene,
      form: 'right',
      base: ft(leg.reachFt),
      height,
      slant: ft(leg.slantFt),
      otherSlant: height,
      footFt: 0,
    };
  }
  const [heightFt, legs] = rng.pick(twoLegs);
  const [one, two] = rng.sample(legs, 2) as [Leg, Leg];
  const [near, far] = one.reachFt < two.reachFt ? [one, two] : [two, one];
  const outside = tier === 3;
  const baseFt = outside ? far.reachFt - near.reachFt : far.reachFt + near.reachFt;
  if (baseFt < 18 || baseFt > 110) return null;
  return {
    ...scene,
    form: outside ? 'outside' : 'inside',
    base: ft(baseFt),
    height: ft(heightFt),
    slant: ft(far.slantFt),
    otherSlant: ft(near.slantFt),
    footFt: near.reachFt,
  };
}

const answer = (g: Given) => triangleArea(g);
const reach = (g: Given) => add(g.base, quantity(g.footFt, 'ft'));

const slips: readonly Slip<Given>[] = [
  {
    key: 'no-half',
    part: 'a',
    answer: (g) => rectangleArea({ length: g.base, width: g.height }),
    message: (g) => ({
      en: en`That is the rectangle around the triangle. ${g.base} × ${g.height} has to be halved.`,
      es: es`Ese es el rectángulo alrededor del triángulo. ${g.base} × ${g.height} se divide entre dos.`,
    }),
  },
  {
    key: 'used-slant-side',
    part: 'a',
    answer: (g) => triangleArea({ base: g.base, height: g.slant }),
    message: (g) => ({
      en: en`You used the sloping side as the height. The height stands square to the base: ${g.height}, not ${g.slant}.`,
      es: es`Usted usó el lado inclinado como altura. La altura va a escuadra con la base: ${g.height}, no ${g.slant}.`,
    }),
  },
  {
    key: 'added-outside',
    part: 'a',
    answer: (g) => (g.form === 'outside' ? triangleArea({ base: reach(g), height: g.height }) : null),
    message: (g) => ({
      en: en`You counted ground beyond the end of the base. The base of the lawn itself is ${g.base}; the dashed line runs on past it.`,
      es: es`Usted contó suelo más allá del final de la base. La base del césped mide ${g.base}; la línea punteada sigue más allá.`,
    }),
  },
  {
    key: 'multiplied-slant-sides',
    part: 'a',
    answer: (g) => (g.form === 'right' ? null : triangleArea({ base: g.slant, height: g.otherSlant })),
    message: (g) => ({
      en: en`You multiplied the two sloping sides. Use one side as the base, ${g.base}, and the height square to it.`,
      es: es`Usted multiplicó los dos lados inclinados. Use un lado como base, ${g.base}, y la altura a escuadra con ella.`,
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => sqFt(add(add(g.base, g.slant), g.otherSlant).value),
    message: (g) => ({
      en: en`You added the three sides. That is the distance around. For the area, multiply the base ${g.base} by the height and halve it.`,
      es: es`Usted sumó los tres lados. Esa es la distancia alrededor. Para el área, multiplique la base ${g.base} por la altura y divida entre dos.`,
    }),
  },
];

function working(g: Given): readonly WorkingLine[] {
  const rectangle = rectangleArea({ length: g.base, width: g.height });
  return [
    {
      name: { en: 'base times height', es: 'base por altura' },
      expression: times(given(g.base), given(g.height)),
      result: given(rectangle),
      reason: { en: 'The rectangle the triangle is half of.', es: 'El rectángulo del que el triángulo es la mitad.' },
    },
    {
      name: { en: 'area', es: 'área' },
      ...toWholeSqFt(dividedBy(given(rectangle), number(2)), answer(g)),
      answers: true,
      reason: { en: 'A triangle is half of that rectangle.', es: 'Un triángulo es la mitad de ese rectángulo.' },
    },
  ];
}

function figure(g: Given): PlanFigure<Text> {
  const [base, h] = [drawn(g.base.value), drawn(g.height.value)];
  const said = (value: Quantity): Text => ({ en: en`${value}`, es: es`${value}` });
  // The near end of the base lies at `start`; the top stands over `top`.
  const start = g.form === 'outside' ? g.footFt : 0;
  const top = g.form === 'outside' ? 0 : g.footFt;
  const peak: Point = [top, 0];
  const near: Point = [start, h];
  const far: Point = [start + base, h];
  const heightLine: PlanDimension<Text> =
    g.form === 'right' ? edge(near, peak, said(g.height)) : across(peak, [top, h], said(g.height));
  const overhang: PlanDimension<Text>[] =
    g.form === 'outside'
      ? [
          {
            from: [0, h],
            to: near,
            text: { en: en`${g.footFt} ft`, es: es`${g.footFt} ft` },
            place: 'inside',
            side: 'right',
            dashed: true,
          },
        ]
      : [];
  const slants = [
    edge(peak, far, said(g.slant)),
    ...(g.form === 'inside' ? [edge(near, peak, said(g.otherSlant))] : []),
  ];
  const where: Record<Given['form'], Text> = {
    right: { en: 'at the square corner', es: 'en la esquina recta' },
    inside: { en: 'inside the triangle, square to the base', es: 'dentro del triángulo, a escuadra con la base' },
    outside: {
      en: en`outside the triangle, ${g.footFt} ft beyond the end of the base and square to its line`,
      es: es`fuera del triángulo, a ${g.footFt} ft del final de la base y a escuadra con su línea`,
    },
  };
  return {
    kind: 'plan',
    width: start + base,
    height: h,
    shapes: [{ form: 'polygon', points: [peak, far, near], ground: 'turf' }],
    dimensions: [edge(far, near, said(g.base)), heightLine, ...slants, ...overhang],
    alt: {
      en: en`Plan to scale of a triangle. The base is ${g.base}, the long sloping side ${g.slant}. The height, ${g.height}, is measured ${where[g.form]}.`,
      es: es`Plano a escala de un triángulo. La base mide ${g.base}, el lado inclinado largo ${g.slant}. La altura, ${g.height}, se mide ${where[g.form]}.`,
    },
  };
}

export const areaTriangleFamily = defineFamily<Given>({
  key: 'area-triangle',
  version: 1,
  topic: 'area',
  tiers: [1, 2, 3],
  title: { en: 'Area of a triangle', es: 'Área de un triángulo' },
  sources: [
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
    {
      title: 'Horticulture toolbox: measuring turf areas',
      publisher: 'WestOne / Government of Western Australia training',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(situations, g).heading,
  statement: (g) => situationOf(situations, g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'area',
      ask: {
        en: 'What is the area in square feet (sq ft), to the nearest whole square foot?',
        es: '¿Cuál es el área en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
      },
      answer: answer(g),
      step: oneSqFt,
      units: areaUnits,
    },
  ],
  figure,
  hints: (g) => [
    {
      en: en`You are asked for the area of a triangle. You have the base, ${g.base}, the height, ${g.height}, and a sloping side you do not need.`,
      es: es`Se pide el área de un triángulo. Tiene la base, ${g.base}, la altura, ${g.height}, y un lado inclinado que no necesita.`,
    },
    {
      en: 'Area = base × height ÷ 2. The height stands square to the base.',
      es: 'Área = base × altura ÷ 2. La altura va a escuadra con la base.',
    },
    { en: en`Begin with ${g.base} × ${g.height}.`, es: es`Empiece con ${g.base} × ${g.height}.` },
  ],
  working,
  slips,
});
