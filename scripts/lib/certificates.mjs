// @ts-check
import { X509Certificate } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

const DAY_MS = 86_400_000;
/** Phones keep trusting the authority; the server's own certificate is renewed under it without asking again. */
const AUTHORITY_DAYS = 3650;
/** From memory: Apple's systems refuse server certificates that are valid for longer than about 13 months. */
const SERVER_DAYS = 390;
const RENEW_BEFORE_DAYS = 30;

/**
 * @typedef {object} Certificates
 * @property {string} certFile the server's certificate, PEM
 * @property {string} keyFile its key, PEM
 * @property {string} authorityFile what a phone has to trust, PEM
 * @property {string} fingerprint of the authority, SHA-256 as phones show it
 */

/**
 * Finds or makes a certificate for this machine's addresses, signed by an authority that is made once.
 * @param {string} folder
 * @param {string[]} addresses IPv4
 * @param {Date} [now]
 * @returns {Promise<Certificates>}
 */
export async function ensureCertificates(folder, addresses, now = new Date()) {
  const certFile = path.join(folder, 'server.crt');
  const keyFile = path.join(folder, 'server.key');
  const authorityFile = path.join(folder, 'slingward-authority.crt');
  const authorityKeyFile = path.join(folder, 'slingward-authority.key');
  fs.mkdirSync(folder, { recursive: true, mode: 0o700 });

  let authority = findCertificate(authorityFile, authorityKeyFile);
  if (!authority || isNearlyOver(authority, now)) {
    save(await createAuthority(now), authorityFile, authorityKeyFile);
    authority = new X509Certificate(fs.readFileSync(authorityFile));
  }
  const server = findCertificate(certFile, keyFile);
  if (!server || isNearlyOver(server, now) || !isFor(server, authority, addresses)) {
    const signer = {
      cert: fs.readFileSync(authorityFile, 'utf8'),
      key: fs.readFileSync(authorityKeyFile, 'utf8'),
    };
    save(await createServerCertificate(signer, addresses, now), certFile, keyFile);
  }
  return { certFile, keyFile, authorityFile, fingerprint: authority.fingerprint256 };
}

/**
 * @param {string} certFile
 * @param {string} keyFile
 */
function findCertificate(certFile, keyFile) {
  try {
    fs.accessSync(keyFile);
    return new X509Certificate(fs.readFileSync(certFile));
  } catch {
    return null;
  }
}

/**
 * @param {X509Certificate} certificate
 * @param {Date} now
 */
const isNearlyOver = (certificate, now) =>
  Date.parse(certificate.validTo) - now.getTime() < RENEW_BEFORE_DAYS * DAY_MS;

/**
 * @param {X509Certificate} certificate
 * @param {X509Certificate} authority
 * @param {string[]} addresses
 */
const isFor = (certificate, authority, addresses) =>
  certificate.verify(authority.publicKey) && addresses.every((address) => certificate.checkIP(address));

/**
 * @param {{ cert: string, private: string }} made
 * @param {string} certFile
 * @param {string} keyFile
 */
function save(made, certFile, keyFile) {
  fs.rmSync(keyFile, { force: true }); // an old file would keep its own mode
  fs.writeFileSync(keyFile, made.private, { mode: 0o600 });
  fs.writeFileSync(certFile, made.cert);
}

/** @param {Date} now */
async function createAuthority(now) {
  const { generate } = await import('selfsigned');
  return generate([{ name: 'commonName', value: `Slingward on ${os.hostname()}` }], {
    ...span(now, AUTHORITY_DAYS),
    keyType: 'ec',
    algorithm: 'sha256',
    extensions: [
      { name: 'basicConstraints', cA: true, pathLenConstraint: 0, critical: true },
      { name: 'keyUsage', keyCertSign: true, cRLSign: true, critical: true },
    ],
  });
}

/**
 * @param {{ cert: string, key: string }} signer
 * @param {string[]} addresses
 * @param {Date} now
 */
async function createServerCertificate(signer, addresses, now) {
  const { generate } = await import('selfsigned');
  const names = ['localhost', os.hostname(), `${os.hostname()}.local`];
  return generate([{ name: 'commonName', value: 'Slingward server' }], {
    ...span(now, SERVER_DAYS),
    keyType: 'ec',
    algorithm: 'sha256',
    ca: signer,
    extensions: [
      { name: 'basicConstraints', cA: false, critical: true },
      { name: 'keyUsage', digitalSignature: true, critical: true },
      { name: 'extKeyUsage', serverAuth: true },
      {
        name: 'subjectAltName',
        altNames: [
          ...names.map((value) => /** @type {const} */ ({ type: 2, value })),
          ...['127.0.0.1', ...addresses].map((ip) => /** @type {const} */ ({ type: 7, ip })),
        ],
      },
    ],
  });
}

/**
 * A day's grace at the start: a phone's clock may be behind.
 * @param {Date} now
 * @param {number} days
 */
const span = (now, days) => ({
  notBeforeDate: new Date(now.getTime() - DAY_MS),
  notAfterDate: new Date(now.getTime() + days * DAY_MS),
});
