import { readFileSync } from 'node:fs';
import path from 'node:path';
import type { Page } from 'playwright-core';
import type { Sling } from '../../../shared/schemas/slings';
import type { TestStore } from '../../support/testStore';
import { expectStatus, openWork } from '../../support/work';
import { see } from './screen';

/** One look at one route: by whom, what shows that it is there, and what is done before it is judged. */
export interface Look {
  /** As the router has it. */
  route: string;
  /** What is special about this look. */
  face: string;
  account: Account;
  at: (made: StoreForLooks) => string;
  ready: string | RegExp;
  prepare?: (page: Page) => Promise<void>;
}

/** Every path that the router knows, read from its source: importing it would start the client. */
export function listRoutes(): string[] {
  const source = readFileSync(path.resolve(import.meta.dirname, '../../../src/app/router.tsx'), 'utf8');
  return [...source.matchAll(/path: '([^']+)'/g)].map((match) => match[1] ?? '');
}

export interface StoreForLooks {
  received: Sling;
  inService: Sling;
  held: Sling;
  condemned: Sling;
  rejectedInspectionId: number;
  runId: number;
  invitation: string;
  userId: number;
}

/** A few slings in the states that the pages differ by. */
export async function fillStore(store: TestStore): Promise<StoreForLooks> {
  const work = await openWork(store);
  const received = await work.register({ kind: 'synthetic-web' });
  const inService = await work.inService();
  const held = await work.inService({ kind: 'wire-rope' });
  await work.act('storekeeper', held, 'hold', {
    reasons: [{ code: 'damage_suspected' }],
    photoIds: [await work.photo()],
  });
  const rejected = await work.register();
  const row = await findFirstRow(store, rejected);
  const { inspectionId } = await work.inspect(rejected, 'initial', { seen: [row] });
  await work.act('storekeeper', rejected, 'secure', { locationId: work.cageId });
  const condemned = await work.act('manager', rejected, 'condemn', { note: 'Beyond repair.' });
  await work.label(received);
  const [run] = await store.database.adminQuery('select max(id) as id from label_runs');
  const admin = await store.signIn('admin');
  const made = expectStatus<{ link: string; user: { id: number } }>(
    await admin.post('/api/users').send({
      name: 'Visiting Inspector',
      email: 'visitor@marram-quay.example',
      roles: ['inspector'],
      siteIds: [store.places.slipStore.id],
      endsOn: null,
      designations: [],
    }),
    201,
  );
  return {
    received,
    inService: await work.read(inService.id),
    held: await work.read(held.id),
    condemned,
    rejectedInspectionId: inspectionId,
    runId: Number(run?.id),
    invitation: new URL(made.link).pathname,
    userId: made.user.id,
  };
}

async function findFirstRow(store: TestStore, sling: Sling): Promise<string> {
  const inspector = await store.signIn('inspector');
  const answer = await inspector.get(`/api/criteria/${sling.kind}?slingId=${sling.id}`);
  const { items } = expectStatus<{ items: { id: string }[] }>(answer, 200);
  return items[0]?.id ?? '';
}

type Account = 'guest' | 'storekeeper' | 'inspector' | 'manager' | 'admin';

const press = (name: string) => (page: Page) => page.getByRole('button', { name }).first().click();

function look(
  account: Account,
  route: string,
  face: string,
  at: string | Look['at'],
  ready: string | RegExp,
  prepare?: Look['prepare'],
): Look {
  const address = typeof at === 'string' ? () => at : at;
  return { account, route, face, at: address, ready, ...(prepare ? { prepare } : {}) };
}

