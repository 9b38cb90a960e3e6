import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, perSqFt, percentMix } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const dellamar4ec: PracticeLabel = {
  key: 'dellamar-4ec',
  name: 'Dellamar 4 EC',
  number: '000-21',
  type: types.insecticide,
  formulation: 'EC',
  active: { en: 'Pelvunarone, 4 lb per gallon', es: 'Pelvunarone, 4 lb por galón' },
  strength: quantity('4', 'lb/gal'),
  signalWord: 'WARNING',
  sites: {
    en: 'Lawns, sports turf, ornamental shrubs, trees',
    es: 'Césped residencial, campos deportivos, arbustos ornamentales, árboles',
  },
  pests: { en: 'Chinch bugs, webworms, aphids', es: 'Chinches del césped, gusanos tejedores, pulgones' },
  rates: [
    perSqFt({ key: 'lawns', site: 'lawn', heading: headings.lawns, product: '0.75', unit: 'fl-oz', waterGal: '2' }),
    perAcre({ key: 'turf', site: 'turf', heading: headings.turf, product: '1', unit: 'qt', waterGal: '80' }),
    perGallon({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
      product: '1',
      unit: 'tbsp',
    }),
    percentMix({
      key: 'trees',
      site: 'trees',
      heading: headings.trees,
      note: { en: 'Trunk and lower branches.', es: 'Tronco y ramas bajas.' },
      percent: '0.5',
    }),
  ],
  limit: { applications: 3, daysApart: 21 },
  wind: { mostMph: 10, waterBufferFt: 50 },
  reentry: reentry.fourHours,
  ppe: ppe.goggles,
  precaution: precautions.bees,
  firstAid: firstAid.swallowed,
  storage: storage.locked,
};
