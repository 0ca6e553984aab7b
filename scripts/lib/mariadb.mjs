// @ts-check
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { getProgram } from './debianPackages.mjs';
import { Failure, findKnownCause } from './failure.mjs';
import { findFreePort } from './ports.mjs';
import { run, startProcess, stopProcess } from './processes.mjs';

const START_LIMIT_MS = 60_000;
const STOP_LIMIT_MS = 60_000;
const LEFTOVER_LIMIT_MS = 30_000;
/** The kernel's limit for a socket's path is 108 bytes with its end mark. */
const LONGEST_SOCKET_PATH = 103;
const isRoot = process.getuid?.() === 0;

/** Keeps every statement's effect through a power cut, or gives that up for a database that is thrown away. */
const DURABILITY = {
  safe: ['--innodb-flush-log-at-trx-commit=1', '--innodb-buffer-pool-size=256M'],
  throwaway: [
    '--innodb-flush-log-at-trx-commit=2',
    '--innodb-buffer-pool-size=128M',
    '--innodb-log-file-size=16M',
  ],
};

/**
 * @typedef {object} Mariadb
 * @property {number} port on 127.0.0.1
 * @property {number} pid
 * @property {(sql: string) => Promise<string>} query as the server's root, tab-separated answer
 * @property {() => Promise<unknown>} stop
 * @property {Promise<import('./processes.mjs').Ended>} ended
 */

/**
 * Starts a private MariaDB on loopback. A server of the whole machine, its data and its port stay untouched.
 * @param {object} options
 * @param {string} options.folder private to this server; made when missing
 * @param {keyof typeof DURABILITY} options.durability
 * @returns {Promise<Mariadb>}
 * @throws {Failure} when it does not start
 */
export async function startMariadb({ folder, durability }) {
  const data = path.join(folder, 'data');
  const log = path.join(folder, 'error.log');
  const pidFile = path.join(folder, 'mariadbd.pid');
  const socket = placeSocket(folder);
  fs.mkdirSync(folder, { recursive: true, mode: 0o700 });
  await outwaitLeftover(pidFile, data);
  await ensureDataFolder(data);
  const port = await findFreePort();
  const logStart = fs.existsSync(log) ? fs.statSync(log).size : 0;
  const running = startProcess(
    getProgram('mariadbd'),
    [
      '--no-defaults',
      ...(isRoot ? ['--user=root'] : []), // as root it refuses to start without being told
      `--datadir=${data}`,
      `--socket=${socket}`,
      `--pid-file=${pidFile}`,
      `--log-error=${log}`,
      '--bind-address=127.0.0.1',
      `--port=${port}`,
      '--skip-name-resolve',
      '--skip-log-bin',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      '--sql-mode=STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION,NO_ZERO_DATE,NO_ZERO_IN_DATE',
      '--max-connections=200',
      '--max-allowed-packet=64M',
      ...DURABILITY[durability],
    ],
    { stdio: 'ignore' },
  );
  const client = ['--no-defaults', `--socket=${socket}`, `--user=${os.userInfo().username}`];
  await waitUntilReady(running, client, log, logStart);
  return {
    port,
    pid: running.child.pid ?? 0,
    query: (sql) => queryAsRoot(client, sql),
    stop: () => stopProcess(running, STOP_LIMIT_MS),
    ended: running.ended,
  };
}

/** @param {string} folder */
function placeSocket(folder) {
  const near = path.join(folder, 'mariadbd.sock');
  if (Buffer.byteLength(near) <= LONGEST_SOCKET_PATH) return near;
  const digest = createHash('sha256').update(folder).digest('hex').slice(0, 16);
  const far = path.join(os.tmpdir(), `slingward-${digest}`);
  fs.mkdirSync(far, { recursive: true, mode: 0o700 });
  if (fs.statSync(far).uid !== process.getuid?.())
    throw new Failure(
      `${far} belongs to another user: delete it, or move the project to a folder with a shorter path.`,
    );
  return path.join(far, 'mariadbd.sock');
}

/**
 * After a crash the last database may still be shutting down; two servers must never open the same data.
 * @param {string} pidFile
 * @param {string} data
 */
