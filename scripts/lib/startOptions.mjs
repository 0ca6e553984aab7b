// @ts-check
import { Failure } from './failure.mjs';

const KNOWN = ['--lan', '--no-demo'];
const DEFAULT_PORT = 4173;

/**
 * @param {string[]} argv what follows `npm start --`
 * @returns {{ isLan: boolean, hasDemo: boolean }}
 * @throws {Failure} on an option that does not exist
 */
export function parseStartOptions(argv) {
  const unknown = argv.find((argument) => !KNOWN.includes(argument));
  if (unknown !== undefined)
    throw new Failure(`There is no option "${unknown}": npm start takes -- --lan and -- --no-demo.`);
  return { isLan: argv.includes('--lan'), hasDemo: !argv.includes('--no-demo') };
}

/**
 * @param {string | undefined} text the environment's PORT
 * @returns {number}
 * @throws {Failure} when it is no port number
 */
export function parsePort(text) {
  if (text === undefined || text === '') return DEFAULT_PORT;
  const port = Number(text);
  if (/^\d+$/.test(text) && port >= 1 && port <= 65535) return port;
  throw new Failure(`PORT is "${text}", but must be a number from 1 to 65535.`);
}
