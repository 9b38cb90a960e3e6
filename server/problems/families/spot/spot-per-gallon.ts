import { productForMix } from '../../../../shared/formulas/product-for-mix.ts';
import { add, convert, quantity, scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { PartKey, Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es, unitFirst } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, over, plus, struck, times, type WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { measuredOut } from '../rate/measure-out.ts';
import { slipsAt } from '../slips-at.ts';
import { toStep } from '../units/unit-steps.ts';
import { labelUse, lineHeading, mixLines, stepOf } from './mix-lines.ts';
import { perGallonSituations, type PerGallonGiven } from './spot-per-gallon-texts.ts';

type Given = PerGallonGiven;

const gallon = quantity(1, 'gal');
const gal = (value: number | string) => quantity(value, 'gal');

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, perGallonSituations.length);
  const line = rng.pick(mixLines);
  if (tier === 1) return { ...scene, line, job: { as: 'mix', mix: gal(rng.int(2, 4)) } };
  const tank = gal(rng.pick(['2', '3', '4']));
  const whole = tank.value.valueOf();
  if (tier === 2) {
    const mix = gal(rng.int(1, whole - 1) + 0.5);
    const g: Given = { ...scene, line, job: { as: 'part-tank', tank, mix } };
    // Quarters of a tablespoon are more than a crew's spoons show.
    return needed(g, {}).value.div(stepOf(asked(g))).d === 1n ? g : null;
  }
  const lastFill = gal(rng.int(1, 2 * whole - 1) / 2);
  return { ...scene, line, job: { as: 'fills', tank, fullFills: rng.int(2, 5), lastFill } };
}

const total = ({ job }: Given): Quantity =>
  job.as === 'fills' ? add(scale(job.tank, job.fullFills), job.lastFill) : job.mix;
const productPart = ({ job }: Given): PartKey => (job.as === 'fills' ? 'b' : 'a');
/** Several fills are measured with a cup, one with the label's own measure. */
const asked = (g: Given) => (g.job.as === 'fills' ? ('fl-oz' as const) : g.line.product.unit);
const mixUsed = (g: Given, earlier: Earlier) => (g.job.as === 'fills' && earlier.a ? earlier.a : total(g));
function productFor(g: Given, mix: Quantity): Quantity {
  return convert(productForMix({ amount: g.line.product, perMix: gallon, mix }), asked(g));
}
const needed = (g: Given, earlier: Earlier) => productFor(g, mixUsed(g, earlier));

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const unit = asked(g);
  const step = stepOf(unit);
  const product: NumberPart = {
    kind: 'number',
    key: productPart(g),
    topic: 'spot',
    ask: both(
      en`How much product, in ${unitFirst(unit)}, to the nearest ${quantity(step, unit)}?`,
      es`¿Cuánto producto, en ${unitFirst(unit)}, redondeado a ${quantity(step, unit)}?`,
    ),
    answer: needed(g, earlier),
    step,
    units: unit === 'tbsp' ? ['tbsp', 'tsp', 'fl-oz', 'ml'] : ['fl-oz', 'tbsp', 'cup', 'qt', 'ml'],
  };
  if (g.job.as !== 'fills') return [product];
  const mix: NumberPart = {
    kind: 'number',
    key: 'a',
    topic: 'tank',
    ask: both(
      'How much mix is that in all, in gallons (gal), to the nearest 0.5 gal?',
      '¿Cuánta mezcla es en total, en galones (gal), redondeada a 0.5 gal?',
    ),
    answer: total(g),
    step: rational('0.5'),
    units: ['gal', 'qt', 'l'],
  };
  return [mix, product];
}

