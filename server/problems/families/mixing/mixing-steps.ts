import type { Text } from '../../../../shared/vocabulary.ts';
import { en, es } from '../../say.ts';
import { both } from '../both.ts';

/** A step of filling a tank. Which steps there are, and in what order they must come, follows from what goes in. */
export type StepKey = 'gloves' | 'water' | 'agitate' | 'dry' | 'liquid' | 'surfactant' | 'rinse' | 'fill';

/** What goes into the tank: product names where there are any. */
export interface Ingredients {
  readonly dry: string | null;
  readonly liquid: string | null;
  readonly surfactant: boolean;
}

/** The steps for these ingredients, in the order they are done. */
export function stepsFor({ dry, liquid, surfactant }: Ingredients): StepKey[] {
  const all: readonly (readonly [StepKey, boolean])[] = [
    ['gloves', true],
    ['water', true],
    ['agitate', surfactant || dry !== null],
    ['dry', dry !== null],
    ['liquid', liquid !== null],
    ['surfactant', surfactant],
    ['rinse', true],
    ['fill', true],
  ];
  return all.flatMap(([key, there]) => (there ? [key] : []));
}

/** Pairs [before, after] that must hold. Where two may change places, as rinse and surfactant, there is no pair. */
export function rulesFor(ingredients: Ingredients): (readonly [StepKey, StepKey])[] {
  const steps = stepsFor(ingredients);
  const has = (key: StepKey) => steps.includes(key);
  const products = (['dry', 'liquid'] as const).filter(has);
  const all: (readonly [StepKey, StepKey])[] = [
    ...steps.slice(1).map((key) => ['gloves', key] as const),
    ...steps.slice(2).map((key) => ['water', key] as const),
    ...[...products, 'surfactant' as const].map((key) => ['agitate', key] as const),
    ['dry', 'liquid'],
    ...products.flatMap((key) => [[key, 'surfactant'] as const, [key, 'rinse'] as const]),
    ...steps.slice(0, -1).map((key) => [key, 'fill'] as const),
  ];
  return all.filter(([before, after]) => has(before) && has(after));
}

/** A step in words, as a command. */
export function stepText(key: StepKey, { dry, liquid }: Ingredients): Text {
  switch (key) {
    case 'gloves':
      return dry !== null && liquid !== null
        ? both(
            'Put on the gloves and the rest the labels ask for.',
            'Póngase los guantes y lo demás que piden las etiquetas.',
          )
        : both(
            'Put on the gloves and the rest the label asks for.',
            'Póngase los guantes y lo demás que pide la etiqueta.',
          );
    case 'water':
      return both('Fill the tank half full with clean water.', 'Llene el tanque hasta la mitad con agua limpia.');
    case 'agitate':
      return both('Start the agitation.', 'Encienda la agitación.');
    case 'dry':
      return both(
        en`Add the ${dry ?? ''} slowly and let it wet through.`,
        es`Agregue despacio el ${dry ?? ''} y deje que se moje bien.`,
      );
    case 'liquid':
      return both(en`Add the ${liquid ?? ''}.`, es`Agregue el ${liquid ?? ''}.`);
    case 'surfactant':
      return both('Add the surfactant.', 'Agregue el surfactante.');
    case 'rinse':
      return both('Rinse what you measured with into the tank.', 'Enjuague en el tanque lo que usó para medir.');
    case 'fill':
      return both('Fill with water to the mark for this job.', 'Complete con agua hasta la marca de este trabajo.');
  }
}

const reasons: Record<StepKey, Text> = {
  gloves: both(
    'Before anything: even a full container can be wet outside.',
    'Antes que nada: hasta un envase cerrado puede estar mojado por fuera.',
  ),
  water: both(
    'Water first. Product alone in a dry tank sticks, clumps and splashes.',
    'Primero el agua. El producto solo en un tanque seco se pega, se hace grumos y salpica.',
  ),
  agitate: both(
    'The mix must move before anything goes in, so that it spreads at once.',
    'El agua debe moverse antes de agregar nada, para que se reparta enseguida.',
  ),
  dry: both(
    'Dry products go in first: they need plain water to wet through.',
    'Los productos secos van primero: necesitan agua sola para mojarse bien.',
  ),
  liquid: both(
    'A liquid product goes in before anything that foams.',
    'El producto líquido va antes de lo que hace espuma.',
  ),
  surfactant: both(
    'Last of what is added: early on it foams and keeps products from mixing.',
    'Lo último que se agrega: antes hace espuma y estorba la mezcla.',
  ),
  rinse: both('What clings to the measure belongs to the dose.', 'Lo que queda pegado es parte de la dosis.'),
  fill: both(
    'To the mark at the end, so that everything together makes the amount you worked out.',
    'Hasta la marca al final, para que todo junto dé la cantidad calculada.',
  ),
};

/** Why a step stands where it does, with these ingredients. */
export function stepReason(key: StepKey, { surfactant }: Ingredients): Text {
  if (key !== 'liquid' || surfactant) return reasons[key];
  return both(
    'Into water that is already there, so that it spreads and does not cling.',
    'En agua que ya está ahí, para que se reparta y no se pegue.',
  );
}
