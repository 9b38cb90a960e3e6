import type { PlanDimension, PlanShape, Point } from '../../shared/contracts/figure.ts';
import { cross, edgesOf, meet, plateBox, touches, type Box, type Segment } from './boxes.ts';
import { drawingWidth, textWidth } from './frame.tsx';
import { dimensionGap, outward, type PlanLayout } from './plan-layout.ts';

/** A dimension as it is drawn: its line, the direction it was pushed to, and where its text stands. */
export interface PlacedDimension {
  from: Point;
  to: Point;
  normal: Point;
  at: Point;
}
type PlacedLine = Omit<PlacedDimension, 'at'>;

/** Along the line, where a text is tried: the middle first. */
const along = [0.5, 0.3, 0.7, 0.12, 0.88];
/** How often every dimension is placed again, now that the others have their places. */
const rounds = 3;
/** What is wrong with a place, worst first; among places with the same faults the first tried is taken. */
const faults = { offPaper: 5000, onText: 1000, linesCross: 150, onLine: 80, onEdge: 30, turned: 20 } as const;

function line(dimension: PlanDimension<string>, layout: PlanLayout, turned: 1 | -1): PlacedLine {
  const [outX, outY] = outward(dimension);
  const normal: Point = [outX * turned, outY * turned];
  const gap = dimension.place === 'outside' ? dimensionGap : 0;
  const shift = ([x, y]: Point): Point => [x + normal[0] * gap, y + normal[1] * gap];
  return { from: shift(layout.at(dimension.from)), to: shift(layout.at(dimension.to)), normal };
}

/** Places for a text, best first: beside an upright line, on a level one where it fits, else above, below or past its ends. */
function candidates(dimension: PlanDimension<string>, placed: PlacedLine): Point[] {
  const { from, to, normal } = placed;
  const [nx, ny] = normal;
  const width = textWidth(dimension.text);
  const on = (share: number): Point => [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  if (Math.abs(nx) > 0.5 && dimension.place === 'outside') {
    const beside = (sign: number) => along.map((share): Point => [on(share)[0] + sign * (width / 2 + 6), on(share)[1]]);
    const past = 15 / (length || 1);
    return [...beside(Math.sign(nx)), ...beside(-Math.sign(nx)), on(-past), on(1 + past)];
  }
  const off = (by: number) => along.map((share): Point => [on(share)[0] + nx * by, on(share)[1] + (ny || -1) * by]);
  return [...(length > width + 14 ? along.map(on) : []), ...off(15), ...off(-15)];
}

function isOnPaper(box: Box, height: number): boolean {
  return box.left >= 1 && box.right <= drawingWidth - 1 && box.top >= 0 && box.bottom <= height;
}

interface Paper {
  layout: PlanLayout;
  edges: readonly Segment[];
  /** The other dimensions, as they stand. */
  others: readonly { placed: PlacedDimension; text: string }[];
}

function costOf(placed: PlacedDimension, text: string, { layout, edges, others }: Paper): number {
  const box = plateBox(placed.at, text);
  const own: Segment = [placed.from, placed.to];
  let cost = isOnPaper(box, layout.height) ? 0 : faults.offPaper;
  for (const other of others) {
    const theirs = plateBox(other.placed.at, other.text);
    const theirLine: Segment = [other.placed.from, other.placed.to];
    if (meet(box, theirs, 1)) cost += faults.onText;
    if (cross(own, theirLine)) cost += faults.linesCross;
    if (touches(box, theirLine)) cost += faults.onLine;
    if (touches(theirs, own)) cost += faults.onLine;
  }
  for (const edge of edges) if (touches(box, edge)) cost += faults.onEdge;
  return cost;
}

function bestPlace(dimension: PlanDimension<string>, paper: Paper): PlacedDimension {
  const tried = ([1, -1] as const).flatMap((turned) => {
    const own = line(dimension, paper.layout, turned);
    return candidates(dimension, own).map((at, index) => {
      const placed = { ...own, at };
      const cost = costOf(placed, dimension.text, paper) + (turned === 1 ? 0 : faults.turned) + index;
      return { placed, cost };
    });
  });
  return tried.reduce((best, next) => (next.cost < best.cost ? next : best)).placed;
}

/**
 * Places all dimensions of a plan so that no text covers another, and lines and texts keep clear of each other and of the
 * edges as far as there is room. Where two lines would meet, as in a notch, one stands on the other side of its edge.
 */
export function placeDimensions(options: {
  dimensions: readonly PlanDimension<string>[];
  shapes: readonly PlanShape<string>[];
  layout: PlanLayout;
}): PlacedDimension[] {
  const { dimensions, shapes, layout } = options;
  const edges = shapes.flatMap((shape) => edgesOf(shape, layout));
  const places: PlacedDimension[] = [];
  for (let round = 0; round < rounds; round += 1) {
    dimensions.forEach((dimension, index) => {
      const others = places.flatMap((placed, other) =>
        other === index ? [] : [{ placed, text: dimensions[other]?.text ?? '' }],
      );
      places[index] = bestPlace(dimension, { layout, edges, others });
    });
  }
  return places;
}
