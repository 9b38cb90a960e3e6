import type { Text } from '../../../../shared/vocabulary.ts';
import { both } from '../both.ts';
import type { Equipment } from './equipment-names.ts';
import type { WrongChoice } from './equipment-rule.ts';

function wrong(equipment: Equipment, slip: string, reason: Text): WrongChoice {
  return { equipment, slip, reason };
}

/** A spreader for a liquid. */
export function spreaderForLiquid(equipment: 'rotary' | 'drop' | 'shaker'): WrongChoice {
  return wrong(
    equipment,
    'spreader-for-liquid',
    both(
      'That is made for dry granules. This product is sprayed in water.',
      'Eso es para gránulos secos. Este producto se rocía con agua.',
    ),
  );
}
/** A sprayer for granules. */
export function sprayerForGranules(equipment: 'backpack' | 'rideOn' | 'hoseEnd' | 'hand'): WrongChoice {
  return wrong(
    equipment,
    'sprayer-for-granules',
    both(
      'That is a sprayer, and granules do not go through a nozzle. The label says to spread them dry.',
      'Eso es un rociador, y los gránulos no pasan por una boquilla. La etiqueta dice que se esparcen secos.',
    ),
  );
}
/** More machine than the job needs. */
export function tooLarge(equipment: Equipment, reason: Text): WrongChoice {
  return wrong(equipment, 'too-large', reason);
}
/** Too little for the job. */
export function tooSmall(equipment: Equipment, reason: Text): WrongChoice {
  return wrong(equipment, 'too-small', reason);
}
/** It cannot get there. */
export function noReach(equipment: Equipment, reason: Text): WrongChoice {
  return wrong(equipment, 'no-reach', reason);
}
/** Product lands where it must not. */
export function offTarget(equipment: Equipment, reason: Text): WrongChoice {
  return wrong(equipment, 'off-target', reason);
}
/** The hose decides the rate. */
export function noSetRate(): WrongChoice {
  return wrong(
    'hoseEnd',
    'no-set-rate',
    both(
      'It mixes by whatever the hose gives, so the rate on the ground is a guess. It also needs a backflow guard at the tap.',
      'Mezcla según el agua que dé la manguera, así que la dosis es una adivinanza. Además, la llave necesita protección contra retroceso.',
    ),
  );
}
/** Bait in the open. */
export function openBait(equipment: 'rotary' | 'shaker'): WrongChoice {
  return wrong(
    equipment,
    'open-bait',
    both(
      'That leaves bait in the open, where children, pets and birds can get it.',
      'Eso deja el cebo a la vista, donde lo alcanzan niños, mascotas y aves.',
    ),
  );
}
/** A product that is used as it comes, handled once more than needed. */
export function handledAgain(equipment: 'hand' | 'hoseEnd' | 'backpack'): WrongChoice {
  return wrong(
    equipment,
    'ready-product-mixed',
    both(
      'This product is used as it comes. Pouring it into another tank adds exposure, and water makes it too weak.',
      'Este producto se usa tal como viene. Pasarlo a otro tanque aumenta la exposición, y con agua queda muy débil.',
    ),
  );
}
/** The machine is not safe there. */
export function unsafeGround(equipment: 'rideOn', reason: Text): WrongChoice {
  return wrong(equipment, 'unsafe-ground', reason);
}
/** A powder that sinks to the bottom. */
export function powderSettles(equipment: 'hoseEnd' | 'backpack' | 'hand', reason: Text): WrongChoice {
  return wrong(equipment, 'powder-settles', reason);
}
