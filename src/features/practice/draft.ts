import { useState } from 'react';

/** A value kept for this tab under a name, so that a reload loses nothing that was typed. */
export function useDraft(name: string, initial: string): [string, (value: string) => void, () => void] {
  const place = `tankmark.draft.${name}`;
  const [value, setValue] = useState(() => {
    try {
      return sessionStorage.getItem(place) ?? initial;
    } catch {
      return initial;
    }
  });
  const keep = (next: string) => {
    setValue(next);
    try {
      sessionStorage.setItem(place, next);
    } catch {
      // Storage is closed to us: the entry holds until the page is left.
    }
  };
  const forget = () => {
    try {
      sessionStorage.removeItem(place);
    } catch {
      // Nothing was kept.
    }
  };
  return [value, keep, forget];
}
