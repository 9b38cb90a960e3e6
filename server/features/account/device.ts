// Order matters: a browser names its relatives too, so the more particular comes first.
const browsers = [
  ['Edge', /\bEdg/],
  ['Opera', /\bOPR\//],
  ['Samsung Internet', /SamsungBrowser/],
  ['Firefox', /Firefox|FxiOS/],
  ['Chrome', /Chrom(e|ium)|CriOS/],
  ['Safari', /Safari/],
] as const;
const systems = [
  ['Android', /Android/],
  ['iPhone or iPad', /iPhone|iPad/],
  ['Windows', /Windows/],
  ['Mac', /Macintosh/],
  ['Linux', /Linux/],
] as const;

/** What a session runs on, in words a person knows; null where the browser's own description says nothing known. */
export function deviceOf(userAgent: string | null): { browser: string | null; system: string | null } {
  const text = userAgent ?? '';
  return {
    browser: browsers.find(([, pattern]) => pattern.test(text))?.[0] ?? null,
    system: systems.find(([, pattern]) => pattern.test(text))?.[0] ?? null,
  };
}
