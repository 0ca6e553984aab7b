import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD } from '../../server/demo/people';
import { parseScan } from '../../shared/domain/tags/tagCode';
import {
  DESK,
  launchBrowser,
  openWindow,
  PHONE,
  serveTestStore,
  takePageErrors,
  type ServedStore,
} from '../support/browser';
import { rasterisePdf, writeMovingY4m } from '../support/labelPictures';
import { addPhoto, see, step } from './steps/screen';
import { CHAIN, fillCertificate, fillChainForm, holdFor, inspectClean } from './steps/slingSteps';

let served: ServedStore;
let folder: string;
let photo: string;
const browsers: Browser[] = [];

beforeAll(async () => {
  served = await serveTestStore();
  folder = mkdtempSync(path.join(tmpdir(), 'slingward-e2e-'));
  photo = path.join(folder, 'damage.jpg');
  await sharp({ create: { width: 640, height: 480, channels: 3, background: '#7a4b32' } })
    .jpeg()
    .toFile(photo);
});
afterAll(async () => {
  for (const browser of browsers) await browser.close();
  await served.close();
  rmSync(folder, { recursive: true, force: true });
});

async function launch(video?: string): Promise<Browser> {
  const browser = await launchBrowser(video ? { video } : {});
  browsers.push(browser);
  return browser;
}

async function register(page: Page): Promise<string> {
  await page.goto('/slings/new');
  await fillChainForm(page);
  await page.reload();
  await see(page, 'Your draft is still here');
  expect(await page.getByLabel('Maker’s serial').inputValue(), 'a reload loses the draft').toBe(CHAIN.serial);
  expect(
    await page.getByRole('heading', { name: /^Fitting \d$/ }).count(),
    'a reload loses the draft’s fittings',
  ).toBe(3);
  await fillCertificate(page);
  await page.getByRole('button', { name: 'Register the sling' }).click();
  await page.waitForURL(/\/slings\/\d+$/);
  return /\/slings\/(\d+)$/.exec(page.url())?.[1] ?? '';
}

/** @returns the run's PDF and the code that the page shows for it */
async function makeLabel(page: Page): Promise<{ pdf: Buffer; code: string }> {
  await page.getByRole('link', { name: 'Print its label' }).first().click();
  await page.getByRole('radio', { name: /^Roll 64 × 30 mm for flat tags, 300 dpi/ }).check();
  await page.getByRole('button', { name: 'Make 1 label' }).click();
  const link = page.getByRole('link', { name: 'Open the PDF' });
  const url = (await link.getAttribute('href')) ?? '';
  const answer = await page.context().request.get(url);
  expect(answer.headers()['content-type'], `the run’s paper at ${url} is no PDF`).toContain(
    'application/pdf',
  );
  const code = await page
    .getByText(/^[0-9A-Z]{4}-[0-9A-Z]{3}-[0-9A-Z]{3}$/)
    .first()
    .innerText();
  return { pdf: await answer.body(), code: code.replaceAll('-', '') };
}

/** Renders the label as a printer would and films it as a held phone sees it. */
async function filmLabel(pdf: Buffer): Promise<string> {
  const pages = await rasterisePdf(pdf, 300);
  const [label] = pages;
  if (!label || pages.length !== 1) throw new Error(`One label is one page of a roll, not ${pages.length}.`);
  const film = path.join(folder, 'label.y4m');
  await writeMovingY4m(film, label);
  return film;
}

async function tellNo(page: Page, address: string, sentence: string): Promise<void> {
  await page.goto(address);
  await see(page, sentence);
}

