import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perSqFt } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const sandrilleG: PracticeLabel = {
  key: 'sandrille-g',
  name: 'Sandrille 1.5 G',
  number: '000-74',
  type: types.insecticide,
  formulation: 'G',
  active: { en: 'Luskavidane, 1.5 % by weight', es: 'Luskavidane, 1.5 % en peso' },
  strength: quantity('1.5', 'percent'),
  signalWord: 'WARNING',
  sites: { en: 'Lawns, building perimeters', es: 'Césped residencial, perímetros de edificios' },
  pests: { en: 'Ants, ticks, billbugs', es: 'Hormigas, garrapatas, picudos del césped' },
  rates: [
    perSqFt({
      key: 'lawns',
      site: 'lawn',
      heading: headings.lawns,
      note: { en: 'Water in the same day.', es: 'Riegue el mismo día.' },
      product: '2',
      unit: 'lb',
    }),
    perSqFt({ key: 'perimeter', site: 'perimeter', heading: headings.perimeter, product: '3', unit: 'lb' }),
  ],
  limit: { applications: 3, daysApart: 30 },
  wind: { mostMph: 15, waterBufferFt: 50 },
  reentry: reentry.watered,
  ppe: ppe.goggles,
  precaution: precautions.bees,
  firstAid: firstAid.swallowed,
  storage: storage.dry,
};
