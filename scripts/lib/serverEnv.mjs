// @ts-check
import { paths } from './paths.mjs';

/**
 * The environment of server/main.ts. The right to change tables is not in it: only the migrations get that.
 * @param {object} facts
 * @param {NodeJS.ProcessEnv} facts.env the person's own environment; what it names wins where that is safe
 * @param {string} facts.databaseUrl
 * @param {string} facts.sessionSecret
 * @param {string} facts.host
 * @param {number} facts.port
 * @param {string} facts.publicUrl
 * @param {'production' | 'development'} facts.mode
 * @param {{ certFile: string, keyFile: string } | null} [facts.certificates]
 * @returns {NodeJS.ProcessEnv}
 */
export function buildServerEnv({
  env,
  databaseUrl,
  sessionSecret,
  host,
  port,
  publicUrl,
  mode,
  certificates = null,
}) {
  const { MIGRATE_DATABASE_URL: _withheld, ...own } = env;
  return {
    ...own,
    NODE_ENV: mode,
    DATABASE_URL: databaseUrl,
    SESSION_SECRET: env.SESSION_SECRET || sessionSecret,
    HOST: host,
    PORT: String(port),
    PUBLIC_URL: env.PUBLIC_URL || publicUrl,
    CLIENT_DIR: paths.client,
    FILES_DIR: env.FILES_DIR || paths.files,
    LOG_LEVEL: env.LOG_LEVEL || (mode === 'production' ? 'info' : 'warn'),
    ...(certificates ? { TLS_CERT: certificates.certFile, TLS_KEY: certificates.keyFile } : {}),
  };
}
