import type { PlanShape, Point } from '../../shared/contracts/figure.ts';
import { meet, plateBox, type Box } from './boxes.ts';
import type { PlanLayout } from './plan-layout.ts';

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

function inside(inner: Box, outer: Box): boolean {
  return (
    inner.left >= outer.left && inner.right <= outer.right && inner.top >= outer.top && inner.bottom <= outer.bottom
  );
}

/**
 * Where each shape's name stands on the paper: inside its shape, clear of the shapes drawn over it. Null for a shape
 * without a name, or without room for one: its name then stands in the text equivalent alone.
 */
export function namePlaces(options: {
  shapes: readonly PlanShape<string>[];
  layout: PlanLayout;
  /** Plates of the dimensions' texts. */
  texts: readonly Box[];
}): (Point | null)[] {
  const { shapes, layout, texts } = options;
  const boxes = shapes.map((shape) => boxOf(shape, layout));
  return shapes.map((shape, index) => {
    const box = boxes[index];
    if (shape.name === undefined || box === undefined) return null;
    const { name } = shape;
    if (shape.form === 'polygon' && shape.nameAt) return layout.at(shape.nameAt);
    const over = boxes.slice(index + 1);
    const at = tries
      .map(([x, y]): Point => [box.left + (box.right - box.left) * x, box.top + (box.bottom - box.top) * y])
      .filter((point) => inside(plateBox(point, name), box));
    const free = (room: number) =>
      at.find((point) => {
        const box = plateBox(point, name);
        return !over.some((other) => meet(box, other, room)) && !texts.some((other) => meet(box, other, 1));
      });
    return free(clearance) ?? free(2) ?? null;
  });
}
