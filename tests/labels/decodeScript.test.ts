import { spawn } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { z } from 'zod';
import { findStock, renderLabelPng } from '../../labels';
import { buildLabelItem } from './labelItems';

const answer = z.strictObject({ file: z.string(), text: z.string().nullable(), ms: z.number().min(0) });
let folder = '';

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'decode-'));
});
afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

function runDecode(input: string): Promise<{ lines: string[]; status: number | null }> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'scripts/decode.ts'], {
      stdio: ['pipe', 'pipe', 'ignore'],
    });
    let output = '';
    child.stdout.on('data', (chunk: Buffer) => (output += chunk.toString()));
    child.on('error', reject);
    child.on('close', (status) => {
      resolve({ lines: output.trim().split('\n'), status });
    });
    child.stdin.end(input);
  });
}

it('prints one JSON line for each picture path, null for what it can’t read or open', async () => {
  const stock = findStock('roll-203-flat');
  if (!stock) throw new Error('No such stock.');
  const item = buildLabelItem();
  const good = join(folder, 'label.png');
  const broken = join(folder, 'broken.jpg');
  const missing = join(folder, 'missing.png');
  await writeFile(good, await renderLabelPng(item, stock));
  await writeFile(broken, 'no picture');
  const { lines, status } = await runDecode(`${good}\n\n${broken}\n${missing}\r\n${good}`);
  const answers = lines.map((line) => answer.parse(JSON.parse(line)));
  expect(answers.map(({ file, text }) => [file, text])).toEqual([
    [good, item.payload],
    [broken, null],
    [missing, null],
    [good, item.payload],
  ]);
  expect(status).toBe(0);
}, 30_000);
