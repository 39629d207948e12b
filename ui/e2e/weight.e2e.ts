import { type Browser, type Page, type Request } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { type Shop, startShop } from './shop';
import { signIn, startBrowser, visit } from './visitor';

/** Bytes of compressed script that a first visit may cost, without the headers of its answers. */
const BUDGET = 250_000;

let shop: Shop;
let browser: Browser;

beforeAll(async () => {
  [shop, browser] = await Promise.all([startShop(), startBrowser()]);
});
afterAll(async () => {
  await browser?.close();
  await shop?.stop();
});

/** Weighs the scripts that a page asks for from now on, as they were sent: compressed. */
function weighScripts(page: Page): () => Promise<{ bytes: number; files: number }> {
  const scripts: Request[] = [];
  page.on('requestfinished', (request) => {
    if (request.resourceType() === 'script') scripts.push(request);
  });
  return async () => {
    await page.waitForLoadState('networkidle');
    const sizes = await Promise.all(scripts.map((request) => request.sizes()));
    const bytes = sizes.reduce((sum, { responseBodySize }) => sum + responseBodySize, 0);
    return { bytes, files: scripts.length };
  };
}

function expectLight(name: string, { bytes, files }: { bytes: number; files: number }): void {
  process.stdout.write(`Script of ${name}: ${(bytes / 1000).toFixed(1)} kB in ${files} files.\n`);
  // A page that weighs next to nothing was not weighed.
  expect(bytes).toBeGreaterThan(100_000);
  expect(bytes).toBeLessThan(BUDGET);
}

test('the first visit to sign-in stays within its weight', async () => {
  const { page, leave } = await visit(browser, shop.url);
  const weigh = weighScripts(page);
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Sign in' }).waitFor();
  expectLight('sign-in', await weigh());
  await leave();
});

test('the first visit to the bench of somebody who is signed in stays within its weight', async () => {
  const before = await visit(browser, shop.url);
  await signIn(before.page, shop.people.technician);
  const kept = await before.context.storageState();
  await before.leave();
  // The same person with an empty cache, as on the morning after an update.
  const { page, leave } = await visit(browser, shop.url, { kept });
  const weigh = weighScripts(page);
  await page.goto('/');
  await page.getByRole('table', { name: 'Cases' }).waitFor();
  expectLight('the bench', await weigh());
  await leave();
});
