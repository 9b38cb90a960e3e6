import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { inUnit, quantity } from '../../shared/quantity/quantity.ts';
import { kindOf, units, unitsOfKind, type UnitKey } from '../../shared/quantity/units.ts';

// An independent table of units: mathjs. Its acre is the survey acre and its kitchen spoons are metric, so the
// international acre and the US spoons are given to it from its own foot and fluid ounce.
const math = create(all ?? {});
math.createUnit('usacre', '43560 sqft');
math.createUnit('thousandsqft', '1000 sqft');
math.createUnit('ustbsp', '0.5 floz');
math.createUnit('ustsp', `${1 / 6} floz`);
math.createUnit('dollar');

const parts: Readonly<Record<string, string>> = {
  'sq-in': 'sqin',
  'sq-ft': 'sqft',
  'sq-yd': 'sqyd',
  'sq-mi': 'sqmile',
  '1000-sq-ft': 'thousandsqft',
  acre: 'usacre',
  'sq-m': 'm^2',
  ha: 'hectare',
  tsp: 'ustsp',
  tbsp: 'ustbsp',
  'fl-oz': 'floz',
  cup: 'cup',
  pt: 'pint',
  qt: 'quart',
  gal: 'gallon',
  ml: 'ml',
  l: 'l',
  'cu-in': 'cuin',
  'cu-ft': 'cuft',
  lb: 'lbm',
  yd: 'yard',
  mi: 'mile',
  kpa: 'kPa',
  mph: 'mile/h',
  min: 'minute',
  h: 'hour',
  s: 's',
  usd: 'dollar',
  '100-gal': '(100 gallon)',
};

/** A unit as mathjs writes it: "fl-oz/100-gal" is "floz/(100 gallon)". */
function foreign(unit: UnitKey): string {
  return unit
    .split('/')
    .map((part) => parts[part] ?? part)
    .join('/');
}

/** How many `to` make one `from`, by mathjs. */
function byLibrary(from: UnitKey, to: UnitKey): number {
  const factor: unknown = math.evaluate(`number((1 ${foreign(from)}) / (1 ${foreign(to)}))`);
  if (typeof factor !== 'number') throw new TypeError(`no plain number for ${from} in ${to}`);
  return factor;
}

const linear = (Object.keys(units) as UnitKey[]).filter(
  (unit) => kindOf(unit) !== 'temperature' && unitsOfKind(kindOf(unit)).length > 1,
);

describe('factors against an independent units library', () => {
  it.each(linear)('%s in every unit of its kind', (unit) => {
    for (const other of unitsOfKind(kindOf(unit))) {
      const ours = inUnit(quantity(1, unit), other).valueOf();
      // Ten digits: the library reckons in floating point and holds psi to ten digits.
      expect(Math.abs(byLibrary(unit, other) / ours - 1), `${unit} in ${other}`).toBeLessThan(1e-9);
    }
  });

  it.each([-40, 0, 32, 59, 70.5, 212])('%d degrees Fahrenheit in Celsius, and back', (degrees) => {
    const celsius = inUnit(quantity(degrees, 'f'), 'c').valueOf();
    expect(celsius).toBeCloseTo(math.unit(degrees, 'degF').toNumber('degC'), 9);
    expect(inUnit(quantity(degrees, 'c'), 'f').valueOf()).toBeCloseTo(math.unit(degrees, 'degC').toNumber('degF'), 9);
  });
});
