import { describe, expect, it } from 'vitest';
import { kindOf, kinds, units, unitsOfKind, type UnitKey } from './units.ts';

const keys = Object.keys(units) as UnitKey[];

describe('units', () => {
  it.each(keys)('%s has a positive factor, a known kind and a source', (key) => {
    const unit = units[key];
    expect(unit.key).toBe(key);
    expect(kinds).toContain(unit.kind);
    expect(unit.toBase.compare(0)).toBe(1);
    expect(unit.source.length).toBeGreaterThan(5);
  });

  it('gives the units of each kind, none left out', () => {
    expect(kinds.flatMap((kind) => unitsOfKind(kind)).toSorted()).toEqual(keys.toSorted());
    for (const kind of kinds) {
      expect(unitsOfKind(kind).length).toBeGreaterThan(0);
      for (const key of unitsOfKind(kind)) expect(kindOf(key)).toBe(kind);
    }
  });

  it('has an offset for degrees only', () => {
    expect(keys.filter((key) => units[key].offset)).toEqual(['f']);
  });

  it('has for each rate the factor of its parts', () => {
    const belows: Readonly<Record<string, readonly [UnitKey, number]>> = { '100-gal': ['gal', 100] };
    const basis: Readonly<Record<string, string>> = { min: '60', s: '60', h: '1' };
    for (const key of keys) {
      const [top, bottom] = key.split('/') as [UnitKey, string | undefined];
      if (bottom === undefined) continue;
      const [below, times] = belows[bottom] ?? [bottom as UnitKey, 1];
      const expected = units[top].toBase.div(units[below].toBase.mul(times));
      // Flow is counted by the minute, all else by the second.
      const scale = units[key].kind === 'flow' ? (basis[bottom] ?? '1') : '1';
      expect(units[key].toBase.equals(expected.mul(scale)), key).toBe(true);
    }
  });
});
