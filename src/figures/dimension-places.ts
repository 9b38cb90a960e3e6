import type { PlanDimension, Point } from '../../shared/contracts/figure.ts';
import { drawingWidth, textWidth } from './frame.tsx';
import { dimensionGap, outward, type PlanLayout } from './plan-layout.ts';

/** A rectangle on the paper. */
export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

/** A dimension as it is drawn: its line, the direction it was pushed to, and where its text stands. */
export interface PlacedDimension {
  from: Point;
  to: Point;
  normal: Point;
  at: Point;
}

const plateHeight = 20;
/** Along the line, where a text is tried: the middle first. */
const along = [0.5, 0.3, 0.7, 0.12, 0.88];

/** The plate that a text at a point takes. */
export function plateBox([x, y]: Point, text: string): Box {
  const half = textWidth(text) / 2;
  return { left: x - half, right: x + half, top: y - plateHeight / 2, bottom: y + plateHeight / 2 };
}

/** Whether two rectangles come closer than `room`. */
export function meet(a: Box, b: Box, room: number): boolean {
  return a.left < b.right + room && a.right > b.left - room && a.top < b.bottom + room && a.bottom > b.top - room;
}

function line(dimension: PlanDimension<string>, layout: PlanLayout): Omit<PlacedDimension, 'at'> {
  const normal = outward(dimension);
  const gap = dimension.place === 'outside' ? dimensionGap : 0;
  const shift = ([x, y]: Point): Point => [x + normal[0] * gap, y + normal[1] * gap];
  return { from: shift(layout.at(dimension.from)), to: shift(layout.at(dimension.to)), normal };
}

/** Places for a text, best first: beside an upright line, on a level one where it fits, else above or below it. */
function candidates(dimension: PlanDimension<string>, placed: Omit<PlacedDimension, 'at'>): Point[] {
  const { from, to, normal } = placed;
  const [nx, ny] = normal;
  const width = textWidth(dimension.text);
  const on = (share: number): Point => [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
  if (Math.abs(nx) > 0.5 && dimension.place === 'outside') {
    const beside = (sign: number) => along.map((share): Point => [on(share)[0] + sign * (width / 2 + 6), on(share)[1]]);
    return [...beside(Math.sign(nx)), ...beside(-Math.sign(nx))];
  }
  const fits = Math.hypot(to[0] - from[0], to[1] - from[1]) > width + 14;
  const off = (by: number) => along.map((share): Point => [on(share)[0] + nx * by, on(share)[1] + (ny || -1) * by]);
  return [...(fits ? along.map(on) : []), ...off(15), ...off(-15)];
}

function onPaper(box: Box, height: number): boolean {
  return box.left >= 1 && box.right <= drawingWidth - 1 && box.top >= 0 && box.bottom <= height;
}

/** Places all dimensions of a plan so that no text covers another. */
export function placeDimensions(dimensions: readonly PlanDimension<string>[], layout: PlanLayout): PlacedDimension[] {
  const taken: Box[] = [];
  return dimensions.map((dimension) => {
    const placed = line(dimension, layout);
    const tried = candidates(dimension, placed);
    const free = tried.find((point) => {
      const box = plateBox(point, dimension.text);
      return onPaper(box, layout.height) && !taken.some((other) => meet(box, other, 1));
    });
    const at = free ?? tried[0] ?? placed.from;
    taken.push(plateBox(at, dimension.text));
    return { ...placed, at };
  });
}
