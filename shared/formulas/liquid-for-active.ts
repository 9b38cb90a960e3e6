import { inUnit, quantity, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * Liquid product that holds a wanted weight of active ingredient: pounds wanted ÷ pounds in a gallon.
 * Units: a weight and a weight per volume in any unit; the result is in gallons, exact.
 * Domain: both above zero.
 * @throws RangeError when one is zero or less, or of another kind
 * Source: Weights and measures; pints of commercial material needed per acre, Pacific Northwest Pest Management Handbooks.
 */
export function liquidForActive(use: { readonly active: Quantity; readonly strength: Quantity }): Quantity {
  mustBePositive({ active: use.active, strength: use.strength });
  return quantity(inUnit(use.active, 'lb').div(inUnit(use.strength, 'lb/gal')), 'gal');
}
