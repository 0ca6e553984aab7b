// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { Failure, findKnownCause } from './failure.mjs';
import { fingerprint } from './fingerprint.mjs';
import { packageScript, paths, root } from './paths.mjs';
import { run } from './processes.mjs';

/** All that the two builds read. */
const SOURCES = [
  'src',
  'server',
  'shared',
  'labels',
  'public',
  'index.html',
  'vite.config.ts',
  'vite.server.config.ts',
  'tailwind.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];

export const serverProgram = path.join(paths.server, 'main.js');
export const migrateProgram = path.join(paths.server, 'migrate.js');
export const demoProgram = path.join(paths.server, 'demo.js');

const RESULTS = [path.join(paths.client, 'index.html'), serverProgram, migrateProgram, demoProgram];

/** @type {{ name: string, args: string[] }[]} */
const BUILDS = [
  { name: 'pages', args: ['build', '--logLevel', 'warn'] },
  { name: 'server', args: ['build', '--config', 'vite.server.config.ts', '--logLevel', 'warn'] },
];

/**
 * Builds pages and server when a source changed since the last build.
 * @returns {Promise<boolean>} whether there was something to build
 * @throws {Failure} when a build fails
 */
export async function ensureBuilt() {
  const current = fingerprint(root, SOURCES);
  if (readStamp() === current && RESULTS.every((file) => fs.existsSync(file))) return false;
  console.log('Building …');
  fs.rmSync(paths.buildStamp, { force: true });
  const vite = packageScript('vite/bin/vite.js');
  const env = { ...process.env, NODE_ENV: 'production' };
  await Promise.all(
    BUILDS.map(async ({ name, args }) => {
      const { code, output } = await run(process.execPath, [vite, ...args], { cwd: root, env });
      if (code !== 0)
        throw new Failure(findKnownCause(output) ?? `The ${name} could not be built:\n${dropStack(output)}`);
    }),
  );
  fs.mkdirSync(paths.data, { recursive: true, mode: 0o700 });
  fs.writeFileSync(paths.buildStamp, JSON.stringify({ fingerprint: current }));
  return true;
}

/**
 * The message and the place in our source say all; the bundler's own stack only hides them.
 * @param {string} output
 */
const dropStack = (output) =>
  output
    .split('\n')
    .filter((line) => !/^\s+at /.test(line))
    .join('\n')
    .trim();

function readStamp() {
  try {
    return JSON.parse(fs.readFileSync(paths.buildStamp, 'utf8')).fingerprint;
  } catch {
    return null;
  }
}
