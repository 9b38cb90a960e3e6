import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const jorvanel2sl: PracticeLabel = {
  key: 'jorvanel-2sl',
  name: 'Jorvanel 2.4 SL',
  number: '000-97',
  type: types.herbicide,
  formulation: 'SL',
  active: { en: 'Ombraxolate, 2.4 lb per gallon', es: 'Ombraxolate, 2.4 lb por galón' },
  strength: quantity('2.4', 'lb/gal'),
  signalWord: 'DANGER',
  sites: { en: 'Lawns, parks and sports turf', es: 'Césped residencial, parques y campos deportivos' },
  pests: {
    en: 'Broadleaf weeds: ground ivy, chickweed, oxalis',
    es: 'Malezas de hoja ancha: hiedra terrestre, pamplina, trébol agrio',
  },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Do not mow for a day before or after.', es: 'No corte el césped un día antes ni después.' },
      product: '0.6',
      unit: 'fl-oz',
      waterGal: '0.5',
      sqFt: '500',
    }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '3', unit: 'pt', waterGal: '40' }),
    perGallon({ key: 'spot', site: 'lawn', heading: headings.spot, product: '1.5', unit: 'tbsp' }),
  ],
  limit: { applications: 2, daysApart: 30 },
  wind: { mostMph: 10, waterBufferFt: 50 },
  reentry: reentry.dry,
  ppe: ppe.danger,
  precaution: precautions.eyeDamage,
  firstAid: firstAid.eyes,
  storage: storage.locked,
};
