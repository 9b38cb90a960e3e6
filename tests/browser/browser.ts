import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { chromium, type Browser, type Page } from 'playwright-core';
import { expect, inject } from 'vitest';
import { openDatabase, type Database } from '../../server/db/client.ts';
import { problem as problemTable } from '../../server/db/schema/practice.ts';
import { generate, type Problem } from '../../server/problems/engine.ts';
import { familyVersion } from '../../server/problems/registry.ts';
import { eq } from 'drizzle-orm';
import { demoPassword } from '../../scripts/demo/people.ts';
import '../support/product.ts';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

export const phone = { width: 360, height: 780 };
export const wide = { width: 1280, height: 900 };

export function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-dev-shm-usage',
      '--disable-gpu',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export interface TestPage {
  page: Page;
  /** Faults seen on the page so far: console errors, uncaught errors, requests to other hosts. */
  faults: string[];
  close: () => Promise<void>;
}

/** A page in a context of its own. What it complains of is kept, and must be empty when it is closed. */
export async function newPage(
  browser: Browser,
  options: { screen?: typeof phone; dark?: boolean; expectedStatus?: readonly number[] } = {},
): Promise<TestPage> {
  const { screen = phone, dark = false, expectedStatus = [] } = options;
  const context = await browser.newContext({
    viewport: screen,
    colorScheme: dark ? 'dark' : 'light',
    locale: 'en-US',
    baseURL: inject('productUrl'),
    bypassCSP: true,
  });
  const page = await context.newPage();
  page.setDefaultTimeout(15_000);
  const faults: string[] = [];
  page.on('console', (message) => {
    const expected = expectedStatus.some((status) => message.text().includes(`status of ${status}`));
    if (message.type() === 'error' && !expected) faults.push(message.text());
  });
  page.on('pageerror', (error) => faults.push(error.message));
  page.on('request', (request) => {
    const { protocol, host } = new URL(request.url());
    if (protocol.startsWith('http') && host !== new URL(inject('productUrl')).host) faults.push(`request to ${host}`);
  });
  return {
    page,
    faults,
    async close() {
      await context.close();
      expect(faults).toEqual([]);
    },
  };
}

interface AxeResult {
  violations: { id: string; help: string; nodes: { html: string; failureSummary?: string }[] }[];
}

/** Runs axe over the whole page; names the place of every violation. */
export async function violations(page: Page): Promise<string[]> {
  await page.evaluate(axeSource);
  const result = await page.evaluate(async (only) => {
    const { axe } = window as unknown as { axe: { run: (where: Document, options: object) => Promise<unknown> } };
    return (await axe.run(document, { runOnly: only })) as AxeResult;
  }, tags);
  return result.violations.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help}: ${node.html.slice(0, 160)} ${node.failureSummary?.slice(0, 200) ?? ''}`),
  );
}

/** How far the page is wider than the screen; 0 when it fits. */
export function overhang(page: Page): Promise<number> {
  return page.evaluate(() => Math.max(0, (document.scrollingElement?.scrollWidth ?? 0) - window.innerWidth));
}

export async function signIn(page: Page, email: string, password = demoPassword): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel(/address|e-mail/i).fill(email);
  await page.locator('input[type=password]').fill(password);
  await page.keyboard.press('Enter');
  await page.waitForURL('**/today');
}

let database: Database | null = null;

export async function closeDatabase(): Promise<void> {
  await database?.close();
  database = null;
}

/** What the server alone knows of the problem a page shows. */
export async function secretOf(page: Page): Promise<Problem> {
  database ??= openDatabase({ url: inject('productDatabase'), connections: 1, onIdleError: () => undefined });
  const id = /\/problems\/([0-9a-f-]{36})/.exec(page.url())?.[1];
  if (!id) throw new Error(`no problem is shown at ${page.url()}`);
  const [row] = await database.db.select().from(problemTable).where(eq(problemTable.id, id));
  const family = row && familyVersion(row.family, row.version);
  if (!row || !family) throw new Error(`the database holds no problem ${id}`);
  return generate(family, { seed: row.seed, tier: row.tier });
}

/** Makes a drill as the signed-in person and opens its first problem. */
export async function openDrill(page: Page, topic: string, tier: 1 | 2 | 3 = 1): Promise<void> {
  const id = await page.evaluate(
    async ([wanted, level]) => {
      const reply = await fetch('/api/drills', {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify({ topics: [wanted], tier: level, length: 5 }),
      });
      return ((await reply.json()) as { id: string }).id;
    },
    [topic, tier] as const,
  );
  await page.goto(`/drills/${id}`);
  await page.waitForURL('**/problems/**');
  await page.getByRole('button', { name: /worked solution/ }).waitFor();
}