const fillSlips: readonly Slip<Given>[] = [
  {
    key: 'forgot-last-fill',
    part: 'a',
    answer: ({ job }) => (job.as === 'fills' ? scale(job.tank, job.fullFills) : null),
    message: ({ job }) => ({
      en: en`You left out the last fill. The last ${job.as === 'fills' ? job.lastFill : ''} goes on top of the full tanks.`,
      es: es`Le faltó el último llenado. Los últimos ${job.as === 'fills' ? job.lastFill : ''} se suman a los tanques llenos.`,
    }),
  },
  {
    key: 'full-last-fill',
    part: 'a',
    answer: ({ job }) => (job.as === 'fills' ? scale(job.tank, job.fullFills + 1) : null),
    message: ({ job }) => ({
      en: en`You filled the last tank to the top. The last one takes only ${job.as === 'fills' ? job.lastFill : ''}.`,
      es: es`Usted llenó por completo el último tanque. El último solo lleva ${job.as === 'fills' ? job.lastFill : ''}.`,
    }),
  },
  {
    key: 'one-of-each',
    part: 'a',
    answer: ({ job }) => (job.as === 'fills' ? add(job.tank, job.lastFill) : null),
    message: ({ job }) => ({
      en: en`You counted one full tank. There are ${job.as === 'fills' ? job.fullFills : ''} of them.`,
      es: es`Usted contó un solo tanque lleno. Son ${job.as === 'fills' ? job.fullFills : ''}.`,
    }),
  },
];

const productSlips = slipsAt<Given>(['a', 'b'], productPart, [
  {
    key: 'one-gallon-only',
    answer: (g) => convert(g.line.product, asked(g)),
    message: (g, earlier) => ({
      en: en`That is the product for one gallon. You mix ${mixUsed(g, earlier)}.`,
      es: es`Ese es el producto para un galón. Usted prepara ${mixUsed(g, earlier)}.`,
    }),
  },
  {
    key: 'used-whole-tank',
    answer: (g) => (g.job.as === 'mix' ? null : productFor(g, g.job.tank)),
    message: ({ job }) =>
      job.as === 'fills'
        ? {
            en: en`That is the product for one full tank. Take the mix of all the fills, not of one tank of ${job.tank}.`,
            es: es`Ese es el producto para un tanque lleno. Tome la mezcla de todos los llenados, no la de un tanque de ${job.tank}.`,
          }
        : {
            en: en`You mixed for the whole tank. The job takes only ${job.mix}, and what is left over has nowhere to go.`,
            es: es`Usted calculó para el tanque lleno. El trabajo solo lleva ${job.mix}, y lo que sobra no tiene dónde ir.`,
          },
  },
  {
    key: 'divided-for-multiplied',
    answer: (g, earlier) => scale(convert(g.line.product, asked(g)), mixUsed(g, earlier).value.inverse()),
    message: (g, earlier) => ({
      en: en`You divided by the gallons. Each of the ${mixUsed(g, earlier)} needs ${g.line.product}, so multiply.`,
      es: es`Usted dividió entre los galones. Cada uno de los ${mixUsed(g, earlier)} lleva ${g.line.product}, así que multiplique.`,
    }),
  },
  {
    key: 'tsp-for-tbsp',
    answer: (g, earlier) => (g.line.product.unit === 'tbsp' ? scale(needed(g, earlier), rational(1, 3)) : null),
    message: (g) => ({
      en: en`You used teaspoons for tablespoons. The label says ${g.line.product}, and a tablespoon (Tbsp) holds 3 teaspoons (tsp).`,
      es: es`Usted usó cucharaditas por cucharadas. La etiqueta dice ${g.line.product}, y una cucharada (cda) tiene 3 cucharaditas (cdta).`,
    }),
  },
  {
    key: 'used-label-number',
    answer: (g, earlier) =>
      g.line.product.unit === asked(g) ? null : quantity(g.line.product.value.mul(mixUsed(g, earlier).value), asked(g)),
    message: (g) => ({
      en: en`Your number is in tablespoons. The label says ${g.line.product} for a gallon; the answer is asked in fluid ounces, and 2 Tbsp are 1 fl oz.`,
      es: es`Su número está en cucharadas. La etiqueta dice ${g.line.product} por galón; se piden onzas líquidas, y 2 cdas son 1 oz líq.`,
    }),
  },
  {
    key: 'added-for-multiplied',
    answer: (g, earlier) => quantity(g.line.product.value.add(mixUsed(g, earlier).value), asked(g)),
    message: (g, earlier) => ({
      en: en`You added the rate and the gallons. Each of the ${mixUsed(g, earlier)} needs ${g.line.product}, so multiply.`,
      es: es`Usted sumó la dosis y los galones. Cada uno de los ${mixUsed(g, earlier)} lleva ${g.line.product}, así que multiplique.`,
    }),
  },
]);

