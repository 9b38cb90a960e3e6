import { en, es } from '../../say.ts';
import { both } from '../both.ts';
import type { EquipmentRule } from './equipment-rule.ts';
import * as wrong from './wrong-choices.ts';

/** Fills of a tank for so many gallons. */
function fills(gallons: number, tankGallons: number): number {
  return Math.ceil(gallons / tankGallons);
}

/** Second tier: size, form and site together decide. Sources as for the first; gallons are the label's water for the area. */
export const largerJobs: readonly EquipmentRule[] = [
  {
    key: 'wide-turf',
    tier: 2,
    largeGrounds: true,
    size: (rng) => rng.int(6, 15) * 10,
    tellings: 2,
    at: (thousands, telling) => ({
      job: telling
        ? both(
            en`A flat sports field of ${thousands * 1000} square feet gets a liquid over all of it, 1 gallon of mix for each 1,000 square feet.`,
            es`Un campo deportivo plano de ${thousands * 1000} pies cuadrados recibe un líquido en toda su área, 1 galón de mezcla por cada 1,000 pies cuadrados.`,
          )
        : both(
            en`All ${thousands * 1000} square feet of open, level turf are sprayed for broadleaf weeds. The label asks for 1 gallon on each 1,000 square feet.`,
            es`Se rocían contra malezas de hoja ancha los ${thousands * 1000} pies cuadrados de un césped abierto y plano. La etiqueta pide 1 galón por cada 1,000 pies cuadrados.`,
          ),
      right: 'rideOn',
      why: both(
        'A boom lays an even swath at a steady speed, and the tank is made for such an area.',
        'Un aguilón deja una franja pareja a velocidad constante, y el tanque es para un área así.',
      ),
      wrong: [
        wrong.tooSmall(
          'backpack',
          both(
            en`That is ${fills(thousands, 4)} fills of 4 gallons. Nobody keeps an even pace that long.`,
            es`Son ${fills(thousands, 4)} cargas de 4 galones. Nadie mantiene un paso parejo tanto tiempo.`,
          ),
        ),
        wrong.noSetRate(),
        wrong.spreaderForLiquid('rotary'),
      ],
    }),
  },
  {
    key: 'strip-at-water',
    tier: 2,
    size: (rng) => rng.int(4, 10),
    tellings: 2,
    at: (feet, telling) => ({
      job: telling
        ? both(
            en`Granules go on a strip of grass ${feet} feet wide between a walk and a flower bed. None may land in the bed.`,
            es`Van gránulos en una franja de césped de ${feet} pies de ancho entre una acera y un arriate. Ninguno debe caer en el arriate.`,
          )
        : both(
            en`A strip of lawn ${feet} feet wide, outside the label's buffer of a pond, gets a granular product. The edge must stay exact.`,
            es`Una franja de césped de ${feet} pies de ancho, fuera de la distancia que la etiqueta pide a un estanque, recibe un granulado. La orilla debe quedar exacta.`,
          ),
      right: 'drop',
      why: both(
        'The drop spreader lets granules fall straight down between its wheels, so the edge is exact.',
        'El esparcidor de caída deja caer los gránulos entre sus ruedas, así que la orilla queda exacta.',
      ),
      wrong: [
        wrong.offTarget(
          'rotary',
          both(
            en`That throws granules many feet to each side, past a strip of ${feet} feet.`,
            es`Eso tira gránulos muchos pies a cada lado, más allá de una franja de ${feet} pies.`,
          ),
        ),
        wrong.sprayerForGranules('backpack'),
        wrong.sprayerForGranules('hoseEnd'),
      ],
    }),
  },
  {
    key: 'powder-on-turf',
    tier: 2,
    largeGrounds: true,
    size: (rng) => rng.int(3, 8) * 10,
    tellings: 2,
    at: (thousands, telling) => ({
      job: telling
        ? both(
            en`A wettable powder goes on ${thousands * 1000} square feet of level turf, 2 gallons of mix for each 1,000. The powder sinks when it is not stirred.`,
            es`Un polvo mojable va en ${thousands * 1000} pies cuadrados de césped plano, 2 galones de mezcla por cada 1,000. El polvo se asienta si no se agita.`,
          )
        : both(
            en`For brown patch, ${thousands * 1000} square feet of open turf get a wettable powder in water, 2 gallons on each 1,000 square feet. The mix must be kept moving.`,
            es`Contra la mancha parda, ${thousands * 1000} pies cuadrados de césped abierto reciben un polvo mojable en agua, 2 galones por cada 1,000. La mezcla debe mantenerse en movimiento.`,
          ),
      right: 'rideOn',
      why: both(
        'Its pump sends part of the mix back to the tank, which keeps the powder stirred, and the boom covers the area.',
        'Su bomba devuelve parte de la mezcla al tanque, lo que mantiene el polvo agitado, y el aguilón cubre el área.',
      ),
      wrong: [
        wrong.powderSettles(
          'hoseEnd',
          both(
            'The powder sinks in its jar, so the first pass is strong and the last one weak.',
            'El polvo se asienta en el frasco: la primera pasada sale fuerte y la última débil.',
          ),
        ),
        wrong.powderSettles(
          'backpack',
          both(
            en`That takes ${fills(thousands * 2, 4)} fills of 4 gallons, and between strokes the powder sinks.`,
            es`Eso lleva ${fills(thousands * 2, 4)} cargas de 4 galones, y entre bombeos el polvo se asienta.`,
          ),
        ),
        {
          equipment: 'rotary',
          slip: 'powder-as-granules',
          reason: both(
            'That throws granules. A wettable powder is mixed with water and sprayed; dry, it is only dust.',
            'Eso tira gránulos. Un polvo mojable se mezcla con agua y se rocía; seco es solo polvo.',
          ),
        },
      ],
    }),
  },
  {
    key: 'narrow-gate',
    tier: 2,
    size: (rng) => rng.int(15, 30),
    tellings: 2,
    at: (thousands, telling) => ({
      job: telling
        ? both(
            en`A walled lawn of ${thousands * 1000} square feet has one gate, 36 inches wide; the ride-on is 48 inches. A liquid goes on all of it, 2 gallons for each 1,000 square feet. The truck parks at the gate.`,
            es`Un césped cercado de ${thousands * 1000} pies cuadrados tiene una puerta de 36 pulgadas; el montado mide 48. Va un líquido en todo, 2 galones por cada 1,000 pies cuadrados. La camioneta queda junto a la puerta.`,
          )
        : both(
            en`A courtyard lawn of ${thousands * 1000} square feet is reached by a door 36 inches wide. The ride-on is 48 inches wide. All of it gets a liquid, 2 gallons on each 1,000 square feet. The truck stands outside.`,
            es`A un césped interior de ${thousands * 1000} pies cuadrados se entra por una puerta de 36 pulgadas. El montado mide 48. Todo recibe un líquido, 2 galones por cada 1,000 pies cuadrados. La camioneta queda afuera.`,
          ),
      right: 'skid',
      why: both(
        'The tank stays on the truck and only the hose goes in; one fill covers the lawn.',
        'El tanque se queda en la camioneta y solo entra la manguera; una carga cubre el césped.',
      ),
      wrong: [
        wrong.noReach(
          'rideOn',
          both(
            'That does not get in: it is 48 inches wide and the way in is 36.',
            'Eso no entra: mide 48 pulgadas y el paso es de 36.',
          ),
        ),
        wrong.tooSmall(
          'hand',
          both(
            en`That is ${thousands * 2} fills of 1 gallon, each measured and mixed by itself.`,
            es`Son ${thousands * 2} cargas de 1 galón, cada una medida y mezclada aparte.`,
          ),
        ),
        wrong.spreaderForLiquid('rotary'),
      ],
    }),
  },
  {
    key: 'steep-bank',
    tier: 2,
    size: (rng) => rng.int(4, 12) * 200,
    tellings: 2,
    at: (sqFt, telling) => ({
      job: telling
        ? both(
            en`A grassy bank of ${sqFt} square feet is steeper than the ride-on's manual allows. Its weeds get a liquid.`,
            es`Un talud con pasto de ${sqFt} pies cuadrados es más empinado de lo que permite el manual del montado. Sus malezas reciben un líquido.`,
          )
        : both(
            en`Brush on a steep bank of ${sqFt} square feet is sprayed with a liquid. The manual of the ride-on forbids such a slope.`,
            es`Se rocían con un líquido los matorrales de un talud empinado de ${sqFt} pies cuadrados. El manual del montado prohíbe esa pendiente.`,
          ),
      right: 'backpack',
      why: both(
        'A person on foot with a backpack sprayer works across the bank strip by strip, where no machine is safe.',
        'Una persona a pie con mochila trabaja a lo largo del talud franja por franja, donde ninguna máquina es segura.',
      ),
      wrong: [
        wrong.unsafeGround(
          'rideOn',
          both(
            'It can tip over there. The manual does not allow that slope.',
            'Ahí se puede volcar. El manual no permite esa pendiente.',
          ),
        ),
        wrong.spreaderForLiquid('rotary'),
        wrong.spreaderForLiquid('drop'),
      ],
    }),
  },
];
