import { both } from '../both.ts';
import type { Slip } from '../../family.ts';
import { rulesFor, type Ingredients, type StepKey } from './mixing-steps.ts';

/** Whether the first named step comes after the second in an order; false where one is not there. */
function late(order: readonly string[], step: StepKey, than: StepKey): boolean {
  const [at, other] = [order.indexOf(step), order.indexOf(than)];
  return at >= 0 && other >= 0 && at > other;
}
const products = ['dry', 'liquid'] as const;

/** The mistakes in an order, worst first: the first that fits is told. */
export const mixingOrderSlips: readonly Slip<Ingredients>[] = [
  {
    key: 'gloves-late',
    part: 'a',
    inOrder: (_, order) => order[0] !== 'gloves',
    message: () =>
      both(
        'Something is handled before the gloves are on. Containers, caps and cups can be wet with product.',
        'Se toca algo antes de ponerse los guantes. Envases, tapas y tazas pueden estar mojados de producto.',
      ),
  },
  {
    key: 'product-before-water',
    part: 'a',
    inOrder: (_, order) => products.some((product) => late(order, 'water', product)),
    message: () =>
      both(
        'Product goes in before the water. It sticks to the dry tank, clumps, and splashes when the water hits it.',
        'El producto entra antes que el agua. Se pega al tanque seco, se hace grumos y salpica cuando cae el agua.',
      ),
  },
  {
    key: 'surfactant-first',
    part: 'a',
    inOrder: (_, order) => products.some((product) => late(order, product, 'surfactant')),
    message: () =>
      both(
        'The surfactant goes in too early. It foams, and products put in after it mix badly.',
        'El surfactante entra demasiado pronto. Hace espuma, y lo que se agrega después se mezcla mal.',
      ),
  },
  {
    key: 'no-agitation',
    part: 'a',
    inOrder: (_, order) =>
      ([...products, 'surfactant'] as const).some((added) => late(order, 'agitate', added)) ||
      late(order, 'water', 'agitate'),
    message: () =>
      both(
        'The agitation starts at the wrong moment. Start it with water in the tank, before anything else goes in, or the product sinks.',
        'La agitación empieza en mal momento. Va con agua en el tanque y antes de agregar nada; si no, el producto se asienta.',
      ),
  },
  {
    key: 'liquid-before-dry',
    part: 'a',
    inOrder: (_, order) => late(order, 'dry', 'liquid'),
    message: () =>
      both(
        'The liquid goes in before the dry product. Dry products need plain water to wet through, or they clump.',
        'El líquido entra antes que el producto seco. Lo seco necesita agua sola para mojarse; si no, se hace grumos.',
      ),
  },
  {
    key: 'filled-too-soon',
    part: 'a',
    inOrder: (_, order) => order.at(-1) !== 'fill',
    message: () =>
      both(
        'The tank is filled to the mark too soon. Whatever goes in after that makes more mix than the job takes, and thinner.',
        'El tanque se completa demasiado pronto. Lo que entra después da más mezcla de la que lleva el trabajo.',
      ),
  },
  {
    key: 'rinse-too-soon',
    part: 'a',
    inOrder: (given, order) =>
      rulesFor(given).some(([before, after]) => after === 'rinse' && late(order, before, after)),
    message: () =>
      both(
        'The measure is rinsed before it was used. Rinse it into the tank once the product is in.',
        'La medida se enjuaga antes de usarla. Enjuáguela en el tanque cuando el producto ya esté adentro.',
      ),
  },
];
