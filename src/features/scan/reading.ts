import { z } from 'zod';
import { parseScan, type ScanReading } from '../../../shared/domain/tags/tagCode';

export const READ_WAYS = ['camera', 'photo', 'scanner', 'typed'] as const;
export type ReadWay = (typeof READ_WAYS)[number];

/** A code that was read and is being answered; kept in the history entry, so that Back shows the answer again. */
export const readingSchema = z.object({
  code: z.string(),
  via: z.enum(READ_WAYS),
  /** The host in the label's link, null for a bare code. */
  host: z.string().nullable(),
  /** Milliseconds; tells two scans of one label apart. */
  readAt: z.number(),
});
export type Reading = z.infer<typeof readingSchema>;

/** What can't be looked up at all. The text is shown as text, never as a link. */
export type Refusal = Exclude<ScanReading, { kind: 'tag' }>;

export type Understood = { ok: true; reading: Reading } | { ok: false; refusal: Refusal };

/**
 * A link at any host counts as ours here: the client doesn't know every address that the labels were printed with, and
 * whether the code was ever given is the server's to say. The host is kept for the answer's words.
 */
export function understand(text: string, via: ReadWay, atMs: number): Understood {
  const scan = parseScan(text);
  if (scan.kind !== 'tag') return { ok: false, refusal: scan };
  return { ok: true, reading: { code: scan.code, via, host: findHost(text), readAt: atMs } };
}

function findHost(text: string): string | null {
  return /^https?:\/\/([^/]+)/i.exec(text.trim())?.[1]?.toLowerCase() ?? null;
}

/** Through `?code=` comes what a handheld scanner typed on another page (the whole link), or a bare code by hand. */
export const wayOfAddress = (text: string): ReadWay => (findHost(text) === null ? 'typed' : 'scanner');

/** A foreign code may be anything: one line, no control or direction characters, cut to what a screen can hold. */
export function showSafely(text: string, maxLength = 120): string {
  const plain = text.replace(/[\p{C}\p{Z}]+/gu, ' ').trim();
  return plain.length > maxLength ? `${plain.slice(0, maxLength)}…` : plain;
}
