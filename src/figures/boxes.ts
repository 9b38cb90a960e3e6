import type { PlanShape, Point } from '../../shared/contracts/figure.ts';
import { textWidth } from './frame.tsx';
import type { PlanLayout } from './plan-layout.ts';

/** A rectangle on the paper. */
export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

export type Segment = readonly [from: Point, to: Point];

const plateHeight = 20;

/** The plate that a text at a point takes. */
export function plateBox([x, y]: Point, text: string): Box {
  const half = textWidth(text) / 2;
  return { left: x - half, right: x + half, top: y - plateHeight / 2, bottom: y + plateHeight / 2 };
}

/** Whether two rectangles come closer than `room`. */
export function meet(a: Box, b: Box, room: number): boolean {
  return a.left < b.right + room && a.right > b.left - room && a.top < b.bottom + room && a.bottom > b.top - room;
}

/** On which side of a line a point lies: positive, negative, or 0 on it. */
function sideOf([a, b]: Segment, [x, y]: Point): number {
  return Math.sign((b[0] - a[0]) * (y - a[1]) - (b[1] - a[1]) * (x - a[0]));
}

/** Whether two lines run through each other. */
export function cross(a: Segment, b: Segment): boolean {
  return sideOf(a, b[0]) * sideOf(a, b[1]) < 0 && sideOf(b, a[0]) * sideOf(b, a[1]) < 0;
}

/** Whether a line touches a rectangle: it begins in it, or runs through one of its diagonals. */
export function touches({ left, top, right, bottom }: Box, line: Segment): boolean {
  const isIn = line.some(([x, y]) => x > left && x < right && y > top && y < bottom);
  const falling: Segment = [
    [left, top],
    [right, bottom],
  ];
  const rising: Segment = [
    [left, bottom],
    [right, top],
  ];
  return isIn || cross(line, falling) || cross(line, rising);
}

/** The straight edges of a shape on the paper; none of a circle. */
export function edgesOf(shape: PlanShape<string>, layout: PlanLayout): Segment[] {
  if (shape.form === 'circle') return [];
  const { x, y, width, height } = shape.form === 'rect' ? shape : { x: 0, y: 0, width: 0, height: 0 };
  const corners: readonly Point[] =
    shape.form === 'rect'
      ? [
          [x, y],
          [x + width, y],
          [x + width, y + height],
          [x, y + height],
        ]
      : shape.points;
  const placed = corners.map(layout.at);
  return placed.map((corner, index) => [corner, placed[(index + 1) % placed.length] as Point]);
}
