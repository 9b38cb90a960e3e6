import type { PlanShape, Point } from '../../shared/contracts/figure.ts';
import { textWidth } from './frame.tsx';
import type { PlanLayout } from './plan-layout.ts';

interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

const plateHeight = 20;
/** Kept clear round a smaller shape: its dimension lines and their text stand there. */
const clearance = 30;
/** Where a name is tried, as shares of the shape's width and height: the middle first. */
const tries: readonly Point[] = [
  [0.5, 0.5],
  [0.5, 0.85],
  [0.5, 0.15],
  [0.2, 0.85],
  [0.8, 0.85],
  [0.2, 0.5],
  [0.8, 0.5],
  [0.2, 0.15],
  [0.8, 0.15],
];

function boxOf(shape: PlanShape<string>, layout: PlanLayout): Box {
  const corners: readonly Point[] =
    shape.form === 'rect'
      ? [
          [shape.x, shape.y],
          [shape.x + shape.width, shape.y + shape.height],
        ]
      : shape.form === 'circle'
        ? [
            [shape.x - shape.radius, shape.y - shape.radius],
            [shape.x + shape.radius, shape.y + shape.radius],
          ]
        : shape.points;
  const placed = corners.map(layout.at);
  const xs = placed.map(([x]) => x);
  const ys = placed.map(([, y]) => y);
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), bottom: Math.max(...ys) };
}

function meet(a: Box, b: Box, room: number): boolean {
  return a.left < b.right + room && a.right > b.left - room && a.top < b.bottom + room && a.bottom > b.top - room;
}

function plate([x, y]: Point, text: string): Box {
  const half = textWidth(text) / 2;
  return { left: x - half, right: x + half, top: y - plateHeight / 2, bottom: y + plateHeight / 2 };
}

function inside(inner: Box, outer: Box): boolean {
  return (
    inner.left >= outer.left && inner.right <= outer.right && inner.top >= outer.top && inner.bottom <= outer.bottom
  );
}

/**
 * Where each shape's name stands on the paper: inside its shape, clear of the shapes drawn over it. Null for a shape
 * without a name, or without room for one: its name then stands in the text equivalent alone.
 */
export function namePlaces(shapes: readonly PlanShape<string>[], layout: PlanLayout): (Point | null)[] {
  const boxes = shapes.map((shape) => boxOf(shape, layout));
  return shapes.map((shape, index) => {
    const box = boxes[index];
    if (shape.name === undefined || box === undefined) return null;
    const { name } = shape;
    if (shape.form === 'polygon' && shape.nameAt) return layout.at(shape.nameAt);
    const over = boxes.slice(index + 1);
    const at = tries
      .map(([x, y]): Point => [box.left + (box.right - box.left) * x, box.top + (box.bottom - box.top) * y])
      .filter((point) => inside(plate(point, name), box));
    const free = (room: number) => at.find((point) => !over.some((other) => meet(plate(point, name), other, room)));
    return free(clearance) ?? free(2) ?? null;
  });
}
