import type { Text } from '../../../../shared/vocabulary.ts';
import { both } from '../both.ts';

/** What a crew may have on the truck. The names are of like length, so that none stands out as an answer. */
export const equipmentNames = {
  trigger: both('Ready-to-use trigger bottle', 'Botella con gatillo, lista para usar'),
  hand: both('1-gallon compressed-air sprayer', 'Rociador de aire comprimido de 1 galón'),
  backpack: both('4-gallon backpack sprayer', 'Rociador de mochila de 4 galones'),
  skid: both('Skid sprayer with hose and gun', 'Rociador en camioneta, con manguera y pistola'),
  rideOn: both('Ride-on sprayer with a boom', 'Rociador montado con aguilón'),
  hoseEnd: both('Garden hose-end sprayer', 'Rociador para manguera de jardín'),
  rotary: both('Walk-behind rotary spreader', 'Esparcidor rotativo de empuje'),
  drop: both('Walk-behind drop spreader', 'Esparcidor de caída, de empuje'),
  shaker: both('Shaker can held in one hand', 'Bote agitador que se lleva en la mano'),
  stations: both('Tamper-resistant bait stations', 'Cebaderos a prueba de manipulación'),
} as const satisfies Record<string, Text>;

export type Equipment = keyof typeof equipmentNames;
