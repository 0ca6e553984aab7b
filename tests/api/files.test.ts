import { createHash, randomBytes } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import sharp from 'sharp';
import type { Response } from 'superagent';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIMITS } from '../../shared/limits';
import type { StoredFile } from '../../shared/schemas/files';
import {
  buildBomb,
  buildPdf,
  halfOf,
  noisePng,
  openAction,
  packedScriptPdf,
  sendZeros,
  textBomb,
} from '../support/badFiles';
import { countRows, expectProblem, findProblemFault, openSecondApp } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

const hash = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');
const upload = async (bytes: Buffer, filename: string, contentType?: string) =>
  (await store.signIn('storekeeper'))
    .post('/api/files')
    .attach('file', bytes, { filename, ...(contentType ? { contentType } : {}) });
const download = async (id: string, query = '') =>
  (await store.signIn('auditor')).get(`/api/files/${id}${query}`).buffer(true).parse(collect);

function collect(response: Response, done: (error: Error | null, body: Buffer) => void): void {
  const parts: Buffer[] = [];
  response.on('data', (part: Buffer) => parts.push(part)).on('end', () => done(null, Buffer.concat(parts)));
}

const picture = () =>
  sharp({ create: { width: 320, height: 200, channels: 3, background: '#2266aa' } }).withExif({
    IFD0: { Artist: 'A person with a name', Copyright: 'EXIF-SECRET' },
    IFD3: { GPSLatitude: '51/1 30/1 0/1', GPSLatitudeRef: 'N' },
  });

describe('a picture', () => {
  it.each([
    ['JPEG', () => picture().jpeg().toBuffer()],
    ['PNG', () => picture().png().toBuffer()],
    ['WebP', () => picture().webp().toBuffer()],
  ])('as %s is kept encoded anew, without what it told besides', async (_, build) => {
    const original = await build();
    expect(original.includes('EXIF-SECRET')).toBe(true);
    const kept = expectStatus<StoredFile>(await upload(original, 'photo.bin', 'text/plain'), 201);
    expect(kept).toMatchObject({ contentType: 'image/jpeg', originalSha256: hash(original) });
    const answer = await download(kept.id);
    const bytes = answer.body as Buffer;
    expect(answer.headers['content-type']).toBe('image/jpeg');
    expect(hash(bytes)).toBe(kept.sha256);
    expect(bytes).toHaveLength(kept.size);
    const facts = await sharp(bytes).metadata();
    expect(facts).toMatchObject({ format: 'jpeg', width: 320, height: 200 });
    expect(facts.exif).toBeUndefined();
    expect(bytes.includes('EXIF-SECRET')).toBe(false);
  });

  it('stands upright and is at most so wide, and may be asked for smaller', async () => {
    const lying = await sharp({ create: { width: 3000, height: 1500, channels: 3, background: '#fff' } })
      .jpeg()
      .withMetadata({ orientation: 6 })
      .toBuffer();
    const kept = expectStatus<StoredFile>(await upload(lying, 'big.jpg'), 201);
    const full = await sharp((await download(kept.id)).body as Buffer).metadata();
    expect([full.width, full.height]).toEqual([LIMITS.imageEdgePx / 2, LIMITS.imageEdgePx]);
    const small = await sharp((await download(kept.id, '?w=320')).body as Buffer).metadata();
    expect(small.width).toBe(320);
    expectProblem(
      await (await store.signIn('auditor')).get(`/api/files/${kept.id}?w=9999`),
      400,
      'malformed',
    );
  });

  it('that hides a page behind its pixels loses it', async () => {
    const png = await picture().png().toBuffer();
    const polyglot = Buffer.concat([png, Buffer.from('<script>alert(1)</script><?php system("id") ?>')]);
    const kept = expectStatus<StoredFile>(await upload(polyglot, 'photo.png'), 201);
    const answer = await download(kept.id);
    expect((answer.body as Buffer).includes('<script>')).toBe(false);
    expect(answer.headers['x-content-type-options']).toBe('nosniff');
    expect(answer.headers['content-security-policy']).toContain("default-src 'none'");
  });

  it('loses the megabytes of packed text that it carries', async () => {
    const kept = expectStatus<StoredFile>(await upload(buildBomb(8, 8, [textBomb()]), 'photo.png'), 201);
    expect(kept.size).toBeLessThan(2000);
  });

  it('is read by nobody who is not signed in', async () => {
    expectProblem(await store.guest().get(`/api/files/${await work.photo()}`), 401);
  });
});

