import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { listLedgerTransitions } from '../../shared/domain/lifecycle/events';
import * as guards from '../migrations/0004-guards';
import * as listOrders from '../migrations/0005-list-orders';
import * as labels from '../migrations/0003-labels-and-shipments';
import * as people from '../migrations/0001-people-and-places';
import * as slings from '../migrations/0002-slings';
import { connectDatabase } from './connection';
import { grantAppAccount } from './grants';

const MIGRATIONS = [people, slings, labels, guards, listOrders];

/** Brings the database to the newest form; several processes may call it at once, one does the work. */
export async function migrate(sequelize: Sequelize): Promise<string[]> {
  return sequelize.transaction(async (lock) => {
    // GET_LOCK belongs to a connection: this transaction keeps one for the whole of the migration.
    await sequelize.query("SELECT GET_LOCK('slingward.migrate', 60)", {
      transaction: lock,
      type: QueryTypes.SELECT,
    });
    try {
      return await runMigrations(sequelize, lock);
    } finally {
      await sequelize.query("SELECT RELEASE_LOCK('slingward.migrate')", {
        transaction: lock,
        type: QueryTypes.SELECT,
      });
    }
  });
}

async function runMigrations(sequelize: Sequelize, lock: Transaction): Promise<string[]> {
  const umzug = new Umzug({
    migrations: MIGRATIONS.map(({ name, up }) => ({
      name,
      up: async () => {
        for (const statement of up) await sequelize.query(statement, { transaction: lock });
      },
    })),
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
  });
  const done = await umzug.up();
  await syncTransitions(sequelize, lock);
  return done.map((migration) => migration.name);
}

/** The table of the lifecycle is data in shared/: the database's copy follows it. */
async function syncTransitions(sequelize: Sequelize, transaction: Transaction): Promise<void> {
  const rows = listLedgerTransitions().map((row) => [
    row.type,
    row.from ?? '',
    row.fromCondemned,
    row.to,
    row.toCondemned,
  ]);
  await sequelize.query('DELETE FROM lifecycle_transitions', { transaction });
  await sequelize.query('INSERT INTO lifecycle_transitions VALUES ?', { transaction, replacements: [rows] });
}

/** Migrates over the account that may, then gives the working account its rights. */
export async function prepareDatabase(migrateUrl: string, appUrl: string): Promise<void> {
  const sequelize = connectDatabase(migrateUrl, { poolSize: 2 });
  try {
    await migrate(sequelize);
    const app = new URL(appUrl);
    if (app.username !== new URL(migrateUrl).username) {
      await grantAppAccount(sequelize, decodeURIComponent(app.username));
    }
  } finally {
    await sequelize.close();
  }
}
