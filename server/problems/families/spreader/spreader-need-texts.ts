import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';
import { productName } from '../spot/mix-lines.ts';
import { granuleSite, type GranuleLine } from './granule-lines.ts';

/** What spreader-need draws. */
export interface SpreaderNeedGiven extends Scene {
  readonly line: GranuleLine;
  readonly bag: Quantity;
  readonly known:
    | { readonly as: 'area'; readonly area: Quantity }
    | { readonly as: 'sides'; readonly length: Quantity; readonly width: Quantity };
  /** Third tier: whole bags are asked for, too. */
  readonly bagsAsked: boolean;
}

function facts(g: SpreaderNeedGiven): Text {
  const { known, line, bag } = g;
  if (known.as === 'area') {
    return both(
      en`It covers ${firstUse(known.area)}. The label says ${firstUse(line.product)} for each 1,000 sq ft. A bag holds ${bag}.`,
      es`Cubre ${firstUse(known.area)}. La etiqueta dice ${firstUse(line.product)} por cada 1,000 pies². Una bolsa trae ${bag}.`,
    );
  }
  return both(
    en`It is ${firstUse(known.length)} by ${known.width}. A bag holds ${firstUse(bag)}. Use the rate on the practice label.`,
    es`Mide ${firstUse(known.length)} por ${known.width}. Una bolsa trae ${firstUse(bag)}. Use la dosis de la etiqueta de práctica.`,
  );
}

const name = (g: SpreaderNeedGiven) => productName(g.line);
const site = (g: SpreaderNeedGiven) => granuleSite(g.line);

/** The ways of telling it. */
export const spreaderNeedSituations: readonly Situation<SpreaderNeedGiven>[] = [
  {
    heading: both('Granules for one site', 'Gránulos para un sitio'),
    statement: (g) =>
      both(
        en`${g.person} spreads ${name(g)} on a ${site(g)} ${g.place.at}. ${facts(g)}`,
        es`${g.person} esparce ${name(g)} en un ${site(g)} ${g.place.at}. ${facts(g)}`,
      ),
  },
  {
    heading: both('Loading the truck', 'Carga de la camioneta'),
    statement: (g) =>
      both(
        en`${g.person} loads granules for ${g.place.the}, where a ${site(g)} gets ${name(g)} once. ${facts(g)}`,
        es`${g.person} carga gránulos para ${g.place.the}, donde un ${site(g)} recibe ${name(g)} una vez. ${facts(g)}`,
      ),
  },
  {
    heading: both('A treatment on the calendar', 'Un tratamiento en el calendario'),
    statement: (g) =>
      both(
        en`${capital(g.season)} the ${site(g)} ${g.place.at} is due for ${name(g)}. ${facts(g)}`,
        es`${capital(g.season)} le toca ${name(g)} al ${site(g)} ${g.place.at}. ${facts(g)}`,
      ),
  },
  {
    heading: both('How much goes in the hopper', 'Cuánto va en la tolva'),
    statement: (g) =>
      both(
        en`The spreader is set and checked. Next is a ${site(g)} ${g.place.at}, to be treated with ${name(g)}. ${facts(g)}`,
        es`El esparcidor está ajustado y revisado. Sigue un ${site(g)} ${g.place.at}, que se trata con ${name(g)}. ${facts(g)}`,
      ),
  },
];
