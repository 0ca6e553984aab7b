// @ts-check
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

/**
 * One digest of many files: changes when a file's content or name changes, appears or goes; not with its times.
 * @param {string} base
 * @param {string[]} entries files and folders below `base`; missing ones count as missing
 * @returns {string} SHA-256 in hex
 */
export function fingerprint(base, entries) {
  const hash = createHash('sha256');
  for (const entry of entries) {
    for (const file of listFiles(path.join(base, entry))) {
      const content = fs.readFileSync(file);
      // With the length, no two lists of files can run together into the same bytes.
      hash.update(`${path.relative(base, file)}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest('hex');
}

/**
 * @param {string} file
 * @returns {string[]} the file itself or all files below, in an order of their own
 */
function listFiles(file) {
  const stat = fs.statSync(file, { throwIfNoEntry: false });
  if (!stat) return [];
  if (!stat.isDirectory()) return [file];
  return fs
    .readdirSync(file)
    .sort()
    .flatMap((name) => listFiles(path.join(file, name)));
}
