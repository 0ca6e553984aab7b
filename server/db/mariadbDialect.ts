import mariadb, { type ConnectionConfig } from 'mariadb';

/**
 * Sequelize 6 deletes `rows.meta` after an untyped raw SELECT; mariadb from 3.1 on defines it as
 * non-configurable, so that throws. Hand Sequelize result arrays whose meta can go.
 */
function releaseMeta(result: unknown): unknown {
  if (!Array.isArray(result)) return result;
  const meta = Object.getOwnPropertyDescriptor(result, 'meta');
  if (!meta || meta.configurable) return result;
  return Object.defineProperty(result.slice(), 'meta', {
    value: meta.value as unknown,
    writable: true,
    configurable: true,
    enumerable: false,
  });
}

export const dialectModule: object = {
  ...mariadb,
  async createConnection(options: ConnectionConfig) {
    const connection = await mariadb.createConnection(options);
    const query = connection.query.bind(connection);
    connection.query = (async (...args: Parameters<typeof query>) =>
      releaseMeta(await query(...args))) as typeof connection.query;
    // A bare connection without a listener takes the process down when the server goes away.
    connection.on('error', () => undefined);
    return connection;
  },
};
