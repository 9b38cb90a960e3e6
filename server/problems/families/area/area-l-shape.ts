import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, quantity, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf, type Situation } from '../../situations.ts';
import { given, minus, plus, times, type WorkingLine } from '../../working.ts';
import { around, lShapeFigure, markedSides, narrowDepth, narrowLength, type LShapeGiven } from './area-l-shape-plan.ts';
import { areaUnits, oneSqFt, sqFt } from './plan-parts.ts';

type Given = LShapeGiven;

const situations: readonly Situation<Given>[] = [
  {
    heading: { en: 'A lawn around a corner', es: 'Un césped en esquina' },
    statement: (g) => ({
      en: en`${g.person} treats a lawn ${g.place.at} that is shaped like ${an(g)}. The sides on the plan are in feet (ft).`,
      es: es`${g.person} trata un césped en forma de ${g.shape} ${g.place.at}. Los lados del plano están en pies.`,
    }),
  },
  {
    heading: { en: 'Turf beside a building', es: 'Césped junto a un edificio' },
    statement: (g) => ({
      en: en`The turf beside ${g.place.the} makes ${an(g)}. All of it gets treated ${g.season}. The sides on the plan are in feet (ft).`,
      es: es`El césped junto ${g.place.to} forma una ${g.shape}. Se trata todo ${g.season}. Los lados del plano están en pies.`,
    }),
  },
  {
    heading: { en: 'Two rectangles in one', es: 'Dos rectángulos en uno' },
    statement: (g) => ({
      en: en`${g.person} tapes ${an(g)}-shaped lawn ${g.place.at} and writes the sides on a plan, in feet (ft). The whole lawn gets treated.`,
      es: es`${g.person} mide con cinta un césped en forma de ${g.shape} ${g.place.at} y anota los lados en un plano, en pies. Se trata todo el césped.`,
    }),
  },
  {
    heading: { en: 'An area for the record', es: 'Un área para el registro' },
    statement: (g) => ({
      en: en`The spray record for ${g.place.the} needs the area of ${an(g)}-shaped lawn. Its sides are on the plan, in feet (ft).`,
      es: es`El registro de aplicación ${g.place.of} necesita el área de un césped en forma de ${g.shape}. Sus lados están en el plano, en pies.`,
    }),
  },
];

function an({ shape }: Given): string {
  return shape === 'L' ? 'an L' : 'a T';
}

function draw(rng: Rng, tier: Tier): Given {
  const scene = drawScene(rng, situations.length);
  const shape = tier === 3 ? 'T' : 'L';
  const length = rng.int(40, 100);
  const depth = rng.int(36, 80);
  const ft = (value: number) => quantity(value, 'ft');
  const wide = rng.int(14, depth - 14);
  const base = {
    ...scene,
    shape,
    allMarked: tier === 1,
    mirrored: rng.chance(1, 2),
    length: ft(length),
    depth: ft(depth),
    wideDepth: ft(wide),
  } as const;
  if (shape === 'L') return { ...base, narrowLength: ft(rng.int(14, length - 14)) };
  const stem = rng.int(12, length - 16);
  const left = rng.int(6, length - stem - 6);
  return { ...base, leftInset: ft(left), rightInset: ft(length - stem - left) };
}

const wide = (g: Given) => rectangleArea({ length: g.length, width: g.wideDepth });
const narrow = (g: Given) => rectangleArea({ length: narrowLength(g), width: narrowDepth(g) });
const answer = (g: Given) => add(wide(g), narrow(g));
const both = (g: Given, width: Quantity, length = narrowLength(g)) => add(wide(g), rectangleArea({ length, width }));

