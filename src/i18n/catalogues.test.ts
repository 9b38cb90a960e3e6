import { describe, expect, test } from 'vitest';

// Every area's Spanish has exactly the messages of its English, with the same places to fill.

type Catalogue = Readonly<Record<string, unknown>>;

const spanish = import.meta.glob<{ es: Catalogue }>('./es/*.ts', { eager: true });
const sources = import.meta.glob<string>('./*.ts', { eager: true, query: '?raw', import: 'default' });

/** The English of an area as it stands in its file: the library keeps the texts to itself. */
function englishOf(area: string): { keys: Map<string, Set<string>> } | null {
  for (const text of Object.values(sources)) {
    const start = text.indexOf(`i18n('${area}', {`);
    if (start === -1) continue;
    const body = text.slice(start, text.indexOf('\n});', start));
    const keys = new Map<string, Set<string>>();
    let key = '';
    for (const line of body.split('\n').slice(1)) {
      key = /^ {2}'?([\w-]+)'?:/.exec(line)?.[1] ?? key;
      const places = keys.get(key) ?? new Set();
      for (const [, name] of line.matchAll(/\{(\w+)\}/g)) places.add(String(name));
      keys.set(key, places);
    }
    return { keys };
  }
  return null;
}

function placesOf(message: unknown): string[] {
  const texts = typeof message === 'string' ? [message] : Object.values(message as Record<string, string>);
  return [
    ...new Set(texts.flatMap((text) => [...text.matchAll(/\{(\w+)\}/g)].map((match) => String(match[1])))),
  ].sort();
}

const areas = Object.values(sources).flatMap((text) =>
  [...text.matchAll(/i18n\('([\w-]+)'/g)].map((match) => String(match[1])),
);

describe('the catalogues', () => {
  test('there is a Spanish file for every area, and none besides', () => {
    const files = Object.keys(spanish).map((name) => name.replace('./es/', '').replace('.ts', ''));
    expect(files.sort()).toEqual([...areas].sort());
    expect(areas.length).toBeGreaterThan(10);
  });

  test.each(areas)('%s says the same in both languages', (area) => {
    const english = englishOf(area)?.keys ?? new Map<string, Set<string>>();
    const other = spanish[`./es/${area}.ts`]?.es ?? {};
    expect(Object.keys(other).sort()).toEqual([...english.keys()].sort());
    for (const [key, places] of english) expect(placesOf(other[key]), `${area}.${key}`).toEqual([...places].sort());
  });
});
