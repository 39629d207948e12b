import { type Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { barriers, overhang } from './axe';
import { type Shop, startShop } from './shop';
import { type ScreenName, signIn, startBrowser, visit } from './visitor';

let shop: Shop;
let browser: Browser;

beforeAll(async () => {
  [shop, browser] = await Promise.all([startShop(), startBrowser()]);
});
afterAll(async () => {
  await browser?.close();
  await shop?.stop();
});

/** Screens and what stands on them once they are filled. */
const SCREENS: [path: string, heading: RegExp, filled: RegExp][] = [
  ['/', /^Bench$/, /Holm Valley console/],
  ['/cases/1/intake', /./, /As found/],
  ['/cases/1/circuit', /./, /./],
  ['/cases/1/readings', /./, /All readings are saved/],
  ['/cases/1/suspects', /./, /./],
  ['/cases/1/working', /./, /How far to trust it/],
  ['/families', /^Families$/, /solved case/],
  ['/families/1', /./, /Versions of the circuit/],
  ['/rules', /^Rules$/, /Because/],
  ['/rules/surge-at-switch-on', /surge/, /When it speaks/],
  ['/parts-data', /^Parts data$/, /of \d+/],
  ['/people', /^People$/, /This is you/],
  ['/nowhere', /^Nothing here$/, /leads nowhere/],
];

const LOOKS: [screen: ScreenName, isDark: boolean][] = [
  ['desktop', false],
  ['phone', false],
  ['desktop', true],
];

describe.each(LOOKS)('every screen on a %s, dark: %s', (screen, isDark) => {
  test('keeps nobody out and scrolls no page sideways', async () => {
    const { page, troubles, picture, leave } = await visit(browser, shop.url, { screen, isDark });
    await signIn(page, shop.people.owner);
    const found: string[] = [];
    for (const [path, heading, filled] of SCREENS) {
      await page.goto(path);
      await page.getByRole('heading', { level: 1, name: heading }).waitFor();
      await page.getByText(filled).first().waitFor({ state: 'attached' });
      await page.waitForLoadState('networkidle');
      if (process.env.PICTURES) await picture(`${screen}-${isDark}${path.replaceAll('/', '_')}`);
      found.push(...(await barriers(page)).map((line) => `${path} ${line}`));
      const wide = await overhang(page);
      if (wide > 0) found.push(`${path} is ${wide} px too wide`);
    }
    expect(found).toEqual([]);
    expect(troubles).toEqual([]);
    await leave();
  });
});
