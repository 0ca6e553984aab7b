import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Express } from 'express';
import pino from 'pino';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import { expect } from 'vitest';
import { z } from 'zod';
import { createApp } from '../../server/app';
import { openDiskStore } from '../../server/files/fileStore';
import type { Role } from '../../shared/domain/access/roles';
import { ERROR_CODES, problemSchema, type ErrorCode, type Problem } from '../../shared/errors';
import type { DesignationInput, SessionUser } from '../../shared/schemas/people';
import { expectStatus } from './work';
import type { TestStore } from './testStore';

export interface AnyAnswer {
  status: number;
  headers: Record<string, unknown>;
  body: unknown;
  text: string;
}

const strictProblem = z.strictObject(problemSchema.shape);
/** Stack frames, SQL, the connector's words, folders of this or any machine. */
const LEAKS = [
  /\n\s+at .+:\d+/,
  /node_modules/,
  /\b(?:SELECT|INSERT INTO|UPDATE|DELETE FROM) .*\b(?:FROM|VALUES|SET|WHERE)\b/,
  /SQLSTATE|\bER_[A-Z_]{4,}|[Ss]equelize|[Mm]aria[Dd][Bb]/,
  /(?:^|[\s"'(])\/(?:home|root|tmp|usr|var|etc|opt|work)\//,
  /\.(?:ts|js|mjs):\d+/,
];

/** What of an answer is no refusal as the API promises it; null when all is well. */
export function findProblemFault(answer: AnyAnswer): string | null {
  if (answer.status < 400 || answer.status >= 500) return `status ${answer.status}: ${answer.text}`;
  const type = String(answer.headers['content-type']);
  if (!type.startsWith('application/problem+json')) return `content type ${type}`;
  const parsed = strictProblem.safeParse(JSON.parse(answer.text));
  if (!parsed.success) return `shape: ${parsed.error.message}`;
  if (parsed.data.status !== answer.status) return `status in the body: ${parsed.data.status}`;
  const code = parsed.data.type.split('/').at(-1);
  if (!ERROR_CODES.some((known) => known === code)) return `type ${parsed.data.type}`;
  const leak = LEAKS.find((pattern) => pattern.test(answer.text));
  return leak ? `it lets out ${String(leak)}: ${answer.text}` : null;
}

/** The problem of a refusal, after checking its form. */
export function expectProblem(answer: AnyAnswer, status: number, code?: ErrorCode): Problem {
  expect(answer.status, answer.text.slice(0, 400)).toBe(status);
  expect(findProblemFault(answer)).toBeNull();
  const problem = problemSchema.parse(JSON.parse(answer.text));
  if (code) expect(problem.type.split('/').at(-1)).toBe(code);
  return problem;
}

export const errorPaths = (problem: Problem): string[] => (problem.errors ?? []).map(({ path }) => path);
export const unmetRules = (problem: Problem): string[] => (problem.unmet ?? []).map(({ rule }) => rule);

export const SESSION_SECRET = 'a-secret-of-the-tests-alone-0123456789';

/** Another server process on the same database, with limits of its own. */
export function openSecondApp(
  store: TestStore,
  options: { publicUrl?: string; trustProxy?: number } = {},
): Express {
  return createApp({
    sequelize: store.sequelize,
    files: openDiskStore(mkdtempSync(path.join(tmpdir(), 'slingward-files-'))),
    publicUrl: options.publicUrl ?? 'http://127.0.0.1:4173',
    now: () => new Date(),
    sessionSecret: SESSION_SECRET,
    logger: pino({ level: 'silent' }),
    trustProxy: options.trustProxy ?? 0,
  });
}

export async function signInTo(app: Express, email: string, password: string): Promise<TestAgent> {
  const agent = request.agent(app);
  expectStatus(await agent.post('/api/session').send({ email, password }), 200);
  return agent;
}

export interface NewPerson {
  roles: Role[];
  siteIds?: number[];
  endsOn?: string | null;
  designations?: DesignationInput[];
}

let made = 0;
export const PERSON_PASSWORD = 'a-password-of-the-tests';

/** An account made by the administrator, its one-time link used, signed in. */
export async function addPerson(
  store: TestStore,
  { roles, siteIds = [store.places.slipStore.id], endsOn = null, designations = [] }: NewPerson,
): Promise<{ agent: TestAgent; user: SessionUser; email: string }> {
  made += 1;
  const email = `person${made}@marram-quay.example`;
  const admin = await store.signIn('admin');
  const invited = await admin
    .post('/api/users')
    .send({ name: `Person ${made}`, email, roles, siteIds, endsOn, designations });
  const { link } = expectStatus<{ link: string }>(invited, 201);
  const agent = request.agent(store.app);
  const token = link.split('/').at(-1) ?? '';
  const answer = await agent.post(`/api/invitations/${token}`).send({ password: PERSON_PASSWORD });
  return { agent, user: expectStatus<{ user: SessionUser }>(answer, 200).user, email };
}

/** YYYY-MM-DD so many days from today, UTC. */
export function day(offset: number): string {
  return new Date(Date.now() + offset * 86_400_000).toISOString().slice(0, 10);
}

const WRITTEN_TABLES = [
  'sites',
  'locations',
  'users',
  'designations',
  'invitations',
  'files',
  'slings',
  'sling_fittings',
  'certificates',
  'sling_photos',
  'ledger',
  'hold_reasons',
  'inspections',
  'damage_reports',
  'label_runs',
  'tags',
  'evaluators',
  'shipments',
  'shipment_lines',
];

/** How much the store holds, table by table: the same before and after when nothing was written. */
export async function countRows(store: TestStore): Promise<Record<string, unknown>> {
  const parts = WRITTEN_TABLES.map((table) => `(SELECT COUNT(*) FROM ${table}) AS ${table}`);
  const [row] = await store.database.adminQuery(`SELECT ${parts.join(', ')}`);
  return { ...row };
}