async function outwaitLeftover(pidFile, data) {
  const findLeftover = () => {
    try {
      const pid = Number(fs.readFileSync(pidFile, 'utf8'));
      return fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(`--datadir=${data}\0`) ? pid : null;
    } catch {
      return null;
    }
  };
  const pid = findLeftover();
  if (pid === null) return;
  process.kill(pid, 'SIGTERM');
  const giveUpAt = Date.now() + LEFTOVER_LIMIT_MS;
  while (findLeftover() !== null) {
    if (Date.now() > giveUpAt)
      throw new Failure(
        `The database of the last run (process ${pid}) does not end: stop it, then start again.`,
      );
    await pause(100);
  }
}

/** @param {string} data */
async function ensureDataFolder(data) {
  if (fs.existsSync(data)) {
    // root could open another user's files, but what it adds that user could not open again.
    const owner = fs.statSync(data).uid;
    if (owner !== process.getuid?.())
      throw new Failure(
        `The database belongs to another user (number ${owner}): start Slingward as that user, or hand over the folder ${path.dirname(path.dirname(data))}.`,
      );
    return;
  }
  const part = `${data}.part`; // renamed when whole, so that a broken-off first start leaves nothing half made
  fs.rmSync(part, { recursive: true, force: true });
  const { code, output } = await run(
    getProgram('mariadb-install-db'),
    [
      '--no-defaults',
      `--datadir=${part}`,
      // Without these two, root could sign in from loopback with no password.
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${os.userInfo().username}`,
      '--skip-test-db',
      '--skip-name-resolve',
      ...(isRoot ? ['--user=root'] : []),
    ],
    { env: { ...process.env, PATH: '/usr/sbin:/usr/bin:/sbin:/bin' } },
  );
  if (code !== 0) {
    fs.rmSync(part, { recursive: true, force: true });
    throw new Failure(findKnownCause(output) ?? 'MariaDB could not make its first data files.');
  }
  fs.renameSync(part, data);
}

/**
 * @param {import('./processes.mjs').Running} running
 * @param {string[]} client
 * @param {string} log
 * @param {number} logStart where this run's part of the log begins, in bytes
 */
async function waitUntilReady(running, client, log, logStart) {
  const giveUpAt = Date.now() + START_LIMIT_MS;
  for (;;) {
    if (running.hasEnded()) throw new Failure(explainLog(log, logStart));
    const ping = await run(getProgram('mariadb-admin'), [...client, 'ping']);
    // A ping can be answered by nobody else: the socket lies in the private folder.
    if (ping.code === 0 && !running.hasEnded()) return;
    if (Date.now() > giveUpAt) {
      await stopProcess(running, STOP_LIMIT_MS);
      throw new Failure(`The database did not get ready in ${START_LIMIT_MS / 1000} s; its log is ${log}.`);
    }
    await pause(40);
  }
}

/**
 * @param {string} log
 * @param {number} start
 */
function explainLog(log, start) {
  const text = fs.existsSync(log) ? fs.readFileSync(log).subarray(start).toString('utf8') : '';
  const known = findKnownCause(text);
  if (known) return known;
  if (/Permission denied|errno: 13\b/.test(text))
    return 'This user may not open the database files: start Slingward as the user who started it first.';
  if (/Unable to lock|errno: 11\b/.test(text))
    return 'Another program has the database files open: stop it, then start again.';
  if (/corrupt|checksum/i.test(text))
    return `The database files are damaged: bring back a backup of the folder; the log is ${log}.`;
  return `The database did not start; its log ${log} says why.`;
}

/**
 * @param {string[]} client
 * @param {string} sql
 */
async function queryAsRoot(client, sql) {
  const { code, stdout, output } = await run(
    getProgram('mariadb'),
    [...client, '--batch', '--skip-column-names'],
    {
      input: sql,
    },
  );
  if (code !== 0)
    throw new Failure(
      findKnownCause(output) ?? `The database refused a statement: ${output.trim().split('\n').pop()}`,
    );
  return stdout;
}

/** @param {number} ms */
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));
