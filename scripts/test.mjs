// @ts-check
// npm test: sets up what is missing, then every check; `unit`, `api` or `browser` runs that part alone.
import { ensureBuilt } from './lib/build.mjs';
import { runChecks } from './lib/checks.mjs';
import { ensureDebianPackages } from './lib/debianPackages.mjs';
import { assertRoomOnDisk } from './lib/disk.mjs';
import { explain, Failure } from './lib/failure.mjs';
import { runCommand } from './lib/lifetime.mjs';
import { ensureNodeModules } from './lib/nodeModules.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';
import { root } from './lib/paths.mjs';
import { countStep, exitCodeOf, summarise } from './lib/results.mjs';
import { runVitest } from './lib/testRun.mjs';

const NEEDED_MB = 500;
const BUILD = 'production build';
const INTERRUPTED = { interruptedCode: 130 };

/**
 * @typedef {import('./lib/results.mjs').Result} Result
 * @typedef {import('./lib/lifetime.mjs').Lifetime} Lifetime
 */

/** @type {Record<'check' | 'unit' | 'api' | 'build' | 'browser', (lifetime: Lifetime) => Promise<Result[]>>} */
const PARTS = {
  check: runChecks,
  unit: async (lifetime) => [await runVitest('unit', lifetime)],
  api: async (lifetime) => [await runVitest('api', lifetime)],
  build: async () => [await runBuild()],
  browser: async (lifetime) => [await runVitest('browser', lifetime)],
};

const CHOICES = /** @type {const} */ ({
  all: ['check', 'unit', 'api', 'build', 'browser'],
  unit: ['unit'],
  api: ['api'],
  browser: ['build', 'browser'],
});

await runCommand(async (lifetime) => {
  /** @type {Result[]} */
  const results = [];
  try {
    await setUp();
    for (const part of chooseParts(process.argv[2])) {
      if (lifetime.isEnding()) return 1;
      console.log(`\n── ${part} ──`);
      const isBuilt = !results.some(({ name, failed }) => name === BUILD && failed > 0);
      if (part === 'browser' && !isBuilt)
        results.push({ ...countStep(part, false), note: 'not run without a build' });
      else results.push(...(await PARTS[part](lifetime)));
    }
  } catch (error) {
    if (lifetime.isEnding()) return 1;
    console.error(explain(error));
    results.push(countStep('set-up', false));
  }
  if (lifetime.isEnding()) return 1; // half a run has no result
  const sum = summarise(results);
  console.log(`\n${sum.lines.join('\n')}`);
  return exitCodeOf(sum);
}, INTERRUPTED);

async function setUp() {
  checkNodeVersion();
  assertRoomOnDisk(root, NEEDED_MB);
  await ensureDebianPackages(['mariadb-server', 'chromium', 'poppler-utils']);
  await ensureNodeModules({ needsDev: true });
}

/** @param {string | undefined} name */
function chooseParts(name) {
  const choice = name ?? 'all';
  if (choice === 'all' || choice === 'unit' || choice === 'api' || choice === 'browser')
    return CHOICES[choice];
  throw new Failure(
    `There is no part "${choice}": npm test runs all, npm run test:unit, test:api or test:browser one.`,
  );
}

async function runBuild() {
  try {
    const isNew = await ensureBuilt();
    console.log(isNew ? 'built' : 'nothing changed since the last build');
    return countStep(BUILD, true);
  } catch (error) {
    console.error(explain(error));
    return countStep(BUILD, false);
  }
}
