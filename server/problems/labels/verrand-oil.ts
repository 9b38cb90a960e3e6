import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perGallon, percentMix } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const verrandOil: PracticeLabel = {
  key: 'verrand-oil',
  name: 'Verrand Oil',
  number: '000-90',
  type: types.insecticide,
  formulation: 'oil',
  active: { en: 'Practice-grade plant oil, 98 % by weight', es: 'Aceite vegetal de práctica, 98 % en peso' },
  strength: quantity('98', 'percent'),
  signalWord: 'CAUTION',
  sites: { en: 'Ornamental shrubs, trees, flower beds', es: 'Arbustos ornamentales, árboles, arriates' },
  pests: { en: 'Scale insects, mites and their eggs', es: 'Escamas, ácaros y sus huevos' },
  rates: [
    percentMix({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'In leaf, below 90 °F.', es: 'Con hojas, a menos de 90 °F.' },
      percent: '1',
    }),
    percentMix({
      key: 'trees',
      site: 'trees',
      heading: headings.trees,
      note: { en: 'Dormant trees only.', es: 'Solo árboles en reposo.' },
      percent: '3',
    }),
    perGallon({ key: 'beds', site: 'bed', heading: headings.beds, product: '2.5', unit: 'tbsp' }),
  ],
  limit: { applications: 4, daysApart: 14 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.skin,
  firstAid: firstAid.skin,
  storage: storage.freezing,
};
