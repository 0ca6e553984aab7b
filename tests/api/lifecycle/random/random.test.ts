import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../../shared/schemas/slings';
import { buildSlingRequest } from '../../../factories/slingRequest';
import { expectStatus } from '../../../support/work';
import { problemOf, verifyLedger } from '../calls';
import { openScenes } from '../scenes';
import { send, startReal, type Fixtures, type Real } from './client';
import { chooseCommand, expectStatusOf, type Command, type Draw } from './commands';
import { ACTIONS, allowedFrom, mayUse, newModel, TABLE, type Model } from './model';

const RUNS = 40;
const COMMANDS = 25;
/** A slow machine does fewer runs rather than hold up everything. */
const TIME_LIMIT_MS = 90_000;

let fixtures: Fixtures;

beforeAll(async () => {
  const scenes = await openScenes();
  const { store, work } = scenes;
  const stocks = await (await store.signIn('storekeeper')).get('/api/label-stocks');
  const elsewhere = await (
    await store.signIn('storekeeper2')
  )
    .post('/api/slings')
    .send(buildSlingRequest(store.places.bladeHall.id));
  fixtures = {
    scenes,
    stock: expectStatus<{ items: { id: string }[] }>(stocks, 200).items[0]?.id ?? '',
    fileId: await work.photo(),
    elsewhere: expectStatus<Sling>(elsewhere, 201),
  };
});
afterAll(() => fixtures.scenes.close());

const draw: fc.Arbitrary<Draw> = fc.record({
  pick: fc.nat(999),
  person: fc.nat(999),
  variant: fc.nat(999),
  oddity: fc.nat(99),
});
const run = fc.record({
  isChain: fc.boolean(),
  isHired: fc.boolean(),
  start: fc.constantFrom('received', 'in_service', 'sent_for_evaluation'),
  draws: fc.array(draw, { minLength: COMMANDS, maxLength: COMMANDS }),
});

const succeeded = new Set<string>();
const statuses = new Map<number, number>();

/** The real sling is what the model says, in every respect that somebody could act on. */
function compare(real: Sling, model: Model, after: string): void {
  const seen = {
    state: real.state,
    condemned: real.condemned,
    mayUse: real.mayUse,
    mayNotUse: real.mayNotUse.length === 0,
    custody: real.custody.kind,
    label: real.tag?.status ?? 'none',
    version: real.version,
    reasons: real.openReasons.map(({ code, confirmed }) => `${code}${confirmed ? '!' : ''}`).sort(),
  };
  expect(seen, after).toEqual({
    state: model.state,
    condemned: model.condemned !== null,
    mayUse: mayUse(model),
    mayNotUse: mayUse(model),
    custody: model.custody,
    label: model.label,
    version: model.seq,
    reasons: model.reasons.map(({ code, confirmed }) => `${code}${confirmed ? '!' : ''}`).sort(),
  });
}

async function doCommand(real: Real, model: Model, command: Command, story: string[]): Promise<void> {
  const before = structuredClone(model);
  const needsLabel = (command.name === 'confirm' || command.name === 'void') && real.code === null;
  if (needsLabel || (command.name === 'outcome' && !real.line)) return;
  const expected = expectStatusOf(model, command);
  const answer = await send(fixtures, real, before, command);
  story.push(`${command.by} ${command.name} (${command.oddity}, ${command.variant}): ${answer.status}`);
  expect(answer.status, `${story.join('\n')}\n${answer.text.slice(0, 400)}`).toBe(expected);
  statuses.set(expected, (statuses.get(expected) ?? 0) + 1);
  if (expected < 300) {
    succeeded.add(command.name);
    const body = answer.body as { sling?: Sling };
    if (body.sling) compare(body.sling, model, story.join('\n'));
    return;
  }
  expect(answer.type, story.at(-1)).toBe('application/problem+json');
  expect(model, story.at(-1)).toEqual(before);
  if (expected === 409 && command.name in TABLE && command.name !== 'send') {
    expect(problemOf(answer).from, story.at(-1)).toBe(before.state);
    expect([...(problemOf(answer).allowed ?? [])].sort(), story.at(-1)).toEqual(allowedFrom(before).sort());
  }
  if (expected === 412) expect(problemOf(answer).changes?.length, story.at(-1)).toBeGreaterThan(0);
}

const INTO_SERVICE = [
  ['print', 'storekeeper', 0],
  ['confirm', 'storekeeper', 0],
  ['inspect', 'inspector', 1],
  ['accept', 'inspector', 0],
] as const;
const AWAY = [
  ...INTO_SERVICE,
  ['hold', 'storekeeper', 0],
  ['secure', 'storekeeper', 0],
  ['send', 'manager', 0],
] as const;

/** Some walks begin further on, so that the ways back from evaluation are walked as well. */
async function leadTo(start: string, real: Real, model: Model, story: string[]): Promise<void> {
  const steps = { in_service: INTO_SERVICE, sent_for_evaluation: AWAY }[start] ?? [];
  for (const [name, by, variant] of steps) {
    await doCommand(real, model, { name, by, variant, oddity: 'none' }, story);
  }
  expect(model.state).toBe(start);
}

describe('random commands of random people', () => {
  it(
    'leave every sling where an independent model of the table says, and its ledger whole',
    async () => {
      const giveUpAt = Date.now() + TIME_LIMIT_MS;
      let runs = 0;
      const property = fc.asyncProperty(run, async ({ isChain, isHired, start, draws }) => {
        if (Date.now() > giveUpAt) return;
        runs += 1;
        const story: string[] = [];
        const begin = async () => {
          const begun = {
            model: newModel(isChain, isHired),
            real: await startReal(fixtures, isChain, isHired),
          };
          story.push(`${isHired ? 'hired' : 'own'} ${begun.real.sling.kind}`);
          await leadTo(start, begun.real, begun.model, story);
          return begun;
        };
        const end = async ({ real, model }: { real: Real; model: Model }) => {
          compare(await fixtures.scenes.work.read(real.sling.id), model, story.join('\n'));
          const verified = await verifyLedger(fixtures.scenes.store, real.sling.id);
          expect(verified, story.join('\n')).toMatchObject({ ok: true, rows: model.seq });
        };
        let now = await begin();
        for (const one of draws) {
          // Of a sling that is gone little is left to try: mostly another one takes its place.
          if (allowedFrom(now.model).length === 0 && one.oddity % 3 > 0) {
            await end(now);
            now = await begin();
          }
          await doCommand(now.real, now.model, chooseCommand(now.model, one), story);
        }
        await end(now);
      });
      await fc.assert(property, { numRuns: RUNS, seed: 19_104 });
      expect(runs).toBeGreaterThan(0);
      if (runs === RUNS) {
        // The walks got everywhere: every action was done, every kind of refusal came.
        expect(ACTIONS.filter((action) => !succeeded.has(action))).toEqual([]);
        expect([401, 403, 404, 409, 412, 422].filter((status) => !statuses.has(status))).toEqual([]);
      }
      expect(await verifyLedger(fixtures.scenes.store)).toMatchObject({ ok: true });
    },
    2 * TIME_LIMIT_MS,
  );
});