describe('a PDF', () => {
  it('is kept to the byte, and given as a download', async () => {
    const pdf = await buildPdf();
    const kept = expectStatus<StoredFile>(await upload(pdf, 'photo.jpg', 'image/jpeg'), 201);
    expect(kept).toMatchObject({
      contentType: 'application/pdf',
      sha256: hash(pdf),
      originalSha256: hash(pdf),
    });
    const answer = await download(kept.id);
    expect((answer.body as Buffer).equals(pdf)).toBe(true);
    expect(answer.headers['content-disposition']).toMatch(/^attachment/);
  });

  it('is not taken for a script by chance: packed pictures hold any bytes', async () => {
    const chance = await buildPdf((pdf) => pdf.ref({}).end(Buffer.from('.../JS /XFA /S ...', 'latin1')));
    expect((await upload(chance, 'scan.pdf')).status).toBe(201);
  });

  it('is no photo of a hold', async () => {
    const kept = expectStatus<StoredFile>(await upload(await buildPdf(), 'a.pdf'), 201);
    const sling = await work.register();
    const answer = await (await store.signIn('storekeeper')).patch(`/api/slings/${sling.id}`).send({
      photoIds: [kept.id],
    });
    expectProblem(answer, 422, 'invalid');
  });
});

describe('a bad upload', () => {
  const text = (value: string): Buffer => Buffer.from(value, 'utf8');
  const cases: [string, number, () => Promise<Buffer> | Buffer, string][] = [
    ['a script called PNG', 415, () => text('#!/bin/sh\nrm -rf /\n'), 'photo.png'],
    ['a web page called JPEG', 415, () => text('<!doctype html><script>alert(1)</script>'), 'photo.jpg'],
    ['an SVG', 415, () => text('<svg xmlns="http://www.w3.org/2000/svg" onload="alert(1)"/>'), 'drawing.svg'],
    ['an archive', 415, () => Buffer.concat([text('PK\u0003\u0004'), randomBytes(200)]), 'photo.webp'],
    ['noise', 415, () => randomBytes(5000), 'photo.jpg'],
    [
      'a script behind the first bytes of a PNG',
      422,
      () => Buffer.concat([buildBomb(8, 8).subarray(0, 33), text('<script>alert(1)</script>'.repeat(20))]),
      'photo.png',
    ],
    [
      'a GIF',
      415,
      () =>
        sharp({ create: { width: 9, height: 9, channels: 3, background: '#fff' } })
          .gif()
          .toBuffer(),
      'a.gif',
    ],
    ['half a JPEG', 422, async () => halfOf(await picture().jpeg().toBuffer()), 'photo.jpg'],
    ['half a PNG', 422, async () => halfOf(await noisePng()), 'photo.png'],
    ['half a WebP', 422, async () => halfOf(await picture().webp().toBuffer()), 'photo.webp'],
    ['a picture that unfolds to 900 million pixels', 413, () => buildBomb(30_000, 30_000), 'photo.png'],
    ['a picture one line wide and endless', 413, () => buildBomb(8, 60_000_000), 'photo.png'],
    ['half a PDF', 422, async () => halfOf(await buildPdf()), 'a.pdf'],
    ['a PDF with a script', 422, () => buildPdf((pdf) => openAction(pdf, 'JavaScript')), 'a.pdf'],
    ['a PDF that starts a program', 422, () => buildPdf((pdf) => openAction(pdf, 'Launch')), 'a.pdf'],
    [
      'a PDF with a script by another spelling',
      422,
      async () =>
        text(
          (await buildPdf((pdf) => openAction(pdf, 'JavaScript')))
            .toString('latin1')
            .replace('/JavaScript', '/J#61vaScript')
            .replace('/JS', '/#4AS'),
        ),
      'a.pdf',
    ],
    ['a PDF with a script in a packed object', 422, () => packedScriptPdf(), 'a.pdf'],
    [
      'a PDF with a file in it',
      422,
      () => buildPdf((pdf) => pdf.file(text('MZ'), { name: 'a.exe' })),
      'a.pdf',
    ],
    ['nothing', 400, () => Buffer.alloc(0), 'photo.jpg'],
  ];

  it.each(cases)(
    '%s is refused with %i, nothing is written, and the server goes on',
    async (_, status, build, name) => {
      const bytes = await build();
      const before = await countRows(store);
      const answer = await upload(bytes, name);
      expect(answer.status, answer.text).toBe(status);
      expect(findProblemFault(answer)).toBeNull();
      expect(await countRows(store)).toEqual(before);
      expect((await store.guest().get('/readyz')).status).toBe(200);
    },
  );

  it.each([
    ['JSON instead of a form', 415, 'application/json', '{"file":"x"}'],
    [
      'a form without an end',
      400,
      'multipart/form-data; boundary=x',
      '--x\r\nContent-Disposition: form-data; name="file"; filename="a.jpg"\r\n\r\nabc',
    ],
    ['a form without a boundary', 400, 'multipart/form-data', '--x\r\n\r\n--x--'],
    [
      'a form with another field',
      400,
      'multipart/form-data; boundary=x',
      '--x\r\nContent-Disposition: form-data; name="other"; filename="a.jpg"\r\n\r\nabc\r\n--x--\r\n',
    ],
    [
      'a text where the file belongs',
      400,
      'multipart/form-data; boundary=x',
      '--x\r\nContent-Disposition: form-data; name="file"\r\n\r\nabc\r\n--x--\r\n',
    ],
  ])('%s is refused with %i', async (_, status, type, body) => {
    const agent = await store.signIn('storekeeper');
    expectProblem(await agent.post('/api/files').set('Content-Type', type).send(body), status);
  });

  it('of a file name with a path in it keeps no path', async () => {
    const kept = expectStatus<StoredFile>(
      await upload(await picture().jpeg().toBuffer(), '../../../etc/cron.d/x.jpg'),
      201,
    );
    const answer = await download(kept.id);
    expect(JSON.stringify(answer.headers)).not.toContain('cron');
  });
});

describe('a hundred megabytes', () => {
  const SIZE = 100 * 1024 * 1024;
  it.each([
    ['with its length said beforehand', true],
    ['without a length', false],
  ])('%s are refused with 413 and never held in memory', async (_, hasLength) => {
    const app = openSecondApp(store);
    const server = app.listen(0);
    try {
      const { port } = server.address() as AddressInfo;
      const signedIn = await fetch(`http://127.0.0.1:${port}/api/session`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify({ email: 'storekeeper@marram-quay.example', password: 'marram-quay-demo' }),
      });
      const cookie = signedIn.headers.getSetCookie().join('; ').split(';')[0] ?? '';
      const before = await countRows(store);
      const { status, body, peakBytes } = await sendZeros(port, cookie, SIZE, hasLength);
      expect(status).toBe(413);
      expect(JSON.parse(body)).toMatchObject({ status: 413 });
      expect(peakBytes).toBeLessThan(60 * 1024 * 1024);
      expect(await countRows(store)).toEqual(before);
      expect((await fetch(`http://127.0.0.1:${port}/readyz`)).status).toBe(200);
    } finally {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
    }
  });
});
