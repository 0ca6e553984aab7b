import { loadDemo } from './demo/loadDemo';
import { connectDatabase } from './db/connection';
import { openDiskStore } from './files/fileStore';

const { DATABASE_URL, FILES_DIR, PUBLIC_URL } = process.env;

/** Loads the demo into an empty database; one that holds anything is left as it is. */
async function main(): Promise<void> {
  if (!DATABASE_URL || !FILES_DIR) throw new Error('DATABASE_URL and FILES_DIR are needed.');
  const sequelize = connectDatabase(DATABASE_URL);
  try {
    await loadDemo({
      sequelize,
      files: openDiskStore(FILES_DIR),
      publicUrl: new URL(PUBLIC_URL ?? 'http://127.0.0.1:4173').origin,
      say: (line) => process.stdout.write(`${line}\n`),
    });
  } finally {
    await sequelize.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(
    `The demo could not be loaded: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exit(1);
});
