import { randomBytes } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { drawTagCode, formatTagCode, parseTagCode, TAG_ALPHABET } from '../../shared/domain/tags/tagCode';
import type { Sling } from '../../shared/schemas/slings';
import {
  closeWindows,
  DESK,
  launchBrowser,
  openWindow,
  serveTestStore,
  takePageErrors,
  type ServedStore,
} from '../support/browser';
import { rasterisePdf } from '../support/labelPictures';
import { openWork } from '../support/work';
import { scanByHand } from './steps/handheldScanner';
import { see } from './steps/screen';

/** Any name that isn't the machine itself: browsers keep the camera from it over plain http. */
const PLAIN_HTTP_HOST = 'store.example';

let served: ServedStore;
let sling: Sling;
let code: string;
let link: string;
let labelPhoto: Buffer;
let withCamera: Browser;
let withoutCamera: Browser;

beforeAll(async () => {
  served = await serveTestStore();
  const work = await openWork(served.store);
  sling = await work.inService();
  code = sling.tag?.code ?? '';
  link = `${served.origin}/t/${code}`.toUpperCase();
  labelPhoto = await photographLabel();
  withCamera = await launchBrowser();
  withoutCamera = await launchBrowser({ camera: 'none', resolveHere: PLAIN_HTTP_HOST });
});
afterAll(async () => {
  await withCamera.close();
  await withoutCamera.close();
  await served.close();
});
afterEach(async () => {
  await closeWindows(withCamera, withoutCamera);
  expect(takePageErrors(), 'the pages ran into errors').toEqual([]);
});

/** The sling's printed label, turned a little on a grey ground. */
async function photographLabel(): Promise<Buffer> {
  const agent = await served.store.signIn('storekeeper');
  const runs = await served.store.database.adminQuery('select id from label_runs');
  const answer = await agent.get(`/api/label-runs/${String(runs[0]?.id)}/pdf`).buffer(true);
  const [label] = await rasterisePdf(answer.body as Buffer, 300);
  if (!label) throw new Error('The run’s PDF has no page.');
  const { data, width, height } = label;
  const ground = { r: 120, g: 124, b: 118 };
  return sharp(Buffer.from(data), { raw: { width, height, channels: 1 } })
    .rotate(11, { background: ground })
    .extend({ top: 240, bottom: 240, left: 300, right: 300, background: ground })
    .jpeg({ quality: 80 })
    .toBuffer();
}

async function openAt(path: string, browser = withCamera): Promise<Page> {
  const { page } = await openWindow(browser, served.origin, { account: 'storekeeper' });
  await page.goto(path);
  return page;
}

async function type(page: Page, text: string): Promise<void> {
  await page.getByLabel('Type the code').fill(text);
  await page.getByRole('button', { name: 'Look it up' }).click();
}

async function seeTheSling(page: Page): Promise<void> {
  await see(page, /^USE$/);
  await see(page, new RegExp(`^${sling.number}, `));
}

/** Another check character than the right one. */
function spoil(good: string): string {
  const last = good.slice(-1);
  return good.slice(0, -1) + (TAG_ALPHABET.replace(last, '')[0] ?? '');
}

describe('typing a code', () => {
  it('opens the sling in any case, without dashes, and leads to its record', async () => {
    const page = await openAt('/scan');
    await type(page, code.toLowerCase());
    await seeTheSling(page);
    await page.getByRole('link', { name: 'Open record' }).click();
    await page.waitForURL(`**/slings/${sling.id}`);
    await page.getByRole('heading', { name: `Sling ${sling.number}` }).waitFor({ state: 'attached' });
  });

  it('says which fault a wrong code has, and that an ungiven one is unknown', async () => {
    const page = await openAt('/scan');
    await type(page, 'ABC');
    await see(page, 'A code has 10 characters');
    await type(page, `${code.slice(0, 9)}U`);
    await see(page, 'never the letter U');
    await type(page, spoil(code));
    await see(page, 'the last one doesn’t fit the others');
    const ungiven = drawTagCode(randomBytes);
    await type(page, ungiven);
    await see(page, 'This label is unknown here');
    await see(page, 'DO NOT USE');
    await see(page, formatTagCode(ungiven));
    await see(page, 'two characters that changed places can slip through');
    await page.getByRole('button', { name: 'Scan next' }).click();
    await see(page, 'Look it up');
  });
});

