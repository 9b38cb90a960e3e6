import type { PlanFigure } from '../../../../shared/contracts/figure.ts';
import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es } from '../../say.ts';
import { boxDimensions, drawn } from '../area/plan-parts.ts';
import { both } from '../both.ts';

/** A rectangular test plot to scale with its two sides; `more` is said after it in the text equivalent. */
export function plotFigure(plot: {
  readonly length: Quantity;
  readonly width: Quantity;
  readonly more: Text;
}): PlanFigure<Text> {
  const { length, width, more } = plot;
  const box = { x: 0, y: 0, width: drawn(length.value), height: drawn(width.value) };
  const name = both('test plot', 'parcela de prueba');
  const side = (value: Quantity) => both(en`${value}`, es`${value}`);
  return {
    kind: 'plan',
    width: box.width,
    height: box.height,
    shapes: [{ form: 'rect', ...box, ground: 'swath', name }],
    dimensions: boxDimensions(box, { width: side(length), height: side(width) }),
    alt: both(
      en`Plan to scale of a test plot, ${length} long and ${width} wide. ${more}`,
      es`Plano a escala de una parcela de prueba de ${length} de largo y ${width} de ancho. ${more}`,
    ),
  };
}
