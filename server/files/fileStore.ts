import { createReadStream } from 'node:fs';
import { mkdir, open, readFile, rename, stat } from 'node:fs/promises';
import { randomUUID } from 'node:crypto';
import path from 'node:path';
import type { Readable } from 'node:stream';

/** Keeps bytes under their SHA-256; what is kept is never overwritten. */
export interface FileStore {
  put(sha256: string, bytes: Buffer): Promise<void>;
  read(sha256: string): Promise<Buffer>;
  stream(sha256: string): Readable;
}

export function openDiskStore(directory: string): FileStore {
  const pathOf = (sha256: string): string => path.join(directory, sha256.slice(0, 2), sha256);
  return {
    async put(sha256, bytes) {
      const target = pathOf(sha256);
      if (await stat(target).catch(() => null)) return;
      await mkdir(path.dirname(target), { recursive: true });
      const part = `${target}.${randomUUID()}.part`;
      const handle = await open(part, 'wx', 0o600);
      try {
        await handle.writeFile(bytes);
        await handle.sync();
      } finally {
        await handle.close();
      }
      await rename(part, target);
    },
    read: (sha256) => readFile(pathOf(sha256)),
    stream: (sha256) => createReadStream(pathOf(sha256)),
  };
}
