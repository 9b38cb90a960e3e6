import { render, screen } from '@testing-library/react';
import { describe, expect, test } from 'vitest';
import type { PlanFigure } from '../../shared/contracts/figure.ts';
import { drawingWidth } from './frame.tsx';
import { meet, plateBox } from './boxes.ts';
import { placeDimensions } from './dimension-places.ts';
import { namePlaces } from './name-places.ts';
import { PlanDrawing } from './plan-drawing.tsx';
import { planLayout } from './plan-layout.ts';
import { ProblemFigure } from './problem-figure.tsx';

const lawn: PlanFigure = {
  kind: 'plan',
  width: 65,
  height: 44,
  shapes: [
    { form: 'rect', x: 0, y: 0, width: 65, height: 44, ground: 'turf', name: 'grass' },
    { form: 'rect', x: 8, y: 14, width: 29, height: 16, ground: 'soil', name: 'playground' },
    { form: 'rect', x: 45, y: 0, width: 10, height: 13, ground: 'building', name: 'shed' },
  ],
  dimensions: [
    { from: [0, 0], to: [65, 0], text: '65 ft', place: 'outside', side: 'left' },
    { from: [65, 0], to: [65, 44], text: '44 ft', place: 'outside', side: 'left' },
    { from: [8, 14], to: [37, 14], text: '29 ft', place: 'outside', side: 'left' },
    { from: [37, 14], to: [37, 30], text: '16 ft', place: 'outside', side: 'left' },
    { from: [55, 0], to: [55, 13], text: '13 ft', place: 'outside', side: 'left' },
    { from: [55, 13], to: [45, 13], text: '10 ft', place: 'outside', side: 'left' },
  ],
  alt: 'A lawn 65 feet by 44 feet with a playground and a shed.',
};

describe('a plan', () => {
  test('is true to scale', () => {
    const layout = planLayout(lawn);
    const [x0, y0] = layout.at([0, 0]);
    const [x1, y1] = layout.at([65, 44]);
    expect((x1 - x0) / (y1 - y0)).toBeCloseTo(65 / 44, 6);
  });
  test('no text covers another or leaves the paper', () => {
    const layout = planLayout(lawn);
    const placed = placeDimensions({ ...lawn, layout });
    const texts = placed.map(({ at }, index) => plateBox(at, lawn.dimensions[index]?.text ?? ''));
    const names = namePlaces({ shapes: lawn.shapes, layout, texts }).flatMap((at, index) =>
      at ? [plateBox(at, lawn.shapes[index]?.name ?? '')] : [],
    );
    expect(names.length).toBeGreaterThanOrEqual(2);
    const all = [...texts, ...names];
    all.forEach((box, index) => {
      expect(box.left).toBeGreaterThanOrEqual(0);
      expect(box.right).toBeLessThanOrEqual(drawingWidth);
      expect(box.bottom).toBeLessThanOrEqual(layout.height);
      for (const other of all.slice(index + 1)) expect(meet(box, other, 0)).toBe(false);
    });
  });
  test('two dimensions of a notch do not run through each other', () => {
    const notched: PlanFigure = {
      kind: 'plan',
      width: 65,
      height: 46,
      shapes: [
        {
          form: 'polygon',
          points: [
            [18, 0],
            [65, 0],
            [65, 46],
            [0, 46],
            [0, 19],
            [18, 19],
          ],
          ground: 'turf',
        },
      ],
      dimensions: [
        { from: [18, 19], to: [18, 0], text: '19 ft', place: 'outside', side: 'left' },
        { from: [0, 19], to: [18, 19], text: '18 ft', place: 'outside', side: 'left' },
      ],
      alt: 'A lawn with a corner left out.',
    };
    const layout = planLayout(notched);
    const [upright, level] = placeDimensions({ ...notched, layout });
    const [cornerX, cornerY] = layout.at([18, 19]);
    const isLeft = (upright?.from[0] ?? cornerX) < cornerX;
    const isAbove = (level?.from[1] ?? cornerY) < cornerY;
    expect(isLeft && isAbove).toBe(false);
  });
  test('is one picture with a text equivalent, and the text can be opened', () => {
    render(<ProblemFigure figure={lawn} describe="Describe the drawing" />);
    expect(screen.getByRole('img', { name: lawn.alt })).toBeInTheDocument();
    expect(screen.getByText('Describe the drawing')).toBeInTheDocument();
  });
  test('text stays readable: 12 px or more in a column of 266 px, a problem’s on a phone 360 px wide', () => {
    render(<PlanDrawing figure={lawn} />);
    const size = Number(screen.getByRole('img').getAttribute('font-size'));
    expect((size * 266) / drawingWidth).toBeGreaterThanOrEqual(12);
  });
  test('every dimension is written', () => {
    render(<PlanDrawing figure={lawn} />);
    for (const { text } of lawn.dimensions) expect(screen.getByText(text)).toBeInTheDocument();
  });
  test('an arrow’s text keeps clear of a dimension’s, even in a strip as thin as a course', () => {
    const course: PlanFigure = {
      kind: 'plan',
      width: 200,
      height: 17,
      shapes: [{ form: 'rect', x: 0, y: 0, width: 200, height: 17, ground: 'turf' }],
      dimensions: [{ from: [0, 0], to: [200, 0], text: '200 ft', place: 'outside', side: 'left' }],
      arrows: [{ from: [12, 6], to: [188, 6], text: '39 s' }],
      alt: 'A course of 200 feet, covered in 39 seconds.',
    };
    render(<PlanDrawing figure={course} />);
    const yOf = (text: string) => Number(screen.getByText(text).getAttribute('y'));
    expect(Math.abs(yOf('39 s') - yOf('200 ft'))).toBeGreaterThanOrEqual(20);
  });
});
