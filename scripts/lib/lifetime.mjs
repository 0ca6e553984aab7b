// @ts-check
import { explain } from './failure.mjs';
import { stopProcesses } from './processes.mjs';

const PARENT_CHECK_MS = 500;
const GRACE_MS = 10_000;

/**
 * @typedef {object} Lifetime
 * @property {(cleanup: () => unknown) => void} defer runs at the end, the last one first
 * @property {(code: number, sentence?: string) => Promise<never>} end stops everything and leaves
 * @property {() => boolean} isEnding
 */

/**
 * One way out for a command: Ctrl-C, SIGTERM, a closed terminal, the death of npm (or whatever started it) and
 * faults all run the same clean-up once.
 * @param {number} interruptedCode
 * @returns {Lifetime}
 */
function createLifetime(interruptedCode) {
  /** @type {(() => unknown)[]} */
  const cleanups = [];
  /** @type {Promise<never> | null} */
  let ending = null;

  /** @type {Lifetime['end']} */
  const end = (code, sentence) => {
    ending ??= (async () => {
      if (sentence) console.error(sentence);
      let exitCode = code;
      await stopProcesses(GRACE_MS, ['errand', 'patient errand']);
      for (const cleanup of cleanups.reverse()) {
        try {
          await cleanup();
        } catch (error) {
          console.error(explain(error));
          exitCode ||= 1;
        }
      }
      await stopProcesses(GRACE_MS, ['service', 'errand']);
      process.exit(exitCode);
    })();
    return ending;
  };

  for (const signal of /** @type {NodeJS.Signals[]} */ (['SIGINT', 'SIGTERM', 'SIGHUP']))
    process.on(signal, () => void end(interruptedCode));
  process.on('uncaughtException', (error) => void end(1, explain(error)));
  // The terminal may be gone before we are; that must not keep the database from being stopped.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});

  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent) void end(interruptedCode);
  }, PARENT_CHECK_MS).unref();

  return { defer: (cleanup) => void cleanups.push(cleanup), end, isEnding: () => ending !== null };
}

/**
 * Runs a command's body; a fault becomes one sentence and exit code 1.
 * @param {(lifetime: Lifetime) => Promise<number | void>} body answers the exit code, or nothing to go on running
 * @param {{ interruptedCode?: number }} [options] the exit code after Ctrl-C: 0 where that is the way to stop
 */
export async function runCommand(body, { interruptedCode = 0 } = {}) {
  const lifetime = createLifetime(interruptedCode);
  try {
    const code = await body(lifetime);
    if (code !== undefined) await lifetime.end(code);
  } catch (error) {
    // What fails because the command is being stopped is no news.
    await (lifetime.isEnding() ? lifetime.end(0) : lifetime.end(1, explain(error)));
  }
}
