import { describe, expect, it } from 'vitest';
import { korrin2l } from './korrin-2l.ts';
import { labelView, rateText } from './label-view.ts';
import { labels } from './labels.ts';

describe('a practice label as it is read', () => {
  it('says that it is no real product, in both languages', () => {
    for (const label of labels) {
      expect(labelView(label, 'en').notice).toBe('Practice label. Not a real product.');
      expect(labelView(label, 'es').notice).toBe('Etiqueta de práctica. No es un producto real.');
    }
  });

  it('has a line for each rate, worded as labels are', () => {
    const rows = labelView(korrin2l, 'en').rows;
    expect(rows.find(({ heading }) => heading === 'Lawns')?.text).toBe(
      '1.5 fl oz in 1 gal of water for each 1,000 sq ft. Do not mow for a day before or after.',
    );
    expect(rows.find(({ heading }) => heading === 'Parks and sports turf')?.text).toBe(
      '2 qt in 40 gal of water for each acre.',
    );
    expect(rows.find(({ heading }) => heading === 'Spot treatment')?.text).toBe(
      '1 fl oz in each gallon of finished spray.',
    );
  });

  it('leaves no line empty and none in the other language', () => {
    for (const label of labels) {
      const [en, es] = [labelView(label, 'en').rows, labelView(label, 'es').rows];
      expect(en.length).toBe(es.length);
      en.forEach((row, at) => {
        expect(row.heading).not.toBe('');
        expect(row.text.length).toBeGreaterThan(3);
        expect(row.text).not.toBe(es[at]?.text);
      });
    }
  });

  it('writes a range as least to most', () => {
    const ranges = labels
      .flatMap((label) => label.rates.map((rate) => rateText(rate, 'en')))
      .filter((text) => / to \d/.test(text));
    expect(ranges).toContain('1.5 to 2.5 fl oz in 2 gal of water for each 1,000 sq ft');
  });
});
