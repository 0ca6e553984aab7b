// @ts-check
import { ensureCertificates } from './certificates.mjs';
import { paths } from './paths.mjs';
import { serveTrustPage } from './trustPage.mjs';

/**
 * Makes ready what phones in the local network need: a certificate, and a page that hands it out.
 * @param {import('./lifetime.mjs').Lifetime} lifetime
 * @param {string[]} addresses of this machine, the likeliest first
 * @param {number} port of the product
 * @returns {Promise<{ url: string, certificates: import('./certificates.mjs').Certificates, advice: string }>}
 */
export async function openLan(lifetime, addresses, port) {
  const certificates = await ensureCertificates(paths.certificates, addresses);
  const url = `https://${addresses[0]}:${port}`;
  const page = await serveTrustPage({
    port: port + 1,
    authorityFile: certificates.authorityFile,
    fingerprint: certificates.fingerprint,
    productUrl: url,
  });
  lifetime.defer(page.close);
  const others = addresses.slice(1).map((address) => `https://${address}:${port}`);
  const advice = [
    `On phones in this network: first open http://${addresses[0]}:${page.port} and install the certificate as that page says (once per phone),`,
    `then open ${url}${others.length > 0 ? ` (or ${others.join(', ')})` : ''}.`,
    `Without installing it, the phone warns: going on anyway works for a look, but anybody in the network could then stand between.`,
    `The certificate's SHA-256 fingerprint, to compare: ${certificates.fingerprint}`,
  ].join('\n');
  return { url, certificates, advice };
}
