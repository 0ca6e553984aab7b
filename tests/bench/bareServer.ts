// The baseline: Express and the mariadb connector, doing the very statements that the product does for the same call
// (read off the database's own log), and nothing else. Run as a child process by main.ts.
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import express from 'express';
import mariadb from 'mariadb';
import { z } from 'zod';

const [file = '', port = '0'] = process.argv.slice(2);
const plan = z
  .object({
    database: z.object({
      host: z.string(),
      port: z.number(),
      user: z.string(),
      password: z.string(),
      database: z.string(),
    }),
    scans: z.record(z.string(), z.array(z.string())),
    holds: z.record(z.string(), z.array(z.string())),
  })
  .parse(JSON.parse(readFileSync(file, 'utf8')));

const pool = mariadb.createPool({
  ...plan.database,
  connectionLimit: 12,
  insertIdAsNumber: true,
  bigIntAsNumber: true,
});
const app = express();
app.use(express.json());

app.get('/scan/:code', async (request, response) => {
  const results: unknown[] = await Promise.all(
    (plan.scans[request.params.code] ?? []).map((sql) => pool.query(sql)),
  );
  response.json(results);
});

const headSchema = z.array(z.object({ ledger_count: z.number(), head_hash: z.string() }));

app.post('/hold/:id', async (request, response) => {
  const connection = await pool.getConnection();
  const results: unknown[] = [];
  try {
    await connection.beginTransaction();
    let head = { ledger_count: 0, head_hash: '' };
    for (const sql of plan.holds[request.params.id] ?? []) {
      if (/^INSERT INTO `ledger`/i.test(sql)) {
        const hash = createHash('sha256').update(`${head.head_hash}${head.ledger_count}`).digest('hex');
        const row = /VALUES \(DEFAULT,(\d+),\d+,(.*),'[0-9a-f]{64}','[0-9a-f]{64}'/s.exec(sql);
        const [columns] = /\(`id`[^)]*\)/.exec(sql) ?? [''];
        await connection.query(
          `INSERT INTO ledger ${columns} VALUES (DEFAULT,${row?.[1] ?? ''},${head.ledger_count + 1},${row?.[2] ?? ''},'${head.head_hash}','${hash}')`,
        );
        continue;
      }
      const rows: unknown = await connection.query(sql);
      if (/FOR UPDATE/.test(sql) && /`slings`/.test(sql)) {
        const [found] = await connection
          .query<unknown>('SELECT ledger_count, head_hash FROM slings WHERE id = ?', [request.params.id])
          .then((found) => headSchema.parse(found));
        if (found) head = found;
      }
      results.push(rows);
    }
    await connection.commit();
  } catch (error) {
    await connection.rollback();
    throw error;
  } finally {
    await connection.release();
  }
  response.json({ results: results.length });
});

app.listen(Number(port), '127.0.0.1', () => process.send?.('ready'));
