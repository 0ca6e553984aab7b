import type { CreateSlingInput, Sling } from '../../../shared/schemas/slings';
import type { OutcomeRequest, Shipment } from '../../../shared/schemas/shipments';
import type { buildSlingRequest } from '../../factories/slingRequest';
import { openTestStore, type TestStore } from '../../support/testStore';
import { expectStatus, openWork, type Work } from '../../support/work';
import { openShipping, type Line, type Shipping } from './calls';

type Overrides = Parameters<typeof buildSlingRequest>[1];
type Purpose = Shipment['lines'][number]['purpose'];
type Outcome = OutcomeRequest['outcome'];

/** Slings in the states where a test begins, brought there by the right people. */
export interface Scenes {
  store: TestStore;
  work: Work;
  shipping: Shipping;
  rackId: number;
  otherSiteCageId: number;
  close: () => Promise<void>;
  /** From in service, held by the storekeeper. */
  held: (code?: string, overrides?: Overrides) => Promise<Sling>;
  secured: (code?: string, overrides?: Overrides) => Promise<Sling>;
  /** By `manager`. */
  condemned: (overrides?: Overrides) => Promise<Sling>;
  sent: (options?: { purpose?: Purpose; overrides?: Overrides }) => Promise<{ sling: Sling; line: Line }>;
  /** Sent, given an outcome with a report, received back at the rack. */
  back: (
    outcome: Outcome | null,
    options?: { overrides?: Overrides; more?: Partial<OutcomeRequest>; purpose?: Purpose },
  ) => Promise<{ sling: Sling; line: Line }>;
  releaseBody: (sling: Sling, evidenceFileId?: string) => object;
  destroyBody: (sling: Sling) => Promise<object>;
  proof: (loadKg: number) => NonNullable<CreateSlingInput['proofCertificate']>;
}

export async function openScenes(): Promise<Scenes> {
  const store = await openTestStore();
  const work = await openWork(store);
  const shipping = await openShipping(store);
  const placeOf = (siteId: number, purpose: string): number => {
    const place = store.places.locations.find((here) => here.siteId === siteId && here.purpose === purpose);
    if (!place) throw new Error(`There is no ${purpose}.`);
    return place.id;
  };
  const scenes: Scenes = {
    store,
    work,
    shipping,
    rackId: placeOf(store.places.slipStore.id, 'rack'),
    otherSiteCageId: placeOf(store.places.bladeHall.id, 'cage'),
    close: () => store.close(),
    async held(code = 'damage_suspected', overrides) {
      const sling = await work.inService(overrides);
      return work.act('storekeeper', sling, 'hold', { reasons: [{ code, note: 'Seen in the test.' }] });
    },
    async secured(code, overrides) {
      const sling = await scenes.held(code, overrides);
      return work.act('storekeeper', sling, 'secure', { locationId: work.cageId });
    },
    async condemned(overrides) {
      const sling = await scenes.secured('damage_suspected', overrides);
      return work.act('manager', sling, 'condemn', { note: 'Not worth evaluating' });
    },
    async sent({ purpose = 'evaluate', overrides } = {}) {
      const sling =
        purpose === 'destroy'
          ? await scenes.condemned(overrides)
          : await scenes.secured('damage_suspected', overrides);
      const line = await shipping.ship(sling, purpose);
      return { sling: await work.read(sling.id), line };
    },
    async back(outcome, { overrides, more = {}, purpose } = {}) {
      const { sling, line } = await scenes.sent({
        ...(purpose ? { purpose } : {}),
        ...(overrides ? { overrides } : {}),
      });
      if (outcome) {
        const reportFileId = await work.photo('manager');
        expectStatus(await shipping.outcome(line, { outcome, reportFileId, ...more }), 200);
      }
      const here = await work.act('storekeeper', sling, 'receive_back', { locationId: scenes.rackId });
      return { sling: here, line };
    },
    releaseBody: (sling, evidenceFileId) => ({
      clear: sling.openReasons.map(({ id }) => ({
        reasonId: id,
        note: 'Looked at closely; sound.',
        ...(evidenceFileId ? { evidenceFileId } : {}),
      })),
    }),
    destroyBody: async (sling) => ({
      method: 'Cut through all load-bearing parts',
      photoIds: [await work.photo()],
      fittings: sling.fittings.map(({ id }) => ({ fittingId: id, fate: 'destroyed' })),
      password: 'marram-quay-demo',
    }),
    proof: (loadKg) => ({ basis: 'assembly', loadKg, testedOn: '2026-02-01', number: `FS-${loadKg}` }),
  };
  return scenes;
}
