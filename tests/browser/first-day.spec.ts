import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { roundedAnswer } from '../../server/problems/answer-text.ts';
import { isNumeric } from '../../server/problems/tolerance.ts';
import { closeDatabase, newPage, openBrowser, phone, secretOf, signIn } from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(async () => {
  await browser.close();
  await closeDatabase();
});

const email = 'first.day@example.test';
const password = 'a long enough password';

function answerTo(problem: Awaited<ReturnType<typeof secretOf>>, index = 0): string {
  const part = problem.parts[index];
  if (!part || !isNumeric(part)) throw new Error('this part is not a number');
  return roundedAnswer(part).en;
}

test('a new trainee: account, lesson, drill, the very slip, the solution, another, the level, and back again', async () => {
  const { page, close } = await newPage(browser, { screen: phone, expectedStatus: [409] });
  // The welcome page says what it is, and grades a sample without an account.
  await page.goto('/');
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.locator('input[inputmode=decimal]').fill('12');
  await page.getByRole('button', { name: /^check/i }).click();
  await page
    .getByText(/usual slips|a slip/i)
    .first()
    .waitFor();

  // An account, confirmed from the message in the mailbox page.
  await page.goto('/sign-up');
  await page.getByLabel(/name/i).first().fill('Marisol Quint');
  await page.getByLabel(/address|e-mail/i).fill(email);
  await page.locator('input[type=password]').first().fill(password);
  await page.keyboard.press('Enter');
  await page.waitForURL('**/look-in-your-mail**');
  await page.goto('/mailbox');
  await page
    .getByRole('link', { name: /confirm/i })
    .first()
    .click();
  await page.locator('a[href*="/confirm?"]').first().click();
  await page.waitForURL('**/confirm?**');
  await page.getByRole('link', { name: /today/i }).last().click();
  await page.getByRole('heading', { name: /Marisol/ }).waitFor();

  // A lesson with figures and formulas, and a checkpoint graded by the server.
  await page.goto('/course/area/rectangles-and-what-to-leave-out');
  await page.getByRole('heading', { level: 1, name: /Rectangles/ }).waitFor();
  expect(await page.locator('svg[role=img]').count()).toBeGreaterThan(1);
  expect(await page.locator('math').count()).toBeGreaterThan(3);
  const checkpoint = page.locator('[data-checkpoint=plain-rectangle]');
  await checkpoint.scrollIntoViewIfNeeded();
  await checkpoint.locator('input[inputmode=decimal]').fill('1');
  await checkpoint.getByRole('button', { name: /^check/i }).click();
  await checkpoint
    .getByText(/usual slips|a slip|decimal/i)
    .first()
    .waitFor();

  // A drill: the slip named, the retry right, the worked solution with these numbers, another like it.
  await page.goto('/drills');
  await page.getByLabel('Measuring the site').check();
  await page.getByLabel('Tier 1: one step').check();
  await page.getByLabel('5', { exact: true }).check();
  await page.getByRole('button', { name: 'Start the drill' }).click();
  await page.waitForURL('**/problems/**');
  const field = page.locator('input[inputmode=decimal]');
  await field.waitFor();
  const problem = await secretOf(page);
  const slip = problem.slips[0];
  if (!slip) throw new Error('no slip to make');
  await field.fill(slip.value.toFraction());
  await page.keyboard.press('Enter');
  const [headline = ''] = slip.slip.message(problem.given, {}).en.split('. ');
  await page.getByText(headline, { exact: false }).first().waitFor();
  expect(await page.getByText(answerTo(problem), { exact: true }).count()).toBe(0);
  await page.getByRole('button', { name: /Hint 1/ }).click();
  await page.getByText(problem.family.hints(problem.given)[0].en).waitFor();
  await field.fill(answerTo(problem));
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { name: 'Worked solution' }).waitFor();
  await page.locator('math').first().waitFor();
  const first = page.url();
  await page.getByRole('button', { name: 'Work another like it' }).click();
  await page.waitForURL((url) => url.href !== first && url.pathname.startsWith('/problems/'));
  await field.waitFor();
  const other = await secretOf(page);
  expect(other.key.family).toBe(problem.key.family);
  expect(other.key.seed).not.toBe(problem.key.seed);
  await field.fill(answerTo(other));
  await page.keyboard.press('Enter');
  // The checkpoint, the slip and this one: three first answers, so the tube now shows a level.
  await page.getByText('filling').first().waitFor();

  // Sign out and in: all is still there.
  await page.goto('/account');
  await page
    .getByRole('button', { name: /sign out/i })
    .first()
    .click();
  await page.waitForURL((url) => !url.pathname.startsWith('/account'));
  await signIn(page, email, password);
  await page.getByText('filling').first().waitFor();
  await page.goto(first);
  // Earlier answers are folded away under the last one.
  await page.getByText(headline, { exact: false }).first().waitFor({ state: 'attached' });
  await close();
});
