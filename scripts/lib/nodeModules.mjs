// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { Failure, findKnownCause } from './failure.mjs';
import { root } from './paths.mjs';
import { run } from './processes.mjs';

/**
 * @typedef {{ version?: string, optional?: boolean, dev?: boolean, devOptional?: boolean, link?: boolean }} LockedPackage
 * @typedef {{ packages?: Record<string, LockedPackage> }} LockFile
 */

/**
 * Compares package-lock.json with npm's own record of what it installed, which npm writes last: a broken-off
 * installation has none.
 * @param {LockFile} wanted
 * @param {LockFile} installed
 * @param {boolean} needsDev whether the packages for checks and tests must be there too
 * @returns {boolean}
 */
export function isInstalled(wanted, installed, needsDev) {
  return Object.entries(wanted.packages ?? {}).every(([folder, entry]) => {
    if (folder === '' || entry.link) return true;
    const found = installed.packages?.[folder];
    if (found) return found.version === entry.version;
    // Optional ones are built for other machines; npm leaves them out here.
    return Boolean(entry.optional || entry.devOptional || (entry.dev && !needsDev));
  });
}

/**
 * @param {string} file
 * @returns {LockFile | null}
 */
function readLock(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * Runs `npm ci` when the packages are missing or other than package-lock.json says.
 * @param {{ needsDev: boolean }} options
 * @throws {Failure} when npm cannot install them
 */
export async function ensureNodeModules({ needsDev }) {
  const wanted = readLock(path.join(root, 'package-lock.json'));
  if (!wanted) throw new Failure('package-lock.json is missing or damaged: get a whole copy of the project.');
  const installed = readLock(path.join(root, 'node_modules', '.package-lock.json'));
  if (installed && isInstalled(wanted, installed, needsDev)) return;
  console.log('Installing packages (npm ci) …');
  // npm names its own script in npm_execpath; a bare "npm" serves when started by node itself.
  const npm = process.env.npm_execpath;
  const [command, before] = npm ? [process.execPath, [npm]] : ['npm', []];
  // No package needs its install script, so none may run.
  const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund', '--ignore-scripts'];
  const env = { ...process.env, NODE_ENV: undefined };
  const { code, output } = await run(command, args, { cwd: root, env });
  if (code === 0) return;
  throw new Failure(
    findKnownCause(output) ??
      (/ENOTFOUND|ETIMEDOUT|ECONNREFUSED|EAI_AGAIN|network/i.test(output)
        ? 'The packages could not be fetched: connect this machine to the internet for the first start, then try again.'
        : 'The packages could not be installed; type "npm ci" to see why.'),
  );
}
