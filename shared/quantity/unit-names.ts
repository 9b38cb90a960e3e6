import type { UnitKey } from './units.ts';

interface Name {
  /** As written after a number, one and many. */
  readonly symbol: readonly [one: string, many: string];
  readonly word: readonly [one: string, many: string];
}

function same(symbol: string, one: string, many: string): Name {
  return { symbol: [symbol, symbol], word: [one, many] };
}
function plural(symbolOne: string, symbolMany: string, one: string, many: string): Name {
  return { symbol: [symbolOne, symbolMany], word: [one, many] };
}

type SimpleKey = Exclude<UnitKey, `${string}/${string}`>;

const simpleEn: Record<SimpleKey, Name> = {
  in: same('in', 'inch', 'inches'),
  ft: same('ft', 'foot', 'feet'),
  yd: same('yd', 'yard', 'yards'),
  mi: plural('mile', 'miles', 'mile', 'miles'),
  mm: same('mm', 'millimeter', 'millimeters'),
  cm: same('cm', 'centimeter', 'centimeters'),
  m: same('m', 'meter', 'meters'),
  km: same('km', 'kilometer', 'kilometers'),
  'sq-in': same('sq in', 'square inch', 'square inches'),
  'sq-ft': same('sq ft', 'square foot', 'square feet'),
  'sq-yd': same('sq yd', 'square yard', 'square yards'),
  '1000-sq-ft': same('thousand sq ft', 'thousand square feet', 'thousand square feet'),
  acre: plural('acre', 'acres', 'acre', 'acres'),
  'sq-m': same('sq m', 'square meter', 'square meters'),
  ha: same('ha', 'hectare', 'hectares'),
  'sq-mi': plural('sq mile', 'sq miles', 'square mile', 'square miles'),
  tsp: same('tsp', 'teaspoon', 'teaspoons'),
  tbsp: same('Tbsp', 'tablespoon', 'tablespoons'),
  'fl-oz': same('fl oz', 'fluid ounce', 'fluid ounces'),
  cup: plural('cup', 'cups', 'cup', 'cups'),
  pt: same('pt', 'pint', 'pints'),
  qt: same('qt', 'quart', 'quarts'),
  gal: same('gal', 'gallon', 'gallons'),
  ml: same('mL', 'milliliter', 'milliliters'),
  l: same('L', 'liter', 'liters'),
  'cu-in': same('cu in', 'cubic inch', 'cubic inches'),
  'cu-ft': same('cu ft', 'cubic foot', 'cubic feet'),
  oz: same('oz', 'ounce by weight', 'ounces by weight'),
  lb: same('lb', 'pound', 'pounds'),
  g: same('g', 'gram', 'grams'),
  kg: same('kg', 'kilogram', 'kilograms'),
  ton: plural('ton', 'tons', 'ton', 'tons'),
  mph: same('mph', 'mile per hour', 'miles per hour'),
  psi: same('psi', 'pound per square inch', 'pounds per square inch'),
  kpa: same('kPa', 'kilopascal', 'kilopascals'),
  bar: same('bar', 'bar', 'bar'),
  percent: same('%', 'percent', 'percent'),
  ppm: same('ppm', 'part per million', 'parts per million'),
  f: same('°F', 'degree Fahrenheit', 'degrees Fahrenheit'),
  c: same('°C', 'degree Celsius', 'degrees Celsius'),
  s: same('s', 'second', 'seconds'),
  min: same('min', 'minute', 'minutes'),
  h: same('h', 'hour', 'hours'),
  day: plural('day', 'days', 'day', 'days'),
  usd: same('$', 'dollar', 'dollars'),
  deg: same('°', 'degree', 'degrees'),
  count: same('', '', ''),
};

