const fractions: Readonly<Record<string, string>> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** Signs with more than one form, brought to the one on every keyboard. Every pattern is linear in the text. */
function plainSigns(text: string): string {
  return (
    text
      .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞]/g, (sign) => ` ${fractions[sign] ?? ''}`)
      // Before NFKC, which would take the ordinal sign of Spanish keyboards for an o and split the double prime.
      .replace(/[º˚]/g, '°')
      .replace(/[\u201c\u201d\u2033]/g, '"')
      .replace(/[\u2018\u2019\u2032]/g, "'")
      .normalize('NFKC')
      .replace(/[\s\u200b-\u200f\u2060\ufeff]+/g, ' ')
      .replace(/[\u2044\u2215\u00f7]/g, '/')
      .replace(/[\u2010-\u2015\u2212]/g, '-')
  );
}

/** "About 5" in the forms people put before a number. */
const about = /^[ ~=≈]*(?:(?:about|approximately|approx|roughly|aproximadamente|aprox|como|unos|unas)[ .]+)?/;

function withoutTail(text: string): string {
  let end = text.length;
  while (end > 0 && ' .,;'.includes(text[end - 1] as string)) end -= 1;
  return text.slice(0, end);
}

/**
 * One form for all ways to type the same: plain spaces, slashes, hyphens and quotes, fraction signs written out, no
 * periods after abbreviations, lower case; a lone T, which is a tablespoon where t is a teaspoon, is written "tbsp".
 */
export function tidyEntry(text: string): string {
  // oxlint-disable-next-line no-control-regex -- ASCII needs none of the work on other signs
  const plain = /^[\x20-\x7e]*$/.test(text) ? text : plainSigns(text);
  const lower = plain
    .replaceAll("''", '"')
    .replace(/(?<![\p{L}])T(?![\p{L}])/gu, 'tbsp')
    .toLowerCase()
    .replace(/(\p{L})\.(?=\p{L})/gu, '$1 ')
    .replace(/(\p{L})\./gu, '$1');
  return withoutTail(lower.replace(about, '')).replace(/ {2,}/g, ' ');
}
