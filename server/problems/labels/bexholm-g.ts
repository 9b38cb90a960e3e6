import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const bexholmG: PracticeLabel = {
  key: 'bexholm-g',
  name: 'Bexholm 0.8 G',
  number: '000-79',
  type: types.herbicide,
  formulation: 'G',
  active: { en: 'Bornathrelin, 0.8 % by weight', es: 'Bornathrelin, 0.8 % en peso' },
  strength: quantity('0.8', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, shrub beds, trees', es: 'Césped residencial, arriates de arbustos, árboles' },
  pests: {
    en: 'Annual grasses and chickweed before they come up',
    es: 'Zacates anuales y pamplina antes de que broten',
  },
  rates: [
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '5', unit: 'lb' }),
    perSqFt({
      key: 'beds',
      site: 'bed',
      heading: headings.beds,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '6',
      unit: 'lb',
    }),
  ],
  limit: { applications: 2, daysApart: 90 },
  wind: { mostMph: 15, waterBufferFt: 25 },
  reentry: reentry.watered,
  ppe: ppe.basic,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.dry,
};
