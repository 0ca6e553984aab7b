// @ts-check
import fs from 'node:fs';
import http from 'node:http';

const CERTIFICATE_PATH = '/slingward-authority.crt';

/**
 * Serves one page over plain HTTP from which a phone takes the certificate, as it cannot trust HTTPS before. Nothing
 * else is answered, and the certificate is public; its fingerprint stands in the terminal to compare.
 * @param {{ port: number, authorityFile: string, fingerprint: string, productUrl: string }} options
 * @returns {Promise<{ port: number, close: () => void }>} on another port when the wanted one is taken
 */
export async function serveTrustPage({ port, authorityFile, fingerprint, productUrl }) {
  const certificate = fs.readFileSync(authorityFile);
  const page = renderTrustPage(fingerprint, productUrl);
  const server = http.createServer((request, response) => {
    if (request.url === CERTIFICATE_PATH)
      response.writeHead(200, { 'content-type': 'application/x-x509-ca-cert' }).end(certificate);
    else if (request.url === '/')
      response.writeHead(200, { 'content-type': 'text/html; charset=utf-8' }).end(page);
    else response.writeHead(404, { 'content-type': 'text/plain' }).end('Not found');
  });
  const listen = (/** @type {number} */ wanted) =>
    new Promise((resolve, reject) => {
      server.once('error', reject);
      server.listen(wanted, '0.0.0.0', () => resolve(undefined));
    });
  await listen(port).catch(() => listen(0));
  const address = server.address();
  return {
    port: typeof address === 'object' && address ? address.port : port,
    close: () => {
      server.close();
      server.closeAllConnections();
    },
  };
}

/**
 * @param {string} fingerprint
 * @param {string} productUrl
 */
function renderTrustPage(fingerprint, productUrl) {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Trust this Slingward</title>
<style>
  body { font: 18px/1.5 system-ui, sans-serif; max-width: 40rem; margin: 0 auto; padding: 1.5rem; color: #1b2429; background: #fff }
  a.act { display: block; padding: 1rem; margin: 1rem 0; text-align: center; color: #fff; background: #0f4c5c; border-radius: 6px }
  code { overflow-wrap: anywhere }
  li { margin: .4rem 0 }
</style>
</head>
<body>
<h1>Trust this Slingward</h1>
<p>A phone gives a page its camera only over a secure connection. Install this store's certificate once.</p>
<a class="act" href="${CERTIFICATE_PATH}">Get the certificate</a>
<h2>iPhone and iPad</h2>
<ol>
  <li>Open this page in Safari, get the certificate and allow the profile.</li>
  <li>Settings, General, VPN &amp; Device Management: install the profile.</li>
  <li>Settings, General, About, Certificate Trust Settings: switch it on.</li>
</ol>
<h2>Android</h2>
<ol>
  <li>Get the certificate.</li>
  <li>Settings, search for “CA certificate”: install the file you got.</li>
</ol>
<p>The fingerprint must be the one that the computer shows:<br><code>${fingerprint}</code></p>
<a class="act" href="${productUrl}">Open Slingward</a>
</body>
</html>
`;
}