/** Every route, those with several faces several times; forms with their faults shown. */
export const LOOKS: readonly Look[] = [
  look('guest', '/sign-in', 'refused', '/sign-in', 'Show password', async (page) => {
    await page.getByLabel('E-mail').fill('nobody@marram-quay.example');
    await page.getByLabel('Password', { exact: true }).fill('wrong password');
    await press('Sign in')(page);
    await see(page, 'don’t match an account');
  }),
  look('guest', '/set-up', 'over', '/set-up', 'The store is set up already'),
  look('guest', '/invitation/:token', 'valid', ({ invitation }) => invitation, 'Choose a password'),
  look(
    'guest',
    '/t/:code',
    'use, with the report',
    ({ inService }) => tagAddress(inService),
    /^USE$/,
    press('Report damage'),
  ),
  look('guest', '/t/:code', 'do not use', ({ held }) => tagAddress(held), 'DO NOT USE'),
  look('storekeeper', '/', 'home', '/', 'Scan a label'),
  look('storekeeper', '/account', 'own', '/account', 'What you may do here'),
  look('storekeeper', '/slings', 'register', '/slings', /^TS-/),
  look('storekeeper', '/slings/new', 'with faults', '/slings/new', 'Identity', async (page) => {
    await page.getByRole('radio', { name: 'Chain sling' }).check();
    await press('Add a fitting')(page);
    await page.getByLabel('The certificate is at hand').check();
    await press('Register the sling')(page);
    await see(page, 'to put right');
  }),
  look(
    'storekeeper',
    '/slings/:id/hold',
    'one tap',
    ({ inService }) => `/slings/${inService.id}/hold`,
    'Why?',
  ),
  look(
    'storekeeper',
    '/slings/:id/hold',
    'several reasons',
    ({ inService }) => `/slings/${inService.id}/hold?more`,
    'Why?',
    async (page) => {
      await page.getByRole('checkbox', { name: 'Something else' }).check();
      await press('Hold it')(page);
      await see(page, 'Say what it is.');
    },
  ),
  look(
    'storekeeper',
    '/slings/:id/hold',
    'held',
    ({ held }) => `/slings/${held.id}/hold?held`,
    'Now bring it to the cage',
  ),
  look(
    'storekeeper',
    '/slings/:id/do/:action',
    'destroy',
    ({ condemned }) => `/slings/${condemned.id}/do/destroy`,
    'Look it over',
    press('Look it over'),
  ),
  look('storekeeper', '/cage', 'full', '/cage', 'Condemned'),
  look(
    'storekeeper',
    '/labels',
    'chosen',
    ({ received }) => `/labels?slings=${received.id}`,
    '2. Choose the label stock',
  ),
  look('storekeeper', '/labels/:runId', 'run', ({ runId }) => `/labels/${runId}`, '1. Print'),
  look('storekeeper', '/printer-test', 'choice', '/printer-test', /print/i),
  look('storekeeper', '/scan', 'camera', '/scan', 'Hold a label into the frame', async (page) => {
    await page.getByLabel('Type the code').fill('ABC');
    await press('Look it up')(page);
  }),
  look('storekeeper', '/scan', 'answer', ({ held }) => `/scan?code=${held.tag?.code ?? ''}`, 'DO NOT USE'),
  look('storekeeper', '*', 'lost', '/no/such/page', 'This address leads nowhere'),
  look(
    'inspector',
    '/slings/:id',
    'in service',
    ({ inService }) => `/slings/${inService.id}`,
    'What can be done',
  ),
  look(
    'inspector',
    '/slings/:id/inspect',
    'with faults',
    ({ received }) => `/slings/${received.id}/inspect`,
    'Finish and record',
    async (page) => {
      await page.getByRole('radio', { name: 'Seen', exact: true }).first().check();
      await press('Finish and record')(page);
      await see(page, 'Not answered yet.');
    },
  ),
  look(
    'inspector',
    '/slings/:id/inspect',
    'rejected',
    ({ condemned, rejectedInspectionId }) =>
      `/slings/${condemned.id}/inspect?recorded=${rejectedInspectionId}`,
    'REJECT',
  ),
  look(
    'inspector',
    '/slings/:id/do/:action',
    'not open',
    ({ held }) => `/slings/${held.id}/do/release`,
    'Not open yet',
  ),
  look(
    'inspector',
    '/slings/:id/ledger',
    'held',
    ({ held }) => `/slings/${held.id}/ledger`,
    'Damage suspected',
  ),
  look(
    'manager',
    '/slings/:id',
    'condemned',
    ({ condemned }) => `/slings/${condemned.id}`,
    'What can be done',
  ),
  look('manager', '/', 'home', '/', 'Scan a label'),
  look(
    'manager',
    '/slings/:id/do/:action',
    'condemn',
    ({ held }) => `/slings/${held.id}/do/condemn`,
    'Why it is condemned',
  ),
  look('admin', '/users', 'everybody', '/users', 'Visiting Inspector'),
  look(
    'admin',
    '/users',
    'one',
    ({ userId }) => `/users?person=${userId}`,
    'Roles',
    press('Add a designation'),
  ),
  look('admin', '/sites', 'own', '/sites', 'Slip Store'),
];

const tagAddress = (sling: Sling): string => `/t/${sling.tag?.code ?? ''}`;
