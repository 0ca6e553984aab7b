import { existsSync } from 'node:fs';
import http from 'node:http';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import {
  chromium,
  type Browser,
  type BrowserContext,
  type BrowserContextOptions,
  type Page,
} from 'playwright-core';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '../../server/demo/people';
import { openTestStore, type TestStore } from './testStore';

export interface ServedStore {
  store: TestStore;
  origin: string;
  close: () => Promise<void>;
}

/** A store that serves the built client on a port of its own, so that a real browser can use it. */
export async function serveTestStore(options: { isEmpty?: boolean } = {}): Promise<ServedStore> {
  const clientDir = process.env.E2E_CLIENT_DIR ?? path.resolve(import.meta.dirname, '../../dist');
  if (!existsSync(path.join(clientDir, 'index.html')))
    throw new Error('Build the client first: npm test does.');
  const port = await findFreePort();
  const origin = `http://127.0.0.1:${port}`;
  const store = await openTestStore({ ...options, publicUrl: origin, clientDir });
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

export interface LaunchOptions {
  /** What the fake camera shows (Y4M); without it, Chromium's own moving test picture. */
  video?: string;
  /** `none`: the machine has no camera at all. */
  camera?: 'fake' | 'none';
  /** A host name that leads to this machine, as a store's own name does. */
  resolveHere?: string;
}

/** Debian's Chromium. Whether a page may use the camera is the window's affair (`openWindow`). */
export function launchBrowser({ video, camera = 'fake', resolveHere }: LaunchOptions = {}): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-quic',
      '--disable-background-networking',
      ...(camera === 'fake' ? ['--use-fake-device-for-media-stream'] : []),
      ...(resolveHere ? [`--host-resolver-rules=MAP ${resolveHere} 127.0.0.1`] : []),
      ...(video ? [`--use-file-for-fake-video-capture=${video}`] : []),
    ],
  });
}

export const PHONE = { width: 390, height: 844 };
export const DESK = { width: 1440, height: 900 };

export interface WindowOptions extends Pick<BrowserContextOptions, 'viewport' | 'colorScheme'> {
  /** The demo account that is signed in; null: nobody. */
  account?: string | null;
  /** False: the person refused the camera to this site. */
  mayUseCamera?: boolean;
}

export interface OpenWindow {
  context: BrowserContext;
  page: Page;
}

/** A window with cookies and storage of its own. What goes wrong in it is kept for `takePageErrors`. */
export async function openWindow(
  browser: Browser,
  origin: string,
  { account = null, mayUseCamera = true, viewport = PHONE, ...options }: WindowOptions = {},
): Promise<OpenWindow> {
  const context = await browser.newContext({
    baseURL: origin,
    viewport,
    reducedMotion: 'reduce',
    permissions: mayUseCamera ? ['camera'] : [],
    ...options,
  });
  context.setDefaultTimeout(15_000);
  const page = await context.newPage();
  watchForErrors(page, account ?? 'guest');
  if (account) await signIn(page, account);
  return { context, page };
}

/** From a page by the API, so that only the test of the sign-in page pays for that page. */
async function signIn(page: Page, account: string): Promise<void> {
  await page.goto('/favicon.svg');
  const status = await page.evaluate(
    async (body) => {
      const headers = { 'Content-Type': 'application/json' };
      return (await fetch('/api/session', { method: 'POST', headers, body })).status;
    },
    JSON.stringify({ email: `${account}@${DEMO_DOMAIN}`, password: DEMO_PASSWORD }),
  );
  if (status !== 200) throw new Error(`${account} cannot sign in: ${status}`);
}

const pageErrors: string[] = [];

const HARMLESS = [
  // The API refuses things as part of its work, and the page shows that in words; Chromium logs it all the same
  /^Failed to load resource: the server responded with a status of 4\d\d/,
  // Over plain http from another machine
  /^The Cross-Origin-Opener-Policy header has been ignored/,
];

function watchForErrors(page: Page, who: string): void {
  const note = (what: string): void =>
    void pageErrors.push(`${who} at ${new URL(page.url()).pathname}: ${what}`);
  page.on('pageerror', (error) => note(`uncaught ${String(error)}`));
  // A breach of the content security policy comes as a console error, too
  page.on('console', (message) => {
    if (message.type() === 'error' && !HARMLESS.some((each) => each.test(message.text())))
      note(`console: ${message.text()}`);
  });
  page.on('response', (response) => {
    const isRefusal = response.status() < 500 && new URL(response.url()).pathname.startsWith('/api/');
    if (response.status() >= 400 && !isRefusal) note(`${response.status()} for ${response.url()}`);
  });
}

/** Cameras and pages of a test that is over would go on taking the machine's time. */
export async function closeWindows(...browsers: Browser[]): Promise<void> {
  await Promise.all(browsers.flatMap((browser) => browser.contexts()).map((context) => context.close()));
}

/** What went wrong in any window since the last call: uncaught errors, console errors, files that were not served. */
export function takePageErrors(): string[] {
  return pageErrors.splice(0);
}