const slips: readonly Slip<Given>[] = [
  {
    key: 'bounding-box',
    part: 'a',
    answer: (g) => rectangleArea({ length: g.length, width: g.depth }),
    message: (g) => ({
      en: en`That is the full rectangle around the shape. ${g.length} × ${g.depth} also counts ground that is not lawn. Cut the shape into two rectangles.`,
      es: es`Ese es el rectángulo completo alrededor de la figura. ${g.length} × ${g.depth} cuenta también suelo que no es césped. Divida la figura en dos rectángulos.`,
    }),
  },
  {
    key: 'counted-overlap-twice',
    part: 'a',
    answer: (g) => both(g, g.depth),
    message: (g) => ({
      en: en`You counted one piece twice. The narrow part is only as deep as what is left: ${g.depth} less ${g.wideDepth}.`,
      es: es`Usted contó un pedazo dos veces. La parte angosta solo tiene de fondo lo que queda: ${g.depth} menos ${g.wideDepth}.`,
    }),
  },
  {
    key: 'wrong-missing-side',
    part: 'a',
    answer: (g) => (g.shape === 'T' ? missedInset(g) : both(g, g.wideDepth)),
    message: (g) =>
      g.leftInset && g.rightInset
        ? {
            en: en`A missing side is worked out wrong. The stem is ${g.length} less both ends, ${g.leftInset} and ${g.rightInset}; you took off only one.`,
            es: es`Un lado que falta está mal calculado. El tramo de abajo mide ${g.length} menos los dos extremos, ${g.leftInset} y ${g.rightInset}; usted restó solo uno.`,
          }
        : {
            en: en`One side is wrong. The narrow part is not ${g.wideDepth} deep; that is the wide part. Take ${g.wideDepth} from ${g.depth}.`,
            es: es`Un lado está mal. La parte angosta no mide ${g.wideDepth} de fondo; esa es la parte ancha. Reste ${g.wideDepth} de ${g.depth}.`,
          },
  },
  {
    key: 'one-rectangle-only',
    part: 'a',
    answer: wide,
    message: (g) => ({
      en: en`That is only one of the two rectangles. The part that is ${narrowLength(g)} by ${narrowDepth(g)} belongs to the lawn too.`,
      es: es`Ese es solo uno de los dos rectángulos. La parte de ${narrowLength(g)} por ${narrowDepth(g)} también es césped.`,
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => sqFt(around(g).value),
    message: (g) => ({
      en: en`You added up sides. That gives a distance in feet. For an area, multiply length by width for each rectangle, the first ${g.length} × ${g.wideDepth}.`,
      es: es`Usted sumó lados. Eso da una distancia en pies. Para un área, multiplique largo por ancho en cada rectángulo, el primero ${g.length} × ${g.wideDepth}.`,
    }),
  },
];
function missedInset(g: Given): Quantity | null {
  return g.leftInset ? both(g, narrowDepth(g), subtract(g.length, g.leftInset)) : null;
}

function inferredLines(g: Given): WorkingLine[] {
  if (g.allMarked) return [];
  const lines: WorkingLine[] = [];
  if (g.leftInset && g.rightInset) {
    lines.push({
      name: { en: 'length of the stem', es: 'largo del tramo angosto' },
      expression: minus(given(g.length), given(g.leftInset), given(g.rightInset)),
      result: given(narrowLength(g)),
      reason: {
        en: 'The whole length less what is missing at both ends.',
        es: 'Todo el largo menos lo que falta en los dos extremos.',
      },
    });
  }
  lines.push({
    name: { en: 'depth of the narrow part', es: 'fondo de la parte angosta' },
    expression: minus(given(g.depth), given(g.wideDepth)),
    result: given(narrowDepth(g)),
    reason: { en: 'The whole depth less the depth of the wide part.', es: 'Todo el fondo menos el de la parte ancha.' },
  });
  return lines;
}

function working(g: Given): readonly WorkingLine[] {
  return [
    ...inferredLines(g),
    {
      name: { en: 'wide part', es: 'parte ancha' },
      expression: times(given(g.length), given(g.wideDepth)),
      result: given(wide(g)),
      reason: {
        en: 'One straight cut makes two rectangles. This is the first.',
        es: 'Un corte recto da dos rectángulos. Este es el primero.',
      },
    },
    {
      name: { en: 'narrow part', es: 'parte angosta' },
      expression: times(given(narrowLength(g)), given(narrowDepth(g))),
      result: given(narrow(g)),
      reason: { en: 'The second rectangle.', es: 'El segundo rectángulo.' },
    },
    {
      name: { en: 'area', es: 'área' },
      expression: plus(given(wide(g)), given(narrow(g))),
      result: given(answer(g)),
      answers: true,
      reason: { en: 'Both rectangles together.', es: 'Los dos rectángulos juntos.' },
    },
  ];
}

export const areaLShapeFamily = defineFamily<Given>({
  key: 'area-l-shape',
  version: 1,
  topic: 'area',
  tiers: [1, 2, 3],
  title: { en: 'Area of an L or T shape', es: 'Área de una figura en L o en T' },
  sources: [
    {
      title: 'How Big is Your Lawn? (Purdue Turf Tips)',
      publisher: 'Purdue University Turf Program',
      year: 2014,
      ref: 'Figures 1-2',
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
  figure: lShapeFigure,
  hints: (g) => [
    {
      en: en`You are asked for the whole area. The plan marks these sides: ${markedSides(g)}.`,
      es: es`Se pide el área total. El plano marca estos lados: ${markedSides(g)}.`,
    },
    {
      en: 'Cut the shape into two rectangles. Area = (length × width of one) + (length × width of the other).',
      es: 'Divida la figura en dos rectángulos. Área = (largo × ancho de uno) + (largo × ancho del otro).',
    },
    {
      en: en`Begin with the wide part: ${g.length} × ${g.wideDepth}. The narrow part is ${g.depth} − ${g.wideDepth} deep.`,
      es: es`Empiece con la parte ancha: ${g.length} × ${g.wideDepth}. La parte angosta tiene ${g.depth} − ${g.wideDepth} de fondo.`,
    },
  ],
  working,
  slips,
});
