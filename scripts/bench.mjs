// @ts-check
// npm run bench: figures as ratios against a bare baseline in the same run, never a timed test. It starts its own
// throwaway database and server, fills in slings, and sends bounded load to 127.0.0.1 alone.
import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { ensureDatabasePrograms } from './lib/database.mjs';
import { ensureNodeModules } from './lib/nodeModules.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';

checkNodeVersion();
await ensureDatabasePrograms(process.env);
await ensureNodeModules({ needsDev: true });
const root = path.resolve(import.meta.dirname, '..');
const { status } = spawnSync(
  process.execPath,
  ['--import', 'tsx', 'tests/bench/main.ts', ...process.argv.slice(2)],
  {
    cwd: root,
    stdio: 'inherit',
  },
);
process.exit(status ?? 1);
