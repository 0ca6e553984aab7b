import type { Locator, Page } from 'playwright-core';
import { takePageErrors } from '../../support/browser';

/** Names the part of a long story that broke, with where the page was and what it showed. */
export async function step<T>(title: string, page: Page, act: () => Promise<T>): Promise<T> {
  try {
    return await act();
  } catch (error) {
    const shown = await readScreen(page);
    const errors = takePageErrors().join('\n');
    throw new Error(`${title}: ${describe(error)}\nThe page ${page.url()} shows: ${shown}\n${errors}`, {
      cause: error,
    });
  }
}

const describe = (error: unknown): string => (error instanceof Error ? error.message : String(error));

const MOST_CHARACTERS = 900;

/** What a person reads on the page, on one line. */
export async function readScreen(page: Page): Promise<string> {
  const text = await page
    .locator('main')
    .or(page.locator('body'))
    .last()
    .innerText({ timeout: 1000 })
    .catch(() => '(nothing)');
  return text.replace(/\s+/g, ' ').slice(0, MOST_CHARACTERS);
}

/** Waits until the words can be seen; says what stands there instead. */
export async function see(page: Page, words: string | RegExp): Promise<Locator> {
  const found = page.getByText(words).filter({ visible: true }).first();
  try {
    await found.waitFor();
  } catch (error) {
    throw new Error(`“${String(words)}” is not to be seen at ${page.url()}, but: ${await readScreen(page)}`, {
      cause: error,
    });
  }
  return found;
}

/** Sends a photo as from the gallery, and waits until it stands in the form. */
export async function addPhoto(page: Page, file: Parameters<Locator['setInputFiles']>[0]): Promise<void> {
  await page.getByLabel('From the gallery').setInputFiles(file);
  await page.getByAltText('Photo 1', { exact: true }).waitFor();
}
