import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type OrderPart, type Slip } from '../../family.ts';
import { labels } from '../../labels/labels.ts';
import type { Formulation } from '../../labels/practice-label.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { capital, drawScene, situationOf, type Scene, type Situation } from '../../situations.ts';
import type { WorkingLine } from '../../working.ts';
import { both } from '../both.ts';
import { mixingOrderSlips } from './mixing-order-slips.ts';
import { rulesFor, stepReason, stepsFor, stepText, type Ingredients } from './mixing-steps.ts';

interface Given extends Scene, Ingredients {}

function named(...formulations: readonly Formulation[]): string[] {
  return labels.filter((label) => formulations.includes(label.formulation)).map((label) => label.name);
}
const dryNames = named('WP', 'WG');
const liquidNames = named('SC', 'SL', 'EC');
/** Liquids that publications agree go in after a dry product; for a true solution they do not agree. */
const liquidsAfterDry = named('SC', 'EC');

function draw(rng: Rng, tier: Tier): Given {
  const scene = drawScene(rng, situations.length);
  if (tier === 1) return { ...scene, dry: null, liquid: rng.pick(liquidNames), surfactant: false };
  if (tier === 2) {
    return rng.chance(1, 2)
      ? { ...scene, dry: rng.pick(dryNames), liquid: null, surfactant: true }
      : { ...scene, dry: null, liquid: rng.pick(liquidNames), surfactant: true };
  }
  return { ...scene, dry: rng.pick(dryNames), liquid: rng.pick(liquidsAfterDry), surfactant: true };
}

/** "Ambrill 50 WP, Trennick 4 SC and a surfactant" */
function mixture({ dry, liquid, surfactant }: Given): Text {
  const join = (items: readonly string[], and: string) =>
    items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} ${and} ${items.at(-1) ?? ''}`;
  const names = [dry, liquid].filter((name) => name !== null);
  return both(
    join([...names, ...(surfactant ? ['a surfactant'] : [])], 'and'),
    join([...names, ...(surfactant ? ['un surfactante'] : [])], 'y'),
  );
}
function allowed({ dry, liquid, surfactant }: Given): Text {
  if (dry && liquid) {
    return both(
      'Both labels allow this mix and name no other order.',
      'Las dos etiquetas permiten esta mezcla y no indican otro orden.',
    );
  }
  return surfactant
    ? both(
        'The label allows a surfactant and names no other order.',
        'La etiqueta permite un surfactante y no indica otro orden.',
      )
    : both('The label names no other order.', 'La etiqueta no indica otro orden.');
}

const situations: readonly Situation<Given>[] = [
  {
    heading: both('Filling the tank', 'Llenado del tanque'),
    statement: (g) =>
      both(
        en`${g.person} fills the sprayer with ${mixture(g)} for work ${g.place.at}. ${allowed(g)}`,
        es`${g.person} llena el rociador con ${mixture(g)} para el trabajo ${g.place.at}. ${allowed(g)}`,
      ),
  },
  {
    heading: both('At the mixing place', 'En el lugar de mezcla'),
    statement: (g) =>
      both(
        en`${capital(g.season)} a new helper watches how ${g.person} makes a mix with ${mixture(g)}. ${allowed(g)}`,
        es`${capital(g.season)} una persona nueva mira cómo ${g.person} prepara una mezcla con ${mixture(g)}. ${allowed(g)}`,
      ),
  },
  {
    heading: both('The steps on the card', 'Los pasos de la tarjeta'),
    statement: (g) =>
      both(
        en`The crew writes a card for the mixing place: how a tank with ${mixture(g)} is filled. ${allowed(g)}`,
        es`La cuadrilla escribe una tarjeta para el lugar de mezcla: cómo se llena un tanque con ${mixture(g)}. ${allowed(g)}`,
      ),
  },
  {
    heading: both('Before the day’s work', 'Antes del trabajo del día'),
    statement: (g) =>
      both(
        en`The day's job ${g.place.at} takes one tank with ${mixture(g)}, and ${g.person} mixes it. ${allowed(g)}`,
        es`El trabajo del día ${g.place.at} lleva un tanque con ${mixture(g)}, y ${g.person} lo prepara. ${allowed(g)}`,
      ),
  },
];

function part(g: Given): OrderPart {
  return {
    kind: 'order',
    key: 'a',
    topic: 'mixing',
    ask: both('Put the steps in order.', 'Ponga los pasos en orden.'),
    steps: stepsFor(g).map((key) => ({ key, text: stepText(key, g) })),
    mustPrecede: rulesFor(g),
  };
}

const bare = (text: string) => text.replace(/\.$/, '');

function working(g: Given): readonly WorkingLine[] {
  const steps = stepsFor(g);
  const lines = steps.map((key, index) => {
    const text = stepText(key, g);
    const number = String(index + 1);
    return {
      name: both(`${number}. ${bare(text.en)}`, `${number}. ${bare(text.es)}`),
      reason: stepReason(key, g),
      answers: index === steps.length - 1,
    };
  });
  return [
    ...lines,
    {
      name: both(
        "The product's label gives the order where it differs",
        'La etiqueta del producto manda donde el orden sea otro',
      ),
      reason: both('Read its mixing directions before you begin.', 'Lea sus instrucciones de mezcla antes de empezar.'),
    },
  ];
}

const slips: readonly Slip<Given>[] = mixingOrderSlips;

export const mixingOrderFamily = defineFamily<Given>({
  key: 'mixing-order',
  version: 1,
  topic: 'mixing',
  tiers: [1, 2, 3],
  title: both('Order of filling a tank', 'Orden de llenado de un tanque'),
  sources: [
    {
      title: 'Preparing Spray Solutions: Mixing Order',
      publisher: 'South Dakota State University Extension',
      year: null,
    },
    {
      title: 'General rules for mixing pesticide (from the Manitoba Guide to Crop Protection)',
      publisher: 'Canola Council of Canada',
      year: 2013,
    },
  ],
  draw,
  heading: (g) => situationOf(situations, g).heading,
  statement: (g) => situationOf(situations, g).statement(g),
  parts: (g) => [part(g)],
  hints: (g) => [
    both(
      'You are asked for the order of filling. Think of your hands first, then of what the product falls into.',
      'Se pide el orden de llenado. Piense primero en sus manos y luego en dónde cae el producto.',
    ),
    both(
      'Nothing goes into a dry tank, and the tank is filled to its mark only when everything else is in.',
      'Nada entra en un tanque seco, y el tanque se completa hasta la marca solo cuando todo lo demás está adentro.',
    ),
    g.surfactant
      ? both(
          'What is hard to wet needs plain, moving water. What foams waits until the rest is in.',
          'Lo que cuesta mojar necesita agua sola y en movimiento. Lo que hace espuma espera a que entre lo demás.',
        )
      : both(
          'A little of the dose clings to the measure after you pour. Where should it go, and when?',
          'Después de verter, un poco de la dosis queda pegado a la medida. ¿Adónde debe ir, y cuándo?',
        ),
  ],
  working,
  slips,
});
