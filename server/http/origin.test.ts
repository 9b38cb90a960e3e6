import { describe, expect, it } from 'vitest';
import { isOurs, originsOf } from './origin.ts';

describe('where a change may come from', () => {
  const origins = originsOf('https://school.example');
  it.each([
    [{ origin: 'https://school.example' }, true],
    [{ origin: 'https://school.example', 'sec-fetch-site': 'same-origin' }, true],
    [{ 'sec-fetch-site': 'same-origin' }, true],
    [{ origin: 'null', 'sec-fetch-site': 'same-origin' }, true],
    [{}, false],
    [{ origin: 'null' }, false],
    [{ origin: 'http://school.example' }, false],
    [{ origin: 'https://school.example.evil.example' }, false],
    [{ origin: 'https://school.example', 'sec-fetch-site': 'cross-site' }, false],
    [{ origin: 'https://school.example', 'sec-fetch-site': 'same-site' }, false],
    [{ 'sec-fetch-site': 'none' }, false],
  ])('%j: %s', (headers, ours) => {
    expect(isOurs(headers, origins)).toBe(ours);
  });

  it('knows this machine by each of its names, and others by one', () => {
    expect(originsOf('http://127.0.0.1:4180')).toEqual([
      'http://localhost:4180',
      'http://127.0.0.1:4180',
      'http://[::1]:4180',
    ]);
    expect(originsOf('https://school.example/')).toEqual(['https://school.example']);
  });
});
