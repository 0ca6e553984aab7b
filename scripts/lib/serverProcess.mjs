// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { Failure, ToldFailure } from './failure.mjs';
import { fromRoot, paths, root } from './paths.mjs';
import { startProcess, stopProcess } from './processes.mjs';

const READY_LIMIT_MS = 60_000;
const STOP_LIMIT_MS = 15_000;
/** Above this size the log of earlier starts is put aside, one generation is kept. */
const LARGEST_LOG_BYTES = 20 * 1024 * 1024;

/**
 * Starts the built server and waits until it answers requests; stops the command when the server ends.
 * @param {import('./lifetime.mjs').Lifetime} lifetime
 * @param {string} program
 * @param {NodeJS.ProcessEnv} env
 * @throws {Failure} when it does not get ready
 */
export async function startServer(lifetime, program, env) {
  const log = openLog();
  const running = startProcess(process.execPath, ['--enable-source-maps', program], {
    cwd: root,
    env,
    stdio: ['ignore', log, 'pipe', 'ipc'],
  });
  fs.closeSync(log);
  let hasTold = false;
  running.child.stderr?.on('data', (/** @type {Buffer} */ text) => {
    hasTold = true;
    process.stderr.write(text);
  });
  lifetime.defer(() => stopProcess(running, STOP_LIMIT_MS));
  const logName = fromRoot(paths.serverLog);
  /** @type {Promise<string>} */
  const ready = new Promise((resolve) =>
    running.child.on('message', (message) => message === 'ready' && resolve('ready')),
  );
  const late = new Promise((resolve) => setTimeout(() => resolve('late'), READY_LIMIT_MS).unref());
  const first = await Promise.race([ready, late, running.ended]);
  if (first === 'late')
    throw new Failure(`The server did not get ready in ${READY_LIMIT_MS / 1000} s; its log is ${logName}.`);
  if (first !== 'ready')
    throw hasTold ? new ToldFailure() : new Failure(`The server did not start; its log is ${logName}.`);
  void running.ended.then(({ code, signal }) =>
    lifetime.end(
      1,
      lifetime.isEnding()
        ? undefined
        : `The server stopped by itself (${signal ?? `code ${code}`}): start it again; its log is ${logName}.`,
    ),
  );
}

function openLog() {
  const file = paths.serverLog;
  fs.mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 });
  const stat = fs.statSync(file, { throwIfNoEntry: false });
  if (stat && stat.size > LARGEST_LOG_BYTES) fs.renameSync(file, `${file}.1`);
  return fs.openSync(file, 'a', 0o600);
}
