import { randomBytes } from 'node:crypto';
import { sha256 } from './sha256';

/** 256 random bits; only the hash is kept, so that the database alone opens nothing. */
export function drawToken(): { token: string; tokenHash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashToken(token) };
}

export function hashToken(token: string): string {
  return sha256(token);
}
