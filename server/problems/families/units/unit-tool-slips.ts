import { convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Slip } from '../../family.ts';
import { en, es, unitFirst } from '../../say.ts';
import { fact, perUnit } from './unit-steps.ts';
import type { UnitToolGiven } from './unit-tool-texts.ts';

type Given = UnitToolGiven;

const needed = (g: Given) => scale(g.product, g.gallons.value);
/** What is measured when the label's unit or the tool's is taken for another. */
function labelAs(g: Given, as: UnitKey): Quantity {
  return convert(quantity(needed(g).value, as), g.tool);
}
function toolAs(g: Given, as: UnitKey): Quantity {
  return quantity(convert(needed(g), as).value, g.tool);
}
const one = (unit: UnitKey) => quantity(1, unit);

export const unitToolSlips: readonly Slip<Given>[] = [
  {
    key: 'used-label-number',
    part: 'a',
    answer: (g) => quantity(needed(g).value, g.tool),
    message: (g) => ({
      en: en`You used the label's number with another unit. The label says ${g.product} for a gallon; your measure is marked in ${unitFirst(g.tool)}. ${fact(g.product.unit, g.tool)}.`,
      es: es`Usted usó el número de la etiqueta con otra unidad. La etiqueta dice ${g.product} por galón; su medida está marcada en ${unitFirst(g.tool)}. ${fact(g.product.unit, g.tool)}.`,
    }),
  },
  {
    key: 'inverted-factor',
    part: 'a',
    answer: (g) => quantity(needed(g).value.div(perUnit(g.product.unit, g.tool)), g.tool),
    message: (g) => {
      const grows = perUnit(g.product.unit, g.tool).compare(1) > 0;
      return grows
        ? {
            en: en`You divided where you should multiply. ${fact(g.product.unit, g.tool)}, so the number has to get larger.`,
            es: es`Usted dividió donde debía multiplicar. ${fact(g.product.unit, g.tool)}, así que el número tiene que crecer.`,
          }
        : {
            en: en`You multiplied where you should divide. ${fact(g.product.unit, g.tool)}, so the number has to get smaller.`,
            es: es`Usted multiplicó donde debía dividir. ${fact(g.product.unit, g.tool)}, así que el número tiene que bajar.`,
          };
    },
  },
  {
    key: 'one-gallon-only',
    part: 'a',
    answer: (g) => convert(g.product, g.tool),
    message: (g) => ({
      en: en`That is the product for one gallon. You mix ${g.gallons}.`,
      es: es`Ese es el producto para un galón. Usted mezcla ${g.gallons}.`,
    }),
  },
  {
    key: 'tsp-for-tbsp',
    part: 'a',
    answer: (g) => {
      if (g.product.unit === 'tbsp') return labelAs(g, 'tsp');
      if (g.tool === 'tbsp') return toolAs(g, 'tsp');
      return g.tool === 'tsp' ? toolAs(g, 'tbsp') : null;
    },
    message: () => ({
      en: 'You took one spoon for the other. A tablespoon (Tbsp) holds 3 teaspoons (tsp); 2 tablespoons are a fluid ounce.',
      es: 'Usted confundió las cucharas. Una cucharada (cda) tiene 3 cucharaditas (cdta); 2 cucharadas son una onza líquida.',
    }),
  },
  {
    key: 'wrong-neighbour',
    part: 'a',
    answer: (g) => (g.tool === 'ml' ? labelAs(g, g.product.unit === 'tbsp' ? 'fl-oz' : 'tbsp') : null),
    message: (g) => {
      const other = g.product.unit === 'tbsp' ? one('fl-oz') : one('tbsp');
      return {
        en: en`You used the milliliters of ${other}. The label says ${g.product}, and ${fact(g.product.unit, g.tool)}.`,
        es: es`Usted usó los mililitros de ${other}. La etiqueta dice ${g.product}, y ${fact(g.product.unit, g.tool)}.`,
      };
    },
  },
];
