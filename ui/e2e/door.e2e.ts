import { type Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { barriers, overhang } from './axe';
import { type Shop, startShop } from './shop';
import { type ScreenName, startBrowser, visit } from './visitor';

let shop: Shop;
let browser: Browser;

beforeAll(async () => {
  [shop, browser] = await Promise.all([startShop('none'), startBrowser()]);
});
afterAll(async () => {
  await browser?.close();
  await shop?.stop();
});

describe('an empty shop', () => {
  test('asks for the owner, refuses a short password at its field, and lets the owner in', async () => {
    const { page, troubles, leave } = await visit(browser, shop.url);
    await page.goto('/');
    await page.getByLabel('Name of the shop').fill('Corner Radio Service');
    await page.getByLabel('Your name').fill('Robin Vance');
    await page.getByLabel('E-mail address').fill('robin@corner.example');
    await page.getByLabel('Password').fill('short');
    await page.getByRole('button', { name: 'Open the shop' }).click();
    await page.getByText('A password needs at least 10 characters').waitFor();
    expect(await page.getByLabel('Name of the shop').inputValue()).toBe('Corner Radio Service');
    await page.getByLabel('Password').fill('four quiet tubes glow');
    await page.getByRole('button', { name: 'Open the shop' }).click();
    await page.getByRole('heading', { name: 'Bench', level: 1 }).waitFor();
    await page.getByText('No set is on the bench.').waitFor();
    expect(troubles).toEqual([]);
    await leave();
  });

  test.each<ScreenName>(['desktop', 'phone'])(
    'comes back to the page that was asked for on a %s',
    async (screen) => {
      const { page, troubles, leave } = await visit(browser, shop.url, { screen });
      await page.goto('/families?search=doubler');
      await page.getByLabel('E-mail address').fill('robin@corner.example');
      await page.getByLabel('Password').fill('four quiet tubes glow');
      expect(await barriers(page)).toEqual([]);
      expect(await overhang(page)).toBe(0);
      await page.keyboard.press('Enter');
      await page.getByRole('heading', { name: 'Families', level: 1 }).waitFor();
      expect(new URL(page.url()).search).toBe('?search=doubler');
      expect(troubles).toEqual([]);
      await leave();
    },
  );
});