describe('a handheld scanner', () => {
  it('opens the sling from any page, also out of a field, whose text it leaves alone', async () => {
    const page = await openAt('/cage');
    await page.getByRole('heading', { name: 'Cage' }).first().waitFor();
    await scanByHand(page, link);
    await seeTheSling(page);
    await page.goto(`/slings/${sling.id}/hold?more`);
    await page.getByRole('checkbox', { name: 'Something else' }).check();
    const note = page.getByLabel('What is it?');
    await note.fill('Paint on');
    await note.focus();
    await scanByHand(page, link);
    await seeTheSling(page);
    await page.goBack();
    expect(await note.inputValue(), 'the scan was typed into the note').toBe('Paint on');
  });

  it('takes the next label over the answer that stands, and names a foreign code as foreign', async () => {
    const page = await openAt(`/scan?code=${code}`);
    await seeTheSling(page);
    await scanByHand(page, `${served.origin}/t/${drawTagCode(randomBytes)}`.toUpperCase());
    await see(page, 'no label with it was ever printed here');
    await scanByHand(page, 'https://shop.example/p/4711');
    await see(page, 'This is not one of the store’s labels');
    await see(page, 'https://shop.example/p/4711');
    await scanByHand(page, link.replace(code, spoil(code)));
    await see(page, 'A character of this code is wrong');
    await scanByHand(page, link.replace(served.origin.toUpperCase(), 'HTTPS://OTHER-STORE.EXAMPLE'));
    await seeTheSling(page);
  });
});

describe('a photo from the gallery', () => {
  it('is read, and says so where there is no label on it or it is no picture', async () => {
    const page = await openAt('/scan');
    const input = page.getByLabel('Choose a photo');
    await see(page, 'Hold a label into the frame');
    await input.setInputFiles({ name: 'wall.png', mimeType: 'image/png', buffer: await paintWall() });
    await see(page, 'No label could be read in this photo');
    await input.setInputFiles({ name: 'list.png', mimeType: 'image/png', buffer: Buffer.from('no picture') });
    await see(page, 'This file can’t be opened as a picture');
    await input.setInputFiles({ name: 'label.jpg', mimeType: 'image/jpeg', buffer: labelPhoto });
    await seeTheSling(page);
  });
});

const paintWall = (): Promise<Buffer> =>
  sharp({ create: { width: 400, height: 300, channels: 3, background: '#8a7f70' } })
    .png()
    .toBuffer();

describe('without a camera', () => {
  const stillWorks = async (page: Page): Promise<void> => {
    await type(page, code);
    await seeTheSling(page);
  };

  it('says that it was refused, and how to allow it', async () => {
    const options = { account: 'storekeeper', mayUseCamera: false };
    const { page } = await openWindow(withCamera, served.origin, options);
    await page.goto('/scan');
    await see(page, 'The camera is not allowed here');
    await see(page, 'Allow the camera for this page in the browser');
    await stillWorks(page);
  });

  it('says that there is none', async () => {
    const page = await openAt('/scan', withoutCamera);
    await see(page, 'No camera was found');
    await see(page, 'Plug one in and try again');
    await stillWorks(page);
  });

  it('says that plain http keeps it shut', async () => {
    const origin = served.origin.replace('127.0.0.1', PLAIN_HTTP_HOST);
    const { page } = await openWindow(withoutCamera, origin, { account: 'storekeeper', viewport: DESK });
    await page.goto('/scan');
    await see(page, 'The camera needs a secure address');
    await see(page, 'Open the store’s https address');
    await stillWorks(page);
  });
});

it('the test’s own wrong code differs in its check character alone', () => {
  expect(parseTagCode(code).ok).toBe(true);
  expect(parseTagCode(spoil(code))).toMatchObject({ ok: false, reason: 'check' });
});
