import { acresOf } from '../../../../shared/formulas/acres-of.ts';
import { convert, quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import { roundToStep } from '../../../../shared/quantity/round.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import { labelsWithRate, oneFigure } from '../../labels/pick.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { about, given, over, struck, times, type WorkingLine } from '../../working.ts';
import { drawnLine, labelUse, lineHeading } from './label-lines.ts';
import { measuredOut, toTenth } from './measure-out.ts';
import { doseFlOz, perAcreSlips, productPart, scaled, siteArea } from './rate-per-acre-slips.ts';
import { perAcreSituations, type PerAcreGiven } from './rate-per-acre-texts.ts';

type Given = PerAcreGiven;

/** Lines for an acre of turf that give one figure in pints or quarts, and the water. */
const lines = labelsWithRate(
  'area',
  ({ site, area, product, water, note }) =>
    site === 'turf' &&
    // A line with a condition of its own ("before reseeding only") is not for a plain treatment.
    note === undefined &&
    area.unit === 'acre' &&
    (product.least.unit === 'pt' || product.least.unit === 'qt') &&
    !!oneFigure(product) &&
    !!water &&
    !!oneFigure(water),
).map(drawnLine);

const tenth = rational('0.1');
const thousandth = rational('0.001');

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, perAcreSituations.length);
  const drawn = rng.pick(lines);
  if (!drawn.water) return null;
  const line = { ...drawn, water: drawn.water };
  if (tier === 1) {
    return { ...scene, line, asks: 'product', known: { as: 'area', area: quantity(rng.int(16, 70) * 500, 'sq-ft') } };
  }
  const width = rng.int(18, 36) * 5;
  const known = {
    as: 'sides',
    length: quantity(width + rng.int(4, 16) * 5, 'ft'),
    width: quantity(width, 'ft'),
  } as const;
  const g: Given = { ...scene, line, asks: tier === 2 ? 'acres-and-product' : 'acres-product-and-water', known };
  // Close to a whole acre nothing would show whether the amounts were scaled.
  return acresOf({ area: siteArea(g) }).value.compare(rational('0.8')) > 0 ? null : g;
}

/** Bulletins round an acre to 43,500 or 44,000 sq ft: the shares of an acre those give. */
const roundedAcres = (g: Given): Quantity[] =>
  [43500, 44000].map((sqFt) => quantity(convert(siteArea(g), 'sq-ft').value.div(sqFt), 'acre'));
const byRoundedAcres = (g: Given, amount: Quantity): Quantity[] =>
  roundedAcres(g).map((acres) => quantity(amount.value.mul(acres.value), amount.unit));

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const acres: NumberPart = {
    kind: 'number',
    key: 'a',
    topic: 'area',
    ask: {
      en: 'What part of an acre is the site, to the nearest 0.001 acre?',
      es: '¿Qué parte de un acre es el sitio, redondeada a 0.001 acre?',
    },
    answer: acresOf({ area: siteArea(g) }),
    step: thousandth,
    units: ['acre', 'sq-ft'],
    alsoRight: roundedAcres(g),
  };
  const product: NumberPart = {
    kind: 'number',
    key: productPart(g),
    topic: 'rate',
    ask: {
      en: 'How much product, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
      es: '¿Cuánto producto, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
    },
    answer: scaled(g, doseFlOz(g), earlier),
    step: tenth,
    units: ['fl-oz', 'cup', 'pt', 'qt', 'ml'],
    alsoRight: byRoundedAcres(g, doseFlOz(g)),
  };
  const water: NumberPart = {
    kind: 'number',
    key: 'c',
    topic: 'rate',
    ask: {
      en: 'How much water, in gallons (gal), to the nearest 0.1 gal?',
      es: '¿Cuánta agua, en galones (gal), redondeada a 0.1 gal?',
    },
    answer: scaled(g, g.line.water, earlier),
    step: tenth,
    units: ['gal', 'qt', 'l'],
    alsoRight: byRoundedAcres(g, g.line.water),
  };
  if (g.asks === 'product') return [product];
  return g.asks === 'acres-and-product' ? [acres, product] : [acres, product, water];
}

