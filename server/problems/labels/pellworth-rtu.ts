import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { readyToUse } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const pellworthRtu: PracticeLabel = {
  key: 'pellworth-rtu',
  name: 'Pellworth RTU',
  number: '000-99',
  type: types.insecticide,
  formulation: 'RTU',
  active: { en: 'Tirvosanil, 0.02 % by weight', es: 'Tirvosanil, 0.02 % en peso' },
  strength: quantity('0.02', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Building perimeters, ornamental shrubs', es: 'Perímetros de edificios, arbustos ornamentales' },
  pests: { en: 'Ants, earwigs, aphids', es: 'Hormigas, tijeretas, pulgones' },
  rates: [
    readyToUse({ key: 'perimeter', site: 'perimeter', heading: headings.perimeter }),
    readyToUse({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
    }),
  ],
  limit: { applications: 4, daysApart: 7 },
  wind: { mostMph: 10, waterBufferFt: 10 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.bees,
  firstAid: firstAid.swallowed,
  storage: storage.readyToUse,
};
