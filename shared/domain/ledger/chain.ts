import canonicalize from 'canonicalize';
import type { LedgerEventType } from '../lifecycle/events';
import type { CustodyKind, SlingState } from '../lifecycle/states';

/** What a ledger row states and its hash covers; `prevHash` ties it to the row before. */
export interface LedgerContent {
  slingId: number;
  /** Place in the sling's own chain, from 1. */
  slingSeq: number;
  type: LedgerEventType;
  /** ISO 8601, UTC, milliseconds. */
  at: string;
  actor: { id: number | null; name: string };
  from: SlingState | null;
  to: SlingState;
  condemned: boolean;
  custody: { kind: CustodyKind; locationId: number | null };
  data: Record<string, unknown>;
  prevHash: string;
}

/** The hash before the first row. */
export const CHAIN_START = '0'.repeat(64);

/** JSON with one form only (RFC 8785), so that the same content always has the same hash. */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('This value has no JSON form.');
  return text;
}

/** The text whose SHA-256 (hex, lower case) is the row's hash. */
export function canonicalRow(content: LedgerContent): string {
  const { slingId, slingSeq, type, at, actor, from, to, condemned, custody, data, prevHash } = content;
  return canonicalJson({ slingId, slingSeq, type, at, actor, from, to, condemned, custody, data, prevHash });
}

export interface ChainFault {
  slingSeq: number;
  message: string;
}

/**
 * Checks rows of one sling, in order, from the given head on.
 * @param hashOf SHA-256 in hex of a text
 * @returns the first fault, or the new head
 */
export function followChain(
  rows: readonly (LedgerContent & { hash: string })[],
  start: { seq: number; hash: string },
  hashOf: (text: string) => string,
): { fault: ChainFault } | { fault: null; seq: number; hash: string } {
  let { seq, hash } = start;
  for (const row of rows) {
    seq += 1;
    if (row.slingSeq !== seq) return { fault: { slingSeq: seq, message: `Row ${seq} is missing.` } };
    if (row.prevHash !== hash) {
      return { fault: { slingSeq: seq, message: `Row ${seq} does not follow the row before it.` } };
    }
    if (hashOf(canonicalRow(row)) !== row.hash) {
      return { fault: { slingSeq: seq, message: `Row ${seq} was changed after it was written.` } };
    }
    hash = row.hash;
  }
  return { fault: null, seq, hash };
}
