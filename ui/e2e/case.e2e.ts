import { type Browser, type Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { barriers, overhang } from './axe';
import { type Shop, startShop } from './shop';
import { type ScreenName, signIn, startBrowser, visit } from './visitor';

let browser: Browser;

beforeAll(async () => {
  browser = await startBrowser();
});
afterAll(() => browser?.close());

/** Opens the console television whose dropper has an open section. */
async function openConsole(page: Page): Promise<void> {
  await page.getByRole('link', { name: /Holm Valley console, oak cabinet/ }).click();
  await page.getByRole('heading', { name: /oak cabinet/, level: 1 }).waitFor();
}

/** Goes to a section of the case that is open. */
async function goTo(page: Page, section: string): Promise<void> {
  await page
    .getByRole('navigation', { name: 'Sections of this case' })
    .getByRole('link', { name: section })
    .click();
}

/** The places that are suggested next, in order. */
async function nextPlaces(page: Page): Promise<string> {
  const next = page.getByRole('region', { name: 'Next readings' });
  await next.waitFor();
  return next.innerText();
}

/** Types one reading on the wide grid. */
async function typeReading(page: Page, label: RegExp, value: string): Promise<void> {
  const cell = page.getByRole('textbox', { name: label });
  await cell.fill(value);
  await cell.press('Enter');
}

/** Enters one reading with the pad of the phone. */
async function padReading(page: Page, choice: RegExp, keys: string[]): Promise<void> {
  const place = page.getByRole('combobox', { name: /reading/i });
  const option = place.locator('option').filter({ hasText: choice }).first();
  await place.selectOption((await option.getAttribute('value')) ?? '');
  for (const key of keys) await page.getByRole('button', { name: key, exact: true }).click();
  await page.getByRole('button', { name: /^(Save|Enter|Next)/ }).click();
}

describe.each<ScreenName>(['desktop', 'phone'])('the console television on a %s', (screen) => {
  // A shop for each screen: readings that one journey entered would lead the other.
  let shop: Shop;
  beforeAll(async () => {
    shop = await startShop();
  });
  afterAll(() => shop?.stop());

  test('a technician enters three readings and the open section stands first', async () => {
    const { page, troubles, leave, picture } = await visit(browser, shop.url, { screen });
    try {
      await signIn(page, shop.people.technician);
      await openConsole(page);
      await goTo(page, 'Suspects');
      const before = await nextPlaces(page);
      await goTo(page, 'Readings');
      if (screen === 'desktop') {
        await typeReading(page, /^Ohms across R1B/i, 'OL');
        await typeReading(page, /^Ohms across DS1/i, 'OL');
        await typeReading(page, /^Ohms across R1A/i, '33.4');
      } else {
        await padReading(page, /ohms across R1B/i, ['OL']);
        await padReading(page, /ohms across DS1/i, ['OL']);
        await padReading(page, /ohms across R1A/i, ['3', '3', '.', '4']);
      }
      await page.getByText('All readings are saved.').waitFor();
      await goTo(page, 'Suspects');
      const suspects = page.getByRole('region', { name: 'Suspects', exact: true });
      await suspects
        .getByRole('heading', { name: /R1B open/ })
        .first()
        .waitFor();
      expect(await suspects.getByRole('heading').nth(1).innerText()).toMatch(/R1B open/);
      expect(await nextPlaces(page)).not.toBe(before);
      expect(await barriers(page)).toEqual([]);
      expect(await overhang(page)).toBe(0);
      expect(troubles).toEqual([]);
    } catch (error) {
      await picture(`technician-${screen}`);
      throw error;
    } finally {
      await leave();
    }
  });

  test('a trainee compares values and reads why the case cannot be closed', async () => {
    const { page, troubles, leave, picture } = await visit(browser, shop.url, { screen });
    try {
      await signIn(page, shop.people.trainee);
      await openConsole(page);
      await goTo(page, 'Compare');
      await page.getByRole('table').first().waitFor();
      expect(await page.getByRole('row').count()).toBeGreaterThan(5);
      expect(await barriers(page)).toEqual([]);
      expect(await overhang(page)).toBe(0);
      await goTo(page, 'Intake');
      await page.getByText('A trainee cannot close a case.').waitFor();
      expect(await page.getByRole('button', { name: /Close the case/ }).count()).toBe(0);
      expect(troubles).toEqual([]);
    } catch (error) {
      await picture(`trainee-${screen}`);
      throw error;
    } finally {
      await leave();
    }
  });
});
