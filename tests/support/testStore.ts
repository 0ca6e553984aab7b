import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import pino from 'pino';
import request, { type Test } from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import type { Express } from 'express';
import type { Sequelize } from 'sequelize';
import { createApp } from '../../server/app';
import { connectDatabase } from '../../server/db/connection';
import {
  createPeople,
  createPlaces,
  DEMO_DOMAIN,
  DEMO_PASSWORD,
  type DemoPlaces,
} from '../../server/demo/people';
import { openDiskStore } from '../../server/files/fileStore';
import { defineModels } from '../../server/models';
import type { User } from '../../server/models/User';
import { createTestDatabase, type TestDatabase } from './freshDatabase';

export interface TestStore {
  app: Express;
  sequelize: Sequelize;
  database: TestDatabase;
  places: DemoPlaces;
  people: Map<string, User>;
  /** A browser of this demo person, signed in. */
  signIn: (account: string) => Promise<TestAgent>;
  guest: () => TestAgent;
  close: () => Promise<void>;
}

/** A whole store on a real, migrated MariaDB of its own, with the demo's people and places and no slings. */
export async function openTestStore(
  options: { publicUrl?: string; isEmpty?: boolean; clientDir?: string } = {},
): Promise<TestStore> {
  const database = await createTestDatabase();
  const sequelize = connectDatabase(database.databaseUrl);
  const filesDir = mkdtempSync(path.join(tmpdir(), 'slingward-files-'));
  const services = {
    sequelize,
    files: openDiskStore(filesDir),
    publicUrl: options.publicUrl ?? 'http://127.0.0.1:4173',
    now: () => new Date(),
  };
  const app = createApp({
    ...services,
    sessionSecret: 'a-secret-of-the-tests-alone-0123456789',
    logger: pino({ level: process.env.LOG_LEVEL ?? 'silent' }),
    trustProxy: 0,
    ...(options.clientDir === undefined ? {} : { clientDir: options.clientDir }),
  });
  defineModels(sequelize);
  let places: DemoPlaces | null = null;
  let people = new Map<string, User>();
  if (!options.isEmpty) {
    await sequelize.transaction(async (transaction) => {
      const context = { ...services, user: null, at: new Date(), transaction };
      places = await createPlaces(context);
      people = await createPeople(context, places, '2099-12-31');
    });
  }
  const agents = new Map<string, TestAgent>();
  return {
    app,
    sequelize,
    database,
    get places() {
      if (!places) throw new Error('This store was opened empty.');
      return places;
    },
    people,
    async signIn(account) {
      const known = agents.get(account);
      if (known) return known;
      const agent = request.agent(app);
      const answer: Awaited<Test> = await agent
        .post('/api/session')
        .send({ email: `${account}@${DEMO_DOMAIN}`, password: DEMO_PASSWORD });
      if (answer.status !== 200) throw new Error(`${account} cannot sign in: ${answer.text}`);
      agents.set(account, agent);
      return agent;
    },
    guest: () => request.agent(app),
    async close() {
      await sequelize.close();
      await database.drop();
      rmSync(filesDir, { recursive: true, force: true });
    },
  };
}
