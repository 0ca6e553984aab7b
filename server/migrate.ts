import { prepareDatabase } from './db/migrate';

const { DATABASE_URL, MIGRATE_DATABASE_URL } = process.env;

async function main(): Promise<void> {
  if (!DATABASE_URL) throw new Error('DATABASE_URL is not set.');
  await prepareDatabase(MIGRATE_DATABASE_URL ?? DATABASE_URL, DATABASE_URL);
}

main().catch((error: unknown) => {
  const cause = error instanceof Error ? error.message : String(error);
  process.stderr.write(`The database could not be brought up to date: ${cause}\n`);
  process.exit(1);
});
