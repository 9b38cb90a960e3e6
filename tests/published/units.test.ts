import { describe, expect, it } from 'vitest';
import { quantity } from '../../shared/quantity/quantity.ts';
import type { UnitKey } from '../../shared/quantity/units.ts';
import { asPrinted, printedText, type Printed } from './as-printed.ts';

// Sources, named as they name themselves.
const nebraska =
  'Math for Pesticide Applicators: useful measurement conversions, University of Nebraska-Lincoln Pesticide Education';
const handbook =
  'Weights and measures, Pacific Northwest Pest Management Handbooks (Oregon State / Washington State / Idaho extension)';

interface Example {
  readonly one: UnitKey;
  readonly source: string;
  readonly printed: Printed;
}

const examples: readonly Example[] = [
  { one: 'fl-oz', source: nebraska, printed: { value: '29.57', unit: 'ml', step: '0.01' } },
  // Cut, not rounded: 0.94635 would round to 0.9464.
  { one: 'qt', source: nebraska, printed: { value: '0.9463', unit: 'l', step: '0.0001', cut: true } },
  { one: 'acre', source: nebraska, printed: { value: '0.405', unit: 'ha', step: '0.001' } },
  { one: 'kg', source: nebraska, printed: { value: '2.2', unit: 'lb', step: '0.1' } },
];

describe('published unit factors', () => {
  it.each(examples)('1 $one is $printed.value $printed.unit ($source)', ({ one, printed }) => {
    expect(asPrinted(quantity(1, one), printed)).toBe(printedText(printed));
  });
});

describe('where publications disagree', () => {
  it(`an ounce prints as 28.4 g where 28.3495 g would round to 28.3 (${handbook})`, () => {
    const once: Printed = { value: '28.3', unit: 'g', step: '0.1' };
    expect(asPrinted(quantity(1, 'oz'), once)).toBe(printedText(once));
    // The handbook rounds twice: 28.35 first, then 28.4. The exact ounce of 28.349523125 g is followed.
    const hundredth: Printed = { value: '28.35', unit: 'g', step: '0.01' };
    const twice: Printed = { value: '28.4', unit: 'g', step: '0.1' };
    expect(asPrinted(quantity(1, 'oz'), hundredth)).toBe(printedText(hundredth));
    expect(asPrinted(quantity('28.35', 'g'), twice)).toBe(printedText(twice));
  });
});
