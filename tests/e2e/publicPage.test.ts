import { randomBytes } from 'node:crypto';
import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { drawTagCode } from '../../shared/domain/tags/tagCode';
import type { Sling } from '../../shared/schemas/slings';
import {
  closeWindows,
  launchBrowser,
  openWindow,
  serveTestStore,
  takePageErrors,
  type ServedStore,
} from '../support/browser';
import { openWork, type Work } from '../support/work';
import { addPhoto, see, step } from './steps/screen';

let served: ServedStore;
let work: Work;
let sling: Sling;
let browser: Browser;

beforeAll(async () => {
  served = await serveTestStore();
  work = await openWork(served.store);
  sling = await work.inService();
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

const takePhoto = async (): Promise<{ name: string; mimeType: string; buffer: Buffer }> => ({
  name: 'hook.jpg',
  mimeType: 'image/jpeg',
  buffer: await sharp({ create: { width: 640, height: 480, channels: 3, background: '#7a4b32' } })
    .jpeg()
    .toBuffer(),
});

describe('the page behind a label', () => {
  it('takes a crew member’s damage report with a photo, holds the sling and says so', async () => {
    const address = `/T/${sling.tag?.code ?? ''}`;
    const { page } = await openWindow(browser, served.origin);
    await step('Read the label without an account', page, async () => {
      await page.goto(address);
      await see(page, /^USE$/);
      await see(page, `Sling ${sling.number}`);
    });
    await step('Report damage; the draft survives a reload', page, async () => {
      await page.getByRole('button', { name: 'Report damage' }).click();
      await page.getByRole('button', { name: 'Send the report' }).click();
      await page.locator('[aria-invalid=true]').first().waitFor();
      await page.getByLabel('What did you see?').fill('The hook’s tip is bent open.');
      await page.reload();
      expect(await page.getByLabel('What did you see?').inputValue(), 'a reload loses the report').toBe(
        'The hook’s tip is bent open.',
      );
      await addPhoto(page, await takePhoto());
      await page.getByLabel('Your name').fill('Kit Arden');
      await page.getByRole('button', { name: 'Send the report' }).click();
      await see(page, 'This sling is now held. Do not use it. Give it to the store.');
      await see(page, 'DO NOT USE');
    });
    await step('The next one who reads it sees it, too', page, async () => {
      await page.goto(address);
      await see(page, 'DO NOT USE');
    });
    const held = await work.read(sling.id);
    expect(held.state, 'the report didn’t hold the sling').toBe('held');
    expect(held.openReasonCodes, 'the report’s reason is not open').toContain('damage_suspected');
    expect(held.photos.length, 'the report’s photo is not on the record').toBe(sling.photos.length + 1);
  });

  it('says DO NOT USE for a code that was never given, and for one with a wrong character', async () => {
    const { page } = await openWindow(browser, served.origin);
    const ungiven = drawTagCode(randomBytes);
    await page.goto(`/t/${ungiven}`);
    await see(page, 'DO NOT USE');
    await see(page, 'This label is not known here.');
    await page.goto(`/t/${ungiven.slice(0, 9)}${ungiven.endsWith('A') ? 'B' : 'A'}`);
    await see(page, 'DO NOT USE');
    await see(page, 'a character is wrong');
  });
});
