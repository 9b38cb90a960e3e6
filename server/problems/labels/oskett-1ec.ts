import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt, percentMix } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const oskett1ec: PracticeLabel = {
  key: 'oskett-1ec',
  name: 'Oskett 1 EC',
  number: '000-93',
  type: types.insecticide,
  formulation: 'EC',
  active: { en: 'Zelpharonil, 1 lb per gallon', es: 'Zelpharonil, 1 lb por galón' },
  strength: quantity('1', 'lb/gal'),
  signalWord: 'DANGER',
  sites: {
    en: 'Ornamental shrubs, trees, paving, lawns, sports turf',
    es: 'Arbustos ornamentales, árboles, pavimento, césped residencial, campos deportivos',
  },
  pests: { en: 'Caterpillars, lace bugs, billbugs', es: 'Orugas, chinches de encaje, picudos del césped' },
  rates: [
    perGallon({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
      product: '1.5',
      unit: 'tbsp',
    }),
    perGallon({ key: 'trees', site: 'trees', heading: headings.trees, product: '1.5', unit: 'fl-oz' }),
    percentMix({ key: 'paving', site: 'paving', heading: headings.paving, percent: '0.5' }),
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '0.6', unit: 'fl-oz', waterGal: '2' }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '1.5', unit: 'pt', waterGal: '50' }),
  ],
  limit: { applications: 2, daysApart: 30 },
  wind: { mostMph: 8, waterBufferFt: 100 },
  reentry: reentry.twelveHours,
  ppe: ppe.danger,
  precaution: precautions.eyeDamage,
  firstAid: firstAid.eyes,
  storage: storage.locked,
};
