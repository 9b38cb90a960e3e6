import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const quillane60wg: PracticeLabel = {
  key: 'quillane-60wg',
  name: 'Quillane 60 WG',
  number: '000-52',
  type: types.herbicide,
  formulation: 'WG',
  active: { en: 'Juvandrelac, 60 % by weight', es: 'Juvandrelac, 60 % en peso' },
  strength: quantity('60', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, parks and sports turf', es: 'Césped residencial, parques y campos deportivos' },
  pests: { en: 'Crabgrass before it comes up', es: 'Pata de gallina antes de que brote' },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '0.5',
      unit: 'oz',
      waterGal: '1',
    }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '1.25', unit: 'lb', waterGal: '40' }),
  ],
  limit: { applications: 2, daysApart: 60 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.dry,
};
