import { ratio, scale, type Quantity } from '../quantity/quantity.ts';
import { mustBePositive } from './positive.ts';

/**
 * What a whole field takes when only bands are sprayed: rate in the band × band width ÷ row spacing.
 * Units: a rate in any unit and two lengths; the result is in the rate's unit, exact.
 * Domain: all above zero, the band at most as wide as the row.
 * @throws RangeError when one is zero or less, of another kind, or the band is wider than the row
 * Source: Console calibration: band application, equipment manual.
 */
export function fieldRateFromBand(spray: {
  readonly rate: Quantity;
  readonly band: Quantity;
  readonly row: Quantity;
}): Quantity {
  const { rate, band, row } = spray;
  mustBePositive({ rate, band, row });
  const share = ratio(band, row);
  if (share.compare(1) > 0) throw new RangeError('the band is wider than the row');
  return scale(rate, share);
}
