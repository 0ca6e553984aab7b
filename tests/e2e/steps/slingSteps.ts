import type { Page } from 'playwright-core';
import { see } from './screen';

/** What a storekeeper reads off a new chain sling. */
export const CHAIN = { number: 'E2E-0001', maker: 'Tarn Forge', serial: 'TF-77-4182', lastFour: '4182' };

/** Fills the form for a two-leg chain sling with hooks, up to its certificate. */
export async function fillChainForm(page: Page): Promise<void> {
  await page.getByRole('radio', { name: 'Chain sling' }).check();
  await page.getByLabel('Number', { exact: true }).fill(CHAIN.number);
  await page.getByLabel('Maker', { exact: true }).fill(CHAIN.maker);
  await page.getByLabel('Maker’s serial').fill(CHAIN.serial);
  await page.getByLabel('Legs', { exact: true }).selectOption({ label: '2 legs' });
  await fillMeasure(page, 'Reach', '3', 'm');
  await page.getByLabel('Grade', { exact: true }).selectOption({ label: 'Grade 80' });
  await fillMeasure(page, 'Chain size', '10', 'mm');
  await fillMeasure(page, 'Vertical, one leg', '3150', 'kg');
  await fillMeasure(page, 'Bridle, 2 legs', '5450', 'kg');
  await page.getByLabel('At an angle from horizontal of').fill('60');
  await addFitting(page, 1, 'Master link', 'Upper end');
  await addFitting(page, 2, 'Hook', 'Lower end');
  await page.getByRole('button', { name: 'One more like the last' }).click();
}

async function addFitting(page: Page, nth: number, type: string, where: string): Promise<void> {
  await page.getByRole('button', { name: 'Add a fitting' }).click();
  const fitting = page.getByRole('listitem').filter({ hasText: `Fitting ${nth}` });
  await fitting.getByLabel('Type').selectOption({ label: type });
  await fitting.getByLabel('Where').selectOption({ label: where });
  if (type !== 'Hook') return;
  await fitting.getByLabel(/^Throat opening \(/).fill('30');
  await fitting.getByLabel('Has a latch').check();
  await fitting.getByLabel('Can be taken off').check();
}

export async function fillCertificate(page: Page): Promise<void> {
  await page.getByLabel('The certificate is at hand').check();
  await page.getByLabel('Certificate number').fill('TF-C-4182');
  await page.getByLabel('Date of the test or declaration').fill('2025-01-15');
  await fillMeasure(page, 'Proof load', '6300', 'kg');
}

/** A figure and its unit; the label says "(may stay empty)" behind itself where it may. */
async function fillMeasure(page: Page, label: string, figure: string, unit: string): Promise<void> {
  const field = page.getByRole('textbox', { name: new RegExp(`^${label}( \\(may stay empty\\))?$`) });
  await field.fill(figure);
  await field.locator('xpath=following-sibling::select').selectOption({ label: unit });
}

/** Answers every question of an inspection with "not seen" and records it. */
export async function inspectClean(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Finish and record' }).waitFor();
  const wholeGroups = page.getByRole('button', { name: /none seen$/ });
  while ((await wholeGroups.count()) > 0) await wholeGroups.first().click();
  for (const question of await page.getByRole('radio', { name: 'Not seen' }).all()) await question.check();
  await page.getByRole('button', { name: 'Finish and record' }).click();
  await page.getByRole('heading', { name: 'Inspection recorded' }).waitFor();
}

/** On the hold page: the tile of a reason holds at once. */
export async function holdFor(page: Page, reason: string): Promise<void> {
  await page.getByRole('button', { name: reason }).click();
  await page.waitForURL(/[?&]held/);
  await see(page, reason);
}
