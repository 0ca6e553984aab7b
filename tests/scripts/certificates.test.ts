import { X509Certificate } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ensureCertificates } from '../../scripts/lib/certificates.mjs';
import { getLanAddresses } from '../../scripts/lib/lanAddresses.mjs';
import { serveTrustPage } from '../../scripts/lib/trustPage.mjs';

const NOW = new Date('2027-03-01T12:00:00Z');
const later = (days: number) => new Date(NOW.getTime() + days * 86_400_000);

let folder: string;

beforeEach(() => {
  folder = fs.mkdtempSync(path.join(os.tmpdir(), 'slingward-tls-'));
});

afterEach(() => fs.rmSync(folder, { recursive: true, force: true }));

const read = (file: string) => new X509Certificate(fs.readFileSync(file));

describe('the certificate for phones', () => {
  it('names the addresses and this machine, and is signed by the authority', async () => {
    const made = await ensureCertificates(folder, ['192.168.7.20', '10.0.0.4'], NOW);
    const server = read(made.certFile);
    const authority = read(made.authorityFile);
    expect(['192.168.7.20', '10.0.0.4', '127.0.0.1'].every((ip) => server.checkIP(ip))).toBe(true);
    expect(server.checkHost('localhost')).toBe('localhost');
    expect(server.checkIP('192.168.7.21')).toBeUndefined();
    expect(server.verify(authority.publicKey)).toBe(true);
    expect([server.ca, authority.ca]).toEqual([false, true]);
    expect(made.fingerprint).toBe(authority.fingerprint256);
    expect(fs.statSync(made.keyFile).mode & 0o777).toBe(0o600);
    expect(fs.statSync(path.join(folder, 'slingward-authority.key')).mode & 0o777).toBe(0o600);
  });

  it('is kept while it serves', async () => {
    const first = read((await ensureCertificates(folder, ['192.168.7.20', '10.0.0.4'], NOW)).certFile);
    const second = read((await ensureCertificates(folder, ['10.0.0.4'], later(300))).certFile);
    expect(second.fingerprint256).toBe(first.fingerprint256);
  });

  it.each([
    ['an address is new', ['192.168.7.99'], later(1)],
    ['it is nearly over', ['192.168.7.20'], later(365)],
  ])('is renewed under the same authority when %s', async (_why, addresses, now) => {
    const made = await ensureCertificates(folder, ['192.168.7.20'], NOW);
    const first = read(made.certFile);
    const second = await ensureCertificates(folder, addresses, now);
    expect(read(second.certFile).fingerprint256).not.toBe(first.fingerprint256);
    expect(second.fingerprint).toBe(made.fingerprint);
    expect(addresses.every((ip) => read(second.certFile).checkIP(ip))).toBe(true);
  });

  it('is handed out over plain HTTP, with nothing else of the folder', async () => {
    const { authorityFile, fingerprint } = await ensureCertificates(folder, ['192.168.7.20'], NOW);
    const page = await serveTrustPage({
      port: 0,
      authorityFile,
      fingerprint,
      productUrl: 'https://192.168.7.20:4173',
    });
    const get = (target: string) => fetch(`http://127.0.0.1:${page.port}${target}`);
    const html = await (await get('/')).text();
    expect(html).toContain(fingerprint);
    expect(html).toContain('https://192.168.7.20:4173');
    const handed = await get('/slingward-authority.crt');
    expect(handed.headers.get('content-type')).toBe('application/x-x509-ca-cert');
    expect(await handed.text()).toBe(fs.readFileSync(authorityFile, 'utf8'));
    expect((await get('/slingward-authority.key')).status).toBe(404);
    expect((await get('/../slingward-authority.key')).status).toBe(404);
    page.close();
  });
});

describe("this machine's addresses", () => {
  const address = (ip: string, family: 'IPv4' | 'IPv6' = 'IPv4', internal = false) => {
    const common = { address: ip, netmask: '', mac: '', internal, cidr: null };
    return family === 'IPv4' ? { ...common, family } : { ...common, family, scopeid: 0 };
  };

  it('puts the network of the phones before those inside the machine', () => {
    const found = getLanAddresses({
      lo: [address('127.0.0.1', 'IPv4', true)],
      docker0: [address('172.17.0.1')],
      eth0: [address('fe80::1', 'IPv6'), address('192.168.7.20')],
      wlan0: [address('169.254.3.3')],
    });
    expect(found).toEqual(['192.168.7.20', '172.17.0.1']);
  });

  it('says what to do when there is none', () => {
    expect(() => getLanAddresses({ lo: [address('127.0.0.1', 'IPv4', true)] })).toThrow(
      'connect it to the network',
    );
  });
});
