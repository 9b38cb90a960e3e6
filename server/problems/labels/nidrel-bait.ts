import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const nidrelBait: PracticeLabel = {
  key: 'nidrel-bait',
  name: 'Nidrel Bait',
  number: '000-81',
  type: types.insecticide,
  formulation: 'bait',
  active: { en: 'Wexamidole, 0.1 % by weight', es: 'Wexamidole, 0.1 % en peso' },
  strength: quantity('0.1', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Lawns, parks and sports turf', es: 'Césped residencial, parques y campos deportivos' },
  pests: { en: 'Fire ants', es: 'Hormigas de fuego' },
  rates: [
    perAcre({
      key: 'turf',
      site: 'turf',
      heading: headings.turf,
      note: {
        en: 'Spread dry, when ants are active. Do not water in.',
        es: 'Espárzalo en seco, cuando las hormigas estén activas. No lo riegue.',
      },
      product: '1.5',
      unit: 'lb',
    }),
  ],
  limit: { applications: 2, daysApart: 90 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dust,
  ppe: ppe.basic,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.dry,
};
