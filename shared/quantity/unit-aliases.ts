import { units, type UnitKey } from './units.ts';

// What people type for each unit, lower case, without periods, ² written 2. A new spelling is one word in its line.
// A lone T or t is told apart before lower-casing (tablespoon, teaspoon).
const spellings: Partial<Record<UnitKey, string>> = {
  in: 'in|inch|inches|"|pulg|pulgada|pulgadas',
  ft: "ft|foot|feet|'|pie|pies",
  yd: 'yd|yds|yard|yards|yarda|yardas',
  mi: 'mi|mile|miles|milla|millas',
  mm: 'mm|millimeter|millimeters|milimetro|milimetros|milímetro|milímetros',
  cm: 'cm|centimeter|centimeters|centimetro|centimetros|centímetro|centímetros',
  m: 'm|meter|meters|metro|metros',
  km: 'km|kilometer|kilometers|kilometro|kilometros|kilómetro|kilómetros',
  'sq-in': 'sq in|sqin|in2|in^2|square inch|square inches|pulg2|pulgada cuadrada|pulgadas cuadradas',
  'sq-ft': 'sq ft|sqft|sf|ft2|ft^2|sq feet|sq foot|square foot|square feet|square ft|pie2|pies2|pie cuadrado|pies cuadrados',
  'sq-yd': 'sq yd|sq yds|sqyd|yd2|yd^2|square yard|square yards|yarda cuadrada|yardas cuadradas',
  '1000-sq-ft': 'thousand sq ft|thousand square feet|msf|mil pies2|mil pies cuadrados',
  acre: 'acre|acres|ac|a',
  'sq-m': 'sq m|sqm|m2|m^2|square meter|square meters|metro cuadrado|metros cuadrados',
  ha: 'ha|hectare|hectares|hectárea|hectáreas|hectarea|hectareas',
  'sq-mi': 'sq mi|sq mile|sq miles|square mile|square miles|milla2|millas2',
  tsp: 't|tsp|tsps|teaspoon|teaspoons|cdta|cdtas|cdita|cditas|cucharadita|cucharaditas',
  tbsp: 'tbsp|tbsps|tbs|tbl|tablespoon|tablespoons|cda|cdas|cucharada|cucharadas',
  'fl-oz':
    'fl oz|floz|fl ozs|oz fl|fluid oz|fluid ounce|fluid ounces|fl ounce|fl ounces|onza liquida|onzas liquidas|onza líquida|onzas líquidas|oz liq|oz líq|oz liquida|oz líquida|oz liquidas|oz líquidas',
  cup: 'cup|cups|c|taza|tazas',
  pt: 'pt|pts|pint|pints|pinta|pintas',
  qt: 'qt|qts|quart|quarts|cuarto|cuartos|cuarto de galón|cuartos de galón',
  gal: 'gal|gals|gallon|gallons|galon|galón|galones',
  ml: 'ml|milliliter|milliliters|millilitre|millilitres|cc|mililitro|mililitros',
  l: 'l|liter|liters|litre|litres|litro|litros',
  'cu-in': 'cu in|in3|cubic inch|cubic inches|pulg3',
  'cu-ft': 'cu ft|ft3|cubic foot|cubic feet|pie3|pies3',
  oz: 'oz|ozs|ounce|ounces|oz wt|wt oz|oz by weight|ounce by weight|ounces by weight|dry oz|onza|onzas|onzas de peso|onza de peso',
  lb: 'lb|lbs|#|pound|pounds|libra|libras',
  g: 'g|gm|gms|gram|grams|gramo|gramos',
  kg: 'kg|kgs|kilo|kilos|kilogram|kilograms|kilogramo|kilogramos',
  ton: 'ton|tons|tonelada|toneladas|tonelada corta|toneladas cortas',
  'gal/min': 'gpm',
  mph: 'mph|mi/h|mi/hr|mile per hour|miles per hour|miles an hour|millas por hora|milla por hora',
  'km/h': 'kph|kmh',
  psi: 'psi|lb per sq in|pounds per square inch|pound per square inch|libras por pulgada cuadrada|libra por pulgada cuadrada',
  kpa: 'kpa|kilopascal|kilopascals|kilopascales',
  bar: 'bar|bars|bares',
  'gal/acre': 'gpa',
  percent: '%|percent|pct|por ciento',
  ppm: 'ppm|part per million|parts per million|parte por millón|partes por millón|partes por millon',
  f: '°f|f|degree fahrenheit|degrees fahrenheit|grado fahrenheit|grados fahrenheit',
  c: '°c|degree celsius|degrees celsius|grado celsius|grados celsius',
  s: 's|sec|secs|second|seconds|seg|segundo|segundos',
  min: 'min|mins|minute|minutes|minuto|minutos',
  h: 'h|hr|hrs|hour|hours|hora|horas',
  day: 'day|days|día|días|dia|dias',
  usd: '$|dollar|dollars|usd|dólar|dólares|dolar|dolares',
  deg: '°|deg|degree|degrees|grado|grados',
};

/** Spellings of what stands below the line of a rate. */
const belows: Readonly<Record<string, string>> = {
  acre: 'acre|ac|a|acres',
  '1000-sq-ft':
    '1000 sq ft|1,000 sq ft|1000 square feet|1,000 square feet|1000 sqft|1,000 sqft|1000 ft2|1,000 ft2|thousand sq ft|thousand square feet|m sq ft|1k sq ft|k sq ft|1000 pies2|1,000 pies2|1000 pies cuadrados|1,000 pies cuadrados|mil pies2|mil pies cuadrados',
  gal: 'gal|gallon|galón|galon',
  '100-gal': '100 gal|100 gallons|100 galones',
  min: 'min|minute|minuto',
  s: 's|sec|second|segundo',
  h: 'h|hr|hour|hora',
  ha: 'ha|hectare|hectárea',
  l: 'l|liter|litro',
  'sq-m': 'm2|sq m|square meter|metro cuadrado',
};
const joints = ['/', ' / ', ' per ', ' a ', ' an ', ' por ', ' each ', ' for each '];

function spellingsOf(unit: UnitKey): string[] {
  return spellings[unit]?.split('|') ?? [];
}

function build(): Map<string, UnitKey> {
  const map = new Map<string, UnitKey>();
  for (const unit of Object.keys(units) as UnitKey[]) {
    for (const spelling of spellingsOf(unit)) map.set(spelling, unit);
    const [top, bottom] = unit.split('/') as [UnitKey, string | undefined];
    if (bottom === undefined) continue;
    for (const over of spellingsOf(top)) {
      for (const joint of joints) for (const under of belows[bottom]?.split('|') ?? []) map.set(`${over}${joint}${under}`, unit);
    }
  }
  return map;
}

const aliases = build();
const longest = Math.max(...[...aliases.keys()].map((spelling) => spelling.length));
const letter = /[\p{L}0-9]/u;

/**
 * The longest unit that a text starts with at `from`, and where it ends; null when it starts with none. At most as many
 * look-ups as the longest spelling has characters.
 */
export function unitAt(text: string, from: number): { unit: UnitKey; end: number } | null {
  for (let end = Math.min(text.length, from + longest); end > from; end -= 1) {
    const unit = aliases.get(text.slice(from, end));
    if (unit === undefined) continue;
    const inside = letter.test(text[end - 1] ?? '') && letter.test(text[end] ?? '');
    if (!inside) return { unit, end };
  }
  return null;
}

/** Whether a text is a known spelling of a unit; for tests and authors. */
export function knownSpelling(text: string): UnitKey | undefined {
  return aliases.get(text);
}
