import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';
import { both } from '../both.ts';
import { productName, type MixLine } from './mix-lines.ts';

/** What spot-water-test draws. */
export interface WaterTestGiven extends Scene {
  readonly line: MixLine;
  /** First tier: the statement tells the rate as well. */
  readonly rateTold: boolean;
  /** Plants sprayed with plain water, and the water they took. */
  readonly tried: number;
  readonly used: Quantity;
  /** Plants in each row to be treated. */
  readonly rows: readonly number[];
}

/** What the plants are called, in the plural. */
export function plantsOf(g: WaterTestGiven): Text {
  if (g.line.site === 'trees') return both('young trees', 'árboles jóvenes');
  return g.line.site === 'bed' ? both('rose bushes', 'rosales') : both('shrubs', 'arbustos');
}
/** "24 shrubs", or "a row of 18 and a row of 24 shrubs". */
function planted(g: WaterTestGiven): Text {
  const [first, second] = g.rows;
  return second === undefined
    ? both(en`${first ?? 0} ${plantsOf(g)}`, es`${first ?? 0} ${plantsOf(g)}`)
    : both(
        en`a row of ${first ?? 0} and a row of ${second} ${plantsOf(g)}`,
        es`una hilera de ${first ?? 0} y otra de ${second} ${plantsOf(g)}`,
      );
}
function rate(g: WaterTestGiven): Text {
  return g.rateTold
    ? both(
        en`The label of ${productName(g.line)} says ${firstUse(g.line.product)} in each gallon.`,
        es`La etiqueta de ${productName(g.line)} dice ${firstUse(g.line.product)} por cada galón.`,
      )
    : both(
        en`The rate of ${productName(g.line)} is on the practice label.`,
        es`La dosis de ${productName(g.line)} está en la etiqueta de práctica.`,
      );
}

/** The ways of telling it. */
export const waterTestSituations: readonly Situation<WaterTestGiven>[] = [
  {
    heading: both('A trial with plain water', 'Una prueba con agua sola'),
    statement: (g) =>
      both(
        en`${g.person} has ${planted(g)} to spray ${g.place.at}. In a trial, wetting ${g.tried} of them takes ${firstUse(g.used)} of plain water. ${rate(g)}`,
        es`${g.person} tiene que rociar ${planted(g)} ${g.place.at}. En una prueba, mojar ${g.tried} lleva ${firstUse(g.used)} de agua sola. ${rate(g)}`,
      ),
  },
  {
    heading: both('How much for all of them', 'Cuánto para todos'),
    statement: (g) =>
      both(
        en`${capital(g.season)}, before mixing anything, ${g.person} sprays plain water on ${g.tried} ${plantsOf(g)} ${g.place.at} and uses ${firstUse(g.used)}. The whole job is ${planted(g)}. ${rate(g)}`,
        es`${capital(g.season)}, antes de preparar la mezcla, ${g.person} rocía agua sola en ${g.tried} ${plantsOf(g)} ${g.place.at} y usa ${firstUse(g.used)}. Todo el trabajo es ${planted(g)}. ${rate(g)}`,
      ),
  },
  {
    heading: both('First water, then the mix', 'Primero agua, después la mezcla'),
    statement: (g) =>
      both(
        en`The crew leader wants just enough mix for ${planted(g)} ${g.place.at}. A water trial on ${g.tried} of them uses ${firstUse(g.used)}. ${rate(g)}`,
        es`El jefe de cuadrilla quiere la mezcla justa para ${planted(g)} ${g.place.at}. Una prueba con agua en ${g.tried} usa ${firstUse(g.used)}. ${rate(g)}`,
      ),
  },
  {
    heading: both('New plants, no record', 'Plantas nuevas, sin registro'),
    statement: (g) =>
      both(
        en`No record says how much spray the plants ${g.place.at} take. ${g.person} tries it: ${g.tried} ${plantsOf(g)} take ${firstUse(g.used)} of water. The job is ${planted(g)}. ${rate(g)}`,
        es`Ningún registro dice cuánta mezcla llevan las plantas ${g.place.at}. ${g.person} hace la prueba: ${g.tried} ${plantsOf(g)} llevan ${firstUse(g.used)} de agua. El trabajo es ${planted(g)}. ${rate(g)}`,
      ),
  },
];
