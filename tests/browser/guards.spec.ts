import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { families } from '../../server/problems/registry.ts';
import { labels } from '../../server/problems/labels/labels.ts';
import { projectRoot } from '../../server/project-root.ts';
import { newPage, openBrowser, signIn, wide } from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

test('a visitor is sent to sign in and comes back to the page asked for', async () => {
  const { page, close } = await newPage(browser, { screen: wide });
  await page.goto('/progress');
  await page.waitForURL('**/sign-in?next=%2Fprogress');
  await page.getByLabel(/address|e-mail/i).fill('imre.tollund@example.test');
  await page.locator('input[type=password]').fill('mark-the-tank');
  await page.keyboard.press('Enter');
  await page.waitForURL('**/progress');
  expect(new URL(page.url()).pathname).toBe('/progress');
  await close();
});

test('nobody is led to another site after signing in', async () => {
  const { page, close } = await newPage(browser, { screen: wide });
  await page.goto('/sign-in?next=https://elsewhere.example/');
  await page.getByLabel(/address|e-mail/i).fill('imre.tollund@example.test');
  await page.locator('input[type=password]').fill('mark-the-tank');
  await page.keyboard.press('Enter');
  await page.waitForURL('**/today');
  expect(new URL(page.url()).origin).toBe(inject('productUrl'));
  await close();
});

test("a trainee is told that the authors' pages are not theirs", async () => {
  const { page, close } = await newPage(browser, { screen: wide });
  await signIn(page, 'imre.tollund@example.test');
  await page.goto('/staff/families');
  const heading = page.getByRole('heading', { level: 1 });
  await heading.waitFor();
  expect(await heading.textContent()).toBe('This page is not for your account');
  await close();
});

test('no family, slip or practice label is in what the browser is given', () => {
  const folder = join(projectRoot, 'dist', 'client', 'assets');
  const scripts = readdirSync(folder).filter((name) => name.endsWith('.js'));
  expect(scripts.length).toBeGreaterThan(10);
  // One-word slips ("perimeter") are English words that a lesson may use; two words and more are names of ours.
  const slips = families
    .flatMap((family) => family.slips.map((slip) => slip.key))
    .filter((key) => key.split('-').length > 2);
  const names = labels.map((label) => label.name);
  expect(new Set(slips).size).toBeGreaterThan(50);
  for (const name of scripts) {
    const text = readFileSync(join(folder, name), 'utf8');
    // A lesson may show a practice label; nothing else of the client knows one.
    const isLesson = /^\d\d-/.test(name);
    const found = [...slips, ...(isLesson ? [] : names)].filter((secret) => text.includes(secret));
    expect(found, name).toEqual([]);
  }
});
