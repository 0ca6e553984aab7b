import { z } from 'zod';
import { EVENT_NAMES } from '../../../shared/domain/lifecycle/events';
import { HOLD_REASONS, REASON_FACTS } from '../../../shared/domain/lifecycle/reasons';
import { CUSTODY_NAMES, STATE_FACTS } from '../../../shared/domain/lifecycle/states';
import { DEPART_CAUSE_NAMES, DEPART_CAUSES } from '../../../shared/schemas/actions';
import { REPRINT_REASON_FACTS, REPRINT_REASONS } from '../../../shared/schemas/labels';
import type { LedgerRow } from '../../../shared/schemas/ledger';
import { formatTagCode } from '../../lib/format';

const reasonSchema = z.object({ code: z.enum(HOLD_REASONS), note: z.string().optional() });
/** What a reader of the ledger wants in words; rows keep more, which the hashes cover. Each part is read for itself. */
const PARTS = {
  reasons: z.array(reasonSchema),
  cleared: z.array(reasonSchema),
  closed: z.array(reasonSchema),
  note: z.string(),
  reason: z.string(),
  method: z.string(),
  location: z.string(),
  code: z.string(),
  cause: z.enum(DEPART_CAUSES),
  verdict: z.enum(['pass', 'refer', 'reject']),
  outcome: z.string(),
} as const;
type Parts = { [Name in keyof typeof PARTS]?: z.infer<(typeof PARTS)[Name]> };

const VERDICT_WORDS = {
  pass: 'Passed.',
  refer: 'Referred to a qualified person.',
  reject: 'Rejected.',
} as const;

/** The row's act in one line. */
export function nameRow({ type }: Pick<LedgerRow, 'type'>): string {
  const names: Record<string, string | undefined> = EVENT_NAMES;
  return names[type] ?? type;
}

/** The lines under it: from and to, reasons, notes, place. */
export function describeRow(row: LedgerRow, locationName: (id: number) => string | undefined): string[] {
  const parts = readParts(row.data);
  return [
    describeMove(row),
    parts.verdict && VERDICT_WORDS[parts.verdict],
    ...(parts.reasons ?? []).map(describeReason),
    ...(parts.cleared ?? []).map((reason) => `Cleared: ${describeReason(reason)}`),
    ...(parts.closed ?? []).map((reason) => `Closed: ${describeReason(reason)}`),
    parts.method,
    parts.cause && DEPART_CAUSE_NAMES[parts.cause],
    parts.reason && describeReprint(parts.reason),
    parts.note,
    parts.code && `Label ${formatTagCode(parts.code)}`,
    describePlace(row, parts.location, locationName),
  ].flatMap((line) => (line ? [line] : []));
}

function readParts(data: Record<string, unknown>): Parts {
  const found: Record<string, unknown> = {};
  for (const [name, schema] of Object.entries(PARTS)) {
    const parsed = schema.safeParse(data[name]);
    if (parsed.success) found[name] = parsed.data;
  }
  return found;
}

function describeMove({ from, to }: LedgerRow): string | null {
  if (from === null || from === to) return null;
  return `${STATE_FACTS[from].word} → ${STATE_FACTS[to].word.toLowerCase()}`;
}

function describeReason({ code, note }: z.infer<typeof reasonSchema>): string {
  return note ? `${REASON_FACTS[code].name}: ${note}` : REASON_FACTS[code].name;
}

/** A label's reason is one of a few codes, a correction's is free text. */
function describeReprint(reason: string): string {
  const code = REPRINT_REASONS.find((name) => name === reason);
  return code ? REPRINT_REASON_FACTS[code].name : reason;
}

function describePlace(
  { type, custody }: LedgerRow,
  location: string | undefined,
  locationName: (id: number) => string | undefined,
): string | null {
  const isAboutPlace = [
    'registered',
    'secure',
    'release',
    'receive_back',
    'found',
    'moved',
    'return_to_service',
  ].includes(type);
  if (!isAboutPlace) return null;
  const known = location ?? (custody.locationId === null ? undefined : locationName(custody.locationId));
  return known ? `In ${known}` : CUSTODY_NAMES[custody.kind];
}
