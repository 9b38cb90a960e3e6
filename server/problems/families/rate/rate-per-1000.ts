import { quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Earlier, type NumberPart } from '../../family.ts';
import { labelsWithRate, oneFigure } from '../../labels/pick.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { drawScene, situationOf } from '../../situations.ts';
import { given, over, struck, times, type WorkingLine } from '../../working.ts';
import { areaUnits, oneSqFt, toWholeSqFt } from '../area/plan-parts.ts';
import { drawnLine, labelUse, lineHeading } from './label-lines.ts';
import { measuredOut, toTenth } from './measure-out.ts';
import { perThousandSlips, productNeeded, productPart, siteArea } from './rate-per-1000-slips.ts';
import { perThousandSituations, type PerThousandGiven } from './rate-per-1000-texts.ts';

type Given = PerThousandGiven;

/** Lines for each 1,000 sq ft that give one figure in fluid ounces, with the site they are for. */
const lines = labelsWithRate(
  'area',
  ({ site, area, product }) =>
    (site === 'lawn' || site === 'bed') &&
    area.unit === 'sq-ft' &&
    area.value.compare(1000) === 0 &&
    product.least.unit === 'fl-oz' &&
    !!oneFigure(product),
).map((pair) => ({ line: drawnLine(pair), site: pair[1].site === 'bed' ? ('bed' as const) : ('lawn' as const) }));
const lawnLines = lines.filter(({ site }) => site === 'lawn');

const tenth = rational('0.1');

function draw(rng: Rng, tier: Tier): Given {
  const scene = drawScene(rng, perThousandSituations.length);
  const { line, site } = rng.pick(tier === 3 ? lawnLines : lines);
  const bed = site === 'bed';
  if (tier === 1) {
    const area = quantity(bed ? rng.int(16, 60) * 50 : rng.int(18, 150) * 100, 'sq-ft');
    return { ...scene, line, site, known: { as: 'area', area } };
  }
  if (tier === 2) {
    const width = bed ? rng.int(12, 30) : rng.int(30, 75);
    const length = width + (bed ? rng.int(20, 60) : rng.int(10, 60));
    const known = { as: 'sides', length: quantity(length, 'ft'), width: quantity(width, 'ft') } as const;
    return { ...scene, line, site, known };
  }
  const area = quantity(rng.step('0.12', '0.45', '0.01'), 'acre');
  return { ...scene, line, site, known: { as: 'acres', area } };
}

/** Bulletins round an acre to 43,500 or 44,000 sq ft: the areas those give. */
function roundedAcres({ known }: Given): Quantity[] {
  return known.as === 'acres' ? [43500, 44000].map((sqFt) => quantity(known.area.value.mul(sqFt), 'sq-ft')) : [];
}

function areaPart(g: Given): NumberPart {
  return {
    kind: 'number',
    key: 'a',
    topic: 'area',
    ask: {
      en: 'What is the area in square feet (sq ft), to the nearest whole square foot?',
      es: '¿Cuál es el área en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
    },
    answer: siteArea(g),
    step: oneSqFt,
    units: areaUnits,
    alsoRight: roundedAcres(g),
  };
}

function parts(g: Given, earlier: Earlier): readonly NumberPart[] {
  const product: NumberPart = {
    kind: 'number',
    key: productPart(g),
    topic: 'rate',
    ask: {
      en: 'How much product, in fluid ounces (fl oz), to the nearest 0.1 fl oz?',
      es: '¿Cuánto producto, en onzas líquidas (oz líq), redondeado a 0.1 oz líq?',
    },
    answer: productNeeded(g, earlier),
    step: tenth,
    units: ['fl-oz', 'tbsp', 'cup', 'pt', 'qt', 'ml'],
    alsoRight: roundedAcres(g).map((area) => productNeeded(g, { a: area })),
  };
  return g.known.as === 'area' ? [product] : [areaPart(g), product];
}
function areaLine(g: Given): WorkingLine[] {
  const { known } = g;
  if (known.as === 'area') return [];
  const name = { en: 'area', es: 'área' };
  if (known.as === 'sides') {
    return [
      {
        name,
        ...toWholeSqFt(times(given(known.length), given(known.width)), siteArea(g)),
        answers: true,
        reason: { en: 'Length times width.', es: 'Largo por ancho.' },
      },
    ];
  }
  const perAcre = over(given(quantity(43560, 'sq-ft')), struck(quantity(1, 'acre')));
  return [
    {
      name,
      ...toWholeSqFt(times(struck(known.area), perAcre), siteArea(g)),
      answers: true,
      reason: { en: 'An acre is 43,560 square feet.', es: 'Un acre tiene 43,560 pies cuadrados.' },
    },
  ];
}

