import type { Logger } from 'pino';
import { QueryTypes, type Sequelize } from 'sequelize';
import { deleteExpiredSessions } from '../security/session';

const HOUR_MS = 3_600_000;

/** Repeat answers are kept 90 days (agreed API). */
async function deleteOldRepeatKeys(sequelize: Sequelize): Promise<void> {
  await sequelize.query(
    "DELETE FROM idempotency_keys WHERE created_at < UTC_TIMESTAMP(3) - INTERVAL 90 DAY AND scope <> 'set-up' LIMIT 10000",
    { type: QueryTypes.DELETE },
  );
}

/** Once an hour: what has run out is thrown away. Several servers may do it at once; it stays right. */
export function startHousekeeping(sequelize: Sequelize, logger: Logger): () => void {
  const tidy = (): void => {
    Promise.all([deleteExpiredSessions(sequelize), deleteOldRepeatKeys(sequelize)]).catch(
      (error: unknown) => {
        logger.warn({ err: error }, 'housekeeping failed');
      },
    );
  };
  tidy();
  const timer = setInterval(tidy, HOUR_MS);
  return () => clearInterval(timer);
}
