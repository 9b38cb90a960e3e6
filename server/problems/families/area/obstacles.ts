import type { Ground, PlanFigure, PlanShape } from '../../../../shared/contracts/figure.ts';
import { rectangleArea } from '../../../../shared/formulas/rectangle-area.ts';
import { add, quantity, subtract, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import type { Rng } from '../../rng.ts';
import { en, es } from '../../say.ts';
import { given, minus, times, type WorkingLine } from '../../working.ts';
import { boxDimensions, drawn } from './plan-parts.ts';

/** Something on a lawn that is not treated. */
interface ObstacleKind {
  readonly the: Text;
  readonly ground: Ground;
  /** Sides it is found in, in feet; both drawn in steps of `step`. */
  readonly acrossFt: readonly [least: number, most: number];
  readonly deepFt: readonly [least: number, most: number];
  readonly stepFt: number;
  /** Where it lies: against the far edge, against the near edge, or free. */
  readonly lies: 'far' | 'near' | 'free';
}

const kind = (
  name: readonly [en: string, article: 'el' | 'la', es: string],
  rest: Omit<ObstacleKind, 'the'>,
): ObstacleKind => ({
  the: { en: `the ${name[0]}`, es: `${name[1]} ${name[2]}` },
  ...rest,
});

/** Kinds of obstacles by size: a building first, then what a small lawn may hold. */
export const obstacleKinds = {
  house: kind(['house', 'la', 'casa'], {
    ground: 'building',
    acrossFt: [32, 52],
    deepFt: [24, 38],
    stepFt: 2,
    lies: 'free',
  }),
  driveway: kind(['driveway', 'la', 'entrada de autos'], {
    ground: 'hard',
    acrossFt: [10, 20],
    deepFt: [24, 48],
    stepFt: 2,
    lies: 'near',
  }),
  patio: kind(['patio', 'el', 'patio'], {
    ground: 'hard',
    acrossFt: [12, 24],
    deepFt: [10, 20],
    stepFt: 1,
    lies: 'far',
  }),
  terrace: kind(['paved terrace', 'la', 'terraza'], {
    ground: 'hard',
    acrossFt: [15, 30],
    deepFt: [10, 20],
    stepFt: 1,
    lies: 'far',
  }),
  shed: kind(['shed', 'el', 'cobertizo'], {
    ground: 'building',
    acrossFt: [10, 18],
    deepFt: [8, 14],
    stepFt: 1,
    lies: 'far',
  }),
  playground: kind(['playground', 'el', 'área de juegos'], {
    ground: 'soil',
    acrossFt: [18, 30],
    deepFt: [14, 24],
    stepFt: 1,
    lies: 'free',
  }),
  pond: kind(['garden pond', 'el', 'estanque'], {
    ground: 'water',
    acrossFt: [12, 24],
    deepFt: [10, 16],
    stepFt: 1,
    lies: 'free',
  }),
  bed: kind(['flower bed', 'el', 'arriate de flores'], {
    ground: 'bed',
    acrossFt: [12, 30],
    deepFt: [8, 14],
    stepFt: 1,
    lies: 'near',
  }),
} as const satisfies Record<string, ObstacleKind>;

/** One obstacle as drawn: its kind, its sides and where its corner is, in feet from the lawn's far left corner. */
export interface Obstacle {
  readonly kind: keyof typeof obstacleKinds;
  readonly length: Quantity;
  readonly width: Quantity;
  readonly xFt: number;
  readonly yFt: number;
}

/** A rectangular lawn with what stands on it. */
export interface LawnWithObstacles {
  readonly length: Quantity;
  readonly width: Quantity;
  readonly obstacles: readonly Obstacle[];
}

/** What the outer rectangle is called: a lot when a house stands on it, else a lawn. */
export function siteName(lawn: LawnWithObstacles): { readonly the: Text; readonly whole: Text; readonly bare: Text } {
  const lot = lawn.obstacles.some((one) => one.kind === 'house' || one.kind === 'driveway');
  return lot
    ? {
        the: { en: 'the lot', es: 'el terreno' },
        whole: { en: 'whole lot', es: 'todo el terreno' },
        bare: { en: 'lot', es: 'terreno' },
      }
    : {
        the: { en: 'the lawn', es: 'el césped' },
        whole: { en: 'whole lawn', es: 'todo el césped' },
        bare: { en: 'lawn', es: 'césped' },
      };
}

export function obstacleName(obstacle: Obstacle): Text {
  return obstacleKinds[obstacle.kind].the;
}
export function obstacleArea(obstacle: Obstacle): Quantity {
  return rectangleArea(obstacle);
}
export function wholeLawn(lawn: LawnWithObstacles): Quantity {
  return rectangleArea(lawn);
}
export function sumOf(areas: readonly Quantity[]): Quantity {
  return areas.reduce((sum, one) => add(sum, one), quantity(0, 'sq-ft'));
}
/** Whole lawn less everything that stands on it. */
export function treatedArea(lawn: LawnWithObstacles): Quantity {
  return subtract(wholeLawn(lawn), sumOf(lawn.obstacles.map(obstacleArea)));
}

const gapFt = 5;

/**
 * Draws sides for obstacles of these kinds and sets them side by side on the lawn, each in its own share of the length,
 * clear of the next. Null when they do not fit.
 */
export function placeObstacles(
  rng: Rng,
  lawn: { readonly lengthFt: number; readonly widthFt: number },
  kinds: readonly (keyof typeof obstacleKinds)[],
): readonly Obstacle[] | null {
  const drawnSides = kinds.map((key) => {
    const { acrossFt, deepFt, stepFt } = obstacleKinds[key];
    const side = ([least, most]: readonly [number, number]) =>
      least + stepFt * rng.int(0, Math.floor((most - least) / stepFt));
    return { key, across: side(acrossFt), deep: side(deepFt) };
  });
  const taken = drawnSides.reduce((sum, one) => sum + one.across, 0);
  const spare = lawn.lengthFt - taken;
  const gap = Math.floor(spare / (kinds.length + 1));
  if (gap < gapFt) return null;
  const obstacles: Obstacle[] = [];
  let x = gap;
  for (const { key, across, deep } of drawnSides) {
    const room = lawn.widthFt - deep;
    if (room < 2 * gapFt) return null;
    const { lies } = obstacleKinds[key];
    const y = lies === 'far' ? 0 : lies === 'near' ? room : Math.floor(room / 2);
    obstacles.push({ kind: key, length: quantity(across, 'ft'), width: quantity(deep, 'ft'), xFt: x, yFt: y });
    x += across + gap;
  }
  return obstacles;
}

/** Names joined as in a sentence: "the house, the driveway and the patio". */
export function listed(names: readonly Text[], joined: Text = { en: 'and', es: 'y' }): Text {
  const join = (all: readonly string[], last: string) =>
    all.length < 2 ? all.join('') : `${all.slice(0, -1).join(', ')} ${last} ${all.at(-1) ?? ''}`;
  return {
    en: join(
      names.map((one) => one.en),
      joined.en,
    ),
    es: join(
      names.map((one) => one.es),
      joined.es,
    ),
  };
}

/** Names joined after "not": "the house, the driveway or the patio". */
export function noneOf(names: readonly Text[]): Text {
  return listed(names, { en: 'or', es: 'ni' });
}

/** "the patio is 20 ft by 10 ft" for each obstacle, joined. */
export function obstacleSides(lawn: LawnWithObstacles): Text {
  return listed(
    lawn.obstacles.map((one) => ({
      en: en`${obstacleName(one)} is ${one.length} by ${one.width}`,
      es: es`${obstacleName(one)} mide ${one.length} por ${one.width}`,
    })),
  );
}

/** The plan to scale, every side with its dimension. */
export function lawnFigure(lawn: LawnWithObstacles): PlanFigure<Text> {
  const outer = { x: 0, y: 0, width: drawn(lawn.length.value), height: drawn(lawn.width.value) };
  const sides = (one: { length: Quantity; width: Quantity }) => ({
    width: { en: en`${one.length}`, es: es`${one.length}` },
    height: { en: en`${one.width}`, es: es`${one.width}` },
  });
  const boxes = lawn.obstacles.map((one) => ({
    one,
    box: { x: one.xFt, y: one.yFt, width: drawn(one.length.value), height: drawn(one.width.value) },
  }));
  const inner = boxes.map(({ one, box }): PlanShape<Text> => {
    const name = obstacleName(one);
    const bare = { en: name.en.replace(/^the /, ''), es: name.es.replace(/^(el|la) /, '') };
    return { form: 'rect', ...box, ground: obstacleKinds[one.kind].ground, name: bare };
  });
  // The obstacle's width stands below it when it lies against the far edge, so that it stays clear of the lawn's own.
  const obstacleDimensions = boxes.flatMap(({ one, box }) => {
    const [top, side] = boxDimensions(box, sides(one));
    if (!top || !side || box.y > 0) return boxDimensions(box, sides(one));
    const below = box.y + box.height;
    return [{ ...top, from: [box.x + box.width, below] as const, to: [box.x, below] as const }, side];
  });
  const several = lawn.obstacles.length > 0;
  return {
    kind: 'plan',
    width: outer.width,
    height: outer.height,
    shapes: [{ form: 'rect', ...outer, ground: 'turf', name: { en: 'grass', es: 'pasto' } }, ...inner],
    dimensions: [...boxDimensions(outer, sides(lawn)), ...obstacleDimensions],
    alt: {
      en: en`Plan to scale of a rectangular ${siteName(lawn).bare}, ${lawn.length} long and ${lawn.width} wide.${several ? { en: en` Inside it ${obstacleSides(lawn)}.`, es: '' } : ''}`,
      es: es`Plano a escala de un ${siteName(lawn).bare} rectangular de ${lawn.length} de largo y ${lawn.width} de ancho.${several ? { en: '', es: es` Dentro, ${obstacleSides(lawn)}.` } : ''}`,
    },
  };
}

/** Lines that lead to the area treated: the whole, each obstacle, the difference. The last one answers the part. */
export function lawnWorking(lawn: LawnWithObstacles): readonly WorkingLine[] {
  const whole = wholeLawn(lawn);
  const all = {
    name: siteName(lawn).whole,
    expression: times(given(lawn.length), given(lawn.width)),
    result: given(whole),
    reason: { en: 'Length times width.', es: 'Largo por ancho.' },
  };
  if (lawn.obstacles.length === 0) return [{ ...all, name: { en: 'area treated', es: 'área tratada' }, answers: true }];
  return [
    all,
    ...lawn.obstacles.map((one) => ({
      name: obstacleName(one),
      expression: times(given(one.length), given(one.width)),
      result: given(obstacleArea(one)),
      reason: { en: 'Not treated, so it comes off.', es: 'No se trata, así que se resta.' },
    })),
    {
      name: { en: 'area treated', es: 'área tratada' },
      expression: minus(given(whole), ...lawn.obstacles.map((one) => given(obstacleArea(one)))),
      result: given(treatedArea(lawn)),
      answers: true,
      reason: { en: 'Only the ground that is treated counts.', es: 'Solo cuenta el suelo que se trata.' },
    },
  ];
}
