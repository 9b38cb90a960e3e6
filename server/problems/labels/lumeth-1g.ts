import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const lumeth1g: PracticeLabel = {
  key: 'lumeth-1g',
  name: 'Lumeth 1 G',
  number: '000-63',
  type: types.herbicide,
  formulation: 'G',
  active: { en: 'Fennoquilate, 1 % by weight', es: 'Fennoquilate, 1 % en peso' },
  strength: quantity('1', 'percent'),
  signalWord: 'CAUTION',
  sites: {
    en: 'Lawns, parks and sports turf, ornamental beds',
    es: 'Césped residencial, parques y campos deportivos, arriates ornamentales',
  },
  pests: {
    en: 'Crabgrass and annual bluegrass before they come up',
    es: 'Pata de gallina y poa anual antes de que broten',
  },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '4',
      unit: 'lb',
    }),
    perSqFt({
      key: 'beds',
      site: 'bed',
      heading: headings.beds,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '4.5',
      unit: 'lb',
    }),
    perSqFt({ key: 'turf', site: 'turf', heading: headings.turf, product: ['3.5', '5'], unit: 'lb' }),
  ],
  limit: { applications: 2, daysApart: 90 },
  wind: { mostMph: 15, waterBufferFt: 25 },
  reentry: reentry.watered,
  ppe: ppe.basic,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.dry,
};
