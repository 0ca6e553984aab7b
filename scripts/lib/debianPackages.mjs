// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { Failure, findKnownCause } from './failure.mjs';
import { run } from './processes.mjs';

/** Debian package → a program that it brings. */
const PROGRAM_OF = {
  'mariadb-server': 'mariadbd',
  chromium: 'chromium',
  'poppler-utils': 'pdftoppm',
};

/** @typedef {keyof typeof PROGRAM_OF} DebianPackage */

const PROGRAM_FOLDERS = ['/usr/sbin', '/usr/bin', '/usr/local/bin', '/usr/local/sbin', '/sbin', '/bin'];

/**
 * @param {string} name
 * @returns {string | null} the program's path; /usr/sbin is often not in an ordinary user's PATH
 */
export function findProgram(name) {
  return PROGRAM_FOLDERS.map((folder) => path.join(folder, name)).find((file) => fs.existsSync(file)) ?? null;
}

/**
 * @param {string} name
 * @returns {string}
 * @throws {Failure} when it is not installed
 */
export function getProgram(name) {
  const file = findProgram(name);
  if (!file)
    throw new Failure(`The program ${name} is missing on this machine, though its package was installed.`);
  return file;
}

/**
 * Installs what is missing, as root; otherwise says the one command to type.
 * @param {DebianPackage[]} wanted
 * @throws {Failure} when something is missing and cannot be installed
 */
export async function ensureDebianPackages(wanted) {
  const missing = wanted.filter((name) => !findProgram(PROGRAM_OF[name]));
  if (missing.length === 0) return;
  const names = missing.join(' ');
  const command = `apt-get install -y --no-install-recommends ${names}`;
  if (process.getuid?.() !== 0) throw new Failure(`Missing on this machine: ${names}. Type: sudo ${command}`);
  if (!findProgram('apt-get'))
    throw new Failure(`Missing on this machine: ${names}; install it with the package manager you have.`);
  console.log(`Installing ${names} from Debian …`);
  await withServicesHeldBack(async () => {
    const first = await aptInstall(missing);
    if (first.code === 0) return;
    await apt(['update', '-q']);
    const second = await aptInstall(missing);
    if (second.code !== 0)
      throw new Failure(
        findKnownCause(second.output) ??
          `Debian could not install ${names}; type this to see why: ${command}`,
      );
  });
}

/** @param {string[]} names */
const aptInstall = (names) => apt(['install', '-y', '--no-install-recommends', ...names]);

/** @param {string[]} args */
const apt = (args) =>
  run('apt-get', [...args, '-o', 'DPkg::Lock::Timeout=300', '-o', 'Acquire::Retries=3'], {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    isPatient: true,
  });

/**
 * Debian starts a service when it installs one; ours must not appear on port 3306 beside the private server.
 * A policy-rc.d that answers 101 is Debian's own way to say so.
 * @param {() => Promise<void>} work
 */
async function withServicesHeldBack(work) {
  const policy = '/usr/sbin/policy-rc.d';
  const isOurs = !fs.existsSync(policy);
  if (isOurs) fs.writeFileSync(policy, '#!/bin/sh\nexit 101\n', { mode: 0o755 });
  try {
    await work();
  } finally {
    if (isOurs) fs.rmSync(policy, { force: true });
  }
}
