import { createDocument, type ZodOpenApiOperationObject } from 'zod-openapi';
import { z } from 'zod';
import { problemSchema } from '../../shared/errors';
import { ROUTE_ACCESS, type Access } from '../../shared/domain/access/routes';
import type { Route } from '../routing/route';

/** The API's own description, from the schemas that also check the requests. */
export function buildOpenApi(routes: readonly Route[]): object {
  const paths: Record<string, Record<string, ZodOpenApiOperationObject>> = {};
  for (const route of routes) {
    const [method = '', path = ''] = route.route.split(' ');
    const openPath = path.replace(/:(\w+)/g, '{$1}');
    paths[openPath] = { ...paths[openPath], [method.toLowerCase()]: describe(route, path) };
  }
  const document = {
    openapi: '3.1.0' as const,
    info: {
      title: 'Slingward',
      version: '0.1.0',
      description:
        'Identity, inspection and quarantine of lifting slings. A record-keeping and planning aid: it does not replace inspection by a competent or qualified person, the maker’s instructions, or local codes.',
    },
    paths,
  };
  return createDocument(document, {
    // Answers may grow, and parts of one whole (allOf) must not forbid each other's fields.
    override: ({ jsonSchema, io }) => {
      if (io === 'output' && jsonSchema.additionalProperties === false)
        delete jsonSchema.additionalProperties;
    },
  });
}

function describe({ docs, route }: Route, path: string): ZodOpenApiOperationObject {
  const access: Access = ROUTE_ACCESS[route];
  const who = typeof access === 'string' ? access.replace('_', ' ') : access.join(', ');
  const names = [...path.matchAll(/:(\w+)/g)].map((match) => match[1] ?? '');
  return {
    summary: docs.summary,
    description: `Who: ${who}.`,
    requestParams: {
      ...(names.length > 0
        ? { path: z.object(Object.fromEntries(names.map((name) => [name, z.string()]))) }
        : {}),
      ...(docs.query instanceof z.ZodObject ? { query: docs.query } : {}),
    },
    ...(docs.body
      ? { requestBody: { content: { [docs.consumes ?? 'application/json']: { schema: docs.body } } } }
      : {}),
    responses: {
      '2XX': {
        description: 'Done',
        ...(docs.response ? { content: { 'application/json': { schema: docs.response } } } : {}),
        ...(docs.produces ? { content: { [docs.produces]: { schema: z.string() } } } : {}),
      },
      '4XX': {
        description: 'Refused, with the reason in words',
        content: { 'application/problem+json': { schema: problemSchema } },
      },
    },
  };
}
