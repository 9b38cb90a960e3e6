import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const murrave2g: PracticeLabel = {
  key: 'murrave-2g',
  name: 'Murrave 2 G',
  number: '000-69',
  type: types.fungicide,
  formulation: 'G',
  active: { en: 'Yrmatholane, 2 % by weight', es: 'Yrmatholane, 2 % en peso' },
  strength: quantity('2', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, sports turf', es: 'Césped residencial, campos deportivos' },
  pests: { en: 'Brown patch, summer patch', es: 'Mancha café, mancha de verano' },
  rates: [
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '3.5', unit: 'lb' }),
    perSqFt({ key: 'turf', site: 'turf', heading: headings.turf, product: ['3', '4'], unit: 'lb' }),
  ],
  limit: { applications: 4, daysApart: 28 },
  wind: { mostMph: 15, waterBufferFt: 25 },
  reentry: reentry.dust,
  ppe: ppe.dusty,
  precaution: precautions.fish,
  firstAid: firstAid.inhaled,
  storage: storage.dry,
};
