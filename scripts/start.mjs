// @ts-check
// npm start: from a fresh clone to a served product. Node built-ins only, so that it runs before npm has installed
// anything; each step does nothing when its work is done already.
import fs from 'node:fs';
import { demoProgram, ensureBuilt, migrateProgram, serverProgram } from './lib/build.mjs';
import { ensureDatabasePrograms } from './lib/database.mjs';
import { getLanAddresses } from './lib/lanAddresses.mjs';
import { runCommand } from './lib/lifetime.mjs';
import { ensureNodeModules } from './lib/nodeModules.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';
import { fromRoot, paths } from './lib/paths.mjs';
import { assertPortFree } from './lib/ports.mjs';
import { openPreparedDatabase, prepareTables, takeFolder } from './lib/preparation.mjs';
import { loadSecrets } from './lib/secrets.mjs';
import { buildServerEnv } from './lib/serverEnv.mjs';
import { startServer } from './lib/serverProcess.mjs';
import { parsePort, parseStartOptions } from './lib/startOptions.mjs';

await runCommand(async (lifetime) => {
  checkNodeVersion();
  const { isLan, hasDemo } = parseStartOptions(process.argv.slice(2));
  const port = parsePort(process.env.PORT);
  const addresses = isLan ? getLanAddresses() : [];
  const host = isLan ? '0.0.0.0' : '127.0.0.1';
  const url = `${isLan ? 'https' : 'http'}://127.0.0.1:${port}`;

  const lock = takeFolder(lifetime, { command: 'npm start', url });
  await assertPortFree(port, host);
  await ensureDatabasePrograms(process.env);
  await ensureNodeModules({ needsDev: false });

  const secrets = loadSecrets(paths.secrets);
  const [access] = await Promise.all([openPreparedDatabase(lifetime, lock, secrets), ensureBuilt()]);
  const lan = isLan ? await (await import('./lib/lan.mjs')).openLan(lifetime, addresses, port) : null;
  const serverEnv = buildServerEnv({
    env: process.env,
    databaseUrl: access.databaseUrl,
    sessionSecret: secrets.session,
    host,
    port,
    publicUrl: lan?.url ?? url,
    mode: 'production',
    certificates: lan?.certificates,
  });
  fs.mkdirSync(paths.files, { recursive: true, mode: 0o700 });
  await prepareTables({ migrate: [migrateProgram], demo: hasDemo ? [demoProgram] : null }, access, serverEnv);

  await startServer(lifetime, serverProgram, serverEnv);
  if (lan) console.log(lan.advice);
  console.log(`log of the server: ${fromRoot(paths.serverLog)}; stop with Ctrl-C`);
  console.log(`ready ${url}`);
});
