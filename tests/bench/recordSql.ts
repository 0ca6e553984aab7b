import type { Connection } from 'mariadb';

/**
 * The statements that the product sends while `act` runs, in order, read off MariaDB's general log.
 * @param root a connection that may turn the log on
 */
export async function recordSql(
  root: Connection,
  user: string,
  act: () => Promise<unknown>,
): Promise<string[]> {
  await root.query("SET GLOBAL log_output = 'TABLE'");
  await root.query('TRUNCATE mysql.general_log');
  await root.query('SET GLOBAL general_log = 1');
  try {
    await act();
  } finally {
    await root.query('SET GLOBAL general_log = 0');
  }
  const rows = await root.query<{ text: string }[]>(
    "SELECT CONVERT(argument USING utf8mb4) AS text FROM mysql.general_log WHERE user_host LIKE ? AND command_type IN ('Query', 'Execute') ORDER BY event_time, thread_id",
    [`${user}%`],
  );
  return rows.map((row) => row.text).filter((sql) => !/^(START TRANSACTION|COMMIT|ROLLBACK|SET )/i.test(sql));
}
