// @ts-check
import { spawn } from 'node:child_process';
import fs from 'node:fs';

/** How much of a program's output is kept to find out why it failed. */
const KEPT_OUTPUT = 64_000;

/**
 * Makes the kernel end a program when the process that started it dies, even by kill -9, so that no database and
 * no server is ever left behind. Debian always has setpriv; elsewhere the program runs without that.
 * @param {string} command
 * @param {string[]} args
 * @returns {[string, string[]]}
 */
function tieToParent(command, args) {
  const setpriv = ['/usr/bin/setpriv', '/bin/setpriv'].find((file) => fs.existsSync(file));
  return setpriv ? [setpriv, ['--pdeathsig', 'TERM', command, ...args]] : [command, args];
}

/**
 * @typedef {object} Ended how a process ended
 * @property {number | null} code
 * @property {NodeJS.Signals | null} signal
 */

/**
 * @typedef {object} Running
 * @property {import('node:child_process').ChildProcess} child
 * @property {Promise<Ended>} ended
 * @property {() => boolean} hasEnded
 * @property {Manner} manner
 */

/**
 * How to end it with the command: a service is stopped by whoever started it, in order; an errand is broken off first;
 * a patient errand (Debian's installer, which must not be broken off) is waited for.
 * @typedef {'service' | 'errand' | 'patient errand'} Manner
 */

/** @type {Set<Running>} */
const alive = new Set();

/**
 * Starts a program in a process group of its own: Ctrl-C in a terminal reaches only the command itself, which then
 * ends what it started in the right order.
 * @param {string} command
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions} [options]
 * @param {Manner} [manner]
 * @returns {Running}
 */
export function startProcess(command, args, options = {}, manner = 'service') {
  const [tiedCommand, tiedArgs] = manner === 'patient errand' ? [command, args] : tieToParent(command, args);
  const child = spawn(tiedCommand, tiedArgs, { ...options, detached: true });
  let isOver = false;
  /** @type {Promise<Ended>} */
  const ended = new Promise((resolve) => {
    /** @param {Ended} how */
    const finish = (how) => {
      isOver = true;
      alive.delete(running);
      resolve(how);
    };
    child.once('exit', (code, signal) => finish({ code, signal }));
    child.once('error', () => finish({ code: 127, signal: null }));
  });
  const running = { child, ended, hasEnded: () => isOver, manner };
  alive.add(running);
  return running;
}

/**
 * Asks a process to end and, after a while, makes it.
 * @param {Running} running
 * @param {number} graceMs
 * @returns {Promise<Ended>}
 */
export async function stopProcess(running, graceMs) {
  if (running.hasEnded()) return running.ended;
  // A service ends its own helpers in its own order; an errand's helpers would go on without it.
  if (running.manner === 'service') running.child.kill('SIGTERM');
  else signalGroup(running, 'SIGTERM');
  const timer = setTimeout(() => signalGroup(running, 'SIGKILL'), graceMs);
  const how = await running.ended;
  // A shell that is told to end leaves its programs behind for a moment; they still write files.
  while (running.manner !== 'service' && isGroupAlive(running)) await pause(50);
  clearTimeout(timer);
  return how;
}

/** @param {Running} running */
function isGroupAlive({ child }) {
  try {
    return child.pid !== undefined && process.kill(-child.pid, 0);
  } catch {
    return false;
  }
}

/** @param {number} ms */
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/**
 * @param {Running} running
 * @param {NodeJS.Signals} signal
 */
function signalGroup({ child }, signal) {
  try {
    if (child.pid) process.kill(-child.pid, signal);
  } catch {
    child.kill(signal);
  }
}

/**
 * Ends what is still running.
 * @param {number} graceMs
 * @param {Manner[]} manners
 */
export async function stopProcesses(graceMs, manners) {
  await Promise.all(
    [...alive]
      .filter(({ manner }) => manners.includes(manner))
      .map((running) =>
        running.manner === 'patient errand' ? running.ended : stopProcess(running, graceMs),
      ),
  );
}

/**
 * Runs a program to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {object} [options]
 * @param {NodeJS.ProcessEnv} [options.env]
 * @param {string} [options.cwd]
 * @param {string} [options.input] text for its standard input
 * @param {'show' | 'errors' | 'hide'} [options.output] what the person sees of it; all of it is kept for `output`
 * @param {boolean} [options.isColoured] asks the program to colour its output as if it wrote to the terminal
 * @param {boolean} [options.isPatient] the program must not be broken off
 * @returns {Promise<Ended & { stdout: string, output: string }>} `output` is the end of both streams
 */
export async function run(command, args, options = {}) {
  const shown = options.output ?? 'hide';
  const env = { ...(options.env ?? process.env) };
  if (options.isColoured && process.stdout.isTTY) env.FORCE_COLOR = '1';
  const running = startProcess(
    command,
    args,
    { cwd: options.cwd, env, stdio: ['pipe', 'pipe', 'pipe'] },
    options.isPatient ? 'patient errand' : 'errand',
  );
  let stdout = '';
  let output = '';
  const { stdin, stdout: outStream, stderr: errStream } = running.child;
  outStream?.setEncoding('utf8').on('data', (/** @type {string} */ text) => {
    if (shown === 'show') process.stdout.write(text);
    stdout += text;
    output = (output + text).slice(-KEPT_OUTPUT);
  });
  errStream?.setEncoding('utf8').on('data', (/** @type {string} */ text) => {
    if (shown !== 'hide') process.stderr.write(text);
    output = (output + text).slice(-KEPT_OUTPUT);
  });
  stdin?.on('error', () => {}); // the program may end before it has read everything; its exit code tells
  stdin?.end(options.input ?? '');
  const closed = new Promise((resolve) => running.child.once('close', resolve));
  const how = await running.ended;
  // A grandchild can hold the pipes open for ever; what was written by the program itself is there by then.
  await Promise.race([closed, new Promise((resolve) => setTimeout(resolve, 2000).unref())]);
  return { ...how, stdout, output };
}
