import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import {
  closeDatabase,
  newPage,
  openBrowser,
  openDrill,
  overhang,
  phone,
  signIn,
  violations,
  wide,
} from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(async () => {
  await browser.close();
  await closeDatabase();
});

const screens = [
  { name: 'phone, light', screen: phone, dark: false },
  { name: 'phone, dark', screen: phone, dark: true },
  { name: 'wide, light', screen: wide, dark: false },
  { name: 'wide, dark', screen: wide, dark: true },
];
const open = [
  '/',
  '/sign-up',
  '/sign-in',
  '/forgot',
  '/reset?token=x',
  '/look-in-your-mail',
  '/confirm?kind=confirm&token=x',
  '/mailbox',
  '/nowhere',
];
const signedIn = [
  '/today',
  '/course',
  '/course/area/triangles-circles-rings-trapezoids',
  '/course/equipment/compressed-air-and-backpack-sprayers',
  '/drills',
  '/progress',
  '/account',
  '/staff/families',
  '/staff/families/rate-label-base?count=1',
  '/staff/families/mixing-order?count=1',
];

test.each(screens)('every screen passes axe and fits: $name', async ({ screen, dark }) => {
  const { page, close } = await newPage(browser, { screen, dark, expectedStatus: [400, 404, 409] });
  const found: string[] = [];
  const look = async (name: string) => {
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    await page.waitForLoadState('networkidle');
    for (const violation of await violations(page)) found.push(`${name}: ${violation}`);
    const wider = await overhang(page);
    if (wider > 0) found.push(`${name}: ${wider} px wider than the screen`);
  };
  for (const path of open) {
    await page.goto(path);
    await look(path);
  }
  await signIn(page, 'sunniva.caldbeck@example.test');
  for (const path of signedIn) {
    await page.goto(path);
    await look(path);
  }
  for (const topic of ['rate', 'mixing', 'nozzle', 'tank']) {
    await openDrill(page, topic, 2);
    await look(`problem on ${topic}`);
    const field = page.locator('input[inputmode=decimal]').first();
    if ((await field.count()) > 0) {
      await field.fill('1');
      await page.keyboard.press('Enter');
      await page
        .getByText(/usual slips|a slip|decimal|belongs to another unit/i)
        .first()
        .waitFor();
      await look(`problem on ${topic} with a verdict`);
    }
    await page.getByRole('button', { name: 'Show the worked solution' }).click();
    await look(`problem on ${topic} giving up`);
    await page.getByRole('button', { name: 'Yes, show it' }).click();
    await page.getByRole('heading', { name: 'Worked solution' }).waitFor();
    await look(`problem on ${topic} with its solution`);
  }
  await close();
  expect(found).toEqual([]);
});

test('a page full of history passes axe and fits', async () => {
  const { page, close } = await newPage(browser, { screen: phone });
  await signIn(page, 'imre.tollund@example.test');
  const found: string[] = [];
  for (const path of ['/today', '/progress', '/drills']) {
    await page.goto(path);
    await page.waitForLoadState('networkidle');
    found.push(...(await violations(page)));
    if ((await overhang(page)) > 0) found.push(`${path} is wider than the screen`);
  }
  await close();
  expect(found).toEqual([]);
});
