import { scale, type Quantity } from '../../../../shared/quantity/quantity.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es, firstUse } from '../../say.ts';
import type { Scene, Situation } from '../../situations.ts';

/** What area-circle draws. */
export interface CircleGiven extends Scene {
  readonly size: 'bed' | 'lawn';
  /** Half a circle against a straight edge. */
  readonly half: boolean;
  readonly measured: 'radius' | 'diameter';
  readonly radius: Quantity;
}

export function measureName({ measured }: CircleGiven): Text {
  return measured === 'radius'
    ? { en: 'The radius, from center to edge,', es: 'El radio, del centro al borde,' }
    : { en: 'The diameter, all the way across,', es: 'El diámetro, de lado a lado,' };
}

/** "from the center to the edge it is 12 feet (ft)" */
function tape(g: CircleGiven): Text {
  return g.measured === 'radius'
    ? {
        en: en`From the center to the edge it is ${firstUse(g.radius)}`,
        es: es`Del centro al borde mide ${firstUse(g.radius)}`,
      }
    : {
        en: en`All the way across it is ${firstUse(scale(g.radius, 2))}`,
        es: es`De lado a lado mide ${firstUse(scale(g.radius, 2))}`,
      };
}

const beds: readonly Situation<CircleGiven>[] = [
  {
    heading: { en: 'A round bed', es: 'Un arriate redondo' },
    statement: (g) => ({
      en: en`${g.person} treats a round flower bed ${g.place.at}. ${tape(g)}.`,
      es: es`${g.person} trata un arriate redondo de flores ${g.place.at}. ${tape(g)}.`,
    }),
  },
  {
    heading: { en: 'A traffic circle', es: 'Una glorieta' },
    statement: (g) => ({
      en: en`The round planted island in the driveway ${g.place.of} gets treated ${g.season}. ${tape(g)}.`,
      es: es`La isleta redonda plantada en la entrada ${g.place.of} se trata ${g.season}. ${tape(g)}.`,
    }),
  },
  {
    heading: { en: 'Around the flagpole', es: 'Alrededor del asta' },
    statement: (g) => ({
      en: en`A round bed surrounds the flagpole ${g.place.at}. ${g.person} needs its area for the spray record. ${tape(g)}.`,
      es: es`Un arriate redondo rodea el asta de la bandera ${g.place.at}. ${g.person} necesita su área para el registro. ${tape(g)}.`,
    }),
  },
  {
    heading: { en: 'Before the weeds come up', es: 'Antes de que broten las malezas' },
    statement: (g) => ({
      en: en`${g.person} plans a pre-emergence treatment for a round shrub bed ${g.place.at}. ${tape(g)}.`,
      es: es`${g.person} planea un tratamiento antes del brote para un arriate redondo de arbustos ${g.place.at}. ${tape(g)}.`,
    }),
  },
];

const lawns: readonly Situation<CircleGiven>[] = [
  {
    heading: { en: 'A round lawn', es: 'Un césped redondo' },
    statement: (g) => ({
      en: en`${g.person} measures a round lawn ${g.place.at}. ${tape(g)}. All of it gets treated.`,
      es: es`${g.person} mide un césped redondo ${g.place.at}. ${tape(g)}. Se trata todo.`,
    }),
  },
  {
    heading: { en: 'The circle in front', es: 'El círculo del frente' },
    statement: (g) => ({
      en: en`The driveway ${g.place.of} loops around a circle of grass. It is treated ${g.season}. ${tape(g)}.`,
      es: es`La entrada ${g.place.of} rodea un círculo de pasto. Se trata ${g.season}. ${tape(g)}.`,
    }),
  },
  {
    heading: { en: 'A putting green', es: 'Un green de práctica' },
    statement: (g) => ({
      en: en`A practice green ${g.place.at} is close to a true circle. ${tape(g)}. ${g.person} needs the area before mixing.`,
      es: es`Un green de práctica ${g.place.at} es casi un círculo exacto. ${tape(g)}. ${g.person} necesita el área antes de mezclar.`,
    }),
  },
  {
    heading: { en: 'What a sprinkler covers', es: 'Lo que cubre un aspersor' },
    statement: (g) => ({
      en: en`Only the circle of turf that one sprinkler waters gets the product. ${g.person} tapes the circle. ${tape(g)}.`,
      es: es`Solo el círculo de césped que riega un aspersor recibe el producto. ${g.person} mide el círculo. ${tape(g)}.`,
    }),
  },
];

const halves: readonly Situation<CircleGiven>[] = [
  {
    heading: { en: 'Half a circle against a wall', es: 'Medio círculo contra un muro' },
    statement: (g) => ({
      en: en`A bed ${g.place.at} is half a circle, its straight side against the wall. Along the wall it is ${firstUse(scale(g.radius, 2))}.`,
      es: es`Un arriate ${g.place.at} es medio círculo, con el lado recto contra el muro. Junto al muro mide ${firstUse(scale(g.radius, 2))}.`,
    }),
  },
  {
    heading: { en: 'A bed at the entrance', es: 'Un arriate en la entrada' },
    statement: (g) => ({
      en: en`${g.person} treats a half-round bed at the entrance ${g.place.of}. Its straight side is ${firstUse(scale(g.radius, 2))}.`,
      es: es`${g.person} trata un arriate semicircular en la entrada ${g.place.of}. Su lado recto mide ${firstUse(scale(g.radius, 2))}.`,
    }),
  },
  {
    heading: { en: 'The end of a walk', es: 'El final de un andador' },
    statement: (g) => ({
      en: en`A walk ${g.place.at} ends in a half-round bed. ${g.person} tapes the straight side: ${firstUse(scale(g.radius, 2))}.`,
      es: es`Un andador ${g.place.at} termina en un arriate semicircular. ${g.person} mide el lado recto: ${firstUse(scale(g.radius, 2))}.`,
    }),
  },
  {
    heading: { en: 'Half a circle along a fence', es: 'Medio círculo junto a la cerca' },
    statement: (g) => ({
      en: en`Shrubs fill a half circle along the fence ${g.place.of}. It is treated ${g.season}. Along the fence it is ${firstUse(scale(g.radius, 2))}.`,
      es: es`Unos arbustos llenan medio círculo junto a la cerca ${g.place.of}. Se trata ${g.season}. Junto a la cerca mide ${firstUse(scale(g.radius, 2))}.`,
    }),
  },
];

/** The ways of telling a circle of this size. */
export function circleSituations(g: {
  readonly size: 'bed' | 'lawn';
  readonly half: boolean;
}): readonly Situation<CircleGiven>[] {
  if (g.half) return halves;
  return g.size === 'bed' ? beds : lawns;
}
