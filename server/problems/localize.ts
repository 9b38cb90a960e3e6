import type { Locale, Text } from '../../shared/vocabulary.ts';

/** A structure with every `Text` in it replaced by a string. */
export type Localized<T> = T extends Text
  ? string
  : T extends readonly (infer Item)[]
    ? readonly Localized<Item>[]
    : T extends object
      ? { [Key in keyof T]: Localized<T[Key]> }
      : T;

function isText(value: object): value is Text {
  return 'en' in value && 'es' in value && typeof value.en === 'string' && typeof value.es === 'string';
}

/** Puts a structure of texts into one language, however deep they stand. */
export function localize<T>(value: T, locale: Locale): Localized<T> {
  if (value === null || typeof value !== 'object') return value as Localized<T>;
  if (isText(value)) return value[locale] as Localized<T>;
  if (Array.isArray(value)) return value.map((item) => localize(item, locale)) as Localized<T>;
  return Object.fromEntries(
    Object.entries(value).map(([key, inner]) => [key, localize(inner, locale)]),
  ) as Localized<T>;
}
