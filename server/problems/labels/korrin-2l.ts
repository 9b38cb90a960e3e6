import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const korrin2l: PracticeLabel = {
  key: 'korrin-2l',
  name: 'Korrin 2 L',
  number: '000-14',
  type: types.herbicide,
  formulation: 'SL',
  active: { en: 'Orvitessal, 2 lb per gallon', es: 'Orvitessal, 2 lb por galón' },
  strength: quantity('2', 'lb/gal'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, parks and sports turf', es: 'Césped residencial, parques y campos deportivos' },
  pests: {
    en: 'Broadleaf weeds: plantain, clover, dandelion',
    es: 'Malezas de hoja ancha: llantén, trébol, diente de león',
  },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Do not mow for a day before or after.', es: 'No corte el césped un día antes ni después.' },
      product: '1.5',
      unit: 'fl-oz',
      waterGal: '1',
    }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '2', unit: 'qt', waterGal: '40' }),
    perGallon({ key: 'spot', site: 'lawn', heading: headings.spot, product: '1', unit: 'fl-oz' }),
  ],
  limit: { applications: 2, daysApart: 42 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.eyes,
  firstAid: firstAid.eyes,
  storage: storage.locked,
};
