import { readFileSync } from 'node:fs';
import http from 'node:http';
import https from 'node:https';
import pino from 'pino';
import { createApp } from './app';
import { connectDatabase } from './db/connection';
import { readEnv, type Env } from './env';
import { openDiskStore } from './files/fileStore';
import { startHousekeeping } from './jobs/housekeeping';

async function main(): Promise<void> {
  const env = readEnv();
  const logger = pino({ level: env.LOG_LEVEL });
  const sequelize = connectDatabase(env.DATABASE_URL);
  await sequelize.authenticate().catch(() => {
    throw new Error('The database does not answer: check that it runs and that DATABASE_URL is right.');
  });
  const app = createApp({
    sequelize,
    files: openDiskStore(env.FILES_DIR),
    publicUrl: env.PUBLIC_URL,
    now: () => new Date(),
    sessionSecret: env.SESSION_SECRET,
    logger,
    trustProxy: env.TRUST_PROXY,
    clientDir: env.CLIENT_DIR,
  });
  const server = createServer(env, app);
  await listen(server, env);
  const stopHousekeeping = startHousekeeping(sequelize, logger);
  logger.info({ port: env.PORT }, 'listening');
  process.send?.('ready');

  let isStopping = false;
  const stop = (): void => {
    if (isStopping) return;
    isStopping = true;
    stopHousekeeping();
    // Lets requests under way end; idle connections are closed at once, the rest after a short grace.
    server.close(() => {
      void sequelize.close().finally(() => process.exit(0));
    });
    server.closeIdleConnections();
    setTimeout(() => server.closeAllConnections(), 3000).unref();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP', 'disconnect'] as const) process.on(signal, stop);
}

function createServer(env: Env, app: http.RequestListener): http.Server | https.Server {
  if (!env.TLS_CERT || !env.TLS_KEY) return http.createServer(app);
  return https.createServer({ cert: readFileSync(env.TLS_CERT), key: readFileSync(env.TLS_KEY) }, app);
}

function listen(server: http.Server, env: Env): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      const message =
        error.code === 'EADDRINUSE'
          ? `Port ${env.PORT} is in use by another program. Stop it, or choose another with PORT.`
          : `The server cannot listen on port ${env.PORT}: ${error.code ?? error.message}.`;
      reject(new Error(message));
    });
    server.listen(env.PORT, env.HOST, () => resolve());
  });
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
