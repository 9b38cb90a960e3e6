import { add, quantity, scale, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational } from '../../../../shared/quantity/rational.ts';
import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import { defineFamily, type Slip } from '../../family.ts';
import type { Rng } from '../../rng.ts';
import { en, es, firstUse } from '../../say.ts';
import { capital, drawScene, situationOf, type Scene, type Situation } from '../../situations.ts';
import {
  lawnFigure,
  lawnWorking,
  listed,
  noneOf,
  obstacleArea,
  obstacleName,
  obstacleSides,
  placeObstacles,
  siteName,
  sumOf,
  treatedArea,
  wholeLawn,
  type LawnWithObstacles,
  type Obstacle,
} from './obstacles.ts';
import { areaUnits, oneSqFt } from './plan-parts.ts';

interface Given extends Scene, LawnWithObstacles {}

/** "The lawn is 62 feet (ft) by 35 ft; the patio is 20 ft by 10 ft." */
function measures(g: Given): Text {
  return {
    en: en`${capital(siteName(g).the)} is ${firstUse(g.length)} by ${g.width}; ${obstacleSides(g)}.`,
    es: es`${capital(siteName(g).the)} mide ${firstUse(g.length)} por ${g.width}; ${obstacleSides(g)}.`,
  };
}
const names = (g: Given) => listed(g.obstacles.map(obstacleName));

const situations: readonly Situation<Given>[] = [
  {
    heading: { en: 'A lawn, less what stands on it', es: 'Un césped, menos lo que hay encima' },
    statement: (g) => ({
      en: en`${g.person} sprays all the grass on one property, but not ${noneOf(g.obstacles.map(obstacleName))}. ${measures(g)}`,
      es: es`${g.person} rocía todo el pasto de una propiedad, pero no ${noneOf(g.obstacles.map(obstacleName))}. ${measures(g)}`,
    }),
  },
  {
    heading: { en: 'Turf to treat', es: 'El césped por tratar' },
    statement: (g) => ({
      en: en`The grass around ${names(g)} gets treated ${g.season}. ${measures(g)} Find the grass area.`,
      es: es`El pasto alrededor de lo construido se trata ${g.season}. ${measures(g)} Halle el área de pasto.`,
    }),
  },
  {
    heading: { en: 'A work order without an area', es: 'Una orden de trabajo sin área' },
    statement: (g) => ({
      en: en`A work order says "all turf." ${g.person} gets out the tape. ${measures(g)} The rest is turf.`,
      es: es`Una orden de trabajo dice «todo el césped». ${g.person} saca la cinta. ${measures(g)} El resto es césped.`,
    }),
  },
  {
    heading: { en: 'Only the grass', es: 'Solo el pasto' },
    statement: (g) => ({
      en: en`Granules must not land on ${noneOf(g.obstacles.map(obstacleName))}, so ${g.person} counts only the grass. ${measures(g)}`,
      es: es`Los gránulos no deben caer fuera del pasto, así que ${g.person} cuenta solo el pasto. ${measures(g)}`,
    }),
  },
];

/** What stands on the site together, and the sides of a site it fits on. */
interface Layout {
  readonly kinds: readonly Obstacle['kind'][];
  readonly lengthFt: readonly [least: number, most: number];
  readonly widthFt: readonly [least: number, most: number];
}
const small = { lengthFt: [40, 72], widthFt: [28, 46] } as const;
const middle = { lengthFt: [58, 84], widthFt: [34, 50] } as const;
const large = { lengthFt: [76, 100], widthFt: [36, 52] } as const;
const houseLot = { lengthFt: [80, 112], widthFt: [54, 74] } as const;
const largeHouseLot = { lengthFt: [100, 135], widthFt: [60, 78] } as const;

const layouts: Record<Tier, readonly Layout[]> = {
  1: [
    { kinds: ['patio'], ...small },
    { kinds: ['terrace'], ...small },
    { kinds: ['shed'], ...small },
    { kinds: ['playground'], ...small },
    { kinds: ['pond'], ...small },
    { kinds: ['bed'], ...small },
  ],
  2: [
    { kinds: ['house', 'driveway'], ...houseLot },
    { kinds: ['house', 'patio'], ...houseLot },
    { kinds: ['patio', 'bed'], ...middle },
    { kinds: ['playground', 'shed'], ...middle },
    { kinds: ['terrace', 'pond'], ...middle },
  ],
  3: [
    { kinds: ['house', 'driveway', 'patio'], ...largeHouseLot },
    { kinds: ['bed', 'house', 'driveway'], ...largeHouseLot },
    { kinds: ['playground', 'terrace', 'pond'], ...large },
    { kinds: ['patio', 'pond', 'bed'], ...large },
  ],
};
/** An obstacle too small to tell whether it was left out teaches nothing. */
const leastShare = rational(25, 1000);

function draw(rng: Rng, tier: Tier): Given | null {
  const scene = drawScene(rng, situations.length);
  const layout = rng.pick(layouts[tier]);
  const length = rng.int(...layout.lengthFt);
  const width = rng.int(...layout.widthFt);
  const obstacles = placeObstacles(rng, { lengthFt: length, widthFt: width }, layout.kinds);
  if (!obstacles) return null;
  const g = { ...scene, length: quantity(length, 'ft'), width: quantity(width, 'ft'), obstacles };
  const least = wholeLawn(g).value.mul(leastShare);
  return g.obstacles.every((one) => obstacleArea(one).value.compare(least) >= 0) ? g : null;
}

