import { convert, quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es, firstUse, unitFirst } from '../../say.ts';
import { capital, drawScene, situationOf, type Situation } from '../../situations.ts';
import { struck, times, type WorkingLine } from '../../working.ts';
import { unitPairs } from './unit-pairs.ts';
import { byThirtyMl, fact, factorOver, isMetric, perUnit, toStep } from './unit-steps.ts';
import { unitVolumeSlips, type UnitVolumeGiven } from './unit-volume-slips.ts';

type Given = UnitVolumeGiven;

const to = (g: Given) => unitFirst(g.pair.to);
/** Where a metric unit comes in, the figure to use. */
function figureToUse({ pair }: Given): Text {
  if (isMetric(pair.from) === isMetric(pair.to)) return { en: '', es: '' };
  const told = pair.from === 'gal' || pair.to === 'gal' ? quantity('3.785', 'l') : quantity('29.57', 'ml');
  const of = told.unit === 'l' ? quantity(1, 'gal') : quantity(1, 'fl-oz');
  return { en: en` Use ${of} = ${told}.`, es: es` Use ${of} = ${told}.` };
}

const situations: readonly Situation<Given>[] = [
  {
    heading: { en: 'The record sheet', es: 'La hoja de registro' },
    statement: (g) => ({
      en: en`${g.person} measures out ${firstUse(g.amount)} of product ${g.place.at}. The record sheet asks for ${to(g)}.${figureToUse(g)}`,
      es: es`${g.person} mide ${firstUse(g.amount)} de producto ${g.place.at}. La hoja de registro lo pide en ${to(g)}.${figureToUse(g)}`,
    }),
  },
  {
    heading: { en: 'The mixing sheet', es: 'La hoja de mezclas' },
    statement: (g) => ({
      en: en`A work order for ${g.place.the} lists ${firstUse(g.amount)} of product. The mixing sheet in the shop counts in ${to(g)}.${figureToUse(g)}`,
      es: es`Una orden de trabajo para ${g.place.the} pide ${firstUse(g.amount)} de producto. La hoja de mezclas del taller cuenta en ${to(g)}.${figureToUse(g)}`,
    }),
  },
  {
    heading: { en: 'A note from the last crew', es: 'Una nota de la otra cuadrilla' },
    statement: (g) => ({
      en: en`A note from the last crew says the mix took ${firstUse(g.amount)} of product. ${g.person} keeps notes in ${to(g)}.${figureToUse(g)}`,
      es: es`Una nota de la otra cuadrilla dice que la mezcla llevó ${firstUse(g.amount)} de producto. ${g.person} anota todo en ${to(g)}.${figureToUse(g)}`,
    }),
  },
  {
    heading: { en: 'Planning ahead', es: 'Planear con tiempo' },
    statement: (g) => ({
      en: en`${capital(g.season)} the job at ${g.place.the} takes ${firstUse(g.amount)} of product. The crew keeps its tally in ${to(g)}.${figureToUse(g)}`,
      es: es`${capital(g.season)} el trabajo ${g.place.at} lleva ${firstUse(g.amount)} de producto. La cuadrilla lleva la cuenta en ${to(g)}.${figureToUse(g)}`,
    }),
  },
];

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, situations.length);
  const pair = rng.pick(unitPairs[tier]);
  const g: Given = { ...scene, pair, amount: quantity(rng.step(...pair.amounts), pair.from) };
  return inFacts(g) ? null : g;
}

const answer = ({ pair, amount }: Given) => convert(amount, pair.to);
/** Whether the answer is itself a factor that a hint or message names: 1 qt = 32 fl oz. */
function inFacts(g: Given): boolean {
  const { from, through, mixUp, to: asked } = g.pair;
  const named = [from, through, mixUp?.as].filter((unit) => unit !== undefined);
  return named.some((unit) => perUnit(unit, asked).compare(answer(g).value) === 0);
}
const step = ({ pair }: Given) => rational(pair.answerStep);

function working(g: Given): readonly WorkingLine[] {
  const { from, through, to: asked, answerStep } = g.pair;
  const factors = through ? [factorOver(from, through, true), factorOver(through, asked)] : [factorOver(from, asked)];
  const places = answerStep.includes('.') ? answerStep.length - answerStep.indexOf('.') - 1 : 0;
  const grows = perUnit(from, asked).compare(1) > 0;
  return [
    {
      name: { en: 'amount', es: 'cantidad' },
      expression: times(struck(g.amount), ...factors),
      result: toStep(answer(g), step(g), places),
      answers: true,
      reason: grows
        ? {
            en: 'Check: the new unit is smaller, so there are more of them.',
            es: 'Compruebe: la unidad nueva es más pequeña, así que hay más.',
          }
        : {
            en: 'Check: the new unit is larger, so there are fewer of them.',
            es: 'Compruebe: la unidad nueva es más grande, así que hay menos.',
          },
    },
  ];
}

function hints(g: Given): readonly [Text, Text, Text] {
  const { from, through, to: asked } = g.pair;
  const facts: Text = through
    ? {
        en: en`${fact(from, through)} and ${fact(through, asked)}`,
        es: es`${fact(from, through)} y ${fact(through, asked)}`,
      }
    : fact(from, asked);
  const grows = perUnit(from, through ?? asked).compare(1) > 0;
  return [
    {
      en: en`You are given ${g.amount} and asked for the same amount in ${to(g)}.`,
      es: es`La cantidad dada es ${g.amount}. Se pide lo mismo en ${to(g)}.`,
    },
    {
      en: en`${facts}. To a smaller unit you multiply, to a larger one you divide.`,
      es: es`${facts}. Hacia una unidad más pequeña se multiplica, hacia una más grande se divide.`,
    },
    {
      en: en`Begin with ${g.amount}: ${grows ? 'multiply' : 'divide'}, since ${fact(from, through ?? asked)}.`,
      es: es`Empiece con ${g.amount}: ${grows ? 'multiplique' : 'divida'}, porque ${fact(from, through ?? asked)}.`,
    },
  ];
}

export const unitVolumeFamily = defineFamily<Given>({
  key: 'unit-volume',
  version: 1,
  topic: 'units',
  tiers: [1, 2, 3],
  title: { en: 'Changing volume units', es: 'Cambiar unidades de volumen' },
  sources: [
    { title: 'NIST Handbook 44, Appendix C', publisher: 'National Institute of Standards and Technology', year: 2012 },
    {
      title: 'Math for Pesticide Applicators: useful measurement conversions',
      publisher: 'University of Nebraska-Lincoln Pesticide Education',
      year: null,
    },
  ],
  draw,
  heading: (g) => situationOf(situations, g).heading,
  statement: (g) => situationOf(situations, g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'units',
      ask: {
        en: en`How much is that in ${to(g)}, to the nearest ${quantity(step(g), g.pair.to)}?`,
        es: es`¿A cuánto equivale en ${to(g)}, redondeado a ${quantity(step(g), g.pair.to)}?`,
      },
      answer: answer(g),
      step: step(g),
      units: [g.pair.to],
      alsoRight: byThirtyMl(answer(g), g.pair.from),
    },
  ],
  hints,
  working,
  slips: unitVolumeSlips,
});
