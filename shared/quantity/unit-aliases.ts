import type { Kind, UnitKey } from './units.ts';

// What people type for each unit, lower case, without periods, ² written 2. A new spelling is one word in its line.
// A lone T is a tablespoon: told apart, as "tbsp", before lower-casing.

const sqFt =
  'sq ft|sqft|sf|ft2|ft^2|sq feet|sq foot|square foot|square feet|square ft|sq pies|pie2|pies2|pie cuadrado|pies cuadrados';
const sqM = 'sq m|sqm|m2|m^2|square meter|square meters|metro cuadrado|metros cuadrados';
const gal = 'gal|gals|gallon|gallons|us gal|us gallon|us gallons|u s gal|galon|galón|galones';
const acre = 'acre|acres|ac|a';
const ha = 'ha|hectare|hectares|hectárea|hectáreas|hectarea|hectareas';
const l = 'l|liter|liters|litre|litres|lt|lts|litro|litros';
const s = 's|sec|secs|second|seconds|seg|segundo|segundos';
const min = 'min|mins|minute|minutes|minuto|minutos';
const h = 'h|hr|hrs|hour|hours|hora|horas';

/** Names of units that are not rates, and short names of some that are. */
export const spellings: Readonly<Partial<Record<UnitKey, string>>> = {
  in: 'in|inch|inches|"|pulg|pulgs|pulgada|pulgadas',
  ft: "ft|foot|feet|'|pie|pies",
  yd: 'yd|yds|yard|yards|yarda|yardas',
  mi: 'mi|mile|miles|milla|millas',
  mm: 'mm|millimeter|millimeters|milimetro|milimetros|milímetro|milímetros',
  cm: 'cm|centimeter|centimeters|centimetro|centimetros|centímetro|centímetros',
  m: 'm|meter|meters|metro|metros',
  km: 'km|kilometer|kilometers|kilometro|kilometros|kilómetro|kilómetros',
  'sq-in': 'sq in|sqin|in2|in^2|square inch|square inches|pulg2|pulgada cuadrada|pulgadas cuadradas',
  'sq-ft': sqFt,
  'sq-yd': 'sq yd|sq yds|sqyd|yd2|yd^2|sq yard|sq yards|square yard|square yards|yarda cuadrada|yardas cuadradas',
  '1000-sq-ft': 'thousand sq ft|thousand square feet|msf|mil pies2|mil pies cuadrados',
  acre,
  'sq-m': sqM,
  ha,
  'sq-mi': 'sq mi|sq mile|sq miles|mi2|mi^2|square mile|square miles|milla2|millas2|milla cuadrada|millas cuadradas',
  tsp: 't|tsp|tsps|teaspoon|teaspoons|cdta|cdtas|cdita|cditas|cucharadita|cucharaditas',
  tbsp: 'tbsp|tbsps|tbs|tbl|tbls|tb|tblsp|tblsps|tablespoon|tablespoons|cda|cdas|cucharada|cucharadas',
  'fl-oz':
    'fl oz|floz|fl ozs|oz fl|ozfl|fluid oz|fluid ozs|fluid ounce|fluid ounces|fl ounce|fl ounces|liquid oz|liquid ounce|liquid ounces|onza liquida|onzas liquidas|onza líquida|onzas líquidas|onza fluida|onzas fluidas|oz liq|oz líq|oz liquida|oz líquida|oz liquidas|oz líquidas|oz fluida|oz fluidas',
  cup: 'cup|cups|c|taza|tazas',
  pt: 'pt|pts|pint|pints|pinta|pintas',
  qt: 'qt|qts|quart|quarts|cuarto|cuartos|cuarto de galón|cuartos de galón|cuarto de galon|cuartos de galon',
  gal,
  ml: 'ml|mls|milliliter|milliliters|millilitre|millilitres|cc|mililitro|mililitros',
  l,
  'cu-in': 'cu in|in3|in^3|cubic in|cubic inch|cubic inches|pulg3|pulgada cúbica|pulgadas cúbicas',
  'cu-ft': 'cu ft|ft3|ft^3|cubic ft|cubic foot|cubic feet|pie3|pies3|pie cúbico|pies cúbicos',
  oz: 'oz|ozs|ounce|ounces|oz wt|wt oz|oz by weight|ounce by weight|ounces by weight|dry oz|dry ounce|dry ounces|onza|onzas|onza de peso|onzas de peso',
  lb: 'lb|lbs|#|pound|pounds|libra|libras',
  g: 'g|gm|gms|gram|grams|gramo|gramos',
  kg: 'kg|kgs|kilo|kilos|kilogram|kilograms|kilogramo|kilogramos',
  ton: 'ton|tons|short ton|short tons|tonelada|toneladas|tonelada corta|toneladas cortas',
  'gal/min': 'gpm|g p m',
  mph: 'mph|m p h|miles an hour',
  'km/h': 'kph|kmh',
  psi: 'psi|p s i|psig',
  kpa: 'kpa|kilopascal|kilopascals|kilopascales',
  bar: 'bar|bars|bares',
  'gal/acre': 'gpa|g p a',
  percent: '%|percent|per cent|pct|por ciento',
  ppm: 'ppm|p p m|part per million|parts per million|parte por millón|partes por millón|partes por millon',
  f: '°f|f|degree f|degrees f|degree fahrenheit|degrees fahrenheit|fahrenheit|grado fahrenheit|grados fahrenheit',
  c: '°c|degree c|degrees c|degree celsius|degrees celsius|celsius|grado celsius|grados celsius|grados c',
  s,
  min,
  h,
  day: 'day|days|día|días|dia|dias',
  usd: '$|dollar|dollars|usd|dólar|dólares|dolar|dolares',
  deg: '°|deg|degree|degrees|grado|grados',
  // Whole things that are only counted.
  count:
    'load|loads|tank|tanks|tankful|tankfuls|pass|passes|trip|trips|bag|bags|station|stations|carga|cargas|tanque|tanques|pasada|pasadas|viaje|viajes|bolsa|bolsas|saco|sacos|estación|estaciones',
};

