import { createI18n, formatter, type ComponentsJSON } from '@nanostores/i18n';
import { useStore } from '@nanostores/react';
import { atom } from 'nanostores';
import { locales, type Locale } from '../../shared/vocabulary.ts';

/** Each language in its own words. */
export const languageNames: Readonly<Record<Locale, string>> = { en: 'English', es: 'Español' };

const place = 'tankmark.language';

/** What a visitor chose on this device; a person signed in has a language of their own. */
function chosenLocale(): Locale | undefined {
  try {
    return locales.find((locale) => locale === localStorage.getItem(place));
  } catch {
    return undefined;
  }
}

function browserLocale(): Locale {
  const wanted = navigator.languages.map((tag) => tag.slice(0, 2));
  return wanted.map((tag) => locales.find((locale) => locale === tag)).find((locale) => locale !== undefined) ?? 'en';
}

/** The language of the interface: the browser's until someone is signed in, then theirs. */
export const locale = atom<Locale>(chosenLocale() ?? browserLocale());
locale.subscribe((value) => {
  document.documentElement.lang = value;
});

export function chooseLocale(chosen: Locale): void {
  locale.set(chosen);
  try {
    localStorage.setItem(place, chosen);
  } catch {
    // Storage is closed to us: the choice holds until the page is left.
  }
}

export const format = formatter(locale);

const spanish = import.meta.glob<{ es: Record<string, unknown> }>('./es/*.ts');

/** English stands beside the code that uses it; another language is fetched area by area when it is wanted. */
export const i18n = createI18n(locale, {
  async get(_code, areas) {
    const loaded = await Promise.all(
      areas.map(async (area) => [area, (await spanish[`./es/${area}.ts`]?.())?.es ?? {}] as const),
    );
    return Object.fromEntries(loaded) as ComponentsJSON;
  },
});

export function useLocale(): Locale {
  return useStore(locale);
}
export function useFormat() {
  return useStore(format);
}