function measuring(g: Given): Text {
  return asked(g) === 'tbsp'
    ? both(
        'Use level spoons from a set that is kept for pesticides.',
        'Use cucharadas al ras, de un juego reservado para plaguicidas.',
      )
    : measuredOut(needed(g, {}));
}

function working(g: Given): readonly WorkingLine[] {
  const { job, line } = g;
  const perGallon = over(given(line.product), struck(gallon));
  const changed = asked(g) !== line.product.unit;
  const factor = over(given(quantity(1, 'fl-oz')), struck(quantity(2, 'tbsp')));
  const product: WorkingLine = {
    name: both('product', 'producto'),
    expression: changed
      ? times(struck(total(g)), over(struck(line.product), struck(gallon)), factor)
      : times(struck(total(g)), perGallon),
    result: toStep(needed(g, {}), stepOf(asked(g)), 1),
    answers: true,
    reason: measuring(g),
  };
  if (job.as !== 'fills') return [product];
  const mix: WorkingLine = {
    name: both('mix in all', 'mezcla en total'),
    expression: plus(times(given(quantity(job.fullFills, 'count')), given(job.tank)), given(job.lastFill)),
    result: given(total(g), { places: 1 }),
    answers: true,
    reason: both('The full tanks and the last one.', 'Los tanques llenos y el último.'),
  };
  return [mix, product];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { job, line } = g;
  const unitNote: Text =
    asked(g) === line.product.unit ? both('', '') : both(' 2 Tbsp are 1 fl oz.', ' 2 cdas son 1 oz líq.');
  return [
    both(
      en`You are asked for the product. The label line "${lineHeading(line)}" gives it for one gallon of finished spray.`,
      es`Se pide el producto. La línea «${lineHeading(line)}» de la etiqueta lo da por un galón de mezcla terminada.`,
    ),
    both(
      en`Product = product for one gallon × gallons of mix.${unitNote}`,
      es`Producto = producto por galón × galones de mezcla.${unitNote}`,
    ),
    job.as === 'fills'
      ? both(
          en`Begin with the mix: ${job.fullFills} × ${job.tank}, and then the last ${job.lastFill}.`,
          es`Empiece con la mezcla: ${job.fullFills} × ${job.tank} y luego los últimos ${job.lastFill}.`,
        )
      : both(en`Product = ${line.product} × ${job.mix.value}.`, es`Producto = ${line.product} × ${job.mix.value}.`),
  ];
}

export const spotPerGallonFamily = defineFamily<Given>({
  key: 'spot-per-gallon',
  version: 1,
  topic: 'spot',
  tiers: [1, 2, 3],
  title: both('Product from a rate per gallon', 'Producto según una dosis por galón'),
  sources: [
    {
      title: 'Guidelines for Spot Spraying (calibration and mixing card)',
      publisher: 'herbicide manufacturer guidance',
      year: null,
    },
    {
      title: 'Backpack Sprayer Calibration Worksheet',
      publisher: 'NC State Extension, Christmas Trees',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(perGallonSituations, g).heading,
  statement: (g) => situationOf(perGallonSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: [...fillSlips, ...productSlips],
});
