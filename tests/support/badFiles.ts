import { randomBytes } from 'node:crypto';
import http from 'node:http';
import { deflateSync } from 'node:zlib';
import PDFDocument from 'pdfkit';
import sharp from 'sharp';

export function buildPdf(more: (document: PDFKit.PDFDocument) => void = () => undefined): Promise<Buffer> {
  return new Promise((resolve) => {
    const document = new PDFDocument({ compress: false });
    const parts: Buffer[] = [];
    document.on('data', (part: Buffer) => parts.push(part)).on('end', () => resolve(Buffer.concat(parts)));
    document.text('Certificate 1');
    more(document);
    document.end();
  });
}

/** A PNG chunk with its length and checksum. */
function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const out = Buffer.alloc(body.length + 8);
  out.writeUInt32BE(data.length, 0);
  body.copy(out, 4);
  out.writeUInt32BE(crc32(body), body.length + 4);
  return out;
}
function crc32(bytes: Buffer): number {
  let crc = ~0;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit += 1) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return ~crc >>> 0;
}

/** One bit a pixel, all zero: a hundred kilobytes that unfold to the given size. */
export function buildBomb(width: number, height: number, extra: Buffer[] = []): Buffer {
  const head = Buffer.alloc(13);
  head.writeUInt32BE(width, 0);
  head.writeUInt32BE(height, 4);
  head.set([1, 0, 0, 0, 0], 8);
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', head),
    ...extra,
    chunk('IDAT', deflateSync(Buffer.alloc((Math.ceil(width / 8) + 1) * height), { level: 9 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

/** Sends a form whose file is zeros, as fast as the server takes them, until it answers. */
export function sendZeros(
  port: number,
  cookie: string,
  size: number,
  hasLength: boolean,
): Promise<{ status: number; body: string; peakBytes: number }> {
  const head = Buffer.from(
    '--x\r\nContent-Disposition: form-data; name="file"; filename="a.jpg"\r\nContent-Type: image/jpeg\r\n\r\n',
  );
  const tail = Buffer.from('\r\n--x--\r\n');
  const zeros = Buffer.alloc(256 * 1024);
  const held = (): number => process.memoryUsage().arrayBuffers;
  const start = held();
  let peakBytes = 0;
  return new Promise((resolve, reject) => {
    const request = http.request({
      port,
      host: '127.0.0.1',
      path: '/api/files',
      method: 'POST',
      headers: {
        Cookie: cookie,
        'Content-Type': 'multipart/form-data; boundary=x',
        ...(hasLength ? { 'Content-Length': head.length + size + tail.length } : {}),
      },
    });
    let isAnswered = false;
    let sent = 0;
    request.on('response', (response) => {
      isAnswered = true;
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => {
        request.destroy();
        resolve({ status: response.statusCode ?? 0, body: Buffer.concat(parts).toString(), peakBytes });
      });
    });
    // Once the server has answered it may close the connection while we still send.
    request.on('error', (error) => (isAnswered ? undefined : reject(error)));
    const pump = (): void => {
      while (!isAnswered && sent < size) {
        peakBytes = Math.max(peakBytes, held() - start);
        sent += zeros.length;
        if (!request.write(zeros)) {
          request.once('drain', () => setImmediate(pump));
          return;
        }
      }
      if (!isAnswered) request.end(tail);
    };
    request.write(head);
    pump();
  });
}

export const halfOf = (bytes: Buffer): Buffer => bytes.subarray(0, Math.floor(bytes.length / 2));
export const noisePng = (): Promise<Buffer> =>
  sharp(randomBytes(64 * 64 * 3), { raw: { width: 64, height: 64, channels: 3 } })
    .png()
    .toBuffer();

/** Fifty megabytes of text in fifty kilobytes. */
export const textBomb = (): Buffer =>
  chunk(
    'zTXt',
    Buffer.concat([Buffer.from('Comment\0\0'), deflateSync(Buffer.alloc(50 * 1024 * 1024), { level: 9 })]),
  );

/** What runs when the document is opened. */
export function openAction(pdf: PDFKit.PDFDocument, kind: 'JavaScript' | 'Launch'): void {
  const words = kind === 'JavaScript' ? { JS: new String('app.alert(1)') } : { F: new String('a.exe') };
  pdf.ref({ Type: 'Action', S: kind, ...words }).end('');
}

/** An object stream: the dictionary with the script is deflated, so that its name stands nowhere in the bytes. */
export function packedScriptPdf(): Buffer {
  const objects = '4 0 << /Type /Action /S /JavaScript /JS (app.alert\\(1\\)) >>';
  const packed = deflateSync(Buffer.from(objects));
  return Buffer.concat([
    Buffer.from(
      `%PDF-1.5\n1 0 obj\n<< /Type /Catalog /OpenAction 4 0 R >>\nendobj\n2 0 obj\n<< /Type /ObjStm /N 1 /First 4 /Length ${packed.length} /Filter /FlateDecode >>\nstream\n`,
    ),
    packed,
    Buffer.from('\nendstream\nendobj\nstartxref\n0\n%%EOF\n'),
  ]);
}
