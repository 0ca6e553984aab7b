// @ts-check
import { Failure } from './failure.mjs';

/** The oldest Node.js that the packages in package.json accept. */
const OLDEST = { major: 20, minor: 19 };

/**
 * @param {string} [version] like "20.19.0"
 * @throws {Failure} when Node.js is too old
 */
export function checkNodeVersion(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  if (major > OLDEST.major || (major === OLDEST.major && minor >= OLDEST.minor)) return;
  throw new Failure(
    `Slingward needs Node.js ${OLDEST.major}.${OLDEST.minor} or newer, this is ${version}: install a newer one, then start again.`,
  );
}
