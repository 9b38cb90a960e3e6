import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { partsGivenEarlier } from '../../server/problems/engine.ts';
import { isNumeric } from '../../server/problems/tolerance.ts';
import { closeDatabase, newPage, openBrowser, openDrill, phone, secretOf, signIn, wide } from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(async () => {
  await browser.close();
  await closeDatabase();
});

const trainee = 'noor.haverley@example.test';

/** Presses Tab until the focused element suits; fails when it never comes. */
async function tabTo(page: Page, suits: (text: string) => boolean): Promise<void> {
  for (let press = 0; press < 60; press += 1) {
    await page.keyboard.press('Tab');
    const text = await page.evaluate(() => {
      const at = document.activeElement;
      return `${at?.tagName} ${at?.getAttribute('aria-label') ?? ''} ${at?.textContent ?? ''} ${at?.getAttribute('inputmode') ?? ''}`;
    });
    if (suits(text)) return;
  }
  throw new Error('the keyboard never came there');
}

test('credit is carried; an unreadable entry stays in the field; a reload loses nothing', async () => {
  const { page, close } = await newPage(browser, { screen: wide, dark: true });
  await signIn(page, trainee);
  await openDrill(page, 'rate', 2);
  let problem = await secretOf(page);
  for (let tries = 0; problem.slips.every((slip) => slip.part !== 'a') && tries < 5; tries += 1) {
    await openDrill(page, 'rate', 2);
    problem = await secretOf(page);
  }
  const slip = problem.slips.find((live) => live.part === 'a');
  const first = problem.parts[0];
  if (!slip || !first || !isNumeric(first)) throw new Error('no slip in part (a)');
  const fields = page.locator('input[inputmode=decimal]');
  await fields.first().fill('about this much');
  await page.keyboard.press('Enter');
  await page.getByText(/no number in this/).waitFor();
  expect(await fields.first().inputValue()).toBe('about this much');
  await fields.first().fill(slip.value.toFraction());
  await fields.nth(1).fill('not sent yet');
  await page.reload();
  await fields.first().waitFor();
  expect(await fields.nth(1).inputValue()).toBe('not sent yet');
  await page.getByRole('button', { name: 'Check (a)' }).click();
  await page.getByText('A slip').first().waitFor();
  const own = partsGivenEarlier(problem, { a: { value: slip.value, unit: first.answer.unit } })[1];
  if (!own || !isNumeric(own)) throw new Error('no part (b)');
  await page.locator('input[name=answer-b]').fill(roundedAnswer(own).en);
  await page.getByRole('button', { name: 'Check (b)' }).click();
  await page
    .getByText(/earns its mark/i)
    .first()
    .waitFor();
  await close();
});

test('on a phone the label is one press away while answering, opens at its top, and leads back', async () => {
  const { page, close } = await newPage(browser, { screen: phone });
  await signIn(page, trainee);
  await openDrill(page, 'rate', 1);
  for (let tries = 0; (await page.getByText('Practice label:').count()) === 0 && tries < 8; tries += 1)
    await openDrill(page, 'rate', 1);
  await page.locator('input[inputmode=decimal]').last().focus();
  const opener = page.getByRole('button', { name: 'Look at the label' });
  await opener.click();
  const sheet = page.getByRole('dialog');
  const notice = await sheet.getByText('Practice label. Not a real product.').boundingBox();
  const button = await sheet.getByRole('button', { name: 'Close the label' }).boundingBox();
  expect(notice?.y).toBeGreaterThan(0);
  expect((button?.y ?? Infinity) + (button?.height ?? 0)).toBeLessThanOrEqual(phone.height);
  await page.keyboard.press('Escape');
  await page.waitForFunction(() => /Look at the label/.test(document.activeElement?.textContent ?? ''));
  await close();
});

test('by keyboard alone: a number, with the focus going to the verdict', async () => {
  const { page, close } = await newPage(browser, { screen: wide });
  await signIn(page, trainee);
  await openDrill(page, 'area', 1);
  await page.keyboard.press('Tab');
  expect(await page.evaluate(() => document.activeElement?.getAttribute('href'))).toBe('#content');
  await page.keyboard.press('Enter');
  await tabTo(page, (text) => text.includes('decimal'));
  await page.keyboard.type('1');
  await page.keyboard.press('Enter');
  await page.waitForFunction(() => /slip|Not yet/i.test(document.activeElement?.textContent ?? ''));
  await tabTo(page, (text) => text.includes('Show the worked solution'));
  await page.keyboard.press('Enter');
  await tabTo(page, (text) => text.includes('Yes, show it'));
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { name: 'Worked solution' }).waitFor();
  await tabTo(page, (text) => text.includes('Next problem'));
  await page.keyboard.press('Enter');
  await page.getByText(/problem 2 of 5/).waitFor();
  await close();
});

test('by keyboard alone: steps are put in order with their arrows, and a choice is made', async () => {
  const { page, close } = await newPage(browser, { screen: wide });
  await signIn(page, trainee);
  await openDrill(page, 'mixing', 1);
  const before = await page
    .locator('[data-step]')
    .evaluateAll((items) => items.map((item) => item.getAttribute('data-step')));
  await tabTo(page, (text) => text.includes('Move down'));
  await page.keyboard.press('Enter');
  const after = await page
    .locator('[data-step]')
    .evaluateAll((items) => items.map((item) => item.getAttribute('data-step')));
  expect([after[0], after[1]]).toEqual([before[1], before[0]]);
  await tabTo(page, (text) => text.startsWith('BUTTON') && text.includes('Check'));
  await page.keyboard.press('Enter');
  await page.waitForFunction(() => /slip|Not yet|Right/i.test(document.activeElement?.textContent ?? ''));
  await openDrill(page, 'equipment', 1);
  await tabTo(page, (text) => text.startsWith('INPUT'));
  await page.keyboard.press('ArrowDown');
  await tabTo(page, (text) => text.startsWith('BUTTON') && text.includes('Check'));
  await page.keyboard.press('Enter');
  await page.waitForFunction(() => /slip|Not yet|Right/i.test(document.activeElement?.textContent ?? ''));
  await close();
});

test('the network cut while checking: the entry is kept, it is tried again, and counts once', async () => {
  const { page, faults, close } = await newPage(browser, { screen: wide });
  await signIn(page, trainee);
  await openDrill(page, 'area', 1);
  await page.context().setOffline(true);
  await page.locator('input[inputmode=decimal]').fill('1');
  await page.keyboard.press('Enter');
  await page.getByText(/not saved yet/i).waitFor();
  await page.context().setOffline(false);
  await page
    .getByText(/usual slips|a slip|decimal/i)
    .first()
    .waitFor();
  expect(await page.getByText(/usual slips|a slip|decimal/i).count()).toBeGreaterThan(0);
  await page.reload();
  await page
    .getByText(/usual slips|a slip|decimal/i)
    .first()
    .waitFor();
  // The browser itself reports the requests that failed while it was cut off.
  faults.splice(0, faults.length, ...faults.filter((fault) => !fault.includes('ERR_INTERNET_DISCONNECTED')));
  await close();
});
