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
  at: string;
  account: string | null;
  ready: string | RegExp;
  prepare?: (page: Page) => Promise<void>;
}

/** Every path that the router knows, read from its source: importing it would start the client. */
export function listRoutes(): string[] {
  const source = readFileSync(path.resolve(import.meta.dirname, '../../../src/app/router.tsx'), 'utf8');
  return [...source.matchAll(/path: '([^']+)'/g)].map((match) => match[1] ?? '');
}

interface StoreForLooks {
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
async function fillStore(store: TestStore): Promise<StoreForLooks> {
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

/** Looks at every route, at those with several faces several times. */
export async function prepareLooks(store: TestStore): Promise<Look[]> {
  const made = await fillStore(store);
  const { received, inService, held, condemned } = made;
  const press = (name: string) => (page: Page) => page.getByRole('button', { name }).first().click();
  const look = (
    account: string | null,
    route: string,
    at: string,
    ready: string | RegExp,
    prepare?: Look['prepare'],
  ): Look => ({ account, route, at, ready, ...(prepare ? { prepare } : {}) });
  return [
    look(null, '/sign-in', '/sign-in', 'Show password', async (page) => {
      await page.getByLabel('E-mail').fill('nobody@marram-quay.example');
      await page.getByLabel('Password', { exact: true }).fill('wrong password');
      await press('Sign in')(page);
      await see(page, 'don’t match an account');
    }),
    look(null, '/set-up', '/set-up', 'The store is set up already'),
    look(null, '/invitation/:token', made.invitation, 'Choose a password'),
    look(null, '/t/:code', `/t/${inService.tag?.code ?? ''}`, /^USE$/, press('Report damage')),
    look(null, '/t/:code', `/t/${held.tag?.code ?? ''}`, 'DO NOT USE'),
    look('storekeeper', '/', '/', 'Scan a label'),
    look('storekeeper', '/account', '/account', 'What you may do here'),
    look('storekeeper', '/slings', '/slings', received.number),
    look('storekeeper', '/slings/new', '/slings/new', 'Identity', async (page) => {
      await page.getByRole('radio', { name: 'Chain sling' }).check();
      await page.getByRole('button', { name: 'Add a fitting' }).click();
      await page.getByLabel('The certificate is at hand').check();
      await press('Register the sling')(page);
      await see(page, 'to put right');
    }),
    look('storekeeper', '/slings/:id/hold', `/slings/${inService.id}/hold`, 'Why?'),
    look('storekeeper', '/slings/:id/hold', `/slings/${inService.id}/hold?more`, 'Why?', async (page) => {
      await page.getByRole('checkbox', { name: 'Something else' }).check();
      await press('Hold it')(page);
      await see(page, 'Say what it is.');
    }),
    look('storekeeper', '/slings/:id/hold', `/slings/${held.id}/hold?held`, 'Now bring it to the cage'),
    look(
      'storekeeper',
      '/slings/:id/do/:action',
      `/slings/${condemned.id}/do/destroy`,
      'Look it over',
      press('Look it over'),
    ),
    look('storekeeper', '/cage', '/cage', held.number),
    look('storekeeper', '/labels', `/labels?slings=${received.id}`, '2. Choose the label stock'),
    look('storekeeper', '/labels/:runId', `/labels/${made.runId}`, '1. Print'),
    look('storekeeper', '/printer-test', '/printer-test', /print/i),
    look('storekeeper', '/scan', '/scan', 'Hold a label into the frame', async (page) => {
      await page.getByLabel('Type the code').fill('ABC');
      await press('Look it up')(page);
    }),
    look('storekeeper', '/scan', `/scan?code=${held.tag?.code ?? ''}`, 'DO NOT USE'),
    look('storekeeper', '*', '/no/such/page', 'This address leads nowhere'),
    look('inspector', '/slings/:id', `/slings/${inService.id}`, 'What can be done'),
    look(
      'inspector',
      '/slings/:id/inspect',
      `/slings/${received.id}/inspect`,
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
      `/slings/${condemned.id}/inspect?recorded=${made.rejectedInspectionId}`,
      'REJECT',
    ),
    look('inspector', '/slings/:id/do/:action', `/slings/${held.id}/do/release`, 'Not open yet'),
    look('inspector', '/slings/:id/ledger', `/slings/${held.id}/ledger`, 'Damage suspected'),
    look('manager', '/slings/:id', `/slings/${condemned.id}`, 'What can be done'),
    look('manager', '/', '/', 'Scan a label'),
    look('manager', '/slings/:id/do/:action', `/slings/${held.id}/do/condemn`, 'Why it is condemned'),
    look('admin', '/users', '/users', 'Visiting Inspector'),
    look('admin', '/users', `/users?person=${made.userId}`, 'Roles', press('Add a designation')),
    look('admin', '/sites', '/sites', 'Slip Store'),
  ];
}
