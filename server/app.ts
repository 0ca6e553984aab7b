import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { randomUUID } from 'node:crypto';
import compression from 'compression';
import express, { type Express, type RequestHandler } from 'express';
import helmet from 'helmet';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Services } from './context';
import { AppError } from './errors';
import { checkOrigin } from './middleware/checkOrigin';
import { errorHandler } from './middleware/errorHandler';
import { createLimits } from './middleware/rateLimits';
import { defineModels } from './models';
import { listRoutes } from './routes';
import { registerRoutes } from './routing/registerRoutes';
import { createPassport } from './security/passport';
import { sessions } from './security/session';

export interface AppOptions extends Services {
  sessionSecret: string;
  logger: Logger;
  trustProxy: number;
  /** Folder of the built client; left out when another server serves it (development). */
  clientDir?: string | undefined;
}

/** Builds the whole HTTP application over an open database; listening is the caller's. */
export function createApp(options: AppOptions): Express {
  const { sequelize, files, publicUrl, now, logger } = options;
  const services: Services = { sequelize, files, publicUrl, now };
  const isSecure = publicUrl.startsWith('https:');
  const authenticator = createPassport(sequelize);
  const limits = createLimits();
  defineModels(sequelize);

  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', options.trustProxy);
  app.set('etag', false);
  app.use(
    pinoHttp({
      logger,
      genReqId: () => randomUUID(),
      // Paths may hold one-time tokens; neither they nor cookies nor bodies go to the log.
      serializers: {
        req: (request: { id: string; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          url: request.url.replace(/(\/invitations?\/)[^/?]+/, '$1…').replace(/\?.*$/, '?…'),
        }),
        res: (response: { statusCode: number }) => ({ statusCode: response.statusCode }),
      },
    }),
  );
  app.use(securityHeaders(isSecure));
  app.use(compression());
  if (options.clientDir) serveAssets(app, options.clientDir);
  app.use(['/api'], sessions(sequelize, { secret: options.sessionSecret, isSecure }));
  const initialize: unknown = authenticator.initialize();
  app.use(['/api'], initialize as RequestHandler, authenticator.session() as RequestHandler);
  app.use(['/api'], limits.general, checkOrigin(publicUrl), (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  registerRoutes(app, listRoutes(authenticator), services, limits.named);
  app.use('/api', (_request, _response, next) => next(new AppError('not-found', 'There is no such call.')));
  if (options.clientDir) serveClient(app, options.clientDir);
  app.use((_request, _response, next) => next(new AppError('not-found', 'There is no such page.')));
  app.use(errorHandler);
  return app;
}

function securityHeaders(isSecure: boolean) {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        workerSrc: ["'self'"],
        // React sets style attributes; style elements and sheets are our own alone.
        styleSrc: ["'self'"],
        styleSrcAttr: ["'unsafe-inline'"],
        styleSrcElem: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        mediaSrc: ["'self'", 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
      },
    },
    strictTransportSecurity: isSecure ? { maxAge: 86_400 } : false,
    referrerPolicy: { policy: 'same-origin' },
    crossOriginEmbedderPolicy: false,
  });
}

/** Built files carry their hash in the name, so they never change. */
function serveAssets(app: Express, clientDir: string): void {
  app.use(
    '/assets',
    express.static(path.join(clientDir, 'assets'), { immutable: true, maxAge: '1y', index: false }),
  );
  app.use(express.static(clientDir, { index: false, maxAge: '1h' }));
}

/** Every other page is the client's: it finds its way by the address. */
function serveClient(app: Express, clientDir: string): void {
  const page = path.join(clientDir, 'index.html');
  if (!existsSync(page)) throw new Error('The client is not built: run npm start, which builds it.');
  const html = readFileSync(page, 'utf8');
  app.get('/{*path}', (request, response, next) => {
    if (!request.accepts('html') || path.extname(request.path) !== '') {
      next();
      return;
    }
    response
      .set('Cache-Control', 'no-cache')
      .set('Permissions-Policy', 'camera=(self), microphone=(), geolocation=()')
      .type('text/html')
      .send(html);
  });
}
