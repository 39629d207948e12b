import { type Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { barriers } from './axe';
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

test.each<ScreenName>(['desktop', 'phone'])(
  'an owner invites a person, who accepts and works on the bench, on a %s',
  async (screen) => {
    const owner = await visit(browser, shop.url, { screen });
    await signIn(owner.page, shop.people.owner);
    await owner.page.getByRole('link', { name: 'People' }).click();
    await owner.page.getByRole('button', { name: 'Invite a person' }).click();
    const dialog = owner.page.getByRole('dialog', { name: 'Invite a person' });
    await dialog.getByLabel('Name').fill(`Kim Abara ${screen}`);
    await dialog.getByLabel('E-mail address').fill(`kim-${screen}@shop.example`);
    await dialog.getByLabel('Role').selectOption('trainee');
    expect(await barriers(owner.page)).toEqual([]);
    await dialog.getByRole('button', { name: 'Make the invitation' }).click();
    const link = await dialog.getByLabel('Invitation link').inputValue();
    await dialog.getByRole('button', { name: 'Done' }).click();
    await owner.page.getByRole('combobox', { name: `Role of Kim Abara ${screen}` }).waitFor();
    expect(owner.troubles).toEqual([]);
    await owner.leave();

    const invited = await visit(browser, shop.url, { screen });
    await invited.page.goto(link);
    await invited.page.getByLabel('Your name').fill(`Kim Abara ${screen}`);
    await invited.page.getByLabel('Choose a password').fill('four quiet tubes glow');
    expect(await barriers(invited.page)).toEqual([]);
    await invited.page.getByRole('button', { name: 'Join the shop' }).click();
    await invited.page.getByRole('heading', { name: 'Bench', level: 1 }).waitFor();
    expect(await invited.page.getByRole('link', { name: 'People' }).count()).toBe(0);
    expect(invited.troubles).toEqual([]);
    await invited.leave();
  },
);
