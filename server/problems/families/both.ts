import type { Text } from '../../../shared/vocabulary.ts';

/** A text from its two languages. */
export function both(en: string, es: string): Text {
  return { en, es };
}
