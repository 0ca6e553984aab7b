// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { Failure } from './failure.mjs';

/**
 * @typedef {object} Holder who works in this folder
 * @property {number} pid
 * @property {string} born when the process started, in clock ticks; tells a reused process number from the holder
 * @property {string} command like "npm start"
 * @property {string} [url]
 * @property {number} [databasePort]
 */

/**
 * @param {number} pid
 * @returns {string | null} the start time of a living process in clock ticks, null when there is none
 */
export function readBirth(pid) {
  try {
    const stat = fs.readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name in brackets may hold spaces: count after it. State is the first field there, start time the 20th.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' || fields[0] === 'X' ? null : (fields[19] ?? null);
  } catch {
    return null;
  }
}

/**
 * @param {string} file
 * @returns {Holder | null} null when there is none or the file is unreadable
 */
export function findHolder(file) {
  try {
    const holder = JSON.parse(fs.readFileSync(file, 'utf8'));
    return typeof holder?.pid === 'number' && typeof holder.born === 'string' ? holder : null;
  } catch {
    return null;
  }
}

/** @param {Holder} holder */
export const isAlive = (holder) => readBirth(holder.pid) === holder.born;

/**
 * @param {string} file
 * @throws {Failure} when a living command holds the folder
 */
export function assertNotHeld(file) {
  const holder = findHolder(file);
  if (!holder || !isAlive(holder)) return;
  const where = holder.url ? `, ${holder.url}` : '';
  throw new Failure(
    `Slingward already runs in this folder (${holder.command}, process ${holder.pid}${where}): use that one, or stop it first.`,
  );
}

/**
 * Takes the folder for one command. A lock whose holder is gone is taken over, with a sentence.
 * @param {string} file
 * @param {Pick<Holder, 'command' | 'url'>} holder
 * @param {(sentence: string) => void} [tell]
 * @returns {{ update: (facts: Partial<Holder>) => void, release: () => void }}
 * @throws {Failure} when another command holds it
 */
export function acquireLock(file, holder, tell = console.log) {
  fs.mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 });
  /** @type {Holder} */
  let mine = { ...holder, pid: process.pid, born: readBirth(process.pid) ?? 'unknown' };
  const draft = `${file}.${process.pid}`;
  const write = () => fs.writeFileSync(draft, JSON.stringify(mine), { mode: 0o600 });
  write();
  try {
    // A link appears whole or not at all, so nobody ever reads half a lock.
    while (!tryLink(draft, file)) evict(file, tell);
  } finally {
    fs.rmSync(draft, { force: true });
  }
  return {
    update(facts) {
      mine = { ...mine, ...facts };
      write();
      fs.renameSync(draft, file);
    },
    release() {
      if (findHolder(file)?.pid === process.pid) fs.rmSync(file, { force: true });
    },
  };
}

/**
 * @param {string} draft
 * @param {string} file
 */
function tryLink(draft, file) {
  try {
    fs.linkSync(draft, file);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EEXIST') return false;
    throw error;
  }
}

/**
 * @param {string} file
 * @param {(sentence: string) => void} tell
 */
function evict(file, tell) {
  assertNotHeld(file);
  const aside = `${file}.${process.pid}.old`;
  try {
    fs.renameSync(file, aside);
  } catch {
    return; // someone else was quicker; look again
  }
  const moved = findHolder(aside);
  if (moved && isAlive(moved)) {
    // Between the look and the move a new holder came: give the lock back.
    tryLink(aside, file);
  } else if (moved) {
    tell(
      `The last run (${moved.command}, process ${moved.pid}) ended without cleaning up; going on with its data.`,
    );
  }
  fs.rmSync(aside, { force: true });
}
