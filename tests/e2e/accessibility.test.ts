import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  closeWindows,
  DESK,
  launchBrowser,
  openWindow,
  PHONE,
  serveTestStore,
  takePageErrors,
  type ServedStore,
} from '../support/browser';
import { openWork } from '../support/work';
import { fillStore, listRoutes, LOOKS, type StoreForLooks } from './steps/routes';
import { see, step } from './steps/screen';

let served: ServedStore;
let browser: Browser;
let made: StoreForLooks;
let windows: Map<string, Page>;

beforeAll(async () => {
  served = await serveTestStore();
  made = await fillStore(served.store);
  windows = new Map();
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser.close();
  await served.close();
});
afterEach(() => {
  expect(takePageErrors(), 'the pages ran into errors').toEqual([]);
});

/** Structure doesn't depend on the colours: in the dark, only they are judged again. */
const VIEWS = [
  { name: 'phone, light', viewport: PHONE, colorScheme: 'light', isWhole: true },
  { name: 'phone, dark', viewport: PHONE, colorScheme: 'dark', isWhole: false },
  { name: 'desktop, dark', viewport: DESK, colorScheme: 'dark', isWhole: false },
  { name: 'desktop, light', viewport: DESK, colorScheme: 'light', isWhole: true },
] as const;

/** Places shown of one finding. */
const MOST_PLACES = 5;

interface Violation {
  id: string;
  impact?: string | null;
  help: string;
  nodes: { target: unknown; failureSummary?: string }[];
}

declare global {
  interface Window {
    axe: { run: (options: object) => Promise<{ violations: Violation[] }> };
  }
}

/**
 * The axe that the package brings, put into the page once a page: its builder does so for every run, which takes five
 * times as long as the run.
 */
const AXE_SOURCE = readFileSync(
  createRequire(createRequire(import.meta.url).resolve('@axe-core/playwright')).resolve(
    'axe-core/axe.min.js',
  ),
  'utf8',
);

const judge = (page: Page, isWhole: boolean): Promise<Violation[]> =>
  page.evaluate(async (how) => (await window.axe.run(how)).violations, {
    resultTypes: ['violations'],
    ...(isWhole ? {} : { runOnly: ['color-contrast'] }),
  });

/** The new size and colours are there once they were drawn. */
const settle = (page: Page): Promise<void> =>
  page.evaluate(
    () => new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(() => resolve()))),
  );

/** Serious and critical findings, each with the view, the rule and the elements. */
async function listFindings(page: Page): Promise<string[]> {
  const found: string[] = [];
  await page.evaluate(AXE_SOURCE);
  for (const { name, viewport, colorScheme, isWhole } of VIEWS) {
    await page.setViewportSize(viewport);
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    await settle(page);
    for (const { id, impact, help, nodes } of await judge(page, isWhole)) {
      if (impact !== 'serious' && impact !== 'critical') continue;
      for (const { target, failureSummary = '' } of nodes.slice(0, MOST_PLACES)) {
        found.push(`${name}: ${id} (${help}) at ${String(target)}: ${failureSummary.replace(/\s+/g, ' ')}`);
      }
    }
  }
  return found;
}

/** One window a person, used for all their pages. */
async function openFor(account: string): Promise<Page> {
  const known = windows.get(account);
  if (known) return known;
  const options = { account: account === 'guest' ? null : account };
  const { page } = await openWindow(browser, served.origin, options);
  windows.set(account, page);
  return page;
}

describe('axe', () => {
  it('is asked about every route of the client', () => {
    expect([...new Set(LOOKS.map(({ route }) => route))].sort()).toEqual([...new Set(listRoutes())].sort());
  });

  it.each(LOOKS)(
    'finds nothing serious on $route, $face, as $account',
    async ({ account, at, ready, prepare }) => {
      const page = await openFor(account);
      await page.setViewportSize(PHONE);
      await step('Open the page', page, async () => {
        await page.goto(at(made));
        await see(page, ready);
        await prepare?.(page);
      });
      expect((await listFindings(page)).join('\n')).toBe('');
    },
  );
});

const MOST_TABS = 80;

/** Presses Tab until the element has the focus; fails when the keyboard can't reach it. */
async function tabTo(page: Page, target: Locator, what: string): Promise<void> {
  for (let tab = 0; tab < MOST_TABS; tab++) {
    await page.keyboard.press('Tab');
    if (await target.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`${what} is not reached within ${MOST_TABS} presses of Tab.`);
}

const hasFocusRing = (target: Locator): Promise<boolean> =>
  target.evaluate((element) => {
    const { outlineStyle, outlineWidth } = getComputedStyle(element);
    return outlineStyle !== 'none' && parseFloat(outlineWidth) >= 2;
  });

describe('the keyboard', () => {
  beforeAll(() => closeWindows(browser));

  it('reaches the skip link first, which leads past the navigation', async () => {
    const { page } = await openWindow(browser, served.origin, { account: 'storekeeper', viewport: DESK });
    await page.goto('/slings');
    await page.getByRole('heading', { name: 'Slings' }).first().waitFor();
    await page.keyboard.press('Tab');
    const skip = page.getByRole('link', { name: 'Skip to the page' });
    expect(
      await skip.evaluate((link) => link === document.activeElement),
      'another element comes first',
    ).toBe(true);
    const box = await skip.boundingBox();
    expect(box && box.y >= 0 && box.height >= 24, 'the skip link stays out of sight').toBe(true);
    await page.keyboard.press('Enter');
    await page.keyboard.press('Tab');
    const isInPage = await page.evaluate(() =>
      document.getElementById('page')?.contains(document.activeElement),
    );
    expect(isInPage, 'after the skip link, Tab goes on outside the page').toBe(true);
  });

  it('holds a sling and brings it to the cage by itself', async () => {
    const work = await openWork(served.store);
    const sling = await work.inService();
    const { page } = await openWindow(browser, served.origin, { account: 'storekeeper', viewport: DESK });
    await page.goto(`/slings/${sling.id}/hold`);
    const tile = page.getByRole('button', { name: 'Overload or shock' });
    await see(page, 'Overload or shock');
    await tabTo(page, tile, 'The tile of a reason');
    expect(await hasFocusRing(tile), 'the focused tile has no ring').toBe(true);
    await page.keyboard.press('Enter');
    await see(page, 'Now bring it to the cage');
    await tabTo(page, page.getByRole('button', { name: /^Cage 1/ }), 'The button of the cage');
    await page.keyboard.press('Enter');
    await see(page, 'It is secured in Cage 1');
    expect(await work.read(sling.id)).toMatchObject({ state: 'held', custody: { kind: 'cage' } });
  });
});
