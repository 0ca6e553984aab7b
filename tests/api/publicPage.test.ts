import { randomBytes } from 'node:crypto';
import request from 'supertest';
import sharp from 'sharp';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Express } from 'express';
import { drawTagCode } from '../../shared/domain/tags/tagCode';
import type { PublicTag } from '../../shared/schemas/publicPage';
import type { Sling } from '../../shared/schemas/slings';
import { day, errorPaths, expectProblem, openSecondApp } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
/** A server whose limits have counted nothing yet. */
let app: Express;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
beforeEach(() => {
  app = openSecondApp(store);
});
afterAll(() => store.close());

const look = async (code: string): Promise<PublicTag> =>
  expectStatus<PublicTag>(await request(app).get(`/api/public/tags/${encodeURIComponent(code)}`), 200);
const report = (code: string, body: object = { name: 'A rigger', note: 'A link looks bent' }) =>
  request(app).post(`/api/public/tags/${code}/reports`).send(body);
const codeOf = (sling: Sling): string => sling.tag?.code ?? '';
const picture = (): Promise<Buffer> =>
  sharp({ create: { width: 20, height: 20, channels: 3, background: '#123456' } })
    .jpeg()
    .toBuffer();

describe('the public page', () => {
  it('says USE only of a sling that may be used, with its loads and due date and nothing else', async () => {
    const sling = await work.inService({
      owner: { kind: 'hired', name: 'Gannet Hire' },
      notes: 'Secret',
      lot: 'LOT-1',
      cost: 99,
    });
    const answer = await look(codeOf(sling));
    expect(answer).toEqual({
      verdict: 'use',
      message: expect.any(String) as string,
      number: sling.number,
      kind: sling.kind,
      ratedLoads: sling.ratedLoads,
      nextDueOn: sling.nextDueOn,
    });
  });

  it('says it in any writing of the code', async () => {
    const code = codeOf(await work.inService());
    const written = `${code.slice(0, 4)}-${code.slice(4, 7)}-${code.slice(7)}`.toLowerCase();
    expect((await look(written)).verdict).toBe('use');
  });

  const onDay = (column: string, offset: number) => async (sling: Sling) => {
    await store.database.adminQuery(`UPDATE slings SET ${column} = ? WHERE id = ?`, [day(offset), sling.id]);
  };
  it.each<[string, (sling: Sling) => Promise<unknown>]>([
    ['is held', (sling) => work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] })],
    ['is lost', (sling) => work.act('manager', sling, 'report_lost', { note: 'Not seen' })],
    ['was due yesterday', onDay('next_due_on', -1)],
    ['is due today', onDay('next_due_on', 0)],
    ['is past its discard date', onDay('discard_on', -1)],
    ['went off hire', onDay('off_hire_on', -1)],
    [
      'was never inspected',
      (sling) => store.database.adminQuery('UPDATE slings SET next_due_on = NULL WHERE id = ?', [sling.id]),
    ],
    [
      'has a maker’s tag that cannot be read',
      (sling) =>
        store.database.adminQuery("UPDATE slings SET makers_tag = 'illegible' WHERE id = ?", [sling.id]),
    ],
  ])('says DO NOT USE of one that %s, and why, with no loads to lift by', async (_, change) => {
    const sling = await work.inService();
    expect((await look(codeOf(sling))).verdict).toBe('use');
    await change(sling);
    const answer = await look(codeOf(sling));
    expect(answer.verdict).toBe('do_not_use');
    expect(Object.keys(answer).sort()).toEqual(['kind', 'message', 'number', 'verdict']);
    // The page and the person who is signed in are never told different things.
    expect((await work.read(sling.id)).mayUse).toBe(false);
  });

  it('says DO NOT USE of a label that is printed and not confirmed', async () => {
    const sling = await work.register();
    expect((await look(await work.label(sling))).verdict).toBe('do_not_use');
    const used = await work.inService();
    const next = await work.label(used, 'retagged');
    expect((await look(next)).verdict).toBe('do_not_use');
    expect((await look(codeOf(used))).verdict).toBe('use');
  });

  it('says DO NOT USE of a void label, though its sling may be used, and no more', async () => {
    const sling = await work.inService();
    const old = codeOf(sling);
    await work.confirm(sling, await work.label(sling, 'lost'));
    expect((await work.read(sling.id)).mayUse).toBe(true);
    const answer = await look(old);
    expect(answer.verdict).toBe('do_not_use');
    expect(Object.keys(answer).sort()).toEqual(['message', 'verdict']);
  });

  it('says DO NOT USE with 200 for an unknown code, a wrong one and anything else', async () => {
    const code = codeOf(await work.inService());
    const wrong = code.startsWith('A') ? `B${code.slice(1)}` : `A${code.slice(1)}`;
    for (const other of [drawTagCode(randomBytes), wrong, 'x', '<script>', "' OR 1=1", '0', 'é'.repeat(50)]) {
      const answer = await look(other);
      expect(answer.verdict, other).toBe('do_not_use');
      expect(Object.keys(answer).sort()).toEqual(['message', 'verdict']);
    }
  });

  it('is stored nowhere on the way', async () => {
    const code = codeOf(await work.inService());
    const answer = await request(app).get(`/api/public/tags/${code}`);
    expect(answer.headers['cache-control']).toContain('no-store');
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('tells whoever guesses codes to wait, after 120 in a minute', async () => {
    const answers = await Promise.all(
      Array.from({ length: 125 }, () => request(app).get(`/api/public/tags/${drawTagCode(randomBytes)}`)),
    );
    const refused = answers.filter(({ status }) => status === 429);
    expect(refused).toHaveLength(5);
    for (const answer of refused) {
      expect(expectProblem(answer, 429, 'too-many-requests').detail).toMatch(/do not use/i);
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    }
  });
});

