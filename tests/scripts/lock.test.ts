import { spawn } from 'node:child_process';
import { once } from 'node:events';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { acquireLock, assertNotHeld, findHolder, readBirth } from '../../scripts/lib/lock.mjs';

let folder: string;
let file: string;
let told: string[];

beforeEach(() => {
  folder = fs.mkdtempSync(path.join(os.tmpdir(), 'slingward-lock-'));
  file = path.join(folder, 'inner', 'running.json');
  told = [];
});

afterEach(() => fs.rmSync(folder, { recursive: true, force: true }));

const acquire = (url?: string) => acquireLock(file, { command: 'npm start', url }, (text) => told.push(text));

function leaveLock(holder: object): void {
  fs.mkdirSync(path.dirname(file), { recursive: true });
  fs.writeFileSync(file, JSON.stringify(holder));
}

async function findDeadPid(): Promise<number> {
  const child = spawn(process.execPath, ['--version'], { stdio: 'ignore' });
  await once(child, 'exit');
  return child.pid ?? 0;
}

describe('the lock of the project folder', () => {
  it('refuses a second holder and says who and where', () => {
    acquire('http://127.0.0.1:4173');
    expect(() => acquire()).toThrow(
      `Slingward already runs in this folder (npm start, process ${process.pid}, http://127.0.0.1:4173)`,
    );
    expect(() => assertNotHeld(file)).toThrow('already runs');
  });

  it('is free again after release, and leaves no file behind', () => {
    acquire().release();
    expect(fs.readdirSync(path.dirname(file))).toEqual([]);
    acquire();
    expect(told).toEqual([]);
  });

  it('is taken over from a dead process, with a sentence', async () => {
    const pid = await findDeadPid();
    leaveLock({ pid, born: '1', command: 'npm start' });
    acquire();
    expect(findHolder(file)?.pid).toBe(process.pid);
    expect(told).toEqual([
      `The last run (npm start, process ${pid}) ended without cleaning up; going on with its data.`,
    ]);
    expect(fs.readdirSync(path.dirname(file))).toEqual(['running.json']);
  });

  it('is taken over when its process number now belongs to another process', () => {
    leaveLock({ pid: process.pid, born: '1', command: 'npm start' });
    acquire();
    expect(findHolder(file)?.born).toBe(readBirth(process.pid));
  });

  it('is taken over when the file is empty or cut off', () => {
    leaveLock({});
    fs.writeFileSync(file, '{"pid": 1');
    acquire();
    expect(findHolder(file)?.pid).toBe(process.pid);
  });

  it('keeps what is added to it', () => {
    const lock = acquire('http://127.0.0.1:4173');
    lock.update({ databasePort: 3311 });
    expect(findHolder(file)).toMatchObject({ databasePort: 3311, url: 'http://127.0.0.1:4173' });
  });

  it('does not release what another process holds by now', () => {
    const lock = acquire();
    leaveLock({ pid: 1, born: '1', command: 'npm run dev' });
    lock.release();
    expect(findHolder(file)?.pid).toBe(1);
  });

  it('is readable by its owner only', () => {
    acquire();
    expect(fs.statSync(file).mode & 0o777).toBe(0o600);
  });
});
