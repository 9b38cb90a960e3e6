import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const trennick4sc: PracticeLabel = {
  key: 'trennick-4sc',
  name: 'Trennick 4 SC',
  number: '000-96',
  type: types.fungicide,
  formulation: 'SC',
  active: { en: 'Quellarvate, 4 lb per gallon', es: 'Quellarvate, 4 lb por galón' },
  strength: quantity('4', 'lb/gal'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, parks and sports turf, beds', es: 'Césped residencial, parques y campos deportivos, arriates' },
  pests: { en: 'Brown patch, rust, powdery mildew', es: 'Mancha café, roya, cenicilla' },
  rates: [
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '2', unit: 'fl-oz', waterGal: '1.5' }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '2.5', unit: 'qt', waterGal: '60' }),
    perGallon({
      key: 'beds',
      site: 'bed',
      heading: headings.beds,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
      product: '2',
      unit: 'tbsp',
    }),
  ],
  limit: { applications: 4, daysApart: 14 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.eyes,
  firstAid: firstAid.eyes,
  storage: storage.freezing,
};
