// @ts-check
// npm run dev: the product with hot reload. Vite serves the pages on PORT and passes API calls on to the server,
// which starts again whenever one of its files changes.
import fs from 'node:fs';
import { ensureDatabasePrograms } from './lib/database.mjs';
import { Failure } from './lib/failure.mjs';
import { runCommand } from './lib/lifetime.mjs';
import { ensureNodeModules } from './lib/nodeModules.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';
import { packageScript, paths, root } from './lib/paths.mjs';
import { assertPortFree, findConnectFault } from './lib/ports.mjs';
import { openPreparedDatabase, prepareTables, takeFolder } from './lib/preparation.mjs';
import { startProcess, stopProcess } from './lib/processes.mjs';
import { loadSecrets } from './lib/secrets.mjs';
import { buildServerEnv } from './lib/serverEnv.mjs';
import { parsePort, parseStartOptions } from './lib/startOptions.mjs';

const STOP_LIMIT_MS = 10_000;
const READY_LIMIT_MS = 60_000;

await runCommand(async (lifetime) => {
  checkNodeVersion();
  const { isLan, hasDemo } = parseStartOptions(process.argv.slice(2));
  if (isLan) throw new Failure('npm run dev serves this machine only: use npm start -- --lan for phones.');
  const port = parsePort(process.env.PORT);
  const apiPort = parsePort(process.env.API_PORT || String(port + 1));
  const url = `http://127.0.0.1:${port}`;

  const lock = takeFolder(lifetime, { command: 'npm run dev', url });
  await assertPortFree(port, '127.0.0.1');
  await assertPortFree(apiPort, '127.0.0.1');
  await ensureDatabasePrograms(process.env);
  await ensureNodeModules({ needsDev: true });

  const secrets = loadSecrets(paths.secrets);
  const access = await openPreparedDatabase(lifetime, lock, secrets);
  const serverEnv = buildServerEnv({
    env: process.env,
    databaseUrl: access.databaseUrl,
    sessionSecret: secrets.session,
    host: '127.0.0.1',
    port: apiPort,
    publicUrl: url,
    mode: 'development',
  });
  fs.mkdirSync(paths.files, { recursive: true, mode: 0o700 });
  const fromSource = (/** @type {string} */ file) => ['--import', 'tsx', file];
  const steps = {
    migrate: fromSource('server/migrate.ts'),
    demo: hasDemo ? fromSource('server/demo.ts') : null,
  };
  await prepareTables(steps, access, serverEnv);

  keepRunning(
    'server',
    [packageScript('tsx/dist/cli.mjs'), 'watch', '--clear-screen=false', 'server/main.ts'],
    serverEnv,
  );
  const viteEnv = { ...process.env, NODE_ENV: 'development', PORT: String(port), API_PORT: String(apiPort) };
  keepRunning('pages', [packageScript('vite/bin/vite.js'), '--clearScreen', 'false'], viteEnv);
  await waitUntilListening([port, apiPort]);
  console.log(`ready ${url}`);

  /**
   * @param {string} name
   * @param {string[]} args
   * @param {NodeJS.ProcessEnv} env
   */
  function keepRunning(name, args, env) {
    const running = startProcess(process.execPath, args, {
      cwd: root,
      env,
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    lifetime.defer(() => stopProcess(running, STOP_LIMIT_MS));
    void running.ended.then(({ code, signal }) =>
      lifetime.end(
        1,
        lifetime.isEnding() ? undefined : `The ${name} stopped by themselves (${signal ?? `code ${code}`}).`,
      ),
    );
  }
});

/** @param {number[]} ports */
async function waitUntilListening(ports) {
  const giveUpAt = Date.now() + READY_LIMIT_MS;
  for (const port of ports) {
    while (await findConnectFault('127.0.0.1', port, 1000)) {
      if (Date.now() > giveUpAt)
        throw new Failure(`Nothing answers on port ${port}: see the messages above.`);
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
  }
}