function working(g: Given): readonly WorkingLine[] {
  const needed = productNeeded(g, {});
  return [
    ...areaLine(g),
    {
      name: { en: 'product', es: 'producto' },
      expression: times(struck(siteArea(g)), over(given(g.line.product), struck(g.line.labelArea))),
      result: toTenth(needed),
      answers: true,
      reason: measuredOut(needed),
    },
  ];
}

const relation: Record<Given['known']['as'], Text> = {
  area: { en: '', es: '' },
  sides: { en: 'Area = length × width. ', es: 'Área = largo × ancho. ' },
  acres: { en: '1 acre = 43,560 sq ft. ', es: '1 acre = 43,560 pies². ' },
};

/** The first line with numbers. */
function beginning({ known, line }: Given): Text {
  if (known.as === 'sides') {
    return {
      en: en`Begin with the area: ${known.length} × ${known.width}.`,
      es: es`Empiece con el área: ${known.length} × ${known.width}.`,
    };
  }
  return known.as === 'acres'
    ? { en: en`Begin with the area: ${known.area} × 43,560.`, es: es`Empiece con el área: ${known.area} × 43,560.` }
    : { en: en`Begin with ${known.area} ÷ ${line.labelArea}.`, es: es`Empiece con ${known.area} ÷ ${line.labelArea}.` };
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { known, line } = g;
  const first: Text =
    known.as === 'area'
      ? {
          en: en`You are asked for the product. The site is ${known.area}; the label line "${lineHeading(line)}" gives an amount for ${line.labelArea}.`,
          es: es`Se pide el producto. El sitio tiene ${known.area}; la línea «${lineHeading(line)}» de la etiqueta da una cantidad para ${line.labelArea}.`,
        }
      : {
          en: en`You are asked for the area and then the product. The label line "${lineHeading(line)}" gives an amount for ${line.labelArea}.`,
          es: es`Se piden el área y después el producto. La línea «${lineHeading(line)}» de la etiqueta da una cantidad para ${line.labelArea}.`,
        };
  return [
    first,
    {
      en: en`${relation[known.as]}Product = (your area ÷ 1,000 sq ft) × the rate for 1,000 sq ft.`,
      es: es`${relation[known.as]}Producto = (su área ÷ 1,000 pies²) × la dosis para 1,000 pies².`,
    },
    beginning(g),
  ];
}

export const ratePer1000Family = defineFamily<Given>({
  key: 'rate-per-1000',
  version: 1,
  topic: 'rate',
  tiers: [1, 2, 3],
  title: { en: 'Product from a rate per 1,000 sq ft', es: 'Producto según una dosis por 1,000 pies²' },
  sources: [
    { title: 'Drop Spreader Calibration (Louisiana Home Lawn Series)', publisher: 'LSU AgCenter', year: null },
    {
      title: 'Calibrating Application Equipment (turfgrass management slides)',
      publisher: 'Oklahoma State University - Oklahoma City',
      year: 2013,
    },
  ],
  draw,
  heading: (g) => situationOf(perThousandSituations, g).heading,
  statement: (g) => situationOf(perThousandSituations, g).statement(g),
  parts,
  label: (g) => labelUse(g.line),
  hints,
  working,
  slips: perThousandSlips,
});
