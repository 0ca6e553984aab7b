// @ts-check
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..', '..');

const data = path.join(root, '.data');

/** Everything the product writes lies in one ignored folder; a test run writes to another. */
export const paths = {
  data,
  database: path.join(data, 'db'),
  files: path.join(data, 'files'),
  logs: path.join(data, 'logs'),
  serverLog: path.join(data, 'logs', 'server.log'),
  secrets: path.join(data, 'secrets.json'),
  lock: path.join(data, 'running.json'),
  buildStamp: path.join(data, 'build.json'),
  certificates: path.join(data, 'tls'),
  client: path.join(root, 'dist'),
  server: path.join(root, 'dist-server'),
  testData: path.join(root, '.test-data'),
};

/**
 * A path as the person sees it from the project folder.
 * @param {string} file
 */
export const fromRoot = (file) => path.relative(root, file);

/**
 * The script that a package offers as a command, run with this Node and without a shell.
 * @param {string} file below node_modules
 */
export const packageScript = (file) => path.join(root, 'node_modules', file);
