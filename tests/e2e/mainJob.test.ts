import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Browser, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DESK, launchBrowser, openAs, serveTestStore, type ServedStore } from '../support/browser';
import { rasterisePdf, writeMovingY4m } from '../support/labelPictures';

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

const slingIdOf = (page: Page): string => /\/slings\/(\d+)/.exec(page.url())?.[1] ?? '';

async function registerChain(page: Page): Promise<void> {
  await page.goto('/slings/new');
  await page.getByText('Chain sling', { exact: true }).click();
  await page.getByLabel('Number', { exact: false }).first().fill('E2E-0001');
  await page.getByLabel('Maker', { exact: true }).fill('Tarn Forge');
  await page.getByLabel('Maker’s serial').fill('TF-77-4182');
  await page.getByLabel('Legs').selectOption({ label: '2 legs' });
  await page.getByLabel('Reach', { exact: true }).fill('3');
  await page.getByLabel('Grade').selectOption('80');
  await page.getByLabel('Chain', { exact: true }).fill('10');
  await page.getByLabel('Vertical', { exact: true }).fill('3150');
  await page.getByLabel('The certificate is at hand').check();
  await page.getByLabel('Number on the certificate').fill('TF-C-4182');
  await page.getByLabel('Load', { exact: true }).fill('6300');
  await page.getByLabel('Tested on').fill('2026-01-15');
  // A reload in the middle loses nothing.
  await page.waitForTimeout(700);
  await page.reload();
  expect(await page.getByLabel('Maker’s serial').inputValue()).toBe('TF-77-4182');
  await page.getByRole('button', { name: 'Register the sling' }).click();
  await page.waitForURL(/\/slings\/\d+/);
}

describe('the main job in a real browser', () => {
  it('goes from the books over label, camera, inspection and hold to destruction', async () => {
    const { origin } = served;
    const desk = await launch();
    const counter = await openAs(desk, origin, 'storekeeper', DESK);
    await registerChain(counter.page);
    const id = slingIdOf(counter.page);
    expect(id).not.toBe('');
  });
});
