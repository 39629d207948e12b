import { type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { type Shop, startShop } from './shop';
import { signIn, startBrowser, visit } from './visitor';

/** Bytes of compressed script that the first visit may cost. */
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

/** Counts the bytes of script that cross the wire from now on, as they were sent: compressed. */
async function countScript(page: Page): Promise<() => Promise<{ bytes: number; files: number }>> {
  const session = await page.context().newCDPSession(page);
  const scripts = new Set<string>();
  const sizes = new Map<string, number>();
  session.on('Network.responseReceived', ({ requestId, type, response }) => {
    if (type === 'Script' || /javascript/.test(response.mimeType)) scripts.add(requestId);
  });
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) =>
    sizes.set(requestId, encodedDataLength),
  );
  await session.send('Network.enable');
  return async () => {
    await page.waitForLoadState('networkidle');
    const bytes = [...scripts].reduce((sum, id) => sum + (sizes.get(id) ?? 0), 0);
    return { bytes, files: scripts.size };
  };
}

test('sign-in and bench together cost less script than the budget', async () => {
  const visitor = await visit(browser, shop.url);
  const script = await countScript(visitor.page);
  await visitor.page.goto('/sign-in');
  await visitor.page.getByRole('button', { name: 'Sign in' }).waitFor();
  const door = await script();
  await signIn(visitor.page, shop.people.technician);
  // signIn opens the page anew; its files come from the cache and cross the wire once.
  const bench = await script();
  process.stdout.write(
    `Script on the wire: sign-in ${kilobytes(door.bytes)} in ${door.files} files, ` +
      `with the bench ${kilobytes(bench.bytes)}.\n`,
  );
  expect(door.bytes).toBeGreaterThan(50_000);
  expect(bench.bytes).toBeLessThan(BUDGET);
  await visitor.leave();
});

function kilobytes(bytes: number): string {
  return `${(bytes / 1000).toFixed(1)} kB`;
}
