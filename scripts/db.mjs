// @ts-check
// npm run db -- -e "SQL": Debian's client on the product's own database, signed in as the account the product works
// with, so that whatever the database refuses the product is refused here too.
import { spawn } from 'node:child_process';
import fs from 'node:fs';
import { APP_ACCOUNT, openDatabase, parseDatabaseUrl, urlOf } from './lib/database.mjs';
import { ensureDebianPackages, getProgram } from './lib/debianPackages.mjs';
import { Failure } from './lib/failure.mjs';
import { runCommand } from './lib/lifetime.mjs';
import { acquireLock, findHolder, isAlive } from './lib/lock.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';
import { paths } from './lib/paths.mjs';
import { loadSecrets } from './lib/secrets.mjs';

await runCommand(async (lifetime) => {
  checkNodeVersion();
  await ensureDebianPackages(['mariadb-server']);
  const url = process.env.DATABASE_URL || findRunningUrl() || (await startForTheMoment());
  return runClient(url);

  function findRunningUrl() {
    const holder = findHolder(paths.lock);
    if (!holder?.databasePort || !isAlive(holder)) return null;
    return urlOf(APP_ACCOUNT, loadSecrets(paths.secrets).appPassword, holder.databasePort);
  }

  async function startForTheMoment() {
    if (!fs.existsSync(paths.database))
      throw new Failure('There is no database yet: start Slingward once with npm start.');
    const lock = acquireLock(paths.lock, { command: 'npm run db' }, console.error);
    lifetime.defer(lock.release);
    const { databaseUrl, server } = await openDatabase(loadSecrets(paths.secrets), {});
    lifetime.defer(() => server?.stop());
    return databaseUrl;
  }
});

/**
 * @param {string} url
 * @returns {Promise<number>} the client's exit code
 */
function runClient(url) {
  const { host, port, user, password, database } = parseDatabaseUrl('DATABASE_URL', url);
  const args = ['--no-defaults', '--protocol=tcp', `--host=${host}`, `--port=${port}`, `--user=${user}`];
  // Not startProcess: the client reads the terminal, so it stays in the terminal's own process group.
  const client = spawn(getProgram('mariadb'), [...args, database, ...process.argv.slice(2)], {
    stdio: 'inherit',
    env: { ...process.env, MYSQL_PWD: password }, // not in the arguments, which every user of the machine can list
  });
  return new Promise((resolve, reject) => {
    client.once('error', reject);
    client.once('exit', (code) => resolve(code ?? 1));
  });
}
