// @ts-check
// npm run pictures: every route with the demo data, signed in as the right person, at three sizes, light and dark,
// into pictures/ (ignored by git). `-- --docs` renews the few in docs/. `-- NAME …` takes only the routes named so.
// It uses the product that already runs (npm start) on PORT.
import fs from 'node:fs';
import path from 'node:path';
import { chromium } from 'playwright-core';

const base = `http://127.0.0.1:${process.env.PORT ?? 4173}`;
const root = path.resolve(import.meta.dirname, '..');
const SIZES = [
  { name: 'phone', width: 390, height: 844 },
  { name: 'tablet', width: 820, height: 1180 },
  { name: 'desk', width: 1440, height: 900 },
];

/**
 * @typedef {object} Shot
 * @property {string} name
 * @property {string | null} as account of the demo, null for a guest
 * @property {string} to address
 */

/** @param {import('playwright-core').BrowserContext} context @param {string} account */
async function signIn(context, account) {
  const answer = await context.request.post(`${base}/api/session`, {
    data: { email: `${account}@marram-quay.example`, password: 'marram-quay-demo' },
  });
  if (!answer.ok()) throw new Error(`${account} cannot sign in: ${await answer.text()}`);
}

/** Finds slings of the demo in the states that the pictures need. @returns {Promise<Shot[]>} */
async function listShots(/** @type {import('playwright-core').Browser} */ browser) {
  const context = await browser.newContext();
  await signIn(context, 'manager2');
  // Everybody of the demo works at the Slip Store.
  const sites = (await (await context.request.get(`${base}/api/sites`)).json()).items;
  const { id: siteId } = sites.find((/** @type {{ name: string }} */ site) => site.name === 'Slip Store');
  /** @param {string} query */
  const first = async (query) => {
    const answer = await context.request.get(`${base}/api/slings?limit=1&siteId=${siteId}&${query}`);
    const item = (await answer.json()).items[0];
    if (!item) console.warn(`the demo has no sling for ${query}`);
    return item ?? { id: 1, tag: null };
  };
  const usable = await first('state=in_service&kind=alloy-chain&due=ok&label=live');
  const kinds = ['wire-rope', 'metal-mesh', 'synthetic-web', 'synthetic-round', 'synthetic-rope'];
  const held = await first('state=held&secured=false');
  const caged = await first('state=held&secured=true&condemned=false');
  const condemned = await first('state=held&condemned=true');
  const received = await first('state=received&label=printed');
  const returned = await first('state=returned');
  const destroyed = await first('state=destroyed');
  const overdue = await first('state=in_service&due=overdue');
  const code = usable.tag?.code ?? '0000000000';
  const heldCode = held.tag?.code ?? '0000000000';
  const others = await Promise.all(kinds.map((kind) => first(`state=in_service&kind=${kind}`)));
  await context.close();
  return [
    { name: 'sign-in', as: null, to: '/sign-in' },
    { name: 'home-storekeeper', as: 'storekeeper', to: '/' },
    { name: 'home-inspector', as: 'inspector', to: '/' },
    { name: 'home-manager', as: 'manager', to: '/' },
    { name: 'register', as: 'storekeeper', to: '/slings' },
    { name: 'register-filtered', as: 'storekeeper', to: '/slings?state=held&kind=alloy-chain' },
    { name: 'register-empty', as: 'storekeeper', to: '/slings?q=nothing-like-this' },
    { name: 'new-sling', as: 'storekeeper', to: '/slings/new' },
    { name: 'record-in-service', as: 'storekeeper', to: `/slings/${usable.id}` },
    { name: 'record-overdue', as: 'inspector', to: `/slings/${overdue.id}` },
    { name: 'record-received', as: 'storekeeper', to: `/slings/${received.id}` },
    { name: 'record-held', as: 'storekeeper', to: `/slings/${held.id}` },
    { name: 'record-caged', as: 'manager', to: `/slings/${caged.id}` },
    { name: 'record-condemned', as: 'manager2', to: `/slings/${condemned.id}` },
    { name: 'record-returned', as: 'inspector2', to: `/slings/${returned.id}` },
    { name: 'record-destroyed', as: 'auditor', to: `/slings/${destroyed.id}` },
    ...others.map((sling, index) => ({
      name: `record-${kinds[index]}`,
      as: 'manager2',
      to: `/slings/${sling.id}`,
    })),
    { name: 'record-unknown', as: 'storekeeper', to: '/slings/99999999' },
    { name: 'ledger', as: 'manager', to: `/slings/${destroyed.id}/ledger` },
    { name: 'hold', as: 'storekeeper', to: `/slings/${usable.id}/hold` },
    { name: 'inspect', as: 'inspector', to: `/slings/${usable.id}/inspect` },
    { name: 'do-release', as: 'inspector2', to: `/slings/${caged.id}/do/release` },
    { name: 'do-condemn', as: 'manager', to: `/slings/${caged.id}/do/condemn` },
    { name: 'do-destroy', as: 'storekeeper2', to: `/slings/${condemned.id}/do/destroy` },
    { name: 'do-secure', as: 'storekeeper', to: `/slings/${held.id}/do/secure` },
    { name: 'cage', as: 'manager', to: '/cage' },
    { name: 'labels', as: 'storekeeper', to: '/labels' },
    { name: 'label-run', as: 'storekeeper', to: '/labels/1' },
    { name: 'printer-test', as: 'storekeeper', to: '/printer-test' },
    { name: 'scan', as: 'storekeeper', to: '/scan' },
    { name: 'scan-use', as: 'storekeeper', to: `/scan?code=${code}` },
    { name: 'scan-held', as: 'storekeeper', to: `/scan?code=${heldCode}` },
    { name: 'public-use', as: null, to: `/t/${code}` },
    { name: 'public-held', as: null, to: `/t/${heldCode}` },
    { name: 'public-unknown', as: null, to: '/t/0000000000' },
    { name: 'account', as: 'inspector', to: '/account' },
    { name: 'users', as: 'admin', to: '/users' },
    { name: 'sites', as: 'admin', to: '/sites' },
    { name: 'not-found', as: 'storekeeper', to: '/no/such/page' },
  ];
}

