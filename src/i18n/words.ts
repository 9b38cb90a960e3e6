import { i18n } from './i18n.ts';

/** The product's closed word lists, as people read them. */
export const topicMessages = i18n('topics', {
  label: 'The label first',
  pests: 'Pests and the right moment',
  equipment: 'Choosing equipment',
  nozzle: 'Nozzles and droplets',
  area: 'Measuring the site',
  units: 'Measuring tools and units',
  rate: 'Area and rate',
  spot: 'Spot treatment',
  strength: 'Concentrations',
  handheld: 'Hand and backpack sprayers',
  boom: 'Booms and ride-ons',
  spreader: 'Spreaders and baits',
  tank: 'Tank loads and the mixing plan',
  mixing: 'Mixing safely',
  cleanup: 'Cleaning, storage, disposal',
  ppe: 'People and protection',
  drift: 'Drift, water, wildlife',
  law: 'Law and records',
});

export const levelMessages = i18n('levels', {
  'not-started': 'not started',
  filling: 'filling',
  'at-the-mark': 'at the mark',
  'top-up': 'top up',
});
