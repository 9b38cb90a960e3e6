import type { PlanDimension, PlanFigure, Point } from '../../../../shared/contracts/figure.ts';
import { add, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es } from '../../say.ts';
import type { Scene } from '../../situations.ts';
import { drawn, edge } from './plan-parts.ts';

/**
 * What area-l-shape draws. An L is a wide part and, above its left end, a narrow part; a T has its narrow part below the
 * wide one, in from both ends.
 */
export interface LShapeGiven extends Scene {
  readonly shape: 'L' | 'T';
  /** Whether every side is marked, or some have to be worked out. */
  readonly allMarked: boolean;
  readonly mirrored: boolean;
  /** Whole length and whole depth of the shape. */
  readonly length: Quantity;
  readonly depth: Quantity;
  /** Depth of the wide part. */
  readonly wideDepth: Quantity;
  /** L: length of the narrow part. T: how far in the narrow part stands from each end. */
  readonly narrowLength?: Quantity;
  readonly leftInset?: Quantity;
  readonly rightInset?: Quantity;
}

/** Length of the narrow part: marked on an L, worked out on a T. */
export function narrowLength(g: LShapeGiven): Quantity {
  if (g.narrowLength) return g.narrowLength;
  if (g.leftInset && g.rightInset) return subtract(subtract(g.length, g.leftInset), g.rightInset);
  throw new RangeError('an L or T shape needs the narrow part or its insets');
}

/** Depth of the narrow part: whole depth less the wide part's. */
export function narrowDepth(g: LShapeGiven): Quantity {
  return subtract(g.depth, g.wideDepth);
}

const said = (value: Quantity): Text => ({ en: en`${value}`, es: es`${value}` });

interface Drawing {
  readonly points: readonly Point[];
  /** From, to (clockwise) and the measure of each side marked. */
  readonly marks: readonly (readonly [Point, Point, Quantity])[];
}

function lDrawing(g: LShapeGiven): Drawing {
  const [w, h, n, d] = [
    drawn(g.length.value),
    drawn(g.depth.value),
    drawn(narrowLength(g).value),
    drawn(narrowDepth(g).value),
  ];
  const marks: (readonly [Point, Point, Quantity])[] = [
    [[0, 0], [n, 0], narrowLength(g)],
    [[w, d], [w, h], g.wideDepth],
    [[w, h], [0, h], g.length],
    [[0, h], [0, 0], g.depth],
  ];
  if (g.allMarked) {
    marks.push([[n, 0], [n, d], narrowDepth(g)], [[n, d], [w, d], subtract(g.length, narrowLength(g))]);
  }
  return {
    points: [
      [0, 0],
      [n, 0],
      [n, d],
      [w, d],
      [w, h],
      [0, h],
    ],
    marks,
  };
}

function tDrawing(g: LShapeGiven, left: Quantity, right: Quantity): Drawing {
  const [w, h, top] = [drawn(g.length.value), drawn(g.depth.value), drawn(g.wideDepth.value)];
  const from = drawn(left.value);
  const to = w - drawn(right.value);
  return {
    points: [
      [0, 0],
      [w, 0],
      [w, top],
      [to, top],
      [to, h],
      [from, h],
      [from, top],
      [0, top],
    ],
    marks: [
      [[0, 0], [w, 0], g.length],
      [[w, 0], [w, top], g.wideDepth],
      [[w, top], [to, top], right],
      [[from, top], [0, top], left],
      [[0, h], [0, 0], g.depth],
    ],
  };
}

function altText(g: LShapeGiven): Text {
  if (g.leftInset && g.rightInset) {
    return {
      en: en`Plan to scale of a T-shaped lawn. The wide part at the top is ${g.length} long and ${g.wideDepth} deep. The stem below it starts ${g.leftInset} from one end and ${g.rightInset} from the other. From the top edge to the foot of the stem it is ${g.depth}.`,
      es: es`Plano a escala de un césped en forma de T. La parte ancha, arriba, mide ${g.length} de largo y ${g.wideDepth} de fondo. El tramo de abajo empieza a ${g.leftInset} de un extremo y a ${g.rightInset} del otro. Del borde de arriba al pie del tramo hay ${g.depth}.`,
    };
  }
  const inner: Text = g.allMarked
    ? {
        en: en` The two inner sides are ${narrowDepth(g)} and ${subtract(g.length, narrowLength(g))}.`,
        es: es` Los dos lados interiores miden ${narrowDepth(g)} y ${subtract(g.length, narrowLength(g))}.`,
      }
    : { en: ' The two inner sides are not marked.', es: ' Los dos lados interiores no están marcados.' };
  return {
    en: en`Plan to scale of an L-shaped lawn. The long bottom edge is ${g.length}, the full depth on one side ${g.depth}, the short end on the other side ${g.wideDepth}, the top edge ${narrowLength(g)}.${inner}`,
    es: es`Plano a escala de un césped en forma de L. El borde largo de abajo mide ${g.length}, el fondo total de un lado ${g.depth}, el extremo corto del otro lado ${g.wideDepth}, el borde de arriba ${narrowLength(g)}.${inner}`,
  };
}

/** The plan to scale with the marked sides; mirrored left to right on some draws. */
export function lShapeFigure(g: LShapeGiven): PlanFigure<Text> {
  const { points, marks } = g.leftInset && g.rightInset ? tDrawing(g, g.leftInset, g.rightInset) : lDrawing(g);
  const width = drawn(g.length.value);
  const flip = ([x, y]: Point): Point => (g.mirrored ? [width - x, y] : [x, y]);
  const dimension = ([from, to, measure]: readonly [Point, Point, Quantity]): PlanDimension<Text> =>
    // Mirrored, the other way round is clockwise.
    g.mirrored ? edge(flip(to), flip(from), said(measure)) : edge(from, to, said(measure));
  return {
    kind: 'plan',
    width,
    height: drawn(g.depth.value),
    shapes: [{ form: 'polygon', points: points.map(flip), ground: 'turf' }],
    dimensions: marks.map(dimension),
    alt: altText(g),
  };
}

/** All marked sides in a row, for a hint. */
export function markedSides(g: LShapeGiven): Text {
  const { marks } = g.leftInset && g.rightInset ? tDrawing(g, g.leftInset, g.rightInset) : lDrawing(g);
  const list = (locale: 'en' | 'es') => marks.map(([, , measure]) => said(measure)[locale]).join(', ');
  return { en: list('en'), es: list('es') };
}

/** The sides' sum all the way round. */
export function around(g: LShapeGiven): Quantity {
  const half = add(g.length, g.depth);
  return add(half, half);
}