const obstructed = (g: Given) => sumOf(g.obstacles.map(obstacleArea));
const around = (one: Obstacle) => scale(add(one.length, one.width), 2);
const last = (g: Given) => g.obstacles.at(-1);

const slips: readonly Slip<Given>[] = [
  {
    key: 'left-in-obstacle',
    part: 'a',
    answer: wholeLawn,
    message: (g) => ({
      en: en`The ${siteName(g).whole} is still in your area. Take off what is not grass: ${obstructed(g)} in all.`,
      es: es`Todavía está ${siteName(g).whole} en su área. Reste lo que no es pasto: ${obstructed(g)} en total.`,
    }),
  },
  {
    key: 'forgot-one',
    part: 'a',
    answer: (g) => {
      const left = last(g);
      return left && g.obstacles.length > 1 ? add(treatedArea(g), obstacleArea(left)) : null;
    },
    message: (g) => {
      const left = last(g);
      const name = left ? obstacleName(left) : names(g);
      const area = left ? obstacleArea(left) : obstructed(g);
      return {
        en: en`You forgot ${name}. It covers ${area}, and that comes off too.`,
        es: es`Le faltó restar ${name}. Cubre ${area}, y eso también se resta.`,
      };
    },
  },
  {
    key: 'added-obstacle',
    part: 'a',
    answer: (g) => add(wholeLawn(g), obstructed(g)),
    message: (g) => ({
      en: en`You added ${names(g)}. That ground is not treated, so its ${obstructed(g)} come off.`,
      es: es`Usted sumó ${names(g)}. Ese suelo no se trata, así que se restan ${obstructed(g)}.`,
    }),
  },
  {
    key: 'subtracted-perimeter',
    part: 'a',
    answer: (g) => subtract(wholeLawn(g), quantity(aroundAll(g).value, 'sq-ft')),
    message: (g) => ({
      en: en`You took off the distance around ${names(g)}. Take off the area instead: length times width.`,
      es: es`Usted restó el contorno de lo que no se trata. Reste su área: largo por ancho.`,
    }),
  },
  {
    key: 'only-obstacles',
    part: 'a',
    answer: obstructed,
    message: (g) => ({
      en: en`That is the ground you do not treat. Take ${obstructed(g)} off the ${siteName(g).whole}.`,
      es: es`Ese es el suelo que no se trata. Reste ${obstructed(g)} de ${siteName(g).whole}.`,
    }),
  },
  {
    key: 'perimeter',
    part: 'a',
    answer: (g) => quantity(add(g.length, g.width).value.mul(2), 'sq-ft'),
    message: (g) => ({
      en: en`That is the distance around the outside. Area is length times width: ${g.length} × ${g.width} for the ${siteName(g).whole}.`,
      es: es`Esa es la distancia alrededor. El área es largo por ancho: ${g.length} × ${g.width} para ${siteName(g).whole}.`,
    }),
  },
];
function aroundAll(g: Given): Quantity {
  return g.obstacles.map(around).reduce((sum, one) => add(sum, one));
}

export const areaRectangleLessFamily = defineFamily<Given>({
  key: 'area-rectangle-less',
  version: 1,
  topic: 'area',
  tiers: [1, 2, 3],
  title: { en: 'Lawn less obstacles', es: 'Césped menos obstáculos' },
  sources: [
    {
      title: 'How Big is Your Lawn? (Purdue Turf Tips)',
      publisher: 'Purdue University Turf Program',
      year: 2014,
      ref: 'Figures 1-2',
    },
  ],
  draw,
  heading: (g) => situationOf(situations, g).heading,
  statement: (g) => situationOf(situations, g).statement(g),
  parts: (g) => [
    {
      kind: 'number',
      key: 'a',
      topic: 'area',
      ask: {
        en: 'What area is treated, in square feet (sq ft), to the nearest whole square foot?',
        es: '¿Qué área se trata, en pies cuadrados (pies²), redondeada al pie cuadrado entero?',
      },
      answer: treatedArea(g),
      step: oneSqFt,
      units: areaUnits,
    },
  ],
  figure: lawnFigure,
  hints: (g) => [
    {
      en: en`You are asked for the grass only. The plan gives the sides of ${siteName(g).the} and of ${names(g)}.`,
      es: es`Se pide solo el pasto. El plano da los lados de todo el sitio y de cada cosa que no se trata.`,
    },
    {
      en: 'Area treated = whole site − everything that is not treated. Each area = length × width.',
      es: 'Área tratada = todo el sitio − todo lo que no se trata. Cada área = largo × ancho.',
    },
    {
      en: en`The ${siteName(g).whole} = ${g.length} × ${g.width} = ${wholeLawn(g)}.`,
      es: es`${capital(siteName(g).whole)} = ${g.length} × ${g.width} = ${wholeLawn(g)}.`,
    },
  ],
  working: lawnWorking,
  slips,
});
