import { ROUTE_ACCESS, type Access } from '../../shared/domain/access/routes';
import type { Route } from '../routing/route';

const escape = (text: string): string =>
  text.replace(/[&<>"]/g, (character) => `&#${character.charCodeAt(0)};`);

/** A plain page, no script: every call, who may make it, and where the schemas are. */
export function renderDocsPage(routes: readonly Route[]): string {
  const rows = routes
    .map(({ route, docs }) => {
      const access: Access = ROUTE_ACCESS[route];
      const who = typeof access === 'string' ? access.replace('_', ' ') : access.join(', ');
      return `<tr><td><code>${escape(route)}</code></td><td>${escape(docs.summary)}</td><td>${escape(who)}</td></tr>`;
    })
    .join('\n');
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>Slingward API</title>
<style>body{font:16px/1.5 system-ui,sans-serif;margin:2rem auto;max-width:70rem;padding:0 1rem;color:#17212b;background:#f6f4ee}
table{border-collapse:collapse;width:100%}td,th{text-align:left;padding:.5rem .75rem .5rem 0;border-top:1px solid #d8d4c8;vertical-align:top}a{color:#0e5a66}</style></head>
<body><h1>Slingward API</h1>
<p>JSON under <code>/api</code>; errors are <code>application/problem+json</code>; every write takes <code>Idempotency-Key</code>.
The full description with all schemas: <a href="/api/openapi.json">openapi.json</a> (OpenAPI 3.1).</p>
<table><thead><tr><th>Call</th><th>Does</th><th>Who</th></tr></thead><tbody>
${rows}
</tbody></table></body></html>`;
}
