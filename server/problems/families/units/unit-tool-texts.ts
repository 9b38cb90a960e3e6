import type { MeasuresFigure } from '../../../../shared/contracts/figure.ts';
import type { Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { rateText } from '../../labels/label-view.ts';
import { labelByKey, rateByKey } from '../../labels/pick.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, type Scene, type Situation } from '../../situations.ts';

/** Units the measures in a kit are marked in. */
export type ToolUnit = 'tsp' | 'tbsp' | 'fl-oz' | 'ml';

/** What unit-tool draws. */
export interface UnitToolGiven extends Scene {
  readonly labelKey: string;
  readonly rateKey: string;
  /** The label's product for one gallon. */
  readonly product: Quantity;
  readonly gallons: Quantity;
  readonly tool: ToolUnit;
  /** First tier: the statement tells the rate as well. */
  readonly rateTold: boolean;
}

interface ToolMeasure {
  readonly tool: MeasuresFigure['tools'][number]['tool'];
  readonly name: Text;
}

/** The measure that is marked in each unit. */
export const toolMeasures: Record<ToolUnit, ToolMeasure> = {
  tsp: { tool: 'teaspoon', name: { en: 'a teaspoon (tsp) measure', es: 'una cucharadita medidora (cdta)' } },
  tbsp: { tool: 'tablespoon', name: { en: 'a tablespoon (Tbsp) measure', es: 'una cuchara medidora (cda)' } },
  'fl-oz': {
    tool: 'cup',
    name: { en: 'a cup marked in fluid ounces (fl oz)', es: 'una taza marcada en onzas líquidas (oz líq)' },
  },
  ml: {
    tool: 'cylinder',
    name: { en: 'a cylinder marked in milliliters (mL)', es: 'una probeta marcada en mililitros (mL)' },
  },
};

const tool = (g: UnitToolGiven): Text => toolMeasures[g.tool].name;
const product = (g: UnitToolGiven): string => labelByKey(g.labelKey).name;
/** " The label says 1.5 fl oz in each gallon of finished spray." on the first tier, else where to look. */
function rate(g: UnitToolGiven): Text {
  const line = rateByKey(labelByKey(g.labelKey), g.rateKey, 'mix');
  return g.rateTold
    ? {
        en: en`The label line "${line.heading}" says ${rateText(line, 'en')}.`,
        es: es`La línea «${line.heading}» de la etiqueta dice ${rateText(line, 'es')}.`,
      }
    : {
        en: en`Use the label line "${line.heading}."`,
        es: es`Use la línea «${line.heading}» de la etiqueta.`,
      };
}

/** The ways of telling it. */
export const toolSituations: readonly Situation<UnitToolGiven>[] = [
  {
    heading: { en: 'One measure in the kit', es: 'Una sola medida en el equipo' },
    statement: (g) => ({
      en: en`${g.person} mixes ${firstUse(g.gallons)} of spray with ${product(g)}. ${rate(g)} The kit holds only ${tool(g)}.`,
      es: es`${g.person} prepara ${firstUse(g.gallons)} de mezcla con ${product(g)}. ${rate(g)} En el equipo solo hay ${tool(g)}.`,
    }),
  },
  {
    heading: { en: 'The cup stayed at the shop', es: 'La taza se quedó en el taller' },
    statement: (g) => ({
      en: en`At ${g.place.the}, ${g.person} finds that the usual measure stayed at the shop. There is ${tool(g)}. The job takes ${firstUse(g.gallons)} of spray with ${product(g)}. ${rate(g)}`,
      es: es`En el trabajo ${g.place.at}, ${g.person} ve que la medida de siempre se quedó en el taller. Hay ${tool(g)}. El trabajo lleva ${firstUse(g.gallons)} de mezcla con ${product(g)}. ${rate(g)}`,
    }),
  },
  {
    heading: { en: 'Mixing for a small job', es: 'Mezcla para un trabajo pequeño' },
    statement: (g) => ({
      en: en`${capital(g.season)} a small job ${g.place.at} takes ${firstUse(g.gallons)} of spray with ${product(g)}. ${rate(g)} ${g.person} uses ${tool(g)}.`,
      es: es`${capital(g.season)} un trabajo pequeño ${g.place.at} lleva ${firstUse(g.gallons)} de mezcla con ${product(g)}. ${rate(g)} ${g.person} mide con ${tool(g)}.`,
    }),
  },
  {
    heading: { en: 'A new measure on the shelf', es: 'Una medida nueva en el estante' },
    statement: (g) => ({
      en: en`The mixing shelf has a new measure, ${tool(g)}. ${g.person} uses it for ${firstUse(g.gallons)} of spray with ${product(g)}. ${rate(g)}`,
      es: es`En el estante de mezclas hay una medida nueva: ${tool(g)}. ${g.person} la usa para ${firstUse(g.gallons)} de mezcla con ${product(g)}. ${rate(g)}`,
    }),
  },
];
