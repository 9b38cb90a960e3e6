import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const ambrill50wp: PracticeLabel = {
  key: 'ambrill-50wp',
  name: 'Ambrill 50 WP',
  number: '000-47',
  type: types.fungicide,
  formulation: 'WP',
  active: { en: 'Sarquinathone, 50 % by weight', es: 'Sarquinathone, 50 % en peso' },
  strength: quantity('50', 'percent'),
  signalWord: 'WARNING',
  sites: {
    en: 'Lawns, parks and sports turf, flower beds',
    es: 'Césped residencial, parques y campos deportivos, arriates',
  },
  pests: { en: 'Leaf spot, rust, red thread', es: 'Mancha foliar, roya, hilo rojo' },
  rates: [
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '2', unit: 'oz', waterGal: '2' }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '5', unit: 'lb', waterGal: '80' }),
    perSqFt({ key: 'beds', site: 'bed', heading: headings.beds, product: '1.5', unit: 'oz', waterGal: '3' }),
  ],
  limit: { applications: 4, daysApart: 14 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.twelveHours,
  ppe: ppe.dusty,
  precaution: precautions.eyes,
  firstAid: firstAid.eyes,
  storage: storage.dry,
};