describe('a damage report', () => {
  it('holds the sling at once, with the name, the words and the photos, placed by nobody', async () => {
    const sling = await work.inService();
    const code = codeOf(sling);
    const upload = await request(app)
      .post(`/api/public/tags/${code}/files`)
      .attach('file', await picture(), 'photo.jpg');
    const { id } = expectStatus<{ id: string }>(upload, 201);
    const answer = await report(code, { name: 'Jo حسن 🦺', note: '<b>bent</b> link', photoIds: [id] });
    expect(answer.status).toBe(201);
    expect(Object.keys(answer.body as object).sort()).toEqual(['message', 'received']);
    const now = await work.read(sling.id);
    expect(now).toMatchObject({ state: 'held', mayUse: false, photos: [{ fileId: id, purpose: 'report' }] });
    expect(now.openReasons).toMatchObject([
      { code: 'damage_suspected', placedBy: null, note: 'Jo حسن 🦺: <b>bent</b> link', confirmed: false },
    ]);
    expect((await look(code)).verdict).toBe('do_not_use');
  });

  it('counts on a sling that is held already, in another state, or lost', async () => {
    const held = await work.inService();
    await work.act('storekeeper', held, 'hold', { reasons: [{ code: 'latch' }] });
    expect((await report(codeOf(held))).status).toBe(201);
    expect((await work.read(held.id)).openReasons.map(({ code }) => code)).toEqual([
      'latch',
      'damage_suspected',
    ]);
    const lost = await work.inService();
    await work.act('manager', lost, 'report_lost', { note: 'Not seen' });
    expect((await report(codeOf(lost))).status).toBe(201);
    const found = await work.read(lost.id);
    expect(found.state).toBe('held');
    expect(found.openReasons.map(({ code }) => code)).toEqual(['found', 'damage_suspected']);
    const received = await work.register();
    expect((await report(await work.label(received))).status).toBe(201);
    expect((await work.read(received.id)).state).toBe('held');
  });

  it('on a void label is kept as an alarm and holds nothing: which sling it was is not certain', async () => {
    const sling = await work.inService();
    const old = codeOf(sling);
    await work.confirm(sling, await work.label(sling, 'lost'));
    expect((await report(old)).status).toBe(201);
    expect((await work.read(sling.id)).state).toBe('in_service');
    const rows = await store.database.adminQuery('SELECT name FROM damage_reports WHERE tag_code = ?', [old]);
    expect(rows).toEqual([{ name: 'A rigger' }]);
  });

  it('is never stopped by a photo that is not here', async () => {
    const sling = await work.inService();
    const photoIds = ['00000000-0000-4000-8000-000000000000'];
    expect((await report(codeOf(sling), { name: 'A', note: 'B', photoIds })).status).toBe(201);
    expect((await work.read(sling.id)).state).toBe('held');
  });

  it('needs a name and words, and a label that is ours', async () => {
    const code = codeOf(await work.inService());
    expect(errorPaths(expectProblem(await report(code, {}), 422)).sort()).toEqual(['name', 'note']);
    expect(errorPaths(expectProblem(await report(code, { name: '\ud83e', note: 'x' }), 422))).toEqual([
      'name',
    ]);
    expectProblem(await report(drawTagCode(randomBytes)), 404, 'not-found');
    expectProblem(await report('WRONG00000'), 422, 'invalid');
    expect((await look(code)).verdict).toBe('use');
  });

  it('takes no file for a label that is not ours, and no script for a photo', async () => {
    const code = codeOf(await work.inService());
    const upload = (to: string, bytes: Buffer) =>
      request(app).post(`/api/public/tags/${to}/files`).attach('file', bytes, 'photo.jpg');
    expectProblem(await upload(drawTagCode(randomBytes), await picture()), 404);
    expectProblem(await upload(code, Buffer.from('#!/bin/sh\nid')), 415, 'unsupported-type');
  });

  it('is limited for one label, however its code is written, and never in what it costs to read', async () => {
    const sling = await work.inService();
    const code = codeOf(sling);
    const writings = Array.from({ length: 13 }, (_, n) =>
      n % 2 ? code.toLowerCase() : `${code.slice(0, 1 + (n % 9))}-${code.slice(1 + (n % 9))}`,
    );
    const statuses: number[] = [];
    for (const writing of writings) statuses.push((await report(writing)).status);
    expect(statuses.filter((status) => status === 201)).toHaveLength(10);
    expect(statuses.filter((status) => status === 429)).toHaveLength(3);
    const last = await report(code);
    expectProblem(last, 429, 'too-many-requests');
    expect(Number(last.headers['retry-after'])).toBeGreaterThan(0);
    expect((await look(code)).verdict).toBe('do_not_use');
  });

  it('is limited for one address', async () => {
    const slings = [await work.inService(), await work.inService(), await work.inService()];
    const statuses: number[] = [];
    for (let n = 0; n < 24; n += 1) {
      const sling = slings[n % 3];
      if (sling) statuses.push((await report(codeOf(sling))).status);
    }
    expect(statuses.filter((status) => status === 201)).toHaveLength(20);
    expect(statuses.filter((status) => status === 429)).toHaveLength(4);
  });

  it('leaves the ledger whole', async () => {
    const answer = await (await store.signIn('manager')).get('/api/ledger/verify');
    expect(answer.body).toMatchObject({ ok: true });
  });
});
