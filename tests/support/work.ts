import sharp from 'sharp';
import type TestAgent from 'supertest/lib/agent';
import type { SlingAction } from '../../shared/domain/lifecycle/actions';
import type { CriteriaResponse } from '../../shared/schemas/inspection';
import type { LabelRun } from '../../shared/schemas/labels';
import type { CreateSlingInput, Sling } from '../../shared/schemas/slings';
import { buildSlingRequest } from '../factories/slingRequest';
import type { TestStore } from './testStore';

/** What people do in a store, as requests; each step fails with the server's own words. */
export interface Work {
  register: (overrides?: Parameters<typeof buildSlingRequest>[1], by?: string) => Promise<Sling>;
  read: (id: number, by?: string) => Promise<Sling>;
  photo: (by?: string) => Promise<string>;
  label: (sling: Sling, reason?: string) => Promise<string>;
  confirm: (sling: Sling, code: string) => Promise<Sling>;
  inspect: (
    sling: Pick<Sling, 'id' | 'kind'>,
    type: 'initial' | 'frequent' | 'periodic' | 'release',
    options?: { by?: string; seen?: string[] },
  ) => Promise<{ sling: Sling; inspectionId: number; verdict: string }>;
  act: (by: string, sling: Pick<Sling, 'id'>, action: SlingAction, body?: object) => Promise<Sling>;
  /** Registered, labelled, inspected, accepted. */
  inService: (overrides?: Parameters<typeof buildSlingRequest>[1]) => Promise<Sling>;
  cageId: number;
}

export async function openWork(store: TestStore): Promise<Work> {
  const siteId = store.places.slipStore.id;
  const cage = store.places.locations.find((place) => place.purpose === 'cage' && place.siteId === siteId);
  if (!cage) throw new Error('The Slip Store has a cage.');
  const picture = await sharp({ create: { width: 64, height: 48, channels: 3, background: '#884422' } })
    .jpeg()
    .toBuffer();
  const as = (account: string): Promise<TestAgent> => store.signIn(account);

  const work: Work = {
    cageId: cage.id,
    async register(overrides, by = 'storekeeper') {
      const body: CreateSlingInput = buildSlingRequest(siteId, overrides);
      return expectStatus<Sling>(await (await as(by)).post('/api/slings').send(body), 201);
    },
    async read(id, by = 'storekeeper') {
      return expectStatus<Sling>(await (await as(by)).get(`/api/slings/${id}`), 200);
    },
    async photo(by = 'storekeeper') {
      const answer = await (await as(by)).post('/api/files').attach('file', picture, 'photo.jpg');
      return expectStatus<{ id: string }>(answer, 201).id;
    },
    async label(sling, reason) {
      const answer = await (
        await as('storekeeper')
      )
        .post('/api/label-runs')
        .send({ slingIds: [sling.id], stock: (await firstStock(store)).id, ...(reason ? { reason } : {}) });
      const run = expectStatus<LabelRun>(answer, 201);
      return run.tags[0]?.code ?? '';
    },
    async confirm(sling, code) {
      const lastFour = (sling.makerSerial ?? sling.number).slice(-4);
      const answer = await (
        await as('storekeeper')
      )
        .post(`/api/tags/${code}/confirm`)
        .send({ via: 'camera', lastFour });
      return expectStatus<{ sling: Sling }>(answer, 200).sling;
    },
    async inspect(sling, type, { by = 'inspector', seen = [] } = {}) {
      const agent = await as(by);
      const rows = expectStatus<CriteriaResponse>(
        await agent.get(`/api/criteria/${sling.kind}?slingId=${sling.id}`),
        200,
      );
      const answers = rows.items.map(({ id, clean }) =>
        seen.includes(id) ? { ...clean, seen: true, note: 'Seen in the test.' } : clean,
      );
      const answer = await agent.post(`/api/slings/${sling.id}/inspections`).send({ type, answers });
      const kept = expectStatus<{ inspection: { id: number; verdict: string }; sling: Sling }>(answer, 201);
      return { sling: kept.sling, inspectionId: kept.inspection.id, verdict: kept.inspection.verdict };
    },
    async act(by, sling, action, body = {}) {
      const answer = await (await as(by)).post(`/api/slings/${sling.id}/actions/${action}`).send(body);
      return expectStatus<{ sling: Sling }>(answer, 200).sling;
    },
    async inService(overrides) {
      const sling = await work.register(overrides);
      await work.confirm(sling, await work.label(sling));
      await work.inspect(sling, 'initial');
      return work.act('inspector', sling, 'accept');
    },
  };
  return work;
}

async function firstStock(store: TestStore): Promise<{ id: string }> {
  const answer = await (await store.signIn('storekeeper')).get('/api/label-stocks');
  const [stock] = expectStatus<{ items: { id: string }[] }>(answer, 200).items;
  if (!stock) throw new Error('There are stocks of labels.');
  return stock;
}

/** The body, or an error that shows what came instead. */
export function expectStatus<T>(answer: { status: number; body: unknown; text: string }, status: number): T {
  if (answer.status !== status)
    throw new Error(`${status} expected, ${answer.status} came: ${answer.text.slice(0, 600)}`);
  return answer.body as T;
}
