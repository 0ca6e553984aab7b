import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import type { TestProject } from 'vitest/node';
import { explain } from '../../scripts/lib/failure.mjs';
import { startMariadb } from '../../scripts/lib/mariadb.mjs';
import { createThrowawayFolder } from '../../scripts/lib/throwaway.mjs';

/** How tests reach the throwaway server: it knows three accounts, each with its own password. */
export interface DatabaseRoot {
  port: number;
  /** May do everything; for looking behind the product's back. */
  admin: Account;
  /** May make databases named slingward_test_… and everything in them, as the migrations do. */
  migrate: Account;
  /** Has no right until the migrations grant it. */
  app: Account;
}

export interface Account {
  name: string;
  password: string;
}

declare module 'vitest' {
  interface ProvidedContext {
    databaseRoot: DatabaseRoot;
  }
}

/** Starts one throwaway MariaDB for a run of vitest; every test file makes a database of its own in it. */
export default async function setUpDatabase(project: TestProject): Promise<() => Promise<void>> {
  const folder = createThrowawayFolder();
  const root = { port: 0, ...createAccounts() };
  try {
    const server = await startMariadb({ folder, durability: 'throwaway' });
    await server.query(describeAccounts(root));
    project.provide('databaseRoot', { ...root, port: server.port });
    return async () => {
      await server.stop();
      fs.rmSync(folder, { recursive: true, force: true });
    };
  } catch (error) {
    throw new Error(explain(error), { cause: error });
  }
}

function createAccounts(): Pick<DatabaseRoot, 'admin' | 'migrate' | 'app'> {
  const withPassword = (name: string): Account => ({ name, password: randomBytes(18).toString('base64url') });
  return {
    admin: withPassword('slingward_admin'),
    migrate: withPassword('slingward_migrate'),
    app: withPassword('slingward_app'),
  };
}

function describeAccounts({ admin, migrate, app }: DatabaseRoot): string {
  return `
    ${[admin, migrate, app].map(({ name, password }) => `create user '${name}'@'127.0.0.1' identified by '${password}';`).join('\n')}
    grant all privileges on *.* to '${admin.name}'@'127.0.0.1' with grant option;
    grant all privileges on \`slingward\\_test\\_%\`.* to '${migrate.name}'@'127.0.0.1' with grant option;
  `;
}
