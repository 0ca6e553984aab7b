import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { fingerprint } from '../../scripts/lib/fingerprint.mjs';

let base: string;

beforeEach(() => {
  base = fs.mkdtempSync(path.join(os.tmpdir(), 'slingward-fingerprint-'));
  fs.mkdirSync(path.join(base, 'src', 'deep'), { recursive: true });
  fs.writeFileSync(path.join(base, 'src', 'a.ts'), 'one');
  fs.writeFileSync(path.join(base, 'src', 'deep', 'b.ts'), 'two');
  fs.writeFileSync(path.join(base, 'index.html'), 'page');
});

afterEach(() => fs.rmSync(base, { recursive: true, force: true }));

const take = () => fingerprint(base, ['src', 'index.html', 'missing.ts']);

describe('the fingerprint of the sources', () => {
  it('stays when only times change', () => {
    const before = take();
    fs.utimesSync(path.join(base, 'src', 'a.ts'), new Date(0), new Date(0));
    expect(take()).toBe(before);
  });

  it.each<[string, () => void]>([
    ['a content changes', () => fs.writeFileSync(path.join(base, 'src', 'deep', 'b.ts'), 'too')],
    ['a file appears', () => fs.writeFileSync(path.join(base, 'src', 'c.ts'), '')],
    ['a file goes', () => fs.rmSync(path.join(base, 'index.html'))],
    ['a file that was missing is there', () => fs.writeFileSync(path.join(base, 'missing.ts'), '')],
    [
      'a file is renamed',
      () => fs.renameSync(path.join(base, 'src', 'a.ts'), path.join(base, 'src', 'deep', 'a.ts')),
    ],
    [
      'text moves from one file to the next',
      () => {
        fs.writeFileSync(path.join(base, 'src', 'a.ts'), 'on');
        fs.writeFileSync(path.join(base, 'src', 'deep', 'b.ts'), 'etwo');
      },
    ],
  ])('changes when %s', (_what, change) => {
    const before = take();
    change();
    expect(take()).not.toBe(before);
  });
});
