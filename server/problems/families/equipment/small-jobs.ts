import { en, es } from '../../say.ts';
import { both } from '../both.ts';
import type { EquipmentRule } from './equipment-rule.ts';
import * as wrong from './wrong-choices.ts';

/** First tier: one fact decides. Source: Pesticide Application Equipment, British Columbia Ministry of Agriculture. */
export const smallJobs: readonly EquipmentRule[] = [
  {
    key: 'scattered-weeds',
    tier: 1,
    size: (rng) => rng.int(8, 18) * 500,
    tellings: 2,
    at: (sqFt, telling) => ({
      job: telling
        ? both(
            en`On a lawn of ${sqFt} square feet, weeds stand in some thirty small patches. Only the patches are sprayed, with a liquid from a 2-gallon mix.`,
            es`En un césped de ${sqFt} pies cuadrados hay maleza en unos treinta manchones pequeños. Solo se rocían los manchones, con un líquido de una mezcla de 2 galones.`,
          )
        : both(
            en`A lawn of ${sqFt} square feet has scattered dandelions. The label's line for spot treatment is used: a liquid, 2 gallons of mix in all.`,
            es`Un césped de ${sqFt} pies cuadrados tiene dientes de león dispersos. Se usa la línea de tratamiento localizado de la etiqueta: un líquido, 2 galones de mezcla en total.`,
          ),
      right: 'backpack',
      why: both(
        'The backpack sprayer carries the 2 gallons and wets each weed by hand, nothing else.',
        'El rociador de mochila lleva los 2 galones y moja a mano cada maleza, y nada más.',
      ),
      wrong: [
        wrong.tooLarge(
          'rideOn',
          both(
            'That treats the whole lawn. Most of it has no weeds and needs no product.',
            'Eso trata todo el césped. La mayor parte no tiene maleza ni necesita producto.',
          ),
        ),
        wrong.spreaderForLiquid('rotary'),
        wrong.spreaderForLiquid('drop'),
      ],
    }),
  },
  {
    key: 'small-bed',
    tier: 1,
    size: (rng) => rng.int(8, 18) * 5,
    tellings: 2,
    at: (sqFt, telling) => ({
      job: telling
        ? both(
            en`One flower bed of ${sqFt} square feet by the door needs half a gallon of a liquid mix.`,
            es`Un arriate de ${sqFt} pies cuadrados junto a la puerta necesita medio galón de una mezcla líquida.`,
          )
        : both(
            en`A bed of ${sqFt} square feet has aphids. The job takes half a gallon of mix from a liquid concentrate.`,
            es`Un arriate de ${sqFt} pies cuadrados tiene pulgones. El trabajo lleva medio galón de mezcla de un concentrado líquido.`,
          ),
      right: 'hand',
      why: both(
        'The small hand sprayer takes half a gallon, is carried in one hand and leaves little to rinse.',
        'El rociador pequeño lleva medio galón, se carga en una mano y deja poco que enjuagar.',
      ),
      wrong: [
        wrong.tooLarge(
          'skid',
          both(
            'That holds gallons in its pump and hose alone. Half a gallon would never reach the gun.',
            'Eso guarda galones solo en la bomba y la manguera. Medio galón no llegaría a la pistola.',
          ),
        ),
        wrong.tooLarge(
          'rideOn',
          both(
            'That is built for open turf. It does not fit a flower bed.',
            'Eso está hecho para césped abierto. No cabe en un arriate.',
          ),
        ),
        wrong.spreaderForLiquid('rotary'),
      ],
    }),
  },
  {
    key: 'ready-to-use',
    tier: 1,
    size: (rng) => rng.int(6, 20),
    tellings: 2,
    at: (feet, telling) => ({
      job: telling
        ? both(
            en`Ants cross a door sill ${feet} feet long. The label of the product at hand says: use as it comes, do not dilute.`,
            es`Las hormigas cruzan un umbral de ${feet} pies. La etiqueta del producto disponible dice: úselo tal como viene, no lo diluya.`,
          )
        : both(
            en`Along ${feet} feet of a porch wall ants come in. The product is ready to use; its label says not to dilute it.`,
            es`A lo largo de ${feet} pies del muro de un porche entran hormigas. El producto viene listo para usar; la etiqueta dice que no se diluya.`,
          ),
      right: 'trigger',
      why: both(
        'The bottle it comes in is the equipment: nothing to mix, measure or pour.',
        'La botella en que viene es el equipo: nada que mezclar, medir ni verter.',
      ),
      wrong: [
        wrong.handledAgain('hand'),
        wrong.handledAgain('hoseEnd'),
        wrong.tooLarge(
          'rideOn',
          both(
            'That is for open turf, not for a few feet of wall.',
            'Eso es para césped abierto, no para unos pies de muro.',
          ),
        ),
      ],
    }),
  },
  {
    key: 'open-granules',
    tier: 1,
    size: (rng) => rng.int(16, 60) * 500,
    tellings: 2,
    at: (sqFt, telling) => ({
      job: telling
        ? both(
            en`An open lawn of ${sqFt} square feet, with no beds or water near it, gets a granular product.`,
            es`Un césped abierto de ${sqFt} pies cuadrados, sin arriates ni agua cerca, recibe un producto granulado.`,
          )
        : both(
            en`Granules for weed seedlings go on ${sqFt} square feet of open grass. Nothing else grows near it.`,
            es`Van gránulos contra maleza por brotar en ${sqFt} pies cuadrados de césped abierto. Cerca no crece nada más.`,
          ),
      right: 'rotary',
      why: both(
        'The rotary spreader throws a wide, overlapping swath, and here nothing stands in its way.',
        'El esparcidor rotativo tira una franja ancha que se traslapa, y aquí nada le estorba.',
      ),
      wrong: [
        wrong.tooSmall(
          'shaker',
          both(
            en`That is for a few square feet. Nobody spreads ${sqFt} square feet evenly by hand.`,
            es`Eso es para unos pocos pies cuadrados. Nadie reparte parejo ${sqFt} pies cuadrados a mano.`,
          ),
        ),
        wrong.sprayerForGranules('backpack'),
        wrong.sprayerForGranules('rideOn'),
      ],
    }),
  },
  {
    key: 'tall-trees',
    tier: 1,
    size: (rng) => rng.int(5, 9) * 5,
    tellings: 2,
    at: (feet, telling) => ({
      job: telling
        ? both(
            en`Caterpillars feed in the top of shade trees ${feet} feet tall. The spray has to get up there from the ground.`,
            es`Hay orugas en la copa de árboles de sombra de ${feet} pies. El rociado debe llegar arriba desde el suelo.`,
          )
        : both(
            en`A row of trees ${feet} feet tall needs a liquid insecticide over the whole crown.`,
            es`Una hilera de árboles de ${feet} pies necesita un insecticida líquido en toda la copa.`,
          ),
      right: 'skid',
      why: both(
        'A power pump, a long hose and a gun carry the spray up to the crown.',
        'Una bomba de motor, una manguera larga y una pistola llevan el rociado hasta la copa.',
      ),
      wrong: [
        wrong.noReach(
          'backpack',
          both(
            en`A hand pump does not throw spray ${feet} feet up.`,
            es`Una bomba de mano no lanza el rociado a ${feet} pies de altura.`,
          ),
        ),
        wrong.noReach(
          'hand',
          both(
            'That reaches a few feet. Most of the spray would fall back on the person.',
            'Eso alcanza unos pocos pies. Casi todo caería sobre la persona.',
          ),
        ),
        wrong.noReach(
          'rideOn',
          both(
            'A boom points at the ground. The trees stand above it.',
            'Un aguilón apunta al suelo. Los árboles quedan arriba.',
          ),
        ),
      ],
    }),
  },
  {
    key: 'mice-at-wall',
    tier: 1,
    size: (rng) => rng.int(4, 12) * 20,
    tellings: 2,
    at: (feet, telling) => ({
      job: telling
        ? both(
            en`Mice run along ${feet} feet of outside wall, where children pass. The product is a bait block.`,
            es`Hay ratones a lo largo de ${feet} pies de muro exterior, por donde pasan niños. El producto es un cebo en bloque.`,
          )
        : both(
            en`A bait for mice goes out along a wall ${feet} feet long. Dogs are walked there every day.`,
            es`Se coloca cebo para ratones a lo largo de un muro de ${feet} pies. Por ahí pasean perros todos los días.`,
          ),
      right: 'stations',
      why: both(
        'Locked stations let mice in and keep children, pets and birds out.',
        'Los cebaderos cerrados dejan entrar ratones y mantienen fuera a niños, mascotas y aves.',
      ),
      wrong: [
        wrong.openBait('rotary'),
        wrong.openBait('shaker'),
        {
          equipment: 'hand',
          slip: 'sprayer-for-bait',
          reason: both(
            'That sprays a liquid. A bait is eaten where it lies.',
            'Eso rocía un líquido. Un cebo se come donde está.',
          ),
        },
      ],
    }),
  },
];
