import { canonicalJson, canonicalRow, type LedgerContent } from '../../shared/domain/ledger/chain';
import type { LedgerEventType } from '../../shared/domain/lifecycle/events';
import type { CustodyKind, SlingState } from '../../shared/domain/lifecycle/states';
import type { WriteContext } from '../context';
import { LedgerEntry } from '../models/LedgerEntry';
import type { SlingRecord } from '../models/SlingRecord';
import { sha256 } from '../security/sha256';

export interface LedgerEvent {
  type: LedgerEventType;
  /** State after the act; left out where it stays. */
  to?: SlingState;
  condemned?: boolean;
  custody?: { kind: CustodyKind; locationId: number | null };
  /** Evidence and words: JSON, no secrets. */
  data?: Record<string, unknown>;
  /** Who acted, when it is nobody with an account. */
  guestName?: string;
}

/**
 * Writes the ledger row; the database moves the sling with it (migration 0004). The sling must be locked by this
 * transaction, and its instance follows the change.
 */
export async function appendLedger(
  context: WriteContext,
  sling: SlingRecord,
  event: LedgerEvent,
): Promise<LedgerEntry> {
  const { user, transaction, at } = context;
  const custody = event.custody ?? { kind: sling.custodyKind, locationId: sling.custodyLocationId };
  const isFirst = sling.ledgerCount === 0;
  const content: LedgerContent = {
    slingId: sling.id,
    slingSeq: sling.ledgerCount + 1,
    type: event.type,
    at: at.toISOString(),
    actor: { id: user?.id ?? null, name: user?.name ?? event.guestName ?? 'Slingward' },
    from: isFirst ? null : sling.state,
    to: event.to ?? sling.state,
    condemned: event.condemned ?? sling.condemned,
    custody,
    data: event.data ?? {},
    prevHash: sling.headHash,
  };
  const row = await LedgerEntry.create(
    {
      slingId: content.slingId,
      slingSeq: content.slingSeq,
      type: content.type,
      at,
      actorId: content.actor.id,
      actorName: content.actor.name,
      fromState: content.from,
      toState: content.to,
      condemned: content.condemned,
      custodyKind: custody.kind,
      custodyLocationId: custody.locationId,
      data: canonicalJson(content.data),
      prevHash: content.prevHash,
      hash: sha256(canonicalRow(content)),
    },
    { transaction },
  );
  followRow(sling, row, at);
  return row;
}

/** What the trigger wrote, on the instance in hand: saves reading the sling again between two rows. */
function followRow(sling: SlingRecord, row: LedgerEntry, at: Date): void {
  sling.set(
    {
      state: row.toState as SlingState,
      condemned: row.condemned,
      custodyKind: row.custodyKind as CustodyKind,
      custodyLocationId: row.custodyLocationId,
      ledgerCount: row.slingSeq,
      headHash: row.hash,
      updatedAt: at,
    },
    { raw: true },
  );
}