describe('the main job in a real browser', () => {
  it('goes from the books over label, camera, inspection and hold to destruction', async () => {
    const { origin } = served;
    const desk = await launch();
    const counter = (await openWindow(desk, origin, { account: 'storekeeper', viewport: DESK })).page;
    const id = await step('Register a chain sling', counter, () => register(counter));
    const { pdf, code } = await step('Make its label', counter, () => makeLabel(counter));
    expect(parseScan(`${origin}/t/${code}`.toUpperCase()).kind, `${code} is no tag code`).toBe('tag');

    const yard = await launch(await filmLabel(pdf));
    const phone = (await openWindow(yard, origin, { account: 'storekeeper', viewport: PHONE })).page;
    await step('Read the label with the camera and confirm it', phone, async () => {
      await phone.goto('/scan');
      await see(phone, 'This label is not confirmed yet');
      await phone.getByLabel('Last four characters of the maker’s serial').fill(CHAIN.lastFour);
      await phone.getByRole('button', { name: 'Confirm the label' }).click();
      await see(phone, `Label confirmed on ${CHAIN.number}`);
      await see(phone, 'DO NOT USE');
    });

    const bench = (await openWindow(desk, origin, { account: 'inspector', viewport: DESK })).page;
    await step('Inspect for the first time and accept', bench, async () => {
      await bench.goto(`/slings/${id}`);
      await bench.getByRole('link', { name: 'Make its first inspection' }).click();
      await inspectClean(bench);
      await see(bench, 'It passed. It is not used before it is accepted.');
      await bench.getByRole('link', { name: 'Accept' }).click();
      await bench.getByRole('button', { name: 'Accept into service' }).click();
      await see(bench, `${CHAIN.number}: Accepted into service.`);
    });

    await step('Scan says USE once it is accepted', phone, async () => {
      await phone.goto('/scan');
      await see(phone, /^USE$/);
      await see(phone, new RegExp(`^${CHAIN.number}, `));
    });
    await step('Hold in two taps with a photo, then the cage', phone, async () => {
      await phone.getByRole('link', { name: 'Hold it' }).click();
      await holdFor(phone, 'Damage suspected');
      await phone.getByLabel('From the gallery').setInputFiles(photo);
      await see(phone, '1 photo added to the record');
      await phone.getByRole('button', { name: /^Cage 1/ }).click();
      await see(phone, 'It is secured in Cage 1');
    });

    await step('Who placed a reason does not release', bench, async () => {
      await bench.goto(`/slings/${id}/hold`);
      await holdFor(bench, 'Hook latch');
      await bench.goto(`/slings/${id}/inspect?type=release`);
      await inspectClean(bench);
      const words = 'You placed a reason of this hold, so another inspector has to release it.';
      await see(bench, words);
      await tellNo(bench, `/slings/${id}/do/release`, words);
    });

    const office = (await openWindow(desk, origin, { account: 'manager', viewport: DESK })).page;
    await step('Condemn; who condemned does not destroy', office, async () => {
      await office.goto(`/slings/${id}/do/condemn`);
      await office.getByLabel('Why it is condemned').fill('Links stretched beyond any repair.');
      await office.getByRole('button', { name: 'Condemn it' }).click();
      await see(office, `${CHAIN.number}: Condemned. It stays in the cage until another person destroys it.`);
      const words = 'You condemned this sling, so another person has to destroy it.';
      await see(office, words);
      await tellNo(office, `/slings/${id}/do/destroy`, words);
    });

    await step('Another person destroys it, signing with the password', counter, async () => {
      await counter.goto(`/slings/${id}`);
      await counter.getByRole('link', { name: 'Record its destruction' }).click();
      await counter.getByRole('radio', { name: 'Cut through all load-bearing parts' }).check();
      await counter.getByRole('button', { name: /^All \d were destroyed$/ }).click();
      await addPhoto(counter, photo);
      await counter.getByRole('button', { name: 'Look it over' }).click();
      await counter.getByLabel('Your password, as your signature').fill(DEMO_PASSWORD);
      await counter.getByRole('button', { name: 'Destroyed: sign and record' }).click();
      await see(counter, `${CHAIN.number}: Recorded as destroyed.`);
    });

    const stranger = (await openWindow(desk, origin)).page;
    await step('A phone that is not signed in reads DO NOT USE', stranger, async () => {
      await stranger.goto(`/T/${code}`);
      await see(stranger, 'DO NOT USE');
    });
    await step('The destroyed sling’s label scans as void', phone, async () => {
      await phone.goto('/scan');
      await see(phone, 'This label is void');
      await see(phone, 'DO NOT USE');
    });
    expect(takePageErrors(), 'the pages ran into errors').toEqual([]);
  });
});
