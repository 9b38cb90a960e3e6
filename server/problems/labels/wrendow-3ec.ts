import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const wrendow3ec: PracticeLabel = {
  key: 'wrendow-3ec',
  name: 'Wrendow 3 EC',
  number: '000-98',
  type: types.herbicide,
  formulation: 'EC',
  active: { en: 'Nostrivalone, 3 lb per gallon', es: 'Nostrivalone, 3 lb por galón' },
  strength: quantity('3', 'lb/gal'),
  signalWord: 'WARNING',
  sites: {
    en: 'Lawns, parks and sports turf, ornamental beds',
    es: 'Césped residencial, parques y campos deportivos, arriates ornamentales',
  },
  pests: {
    en: 'Crabgrass and goosegrass before they come up',
    es: 'Pata de gallina y zacate de ganso antes de que broten',
  },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '1.2',
      unit: 'fl-oz',
      waterGal: '1.5',
    }),
    perSqFt({
      key: 'beds',
      site: 'bed',
      heading: headings.beds,
      product: '0.9',
      unit: 'fl-oz',
      waterGal: '1',
      sqFt: '600',
    }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '3.5', unit: 'pt', waterGal: '50' }),
  ],
  limit: { applications: 2, daysApart: 60 },
  wind: { mostMph: 10, waterBufferFt: 50 },
  reentry: reentry.dry,
  ppe: ppe.goggles,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.locked,
};
