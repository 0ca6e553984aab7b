import { QueryTypes } from 'sequelize';
import { AppError } from '../errors';
import { buildOpenApi } from '../openapi/buildOpenApi';
import { renderDocsPage } from '../openapi/docsPage';
import { raw } from '../routing/define';
import type { Route } from '../routing/route';

/** Alive, able to work, and what the API is. */
export function healthRoutes(routes: readonly Route[]): Route[] {
  let document: object | null = null;
  const describe = (): object => (document ??= buildOpenApi(routes));
  return [
    raw({
      route: 'GET /healthz',
      summary: 'Alive',
      handle(_services, { response }) {
        response.json({ status: 'alive' });
        return Promise.resolve();
      },
    }),
    raw({
      route: 'GET /readyz',
      summary: 'Able to work: the database answers and is migrated',
      async handle({ sequelize }, { response }) {
        try {
          await sequelize.query('SELECT 1 FROM lifecycle_transitions LIMIT 1', { type: QueryTypes.SELECT });
        } catch {
          throw new AppError('unavailable', 'The database does not answer.', {}, 5);
        }
        response.json({ status: 'ready' });
      },
    }),
    raw({
      route: 'GET /api/openapi.json',
      summary: 'This description',
      handle(_services, { response }) {
        response.json(describe());
        return Promise.resolve();
      },
    }),
    raw({
      route: 'GET /api/docs',
      summary: 'A page to read this description',
      produces: 'text/html',
      handle(_services, { response }) {
        response.type('text/html').send(renderDocsPage(routes));
        return Promise.resolve();
      },
    }),
  ];
}
