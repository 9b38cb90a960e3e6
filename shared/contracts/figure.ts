/**
 * What a drawing is made of. A problem's figure travels as this data and is drawn by `src/figures`; lessons use the same.
 * `S` is `Text` while a family builds it and `string` once it is in the reader's language.
 * Lengths of a plan are in any one unit of the problem (usually feet): the drawing is to scale, whatever the unit.
 */
export type Point = readonly [x: number, y: number];

/** What covers the ground of a shape; drawn with its own hatching besides its color. */
export const grounds = ['turf', 'bed', 'hard', 'building', 'water', 'soil', 'swath', 'outline'] as const;
export type Ground = (typeof grounds)[number];

export type PlanShape<S> =
  | { form: 'rect'; x: number; y: number; width: number; height: number; ground: Ground; name?: S }
  | { form: 'polygon'; points: readonly Point[]; ground: Ground; name?: S; nameAt?: Point }
  | { form: 'circle'; x: number; y: number; radius: number; ground: Ground; name?: S };

/** A dimension line from one point to another; `side` says on which side of the line (seen from `from` to `to`) the text stands. */
export interface PlanDimension<S> {
  from: Point;
  to: Point;
  text: S;
  /** Distance from the measured edge: `outside` draws it clear of the shape with end ticks, `inside` on the line itself. */
  place: 'outside' | 'inside';
  /** Side of the line from `from` to `to`, y pointing down. Outside dimensions are pushed to that side. */
  side: 'left' | 'right';
  dashed?: boolean;
}

export interface PlanArrow<S> {
  from: Point;
  to: Point;
  text?: S;
}

/** A plan to scale: a site, a plot, a strip, a walking course. y points down. */
export interface PlanFigure<S = string> {
  kind: 'plan';
  width: number;
  height: number;
  shapes: readonly PlanShape<S>[];
  dimensions: readonly PlanDimension<S>[];
  arrows?: readonly PlanArrow<S>[];
  /** Text equivalent from which the problem can be solved. */
  alt: S;
}

/** A boom from the front: nozzles at a spacing, with what is known written beside. */
export interface BoomFigure<S = string> {
  kind: 'boom';
  nozzles: number;
  spacing: S;
  flow?: S;
  speed?: S;
  alt: S;
}

/** A tank from the side with its graduations; `level` is the share of the tank that is full, 0 to 1. */
export interface TankFigure<S = string> {
  kind: 'tank';
  level: number;
  capacity: S;
  levelText?: S;
  alt: S;
}

/** The mark that spray leaves, seen from above, beside the spray seen from the side. */
export interface NozzlePatternFigure<S = string> {
  kind: 'nozzle-patterns';
  patterns: readonly { pattern: 'flat-fan' | 'even-fan' | 'hollow-cone' | 'full-cone' | 'stream' | 'flood'; name: S }[];
  alt: S;
}

/** Kitchen-and-shed measures side by side, drawn in proportion by volume. */
export interface MeasuresFigure<S = string> {
  kind: 'measures';
  tools: readonly { tool: 'teaspoon' | 'tablespoon' | 'cylinder' | 'cup' | 'pint' | 'quart' | 'gallon'; name: S }[];
  alt: S;
}

export type Figure<S = string> =
  PlanFigure<S> | BoomFigure<S> | TankFigure<S> | NozzlePatternFigure<S> | MeasuresFigure<S>;
