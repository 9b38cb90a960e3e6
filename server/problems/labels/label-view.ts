import type { LabelView } from '../../../shared/contracts/label.ts';
import { formatNumber, formatQuantity, unitWord } from '../../../shared/quantity/format.ts';
import type { Quantity } from '../../../shared/quantity/quantity.ts';
import type { Locale, Text } from '../../../shared/vocabulary.ts';
import { oneFigure } from './pick.ts';
import type { LabelRate, PracticeLabel, Span } from './practice-label.ts';

const notice: Text = {
  en: 'Practice label. Not a real product.',
  es: 'Etiqueta de práctica. No es un producto real.',
};
const signalWords: Record<PracticeLabel['signalWord'], Text> = {
  CAUTION: { en: 'CAUTION', es: 'PRECAUCIÓN (CAUTION)' },
  WARNING: { en: 'WARNING', es: 'ADVERTENCIA (WARNING)' },
  DANGER: { en: 'DANGER', es: 'PELIGRO (DANGER)' },
};
const rowHeadings = {
  signalWord: { en: 'Signal word', es: 'Palabra de advertencia' },
  active: { en: 'Active ingredient', es: 'Ingrediente activo' },
  sites: { en: 'Sites', es: 'Sitios' },
  pests: { en: 'Controls', es: 'Controla' },
  limit: { en: 'Limit', es: 'Límite' },
  wind: { en: 'Wind and water', es: 'Viento y agua' },
  reentry: { en: 'Re-entry', es: 'Reentrada' },
  ppe: { en: 'Wear', es: 'Equipo de protección' },
  precaution: { en: 'Precautions', es: 'Precauciones' },
  firstAid: { en: 'First aid', es: 'Primeros auxilios' },
  storage: { en: 'Storage and disposal', es: 'Almacenamiento y desecho' },
} as const satisfies Record<string, Text>;

function measured(value: Quantity, locale: Locale): string {
  return formatQuantity(value, { locale });
}

/** What an amount is for, after "each": "acre", "gallon", "1,000 sq ft". */
function one(base: Quantity, locale: Locale): string {
  return base.value.compare(1) === 0 ? unitWord(base.unit, { locale, value: base.value }) : measured(base, locale);
}

/** "1.5 fl oz", or "1.5 to 2.5 fl oz" for a range. */
function spanText(span: Span, locale: Locale): string {
  const figure = oneFigure(span);
  if (figure) return measured(figure, locale);
  return `${formatNumber(span.least.value, { locale })} ${locale === 'es' ? 'a' : 'to'} ${measured(span.most, locale)}`;
}

function areaText(rate: Extract<LabelRate, { basis: 'area' }>, locale: Locale): string {
  const product = spanText(rate.product, locale);
  const area = one(rate.area, locale);
  if (!rate.water) return locale === 'es' ? `${product} por cada ${area}` : `${product} for each ${area}`;
  const water = spanText(rate.water, locale);
  return locale === 'es'
    ? `${product} en ${water} de agua por cada ${area}`
    : `${product} in ${water} of water for each ${area}`;
}

/** A rate line's amount in words, without heading or note: "1.5 fl oz in 1 gal of water for each 1,000 sq ft". */
export function rateText(rate: LabelRate, locale: Locale): string {
  switch (rate.basis) {
    case 'area':
      return areaText(rate, locale);
    case 'mix': {
      const [product, mix] = [spanText(rate.product, locale), one(rate.mix, locale)];
      return locale === 'es'
        ? `${product} por cada ${mix} de mezcla terminada`
        : `${product} in each ${mix} of finished spray`;
    }
    case 'percent': {
      const percent = spanText(rate.percent, locale);
      return locale === 'es'
        ? `${percent} por volumen de la mezcla terminada`
        : `${percent} by volume of the finished spray`;
    }
    case 'ready':
      return locale === 'es' ? 'Úselo tal como viene. No lo diluya' : 'Use it as it comes. Do not dilute';
  }
}

function limitText({ applications, daysApart }: PracticeLabel['limit'], locale: Locale): string {
  return locale === 'es'
    ? `No más de ${applications} aplicaciones al año, con al menos ${daysApart} días entre ellas.`
    : `No more than ${applications} applications a year, at least ${daysApart} days apart.`;
}

function windText({ mostMph, waterBufferFt }: PracticeLabel['wind'], locale: Locale): string {
  return locale === 'es'
    ? `No aplique con viento de más de ${mostMph} mi/h. Manténgase a ${waterBufferFt} pies o más de estanques, arroyos y desagües.`
    : `Do not apply in wind over ${mostMph} mph. Stay ${waterBufferFt} ft or more from ponds, streams and drains.`;
}

/** The label as the reader sees it, in one language. */
export function labelView(label: PracticeLabel, locale: Locale): LabelView {
  const row = (heading: Text, text: string) => ({ heading: heading[locale], text });
  const rateRow = (rate: LabelRate) => {
    const note = rate.note ? ` ${rate.note[locale]}` : '';
    return row(rate.heading, `${rateText(rate, locale)}.${note}`);
  };
  return {
    key: label.key,
    name: label.name,
    type: label.type[locale],
    number: locale === 'es' ? `N.º de práctica ${label.number}` : `Practice no. ${label.number}`,
    notice: notice[locale],
    rows: [
      row(rowHeadings.signalWord, signalWords[label.signalWord][locale]),
      row(rowHeadings.active, label.active[locale]),
      row(rowHeadings.sites, label.sites[locale]),
      row(rowHeadings.pests, label.pests[locale]),
      ...label.rates.map(rateRow),
      row(rowHeadings.limit, limitText(label.limit, locale)),
      row(rowHeadings.wind, windText(label.wind, locale)),
      row(rowHeadings.reentry, label.reentry[locale]),
      row(rowHeadings.ppe, label.ppe[locale]),
      row(rowHeadings.precaution, label.precaution[locale]),
      row(rowHeadings.firstAid, label.firstAid[locale]),
      row(rowHeadings.storage, label.storage[locale]),
    ],
  };
}
