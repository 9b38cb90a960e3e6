import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Active ingredient in a volume of liquid product: gallons × pounds in a gallon.
 * Units: a volume and a weight per volume in any unit; the result is in pounds, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Weights and measures; pints of commercial material needed per acre, Pacific Northwest Pest Management Handbooks.
 */
export function activeInLiquid(use: { readonly product: Quantity; readonly strength: Quantity }): Quantity {
  mustBePositive({ product: use.product, strength: use.strength });
  return quantity(inUnit(use.product, 'gal').mul(inUnit(use.strength, 'lb/gal')), 'lb');
}
