import { describe, expect, it } from 'vitest';
import { perAcreToPerThousand } from '../../shared/formulas/per-acre-to-per-thousand.ts';
import { productForArea } from '../../shared/formulas/product-for-area.ts';
import { quantity, scale, type Quantity } from '../../shared/quantity/quantity.ts';
import { rational } from '../../shared/quantity/rational.ts';
import { asPrinted, printedText, type Printed } from './as-printed.ts';

// Sources, named as they name themselves.
const oklahoma =
  'Calibrating Application Equipment (turfgrass slides), Oklahoma State University - Oklahoma City, 2013';
const handbook =
  'Agrochemical and Pesticide Safety (handbook; mixing chapter), Example 4, M. F. Waxman, CRC/Lewis, 1998 (author, publisher and year from memory)';
const louisiana = 'Drop Spreader Calibration (Louisiana Home Lawn Series), LSU AgCenter';
const massachusetts = 'Rotary Spreader Calibration Procedures, UMass Extension Turf Program';
const worksheet =
  'Turfgrass Mathematics Review/Practice Worksheet, university turf program (institution not shown in the copy read)';
const manual = 'Tow-behind sprayer owner manual, Appendix A, boom spray calibration tables (equipment manual)';

const acre = quantity(1, 'acre');
const thousand = quantity(1000, 'sq-ft');
/** Product that carries a wanted weight of nutrient, from a product of so many percent: weight ÷ share. */
const carrying = (nutrient: Quantity, percent: number) => scale(nutrient, rational(100, percent));

interface Example {
  readonly what: string;
  readonly source: string;
  readonly computed: () => Quantity;
  readonly printed: Printed;
}

const examples: readonly Example[] = [
  {
    what: '25 acres at 3.6 pt an acre, in gallons',
    source: oklahoma,
    computed: () => productForArea({ amount: quantity('3.6', 'pt'), labelArea: acre, area: quantity(25, 'acre') }),
    printed: { value: '11.25', unit: 'gal' },
  },
  {
    what: '3.5 acres at 3 lb an acre',
    source: handbook,
    computed: () => productForArea({ amount: quantity(3, 'lb'), labelArea: acre, area: quantity('3.5', 'acre') }),
    printed: { value: '10.5', unit: 'lb' },
  },
  {
    what: '300 sq ft at 1 lb of nitrogen per 1,000 sq ft from a 20% product',
    source: louisiana,
    computed: () =>
      productForArea({ amount: carrying(quantity(1, 'lb'), 20), labelArea: thousand, area: quantity(300, 'sq-ft') }),
    printed: { value: '1.5', unit: 'lb' },
  },
  {
    what: '1,000 sq ft at 1 lb of nutrient per 1,000 sq ft from a 20% product',
    source: massachusetts,
    computed: () => productForArea({ amount: carrying(quantity(1, 'lb'), 20), labelArea: thousand, area: thousand }),
    printed: { value: '5', unit: 'lb' },
  },
  {
    what: '1,000 sq ft at 0.9 lb of nutrient per 1,000 sq ft from a 25% product',
    source: worksheet,
    computed: () =>
      productForArea({ amount: carrying(quantity('0.9', 'lb'), 25), labelArea: thousand, area: thousand }),
    printed: { value: '3.6', unit: 'lb' },
  },
  {
    what: '40 gal an acre, in gallons per 1,000 sq ft',
    source: oklahoma,
    computed: () => perAcreToPerThousand({ perAcre: quantity(40, 'gal') }),
    printed: { value: '0.92', unit: 'gal', step: '0.01' },
  },
  {
    what: '118.8 gal an acre, in gallons for 10,000 sq ft',
    source: manual,
    computed: () => scale(perAcreToPerThousand({ perAcre: quantity('118.8', 'gal') }), 10),
    printed: { value: '27.3', unit: 'gal', step: '0.1' },
  },
];

describe('published rates', () => {
  it.each(examples)('$what ($source)', ({ computed, printed }) => {
    expect(asPrinted(computed(), printed)).toBe(printedText(printed));
  });
});
