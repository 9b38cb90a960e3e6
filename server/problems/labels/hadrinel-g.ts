import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const hadrinelG: PracticeLabel = {
  key: 'hadrinel-g',
  name: 'Hadrinel 0.5 G',
  number: '000-58',
  type: types.insecticide,
  formulation: 'G',
  active: { en: 'Dorvexanil, 0.5 % by weight', es: 'Dorvexanil, 0.5 % en peso' },
  strength: quantity('0.5', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, parks and sports turf, beds', es: 'Césped residencial, parques y campos deportivos, arriates' },
  pests: { en: 'White grubs, mole crickets', es: 'Gallina ciega, grillos topo' },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '3',
      unit: 'lb',
    }),
    perSqFt({ key: 'beds', site: 'bed', heading: headings.beds, product: '2', unit: 'lb' }),
    perSqFt({
      key: 'turf',
      site: 'turf',
      heading: headings.turf,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '2.5',
      unit: 'lb',
    }),
  ],
  limit: { applications: 2, daysApart: 60 },
  wind: { mostMph: 15, waterBufferFt: 25 },
  reentry: reentry.watered,
  ppe: ppe.basic,
  precaution: precautions.bees,
  firstAid: firstAid.swallowed,
  storage: storage.dry,
};