function combine(fronts: string, separators: readonly string[], backs: string): string {
  const pairs = fronts.split('|').flatMap((front) => separators.map((between) => front + between));
  return pairs.flatMap((start) => backs.split('|').map((back) => start + back)).join('|');
}

const thousand = '1000|1,000|1.000|1 000|1k|k|thousand|mil';

/** Names of what stands below the line of a rate. The trade also says "per thousand" alone. */
export const belowSpellings: Readonly<Record<string, string>> = {
  acre,
  '1000-sq-ft': `${combine(thousand, [' ', ''], sqFt)}|1000|1,000|thousand|msf|m sq ft`,
  gal,
  '100-gal': combine('100|hundred|cien', [' ', ''], gal),
  min,
  s,
  h,
  ha,
  l,
  'sq-m': sqM,
  'sq-in': 'sq in|in2|square inch|square inches|pulgada cuadrada',
};

/** Rates whose key is not the keys of their parts. */
export const rateUnits: Readonly<Record<string, UnitKey>> = { 'mi/h': 'mph', 'lb/sq-in': 'psi' };

/** What a name means where another kind of thing is asked than it usually names; 'asked' is the asked unit itself. */
export const inContext: Readonly<Partial<Record<Kind, Readonly<Record<string, UnitKey | 'asked'>>>>> = {
  temperature: {
    c: 'c',
    '°': 'asked',
    deg: 'asked',
    degree: 'asked',
    degrees: 'asked',
    grado: 'asked',
    grados: 'asked',
  },
  time: { m: 'min' },
  pressure: { pounds: 'psi', lb: 'psi', lbs: 'psi', libras: 'psi' },
};
