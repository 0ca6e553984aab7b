import { createHash } from 'node:crypto';

/** In hex, lower case. */
export function sha256(content: string | Buffer): string {
  return createHash('sha256').update(content).digest('hex');
}
