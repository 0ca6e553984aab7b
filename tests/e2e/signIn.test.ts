import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  closeWindows,
  DESK,
  launchBrowser,
  openWindow,
  serveTestStore,
  takePageErrors,
  type ServedStore,
} from '../support/browser';
import { see, step } from './steps/screen';

const ADMIN = { name: 'Tove Marsh', email: 'tove@strand-works.example', password: 'seven grey herons' };
const KEEPER = { name: 'Ilse Boone', email: 'ilse@strand-works.example', password: 'two brass kettles' };

let served: ServedStore;
let browser: Browser;

beforeAll(async () => {
  served = await serveTestStore({ isEmpty: true });
  browser = await launchBrowser({ camera: 'none' });
});
afterAll(async () => {
  await browser.close();
  await served.close();
});
afterEach(async () => {
  await closeWindows(browser);
  expect(takePageErrors(), 'the pages ran into errors').toEqual([]);
});

const openPage = async (viewport?: typeof DESK): Promise<Page> =>
  (await openWindow(browser, served.origin, viewport ? { viewport } : {})).page;

async function fillSignIn(page: Page, email: string, password: string): Promise<void> {
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

async function setUpTheStore(page: Page): Promise<void> {
  await page.goto('/slings');
  await page.waitForURL('**/set-up');
  await page.getByRole('button', { name: 'Set up the store' }).click();
  await page.locator('[aria-invalid=true]').first().waitFor();
  await page.getByLabel('Name', { exact: true }).fill(ADMIN.name);
  await page.getByLabel('E-mail').fill(ADMIN.email);
  await page.getByLabel('Password', { exact: true }).fill(ADMIN.password);
  await page.getByLabel('Site name').fill('Strand Yard');
  await page.getByRole('radio', { name: 'United Kingdom and Europe' }).check();
  await page.getByRole('button', { name: 'Set up the store' }).click();
  await page.waitForURL('**/users');
  await see(page, 'Only you so far');
}

async function inviteKeeper(page: Page): Promise<string> {
  await page.getByRole('link', { name: 'Add a person' }).first().click();
  await page.getByLabel('Name', { exact: true }).fill(KEEPER.name);
  await page.getByLabel('E-mail').fill(KEEPER.email);
  await page.getByRole('checkbox', { name: 'Storekeeper' }).check();
  await page.getByRole('button', { name: 'Make the account' }).click();
  return page.getByLabel('One-time link').inputValue();
}

describe('the first start', () => {
  it('sets the store up once; the first administrator’s one-time link gives the next person a password', async () => {
    const office = await openPage(DESK);
    await step('Set up the empty store', office, () => setUpTheStore(office));
    const link = await step('Make an account', office, () => inviteKeeper(office));
    expect(link, 'the one-time link leads elsewhere').toContain(`${served.origin}/invitation/`);

    const guest = await openPage();
    await step('The set-up page is over', guest, async () => {
      await guest.goto('/set-up');
      await see(guest, 'The store is set up already');
    });
    await step('The link sets a password', guest, async () => {
      await guest.goto(link);
      await see(guest, `Welcome, ${KEEPER.name}`);
      await guest.getByLabel('New password', { exact: true }).fill('short');
      await guest.getByRole('button', { name: 'Save the password' }).click();
      await guest.locator('input[aria-invalid=true]').waitFor();
      await guest.getByLabel('New password', { exact: true }).fill(KEEPER.password);
      await guest.getByRole('button', { name: 'Save the password' }).click();
      await guest.waitForURL(`${served.origin}/`);
      await see(guest, 'Scan a label');
    });
    await step('The link works once', office, async () => {
      await office.goto(link);
      await see(office, 'This link doesn’t work any more');
    });
  });
});

describe('signing in and out', () => {
  it('says that a wrong password doesn’t match, then comes back to the page that was wanted', async () => {
    const page = await openPage();
    await page.goto('/slings?state=held');
    await page.waitForURL('**/sign-in?to=*');
    await see(page, 'You come back to the page that you wanted.');
    await fillSignIn(page, KEEPER.email, 'two brass kettle');
    await see(page, 'E-mail and password don’t match an account');
    await fillSignIn(page, 'nobody@strand-works.example', KEEPER.password);
    await see(page, 'E-mail and password don’t match an account');
    await fillSignIn(page, KEEPER.email, KEEPER.password);
    await page.waitForURL(`${served.origin}/slings?state=held`);
    await page.getByRole('heading', { name: 'Slings' }).first().waitFor();
  });

  it('follows no return address to another site', async () => {
    const page = await openPage();
    await page.goto('/sign-in?to=//other.example/');
    await fillSignIn(page, KEEPER.email, KEEPER.password);
    await page.waitForURL(`${served.origin}/`);
  });

  it('ends with sign-out: neither Back nor an address shows the store again', async () => {
    const page = await openPage();
    await page.goto('/sign-in?to=/account');
    await fillSignIn(page, KEEPER.email, KEEPER.password);
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL('**/sign-in**');
    await page.goto('/account');
    await page.waitForURL('**/sign-in?to=*');
    await page.goBack();
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    const answer = await page.context().request.get('/api/slings');
    expect(answer.status(), 'the session still works after sign-out').toBe(401);
  });
});
