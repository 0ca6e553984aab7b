import { existsSync } from 'node:fs';
import http from 'node:http';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '../../server/demo/people';
import { openTestStore, type TestStore } from './testStore';

export interface ServedStore {
  store: TestStore;
  origin: string;
  close: () => Promise<void>;
}

/** A store that serves the built client on a port of its own, so that a real browser can use it. */
export async function serveTestStore(): Promise<ServedStore> {
  const clientDir = path.resolve(import.meta.dirname, '../../dist');
  if (!existsSync(path.join(clientDir, 'index.html'))) throw new Error('Build the client first: npm test does.');
  const port = await findFreePort();
  const origin = `http://127.0.0.1:${port}`;
  const store = await openTestStore({ publicUrl: origin, clientDir });
  const server = http.createServer(store.app);
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  return {
    store,
    origin,
    async close() {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await store.close();
    },
  };
}

function findFreePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = http.createServer().once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo;
      probe.close(() => resolve(port));
    });
  });
}

/** Debian's Chromium; with `video`, its fake camera shows that file (Y4M). */
export function launchBrowser(options: { video?: string } = {}): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-quic',
      '--disable-background-networking',
      '--use-fake-device-for-media-stream',
      '--use-fake-ui-for-media-stream',
      ...(options.video ? [`--use-file-for-fake-video-capture=${options.video}`] : []),
    ],
  });
}

export const PHONE = { width: 390, height: 844 };
export const DESK = { width: 1440, height: 900 };

/** A browser window of its own, signed in through the sign-in page. Page errors fail the test that opened it. */
export async function openAs(
  browser: Browser,
  origin: string,
  account: string | null,
  viewport = PHONE,
): Promise<{ context: BrowserContext; page: Page; errors: string[] }> {
  const context = await browser.newContext({ baseURL: origin, viewport, permissions: ['camera'] });
  const page = await context.newPage();
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(String(error)));
  page.setDefaultTimeout(15_000);
  if (account) {
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill(`${account}@${DEMO_DOMAIN}`);
    await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  }
  return { context, page, errors };
}
