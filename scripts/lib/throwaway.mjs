// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { readFreeMb } from './disk.mjs';
import { paths } from './paths.mjs';

const MEMORY = '/dev/shm';
const NEEDED_MB = 1500;
const NAME = /^slingward-test-(\d+)-/;

/**
 * Makes a folder for data that is thrown away: in memory where there is room.
 * @returns {string}
 */
export function createThrowawayFolder() {
  sweepThrowawayFolders();
  const hasMemory = fs.existsSync(MEMORY) && readFreeMb(MEMORY) >= NEEDED_MB;
  const base = hasMemory ? MEMORY : paths.testData;
  fs.mkdirSync(base, { recursive: true });
  return fs.mkdtempSync(path.join(base, `slingward-test-${process.pid}-`));
}

/** Removes the folders of runs that are over: a killed run could not tidy up. */
export function sweepThrowawayFolders() {
  for (const base of [MEMORY, paths.testData].filter((folder) => fs.existsSync(folder))) {
    for (const name of fs.readdirSync(base)) {
      const pid = NAME.exec(name)?.[1];
      if (pid && !fs.existsSync(`/proc/${pid}`))
        fs.rmSync(path.join(base, name), { recursive: true, force: true });
    }
  }
}