const simpleEs: Record<SimpleKey, Name> = {
  in: same('pulg', 'pulgada', 'pulgadas'),
  ft: plural('pie', 'pies', 'pie', 'pies'),
  yd: same('yd', 'yarda', 'yardas'),
  mi: plural('milla', 'millas', 'milla', 'millas'),
  mm: same('mm', 'milímetro', 'milímetros'),
  cm: same('cm', 'centímetro', 'centímetros'),
  m: same('m', 'metro', 'metros'),
  km: same('km', 'kilómetro', 'kilómetros'),
  'sq-in': same('pulg²', 'pulgada cuadrada', 'pulgadas cuadradas'),
  'sq-ft': plural('pie²', 'pies²', 'pie cuadrado', 'pies cuadrados'),
  'sq-yd': same('yd²', 'yarda cuadrada', 'yardas cuadradas'),
  '1000-sq-ft': same('mil pies²', 'mil pies cuadrados', 'mil pies cuadrados'),
  acre: plural('acre', 'acres', 'acre', 'acres'),
  'sq-m': same('m²', 'metro cuadrado', 'metros cuadrados'),
  ha: same('ha', 'hectárea', 'hectáreas'),
  'sq-mi': plural('milla²', 'millas²', 'milla cuadrada', 'millas cuadradas'),
  tsp: plural('cdta', 'cdtas', 'cucharadita', 'cucharaditas'),
  tbsp: plural('cda', 'cdas', 'cucharada', 'cucharadas'),
  'fl-oz': same('oz líq', 'onza líquida', 'onzas líquidas'),
  cup: plural('taza', 'tazas', 'taza', 'tazas'),
  pt: plural('pinta', 'pintas', 'pinta', 'pintas'),
  qt: plural('cuarto', 'cuartos', 'cuarto de galón', 'cuartos de galón'),
  gal: same('gal', 'galón', 'galones'),
  ml: same('mL', 'mililitro', 'mililitros'),
  l: same('L', 'litro', 'litros'),
  'cu-in': same('pulg³', 'pulgada cúbica', 'pulgadas cúbicas'),
  'cu-ft': plural('pie³', 'pies³', 'pie cúbico', 'pies cúbicos'),
  oz: same('oz', 'onza de peso', 'onzas de peso'),
  lb: same('lb', 'libra', 'libras'),
  g: same('g', 'gramo', 'gramos'),
  kg: same('kg', 'kilogramo', 'kilogramos'),
  ton: plural('tonelada', 'toneladas', 'tonelada corta', 'toneladas cortas'),
  mph: same('mi/h', 'milla por hora', 'millas por hora'),
  psi: same('psi', 'libra por pulgada cuadrada', 'libras por pulgada cuadrada'),
  kpa: same('kPa', 'kilopascal', 'kilopascales'),
  bar: same('bar', 'bar', 'bares'),
  percent: same('%', 'por ciento', 'por ciento'),
  ppm: same('ppm', 'parte por millón', 'partes por millón'),
  f: same('°F', 'grado Fahrenheit', 'grados Fahrenheit'),
  c: same('°C', 'grado Celsius', 'grados Celsius'),
  s: same('s', 'segundo', 'segundos'),
  min: same('min', 'minuto', 'minutos'),
  h: same('h', 'hora', 'horas'),
  day: plural('día', 'días', 'día', 'días'),
  usd: same('$', 'dólar', 'dólares'),
  deg: same('°', 'grado', 'grados'),
  count: same('', '', ''),
};

const simple = { en: simpleEn, es: simpleEs } as const;

/** What stands below the line of a rate. */
const below: Readonly<Record<string, Readonly<Record<'en' | 'es', readonly [symbol: string, word: string]>>>> = {
  acre: { en: ['acre', 'acre'], es: ['acre', 'acre'] },
  '1000-sq-ft': { en: ['1,000 sq ft', '1,000 square feet'], es: ['1,000 pies²', '1,000 pies cuadrados'] },
  gal: { en: ['gal', 'gallon'], es: ['gal', 'galón'] },
  '100-gal': { en: ['100 gal', '100 gallons'], es: ['100 gal', '100 galones'] },
  min: { en: ['min', 'minute'], es: ['min', 'minuto'] },
  s: { en: ['s', 'second'], es: ['s', 'segundo'] },
  h: { en: ['h', 'hour'], es: ['h', 'hora'] },
  ha: { en: ['ha', 'hectare'], es: ['ha', 'hectárea'] },
  l: { en: ['L', 'liter'], es: ['L', 'litro'] },
  'sq-m': { en: ['sq m', 'square meter'], es: ['m²', 'metro cuadrado'] },
};

function isSimple(key: string): key is SimpleKey {
  return Object.hasOwn(simpleEn, key);
}

/** A unit's name in a language: `symbol` as written after a number, `word` written out; `many` chooses the plural. */
export function unitName(options: {
  unit: UnitKey;
  locale: 'en' | 'es';
  form: 'symbol' | 'word';
  many: boolean;
}): string {
  const { unit, locale, form, many } = options;
  const pick = (name: Name) => name[form][many ? 1 : 0];
  if (isSimple(unit)) return pick(simple[locale][unit]);
  const [top, bottom] = unit.split('/') as [string, string];
  const under = below[bottom]?.[locale];
  const over = isSimple(top) ? pick(simple[locale][top]) : top;
  if (!under) return `${over}/${bottom}`;
  return `${over} ${locale === 'en' ? 'per' : 'por'} ${under[form === 'symbol' ? 0 : 1]}`;
}
