// The product over the bench's database, alone in a process as it is in use. Run as a child process by main.ts.
import pino from 'pino';
import { createApp } from '../../server/app';
import { connectDatabase } from '../../server/db/connection';
import { openDiskStore } from '../../server/files/fileStore';

const [url = '', files = '', port = '0'] = process.argv.slice(2);
const app = createApp({
  sequelize: connectDatabase(url),
  files: openDiskStore(files),
  publicUrl: `http://127.0.0.1:${port}`,
  now: () => new Date(),
  sessionSecret: 'bench-'.repeat(8),
  logger: pino({ level: 'silent' }),
  trustProxy: 0,
});
app.listen(Number(port), '127.0.0.1', () => process.send?.('ready'));
