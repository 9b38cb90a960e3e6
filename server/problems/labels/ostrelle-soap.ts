import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perGallon, percentMix } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const ostrelleSoap: PracticeLabel = {
  key: 'ostrelle-soap',
  name: 'Ostrelle Soap',
  number: '000-88',
  type: types.insecticide,
  formulation: 'soap',
  active: {
    en: 'Potassium salts of practice soap, 49 % by weight',
    es: 'Sales potásicas de jabón de práctica, 49 % en peso',
  },
  strength: quantity('49', 'percent'),
  signalWord: 'WARNING',
  sites: { en: 'Ornamental shrubs, flower beds, trees', es: 'Arbustos ornamentales, arriates, árboles' },
  pests: { en: 'Aphids, whiteflies, spider mites', es: 'Pulgones, moscas blancas, arañas rojas' },
  rates: [
    percentMix({
      key: 'ornamentals',
      site: 'ornamentals',
      heading: headings.ornamentals,
      note: { en: 'Cover both sides of the leaves.', es: 'Cubra ambos lados de las hojas.' },
      percent: '2',
    }),
    percentMix({ key: 'beds', site: 'bed', heading: headings.beds, percent: ['1', '2'] }),
    perGallon({ key: 'trees', site: 'trees', heading: headings.trees, product: '5', unit: 'tbsp' }),
  ],
  limit: { applications: 4, daysApart: 7 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.goggles,
  precaution: precautions.fish,
  firstAid: firstAid.eyes,
  storage: storage.freezing,
};
