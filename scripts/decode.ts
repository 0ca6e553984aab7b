// Reads picture paths from standard input, one a line, and prints what our reader's core sees in each: one JSON line
// each, {"file": PATH, "text": TEXT or null, "ms": N}. A picture that can't be opened counts as unread, with a word
// on standard error.
import { createInterface } from 'node:readline';
import sharp from 'sharp';
import { createCodeReader } from '../shared/reader/codeReader';
import type { GrayImage } from '../shared/reader/grayImage';

async function loadGray(file: string): Promise<GrayImage> {
  const { data, info } = await sharp(file, { failOn: 'none' })
    .autoOrient()
    .flatten({ background: 'white' })
    .greyscale()
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data: new Uint8ClampedArray(data), width: info.width, height: info.height };
}

const reader = createCodeReader();

async function decodeFile(file: string): Promise<{ file: string; text: string | null; ms: number }> {
  const startedAt = performance.now();
  let text: string | null = null;
  try {
    text = reader.read(await loadGray(file), 'still')?.text ?? null;
  } catch (error) {
    process.stderr.write(`${file}: ${error instanceof Error ? error.message : String(error)}\n`);
  }
  return { file, text, ms: Math.round(performance.now() - startedAt) };
}

for await (const line of createInterface({ input: process.stdin })) {
  const file = line.trim();
  if (file !== '') process.stdout.write(`${JSON.stringify(await decodeFile(file))}\n`);
}
