// @ts-check
import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { Failure } from './failure.mjs';

const NAMES = /** @type {const} */ (['session', 'migratePassword', 'appPassword']);

/** @typedef {Record<(typeof NAMES)[number], string>} Secrets */

/** @returns {string} 256 random bits that need no escaping in a URL or in SQL */
export const createSecret = () => randomBytes(32).toString('base64url');

/**
 * Reads the secrets of this folder; makes them at the first start.
 * @param {string} file readable by its owner only
 * @returns {Secrets}
 * @throws {Failure} when the file is damaged: new secrets would silently sign everybody out
 */
export function loadSecrets(file) {
  if (!fs.existsSync(file)) {
    const made = Object.fromEntries(NAMES.map((name) => [name, createSecret()]));
    fs.mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 });
    fs.writeFileSync(`${file}.part`, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600 });
    fs.renameSync(`${file}.part`, file);
  }
  const secrets = parseSecrets(fs.readFileSync(file, 'utf8'));
  if (!secrets)
    throw new Failure(
      `${path.basename(file)} in ${path.basename(path.dirname(file))} is damaged: put the saved copy back, or delete it to make new secrets (everybody then signs in again).`,
    );
  return secrets;
}

/**
 * @param {string} text
 * @returns {Secrets | null}
 */
function parseSecrets(text) {
  try {
    const secrets = JSON.parse(text);
    // They stand in SQL and URLs as they are, so nothing but what we made ourselves is let in.
    return NAMES.every((name) => /^[\w-]{32,}$/.test(secrets[name])) ? secrets : null;
  } catch {
    return null;
  }
}
