import type { Text } from '../../../shared/vocabulary.ts';

/** Lines that several practice labels share, worded as such labels are. Invented for practice; a real label's own lines rule. */
export const headings = {
  lawns: { en: 'Lawns', es: 'Césped residencial' },
  turf: { en: 'Parks and sports turf', es: 'Parques y campos deportivos' },
  beds: { en: 'Flower and shrub beds', es: 'Arriates de flores y arbustos' },
  ornamentals: { en: 'Ornamental shrubs', es: 'Arbustos ornamentales' },
  trees: { en: 'Trees', es: 'Árboles' },
  fenceLine: { en: 'Fence lines', es: 'Líneas de cerca' },
  paving: { en: 'Cracks in paving', es: 'Grietas del pavimento' },
  perimeter: { en: 'Building perimeters', es: 'Perímetros de edificios' },
  spot: { en: 'Spot treatment', es: 'Tratamiento localizado' },
} as const satisfies Record<string, Text>;

export const types = {
  herbicide: { en: 'Herbicide', es: 'Herbicida' },
  insecticide: { en: 'Insecticide', es: 'Insecticida' },
  fungicide: { en: 'Fungicide', es: 'Fungicida' },
} as const satisfies Record<string, Text>;

export const reentry = {
  dry: {
    en: 'Keep people and pets off until the spray has dried.',
    es: 'No deje entrar a personas ni mascotas hasta que el rociado se haya secado.',
  },
  watered: {
    en: 'Keep people and pets off until the granules are watered in and the ground is dry.',
    es: 'No deje entrar a personas ni mascotas hasta que los gránulos se hayan regado y el suelo esté seco.',
  },
  fourHours: {
    en: 'Keep people and pets off for 4 hours and until the spray has dried.',
    es: 'No deje entrar a personas ni mascotas durante 4 horas y hasta que el rociado se haya secado.',
  },
  twelveHours: {
    en: 'Keep people and pets off for 12 hours.',
    es: 'No deje entrar a personas ni mascotas durante 12 horas.',
  },
  dust: {
    en: 'Keep people and pets off until the dust has settled.',
    es: 'No deje entrar a personas ni mascotas hasta que el polvo se haya asentado.',
  },
} as const satisfies Record<string, Text>;

export const ppe = {
  basic: {
    en: 'Long sleeves, long pants, shoes and socks, waterproof gloves.',
    es: 'Manga larga, pantalón largo, zapatos y calcetines, guantes impermeables.',
  },
  goggles: {
    en: 'Long sleeves, long pants, shoes and socks, chemical-resistant gloves; goggles when mixing.',
    es: 'Manga larga, pantalón largo, zapatos y calcetines, guantes resistentes a químicos; gafas protectoras al mezclar.',
  },
  danger: {
    en: 'Coveralls over long sleeves and long pants, chemical-resistant gloves, boots, goggles or a face shield.',
    es: 'Overol sobre manga larga y pantalón largo, guantes resistentes a químicos, botas, gafas protectoras o careta.',
  },
  dusty: {
    en: 'Long sleeves, long pants, shoes and socks, waterproof gloves; a dust mask when pouring.',
    es: 'Manga larga, pantalón largo, zapatos y calcetines, guantes impermeables; mascarilla contra polvo al verter.',
  },
} as const satisfies Record<string, Text>;

export const precautions = {
  skin: {
    en: 'Harmful if absorbed through the skin. Wash hands before eating or drinking.',
    es: 'Dañino si se absorbe por la piel. Lávese las manos antes de comer o beber.',
  },
  eyes: {
    en: 'Causes moderate eye irritation. Keep out of eyes and off clothing.',
    es: 'Causa irritación moderada en los ojos. Evite el contacto con los ojos y la ropa.',
  },
  eyeDamage: {
    en: 'Causes eye damage that does not heal. Do not get in eyes or on skin.',
    es: 'Causa daño permanente en los ojos. Evite todo contacto con los ojos y la piel.',
  },
  bees: {
    en: 'Harmful if swallowed. Toxic to bees: do not apply to plants in bloom.',
    es: 'Dañino si se traga. Tóxico para las abejas: no lo aplique a plantas en flor.',
  },
  fish: {
    en: 'Harmful if inhaled. Toxic to fish: keep out of drains and ponds.',
    es: 'Dañino si se inhala. Tóxico para los peces: manténgalo lejos de desagües y estanques.',
  },
} as const satisfies Record<string, Text>;

export const firstAid = {
  skin: {
    en: 'On skin: take off clothing and rinse for 15 to 20 minutes. Call poison control or a doctor.',
    es: 'En la piel: quítese la ropa y enjuague de 15 a 20 minutos. Llame al centro de toxicología o a un médico.',
  },
  eyes: {
    en: 'In eyes: hold open and rinse with water for 15 to 20 minutes. Call poison control or a doctor.',
    es: 'En los ojos: manténgalos abiertos y enjuague con agua de 15 a 20 minutos. Llame al centro de toxicología o a un médico.',
  },
  swallowed: {
    en: 'If swallowed: call poison control or a doctor at once. Do not make the person vomit unless told to.',
    es: 'Si se traga: llame enseguida al centro de toxicología o a un médico. No provoque el vómito a menos que se lo indiquen.',
  },
  inhaled: {
    en: 'If inhaled: move to fresh air. Call poison control or a doctor.',
    es: 'Si se inhala: salga al aire libre. Llame al centro de toxicología o a un médico.',
  },
} as const satisfies Record<string, Text>;

export const storage = {
  locked: {
    en: 'Store locked, in the original container. Rinse the empty container three times into the spray tank.',
    es: 'Guárdelo bajo llave, en el envase original. Enjuague tres veces el envase vacío dentro del tanque.',
  },
  freezing: {
    en: 'Store locked and above freezing. Rinse the empty container three times into the spray tank.',
    es: 'Guárdelo bajo llave y donde no se congele. Enjuague tres veces el envase vacío dentro del tanque.',
  },
  dry: {
    en: 'Store locked and dry. Empty the bag into the equipment; then put the bag in the trash if local rules allow.',
    es: 'Guárdelo bajo llave y en seco. Vacíe la bolsa en el equipo y tírela a la basura si las reglas locales lo permiten.',
  },
  readyToUse: {
    en: 'Store locked, in the original container. Do not reuse the empty container.',
    es: 'Guárdelo bajo llave, en el envase original. No vuelva a usar el envase vacío.',
  },
} as const satisfies Record<string, Text>;