function areaLines(g: Given): WorkingLine[] {
  const area = siteArea(g);
  const acres = acresOf({ area });
  const shown = given(acres, { places: 3 });
  const exact = roundToStep(acres.value, thousandth).compare(acres.value) === 0;
  const share: WorkingLine = {
    name: { en: 'acres', es: 'acres' },
    expression: times(struck(area), over(given(quantity(1, 'acre')), struck(quantity(43560, 'sq-ft')))),
    result: exact ? shown : about(given(acres, { maxPlaces: 5 }), shown),
    answers: g.asks !== 'product',
    reason: { en: 'An acre is 43,560 square feet.', es: 'Un acre tiene 43,560 pies cuadrados.' },
  };
  if (g.known.as === 'area') return [share];
  const sides: WorkingLine = {
    name: { en: 'area', es: 'área' },
    expression: times(given(g.known.length), given(g.known.width)),
    result: given(area),
    reason: { en: 'Length times width.', es: 'Largo por ancho.' },
  };
  return [sides, share];
}

function working(g: Given): readonly WorkingLine[] {
  const { product, water, labelArea } = g.line;
  const acres = given(acresOf({ area: siteArea(g) }), { cancel: true, maxPlaces: 5 });
  const needed = scaled(g, doseFlOz(g), {});
  const inUnit = convert(quantity(1, product.unit), 'fl-oz');
  const lines: WorkingLine[] = [
    ...areaLines(g),
    {
      name: { en: 'rate in fluid ounces', es: 'dosis en onzas líquidas' },
      expression: times(struck(product), over(given(inUnit), struck(quantity(1, product.unit)))),
      result: given(doseFlOz(g)),
      reason: {
        en: en`For one acre. The label's unit is changed to the unit asked for.`,
        es: es`Para un acre. La unidad de la etiqueta se cambia a la que se pide.`,
      },
    },
    {
      name: { en: 'product', es: 'producto' },
      expression: times(acres, over(given(doseFlOz(g)), struck(labelArea))),
      result: toTenth(needed),
      answers: true,
      reason: measuredOut(needed),
    },
  ];
  if (g.asks !== 'acres-product-and-water') return lines;
  const forWater: WorkingLine = {
    name: { en: 'water', es: 'agua' },
    expression: times(acres, over(given(water), struck(labelArea))),
    result: toTenth(scaled(g, water, {})),
    answers: true,
    reason: {
      en: 'The water takes the same share of an acre as the product does.',
      es: 'El agua lleva la misma parte de un acre que el producto.',
    },
  };
  return [...lines, forWater];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const begin = dividedSite(g);
  return [
    {
      en: en`You are asked how much ${g.asks === 'acres-product-and-water' ? 'product and water' : 'product'} a part of an acre takes. The label line "${lineHeading(g.line)}" gives amounts for one acre.`,
      es: es`Se pide cuánto ${g.asks === 'acres-product-and-water' ? 'producto y agua' : 'producto'} lleva una parte de un acre. La línea «${lineHeading(g.line)}» de la etiqueta da cantidades para un acre.`,
    },
    {
      en: 'Acres = square feet ÷ 43,560. Amount = acres × the amount for an acre. A pint is 16 fl oz, a quart 32 fl oz.',
      es: 'Acres = pies cuadrados ÷ 43,560. Cantidad = acres × la cantidad por acre. Una pinta son 16 oz líq, un cuarto 32 oz líq.',
    },
    { en: en`Begin with ${begin}.`, es: es`Empiece con ${begin}.` },
  ];
}
function dividedSite(g: Given): Text {
  return g.known.as === 'sides'
    ? {
        en: en`${g.known.length} × ${g.known.width}, then divide by 43,560`,
        es: es`${g.known.length} × ${g.known.width} y divida entre 43,560`,
      }
    : { en: en`${g.known.area} ÷ 43,560`, es: es`${g.known.area} ÷ 43,560` };
}

export const ratePerAcreFamily = defineFamily<Given>({
  key: 'rate-per-acre',
  version: 1,
  topic: 'rate',
  tiers: [1, 2, 3],
  title: { en: 'Product from a rate per acre', es: 'Producto según una dosis por acre' },
  sources: [
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
    {
      title: 'Pesticide Calculations for Small Acreages',
      publisher: 'University of Kentucky Cooperative Extension',
      year: null,
      ref: 'ENTFACT-800, eq. 2',
    },
  ],
  draw,
  heading: (g) => situationOf(perAcreSituations, g).heading,
  statement: (g) => situationOf(perAcreSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: perAcreSlips,
});
