import type { Response } from 'supertest';
import type { SlingKind } from '../../../shared/domain/slings/kinds';
import { SLING_KINDS } from '../../../shared/domain/slings/kinds';
import type { Problem } from '../../../shared/errors';
import type { VerifyResponse } from '../../../shared/schemas/ledger';
import type { Evaluator, OutcomeRequest, Shipment } from '../../../shared/schemas/shipments';
import type { Sling } from '../../../shared/schemas/slings';
import type { TestStore } from '../../support/testStore';
import { expectStatus } from '../../support/work';

type Purpose = Shipment['lines'][number]['purpose'];

/** The answer as it came, refusals too. */
export async function tryAct(
  store: TestStore,
  by: string,
  slingId: number,
  action: string,
  body: object = {},
  headers: Record<string, string> = {},
): Promise<Response> {
  return (await store.signIn(by)).post(`/api/slings/${slingId}/actions/${action}`).set(headers).send(body);
}

export const problemOf = (answer: Response): Problem => answer.body as Problem;
export const unmetRules = (answer: Response): string[] =>
  (problemOf(answer).unmet ?? []).map(({ rule }) => rule).sort();
export const errorPaths = (answer: Response): string[] =>
  (problemOf(answer).errors ?? []).map(({ path }) => path);

export async function verifyLedger(store: TestStore, slingId?: number): Promise<VerifyResponse> {
  const query = slingId === undefined ? '' : `?slingId=${slingId}`;
  // manager2 works at both sites.
  return expectStatus(await (await store.signIn('manager2')).get(`/api/ledger/verify${query}`), 200);
}

export interface Shipping {
  evaluator: Evaluator;
  draft: (sling: Pick<Sling, 'id'>, purpose: Purpose) => Promise<Response>;
  /** Sends the draft; the answer as it came. */
  send: (shipmentId: number, by?: string) => Promise<Response>;
  /** Drafts and sends one sling. */
  ship: (sling: Pick<Sling, 'id'>, purpose?: Purpose) => Promise<Line>;
  outcome: (line: Line, outcome: OutcomeRequest, by?: string) => Promise<Response>;
  destroyed: (line: Line, by?: string) => Promise<Response>;
}
export interface Line {
  shipmentId: number;
  lineId: number;
}

let evaluators = 0;

/** Shipments to one evaluator who may repair every kind, so that only the product's own rule says which are never repaired. */
export async function openShipping(store: TestStore, mayRepair = [...SLING_KINDS] as SlingKind[]) {
  evaluators += 1;
  const evaluator = expectStatus<Evaluator>(
    await (await store.signIn('manager')).post('/api/evaluators').send({
      name: `Fennel & Stroud Rigging Repair ${evaluators}`,
      email: 'desk@fennel-stroud.example',
      isMaker: false,
      mayRepair,
    }),
    201,
  );
  const as = (account: string) => store.signIn(account);
  const shipping: Shipping = {
    evaluator,
    async draft(sling, purpose) {
      return (await as('manager')).post('/api/shipments').send({
        evaluatorId: evaluator.id,
        siteId: store.places.slipStore.id,
        lines: [{ slingId: sling.id, purpose }],
        expectedBackOn: '2099-01-31',
      });
    },
    async send(shipmentId, by = 'manager') {
      return (await as(by)).post(`/api/shipments/${shipmentId}/send`).send({});
    },
    async ship(sling, purpose = 'evaluate') {
      const draft = expectStatus<Shipment>(await shipping.draft(sling, purpose), 201);
      const sent = expectStatus<Shipment>(await shipping.send(draft.id), 200);
      return { shipmentId: sent.id, lineId: sent.lines[0]?.id ?? 0 };
    },
    async outcome({ shipmentId, lineId }, outcome, by = 'manager') {
      return (await as(by)).put(`/api/shipments/${shipmentId}/lines/${lineId}/outcome`).send(outcome);
    },
    async destroyed({ shipmentId, lineId }, by = 'manager') {
      return (await as(by)).post(`/api/shipments/${shipmentId}/lines/${lineId}/destroyed`).send({});
    },
  };
  return shipping;
}
