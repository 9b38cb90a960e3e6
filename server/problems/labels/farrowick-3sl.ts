import { quantity } from '../../../shared/quantity/quantity.ts';
import { firstAid, headings, ppe, precautions, reentry, storage, types } from './common-lines.ts';
import type { PracticeLabel } from './practice-label.ts';
import { perAcre, perGallon, percentMix } from './rate-lines.ts';

/** Practice label. Not a real product. */
export const farrowick3sl: PracticeLabel = {
  key: 'farrowick-3sl',
  name: 'Farrowick 3 SL',
  number: '000-85',
  type: types.herbicide,
  formulation: 'SL',
  active: { en: 'Gorlatinate, 3 lb per gallon', es: 'Gorlatinate, 3 lb por galón' },
  strength: quantity('3', 'lb/gal'),
  signalWord: 'CAUTION',
  sites: {
    en: 'Fence lines, paving, turf before reseeding',
    es: 'Líneas de cerca, pavimento, césped antes de resembrar',
  },
  pests: { en: 'All green plants that are wetted', es: 'Toda planta verde que se moje' },
  rates: [
    perGallon({
      key: 'fence-line',
      site: 'fence-line',
      heading: headings.fenceLine,
      note: { en: 'Wet the leaves but not to the point of dripping.', es: 'Moje las hojas sin que goteen.' },
      product: '2.5',
      unit: 'fl-oz',
    }),
    percentMix({ key: 'paving', site: 'paving', heading: headings.paving, percent: '2' }),
    perAcre({
      key: 'turf',
      site: 'turf',
      heading: headings.turf,
      note: { en: 'Before reseeding only.', es: 'Solo antes de resembrar.' },
      product: '2',
      unit: 'qt',
      waterGal: '30',
    }),
  ],
  limit: { applications: 3, daysApart: 30 },
  wind: { mostMph: 10, waterBufferFt: 25 },
  reentry: reentry.dry,
  ppe: ppe.basic,
  precaution: precautions.eyes,
  firstAid: firstAid.eyes,
  storage: storage.locked,
};
