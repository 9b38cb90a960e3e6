export const schemes = ['system', 'light', 'dark'] as const;
export type Scheme = (typeof schemes)[number];

const place = 'tankmark.scheme';

/** The look the person chose on this device. */
export function chosenScheme(): Scheme {
  try {
    return schemes.find((scheme) => scheme === localStorage.getItem(place)) ?? 'system';
  } catch {
    return 'system';
  }
}

export function chooseScheme(scheme: Scheme): void {
  if (scheme === 'system') delete document.documentElement.dataset.scheme;
  else document.documentElement.dataset.scheme = scheme;
  try {
    localStorage.setItem(place, scheme);
  } catch {
    // Storage is closed to us: the choice holds until the page is left.
  }
}
