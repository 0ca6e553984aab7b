import type { Response } from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import type { CriteriaResponse } from '../../../../shared/schemas/inspection';
import type { LabelRun } from '../../../../shared/schemas/labels';
import type { Shipment } from '../../../../shared/schemas/shipments';
import type { Sling } from '../../../../shared/schemas/slings';
import { expectStatus } from '../../../support/work';
import type { Line } from '../calls';
import type { Scenes } from '../scenes';
import { variants, type Command } from './commands';
import type { Model } from './model';

/** What the client has to remember of the real sling to fill in its requests. */
export interface Real {
  sling: Sling;
  answers: CriteriaResponse['items'][number]['clean'][];
  code: string | null;
  line: Line | null;
  lastInspectionId: number | null;
}

export interface Fixtures {
  scenes: Scenes;
  stock: string;
  fileId: string;
  elsewhere: Sling;
}

export async function startReal({ scenes }: Fixtures, isChain: boolean, isHired: boolean): Promise<Real> {
  const sling = await scenes.work.register({
    kind: isChain ? 'alloy-chain' : 'synthetic-web',
    ...(isHired ? { owner: { kind: 'hired', name: 'Dock Hire' } } : {}),
  });
  const rows = await (
    await scenes.store.signIn('inspector')
  ).get(`/api/criteria/${sling.kind}?slingId=${sling.id}`);
  const answers = expectStatus<CriteriaResponse>(rows, 200).items.map(({ clean }) => clean);
  return { sling, answers, code: null, line: null, lastInspectionId: null };
}

/** Sends the command as a request; `model` is what the sling was before it. */
export async function send(
  fixtures: Fixtures,
  real: Real,
  model: Model,
  command: Command,
): Promise<Response> {
  const { store } = fixtures.scenes;
  const agent = command.by === 'guest' ? store.guest() : await store.signIn(command.by);
  const special = HELPERS[command.name];
  if (special) return special(agent, fixtures, real, model, command);
  const { oddity, name } = command;
  const id =
    oddity === 'unknown'
      ? 999_999
      : oddity === 'elsewhere' && !command.by.endsWith('2')
        ? fixtures.elsewhere.id
        : real.sling.id;
  const body = await buildBody(fixtures, real, model, command);
  const request = agent.post(`/api/slings/${id}/actions/${name}`);
  return (oddity === 'stale' ? request.set('If-Match', '"1"') : request).send(body);
}

type Special = (
  agent: TestAgent,
  fixtures: Fixtures,
  real: Real,
  model: Model,
  command: Command,
) => Promise<Response>;

/** A code that no label has, for lack of one. */
const NO_CODE = '0000000000';

