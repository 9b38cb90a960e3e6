import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach, beforeEach, expect, vi } from 'vitest';

// Anything on the console's error channel is a fault of the page: React's warnings, unhandled rejections, missing keys.

let complaints: unknown[][] = [];

beforeEach(() => {
  complaints = [];
  vi.spyOn(console, 'error').mockImplementation((...args: unknown[]) => void complaints.push(args));
});
afterEach(() => {
  cleanup();
  const found = complaints.map((args) => args.map(String).join(' '));
  vi.restoreAllMocks();
  expect(found, 'console.error').toEqual([]);
});