/** What README shows. */
const DOCS = [
  ['record-caged', 'phone', 'light'],
  ['scan-use', 'phone', 'light'],
  ['public-held', 'phone', 'light'],
  ['cage', 'desk', 'light'],
  ['register', 'desk', 'light'],
  ['hold', 'phone', 'light'],
];

const names = process.argv.slice(2).filter((argument) => !argument.startsWith('--'));
const isForDocs = process.argv.includes('--docs');
const folder = path.join(root, isForDocs ? 'docs' : 'pictures');
fs.mkdirSync(folder, { recursive: true });

const browser = await chromium.launch({
  executablePath: '/usr/bin/chromium',
  args: ['--no-sandbox', '--use-fake-device-for-media-stream', '--use-fake-ui-for-media-stream'],
});
try {
  const shots = (await listShots(browser)).filter(
    ({ name }) =>
      (names.length === 0 || names.includes(name)) && (!isForDocs || DOCS.some(([shot]) => shot === name)),
  );
  for (const account of new Set(shots.map((shot) => shot.as))) {
    for (const size of SIZES) {
      for (const colorScheme of /** @type {const} */ (['light', 'dark'])) {
        const wanted = shots.filter(
          ({ as, name }) =>
            as === account &&
            (!isForDocs ||
              DOCS.some(([shot, at, theme]) => shot === name && at === size.name && theme === colorScheme)),
        );
        if (wanted.length === 0) continue;
        const context = await browser.newContext({
          viewport: { width: size.width, height: size.height },
          colorScheme,
          reducedMotion: 'reduce',
          permissions: ['camera'],
        });
        if (account) await signIn(context, account);
        const page = await context.newPage();
        for (const { name, to } of wanted) {
          await page.goto(base + to, { waitUntil: 'networkidle' }).catch(() => undefined);
          await page.waitForFunction(
            "document.querySelector('main') !== null && document.querySelector('.skeleton') === null",
            null,
            { timeout: 15_000 },
          );
          await page.waitForTimeout(150);
          const file = isForDocs ? `${name}.png` : `${name}.${size.name}.${colorScheme}.png`;
          await page.screenshot({
            path: path.join(folder, file),
            fullPage: !isForDocs && !to.startsWith('/scan'),
          });
        }
        await context.close();
      }
    }
  }
  console.log(`${shots.length} routes, pictures in ${path.relative(root, folder)}/`);
} finally {
  await browser.close();
}
