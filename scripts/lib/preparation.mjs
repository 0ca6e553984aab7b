// @ts-check
import fs from 'node:fs';
import { createAccounts, openDatabase } from './database.mjs';
import { assertRoomOnDisk } from './disk.mjs';
import { Failure, ToldFailure } from './failure.mjs';
import { acquireLock, assertNotHeld } from './lock.mjs';
import { fromRoot, paths, root } from './paths.mjs';
import { run } from './processes.mjs';

/** A fresh database, the logs and some photos; with it, the packages. */
const NEEDED_MB = 300;
const NEEDED_MB_FOR_PACKAGES = 500;

/**
 * Takes the project folder for one long-running command.
 * @param {import('./lifetime.mjs').Lifetime} lifetime
 * @param {{ command: string, url?: string }} holder
 */
export function takeFolder(lifetime, holder) {
  assertNotHeld(paths.lock); // before the disk: whoever runs already is the nearer reason
  const hasPackages = fs.existsSync(`${root}/node_modules`);
  assertRoomOnDisk(root, hasPackages ? NEEDED_MB : NEEDED_MB + NEEDED_MB_FOR_PACKAGES);
  const lock = acquireLock(paths.lock, holder);
  lifetime.defer(lock.release);
  return lock;
}

/**
 * Opens the database and stops everything, with a sentence, when the private one dies.
 * @param {import('./lifetime.mjs').Lifetime} lifetime
 * @param {ReturnType<typeof takeFolder>} lock
 * @param {import('./secrets.mjs').Secrets} secrets
 * @returns {Promise<import('./database.mjs').Access>}
 */
export async function openPreparedDatabase(lifetime, lock, secrets) {
  const access = await openDatabase(secrets, process.env);
  const { server } = access;
  if (server) {
    lifetime.defer(server.stop);
    void server.ended.then(({ code, signal }) =>
      lifetime.end(
        1,
        lifetime.isEnding()
          ? undefined
          : `The database stopped by itself (${signal ?? `code ${code}`}), so Slingward stops too: start it again; the log is ${fromRoot(paths.database)}/error.log.`,
      ),
    );
    lock.update({ databasePort: server.port });
    await createAccounts(server, secrets);
  }
  return access;
}

/**
 * Brings the tables up to date and loads the demo into an empty database.
 * @param {object} steps
 * @param {string[]} steps.migrate arguments for Node that run the migrations
 * @param {string[] | null} steps.demo arguments for Node that load the demo, null to start empty
 * @param {import('./database.mjs').Access} access
 * @param {NodeJS.ProcessEnv} serverEnv
 * @throws {Failure} when one of them fails
 */
export async function prepareTables(steps, access, serverEnv) {
  const migrateEnv = { ...serverEnv, MIGRATE_DATABASE_URL: access.migrateDatabaseUrl };
  await runStep('The tables could not be brought up to date', steps.migrate, migrateEnv);
  if (steps.demo) await runStep('The demo could not be loaded', steps.demo, serverEnv);
}

/**
 * @param {string} title
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env
 */
async function runStep(title, args, env) {
  const { code, signal, output } = await run(process.execPath, args, { cwd: root, env, output: 'show' });
  if (code === 0) return;
  // Code 1 is the step's own failure, which it tells in a sentence; anything else is a crash.
  throw code === 1 && output.trim()
    ? new ToldFailure()
    : new Failure(`${title} (${signal ?? `code ${code}`}).`);
}
