import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const tevlinSc: PracticeLabel = {
  key: 'tevlin-sc',
  name: 'Tevlin 1.7 SC',
  number: '000-33',
  type: types.fungicide,
  formulation: 'SC',
  active: { en: 'Quelmarotane, 1.7 lb per gallon', es: 'Quelmarotane, 1.7 lb por galón' },
  strength: quantity('1.7', 'lb/gal'),
  signalWord: 'CAUTION',
  sites: {
    en: 'Lawns, parks and sports turf, ornamental shrubs, beds',
    es: 'Césped residencial, parques y campos deportivos, arbustos ornamentales, arriates',
  },
  pests: { en: 'Brown patch, dollar spot, leaf spot', es: 'Mancha café, mancha de dólar, mancha foliar' },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      product: ['1.5', '2.5'],
      unit: 'fl-oz',
      waterGal: '2',
    }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '3', unit: 'qt', waterGal: '80' }),
    perGallon({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
      product: ['1.5', '2'],
      unit: 'tbsp',
    }),
    perSqFt({ key: 'beds', site: 'bed', heading: headings.beds, product: '3', unit: 'fl-oz', waterGal: '4' }),
  ],
  limit: { applications: 4, daysApart: 14 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.fish,
  firstAid: firstAid.inhaled,
  storage: storage.freezing,
};