const HELPERS: Record<string, Special> = {
  async print(agent, { stock }, real, model, { variant }) {
    const reason = model.label === 'none' ? undefined : variants.printReason(variant);
    const answer = await agent
      .post('/api/label-runs')
      .send({ slingIds: [real.sling.id], stock, ...(reason ? { reason } : {}) });
    if (answer.status === 201) real.code = (answer.body as LabelRun).tags[0]?.code ?? null;
    return answer;
  },
  async confirm(agent, _fixtures, real) {
    const lastFour = (real.sling.makerSerial ?? real.sling.number).slice(-4);
    return agent.post(`/api/tags/${real.code ?? NO_CODE}/confirm`).send({ via: 'scanner', lastFour });
  },
  async void(agent, _fixtures, real) {
    return agent.post(`/api/tags/${real.code ?? NO_CODE}/void`).send({ reason: 'illegible', note: 'Torn' });
  },
  async inspect(agent, _fixtures, real, _model, { variant }) {
    const [type, verdict] = variants.inspection(variant);
    const answer = await agent.post(`/api/slings/${real.sling.id}/inspections`).send({
      type,
      answers: real.answers,
      ...(verdict === 'pass' ? {} : { stricter: { verdict, note: 'I do not trust it' } }),
    });
    if (answer.status === 201) {
      real.lastInspectionId = (answer.body as { inspection: { id: number } }).inspection.id;
    }
    return answer;
  },
  async outcome(agent, { fileId, scenes }, real, _model, { variant }) {
    const { shipmentId, lineId } = real.line ?? { shipmentId: 999_999, lineId: 999_999 };
    return agent.put(`/api/shipments/${shipmentId}/lines/${lineId}/outcome`).send({
      outcome: variants.outcome(variant),
      ...(variants.hasReport(variant) ? { reportFileId: fileId } : {}),
      ...(variants.isProven(variant)
        ? { repairer: 'Fennel & Stroud', proofCertificate: scenes.proof(6300) }
        : {}),
    });
  },
  async send(agent, { scenes }, real, model, { variant }) {
    const draft = await agent.post('/api/shipments').send({
      evaluatorId: scenes.shipping.evaluator.id,
      siteId: real.sling.siteId,
      lines: [{ slingId: real.sling.id, purpose: variants.purpose(variant, model) }],
      expectedBackOn: '2099-01-31',
    });
    if (draft.status !== 201) return draft;
    const { id, lines } = draft.body as Shipment;
    const sent = await agent.post(`/api/shipments/${id}/send`).send({});
    if (sent.status === 200) real.line = { shipmentId: id, lineId: lines[0]?.id ?? 0 };
    return sent;
  },
  async destroyed_by_evaluator(agent, _fixtures, real, model) {
    // Without a shipment there is only the action itself, which is refused in its own way.
    if (!real.line || model.state !== 'sent_for_evaluation') {
      return agent.post(`/api/slings/${real.sling.id}/actions/destroyed_by_evaluator`).send({});
    }
    return agent.post(`/api/shipments/${real.line.shipmentId}/lines/${real.line.lineId}/destroyed`).send({});
  },
};

async function buildBody(
  { scenes, fileId }: Fixtures,
  real: Real,
  model: Model,
  { name, variant }: Command,
): Promise<object> {
  const locationId = variants.isInCage(variant) ? scenes.work.cageId : scenes.rackId;
  switch (name) {
    case 'hold':
      return { reasons: [{ code: variants.holdCode(variant), note: 'In a random run' }] };
    case 'secure':
    case 'receive_back':
      return { locationId };
    case 'found':
      return variants.isInCage(variant) ? { locationId } : {};
    case 'release': {
      const clearing = variants.clearing(variant);
      const { openReasons } = await scenes.work.read(real.sling.id);
      const clear = openReasons.map(({ id }) => ({
        reasonId: id,
        note: 'Sound',
        ...(clearing === 'all' ? { evidenceFileId: fileId } : {}),
      }));
      return { clear: clearing === 'none' ? [] : clear };
    }
    case 'condemn':
    case 'report_lost':
      return { note: 'In a random run' };
    case 'depart':
      return { cause: variants.cause(variant), note: 'To its owner' };
    case 'destroy':
      return {
        method: 'Cut through all load-bearing parts',
        photoIds: [fileId],
        fittings: variants.saysAllFates(variant)
          ? real.sling.fittings.map(({ id }) => ({ fittingId: id, fate: 'destroyed' }))
          : [{ fittingId: 999_999, fate: 'destroyed' }],
        password: 'marram-quay-demo',
      };
    case 'withdraw_as_error': {
      const { openReasons } = await scenes.work.read(real.sling.id);
      const reason = openReasons.find(({ confirmed }) => confirmed) ?? openReasons[0];
      return {
        ...(variants.withdrawsCondemnation(variant, model)
          ? { condemnation: true }
          : { reasonId: reason?.id ?? 999_999 }),
        inspectionId: real.lastInspectionId ?? 999_999,
        photoIds: [fileId],
        note: 'Another sling was meant',
      };
    }
    default:
      return {};
  }
}
