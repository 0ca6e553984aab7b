import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { ROUTE_ACCESS } from '../../shared/domain/access/routes';
import { openTestStore, type TestStore } from '../support/testStore';
import { openWork } from '../support/work';

/** As much of OpenAPI 3.1.1 as this document uses; what the specification does not know is refused. */
const media = z.record(z.string().regex(/^[\w*]+\/[\w.*+-]+$/), z.strictObject({ schema: z.unknown() }));
const operation = z.strictObject({
  summary: z.string().min(5),
  description: z.string(),
  parameters: z
    .array(
      z.strictObject({
        in: z.enum(['path', 'query']),
        name: z.string(),
        required: z.boolean().optional(),
        description: z.string().optional(),
        schema: z.record(z.string(), z.unknown()),
      }),
    )
    .optional(),
  requestBody: z.strictObject({ required: z.boolean().optional(), content: media }).optional(),
  responses: z.record(
    z.string().regex(/^(default|[1-5](\d\d|XX))$/),
    z.strictObject({ description: z.string(), content: media.optional() }),
  ),
  security: z.array(z.record(z.string(), z.array(z.string()))).optional(),
});
const document = z.object({
  openapi: z.string().regex(/^3\.1\.\d+$/),
  info: z.strictObject({ title: z.string(), version: z.string(), description: z.string() }),
  paths: z.record(
    z.string().startsWith('/'),
    z.record(z.enum(['get', 'post', 'put', 'patch', 'delete']), operation.optional()),
  ),
});
type Document = z.infer<typeof document>;

let store: TestStore;
let text: string;
let api: Document;
beforeAll(async () => {
  store = await openTestStore();
  const answer = await store.guest().get('/api/openapi.json');
  expect(answer.status).toBe(200);
  expect(answer.headers['content-type']).toContain('application/json');
  text = answer.text;
  api = document.parse(JSON.parse(text));
});
afterAll(() => store.close());

const operations = () =>
  Object.entries(api.paths).flatMap(([path, verbs]) =>
    Object.entries(verbs).flatMap(([verb, found]) => (found ? [{ path, verb, found }] : [])),
  );

/** Every schema object inside a value. */
function* walk(value: unknown): Generator<Record<string, unknown>> {
  if (typeof value !== 'object' || value === null) return;
  if (!Array.isArray(value)) yield value as Record<string, unknown>;
  for (const inner of Object.values(value)) yield* walk(inner);
}

describe('the description of the API', () => {
  it('holds every call and no other', () => {
    const told = operations().map(
      ({ path, verb }) => `${verb.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`,
    );
    expect(told.sort()).toEqual(Object.keys(ROUTE_ACCESS).sort());
  });

  it('names every part of a path, and nothing twice', () => {
    for (const { path, found } of operations()) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);
      const named = (found.parameters ?? []).filter((parameter) => parameter.in === 'path');
      expect(named.map(({ name }) => name).sort(), path).toEqual(inPath.sort());
      expect(
        named.every(({ required }) => required === true),
        path,
      ).toBe(true);
      const all = (found.parameters ?? []).map((parameter) => `${parameter.in} ${parameter.name}`);
      expect(new Set(all).size, path).toBe(all.length);
    }
  });

  it('tells the form of every answer, of every refusal, and of every body that is JSON', () => {
    for (const { path, verb, found } of operations()) {
      const what = `${verb} ${path}`;
      expect(Object.keys(found.responses), what).toContain('4XX');
      expect(found.responses['4XX']?.content, what).toHaveProperty('application/problem+json');
      if (verb === 'get') expect(found.requestBody, what).toBeUndefined();
    }
    const bodies = operations().filter(({ found }) => found.requestBody).length;
    expect(bodies).toBeGreaterThan(18);
  });

  it('refers to nothing that is not in it, and uses no word of OpenAPI 3.0', () => {
    const root = JSON.parse(text) as unknown;
    for (const schema of walk(root)) {
      if (typeof schema.$ref === 'string') {
        const target = schema.$ref
          .slice(2)
          .split('/')
          .reduce<unknown>((at, key) => (at as Record<string, unknown> | undefined)?.[key], root);
        expect(target, schema.$ref).toBeDefined();
      }
      expect(schema).not.toHaveProperty('nullable', true);
    }
  });

  it('contradicts itself nowhere: parts of one whole do not forbid each other’s fields', () => {
    for (const { path, verb, found } of operations()) {
      for (const schema of walk(found)) {
        if (!Array.isArray(schema.allOf)) continue;
        const closed = (schema.allOf as Record<string, unknown>[]).filter(isClosed);
        expect(closed, `${verb} ${path}`).toEqual([]);
      }
    }
  });

  it('describes the query of the list, and what a sling looks like', () => {
    const list = api.paths['/api/slings']?.get;
    const names = (list?.parameters ?? []).map(({ name }) => name);
    for (const name of ['state', 'kind', 'siteId', 'q', 'due', 'custody', 'sort', 'limit', 'cursor']) {
      expect(names).toContain(name);
    }
    expect(JSON.stringify(list?.responses)).toContain('mayUse');
  });

  it('lets nothing in of how it is made', () => {
    expect(text).not.toMatch(/sequelize|password_hash|node_modules/i);
  });
});

/** Forbids every field that it does not name itself. */
function isClosed(schema: Record<string, unknown>): boolean {
  const parts = [schema, ...((schema.oneOf ?? schema.anyOf ?? []) as Record<string, unknown>[])];
  return parts.some((part) => part.additionalProperties === false);
}

describe('the page to read it', () => {
  it('lists every call, runs no script and loads nothing from elsewhere', async () => {
    await openWork(store);
    const answer = await store.guest().get('/api/docs');
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toContain('text/html');
    for (const route of Object.keys(ROUTE_ACCESS)) expect(answer.text).toContain(`<code>${route}</code>`);
    expect(answer.text).not.toMatch(/<script|https?:\/\//);
  });
});
