// @ts-check
import { randomUUID } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { packageScript, paths, root } from './paths.mjs';
import { startProcess, stopProcess } from './processes.mjs';
import { countVitest } from './results.mjs';
import { sweepThrowawayFolders } from './throwaway.mjs';

const PART_LIMIT_MS = 20 * 60_000;
const STOP_LIMIT_MS = 10_000;
/** Marks every process that a test run starts, however deep, so that none is left behind. */
const MARK = 'SLINGWARD_TEST_RUN';

/** What names a real database or a real server must not reach a test. */
const KEPT_OUT = [
  'DATABASE_URL',
  'MIGRATE_DATABASE_URL',
  'SESSION_SECRET',
  'PUBLIC_URL',
  'PORT',
  'API_PORT',
  'HOST',
];

/**
 * Runs one vitest project to its end, or stops it when it hangs.
 * @param {'unit' | 'api' | 'browser'} project
 * @param {import('./lifetime.mjs').Lifetime} lifetime
 * @returns {Promise<import('./results.mjs').Result>}
 */
export async function runVitest(project, lifetime) {
  fs.mkdirSync(paths.testData, { recursive: true });
  const reportFile = path.join(paths.testData, `vitest-${project}.json`);
  fs.rmSync(reportFile, { force: true });
  const mark = randomUUID();
  lifetime.defer(() => tidyUp(mark));
  const running = startProcess(
    process.execPath,
    [
      packageScript('vitest/vitest.mjs'),
      'run',
      `--project=${project}`,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${reportFile}`,
    ],
    { cwd: root, env: buildTestEnv(mark), stdio: ['ignore', 'inherit', 'inherit'] },
    'errand',
  );
  let isTooLate = false;
  const limit = setTimeout(() => {
    isTooLate = true;
    void stopProcess(running, STOP_LIMIT_MS);
  }, PART_LIMIT_MS);
  const { code } = await running.ended;
  clearTimeout(limit);
  await tidyUp(mark);
  const result = countVitest(project, readReport(reportFile), code);
  if (!isTooLate) return result;
  return { ...result, failed: result.failed || 1, note: `stopped after ${PART_LIMIT_MS / 60_000} minutes` };
}

/** @param {string} mark */
async function tidyUp(mark) {
  await endMarked(mark);
  sweepThrowawayFolders();
}

/** @param {string} mark */
function buildTestEnv(mark) {
  /** @type {NodeJS.ProcessEnv} */
  const env = { ...process.env, [MARK]: mark, NODE_ENV: 'test' };
  for (const name of KEPT_OUT) delete env[name];
  return env;
}

/**
 * @param {string} file
 * @returns {import('./results.mjs').VitestReport | null}
 */
function readReport(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * Ends what a test forgot, found by the mark in its environment.
 * @param {string} mark
 */
async function endMarked(mark) {
  for (const signal of /** @type {const} */ (['SIGTERM', 'SIGKILL'])) {
    const left = listMarked(mark);
    if (left.length === 0) return;
    if (signal === 'SIGTERM')
      console.log(`Ending what a test left running: ${left.map(({ name }) => name).join(', ')}`);
    for (const { pid } of left) {
      try {
        process.kill(pid, signal);
      } catch {
        // gone meanwhile
      }
    }
    for (let waits = 0; waits < 50 && listMarked(mark).length > 0; waits += 1)
      await new Promise((resolve) => setTimeout(resolve, 100));
  }
}

/**
 * @param {string} mark
 * @returns {{ pid: number, name: string }[]}
 */
function listMarked(mark) {
  if (!fs.existsSync('/proc/self/environ')) return [];
  return fs
    .readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry))
    .flatMap((entry) => {
      try {
        const environment = fs.readFileSync(`/proc/${entry}/environ`, 'latin1');
        if (!environment.split('\0').includes(`${MARK}=${mark}`)) return [];
        return [{ pid: Number(entry), name: fs.readFileSync(`/proc/${entry}/comm`, 'utf8').trim() }];
      } catch {
        return []; // ended meanwhile, or another user's
      }
    });
}
