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

type PlacedLine = Omit<PlacedDimension, 'at'>;

/** On which side of the line through `a` and `b` a point lies: positive, negative, or 0 on it. */
function sideOf(a: Point, b: Point, [x, y]: Point): number {
  return Math.sign((b[0] - a[0]) * (y - a[1]) - (b[1] - a[1]) * (x - a[0]));
}

/** Whether two dimension lines run through each other. */
function cross(a: PlacedLine, b: PlacedLine): boolean {
  return (
    sideOf(a.from, a.to, b.from) * sideOf(a.from, a.to, b.to) < 0 &&
    sideOf(b.from, b.to, a.from) * sideOf(b.from, b.to, a.to) < 0
  );
}

function line(dimension: PlanDimension<string>, layout: PlanLayout, turned: 1 | -1): PlacedLine {
  const [outX, outY] = outward(dimension);
  const normal: Point = [outX * turned, outY * turned];
  const gap = dimension.place === 'outside' ? dimensionGap : 0;
  const shift = ([x, y]: Point): Point => [x + normal[0] * gap, y + normal[1] * gap];
  return { from: shift(layout.at(dimension.from)), to: shift(layout.at(dimension.to)), normal };
}

/** Places for a text, best first: beside an upright line, on a level one where it fits, else above or below it. */
function candidates(dimension: PlanDimension<string>, placed: PlacedLine): Point[] {
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

/**
 * Places all dimensions of a plan so that no text covers another and no line runs through another: in a notch, where two would
 * meet, the second stands on the other side of its edge.
 */
export function placeDimensions(dimensions: readonly PlanDimension<string>[], layout: PlanLayout): PlacedDimension[] {
  const taken: Box[] = [];
  const lines: PlacedLine[] = [];
  return dimensions.map((dimension) => {
    const isClear = (own: PlacedLine) => !lines.some((other) => cross(own, other));
    const pushed = line(dimension, layout, 1);
    const turned = line(dimension, layout, -1);
    const placed = isClear(pushed) || !isClear(turned) ? pushed : turned;
    lines.push(placed);
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
