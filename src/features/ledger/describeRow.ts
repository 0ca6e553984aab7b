import { z } from 'zod';
import { EVENT_NAMES } from '../../../shared/domain/lifecycle/events';
import { EVALUATION_OUTCOMES, type EvaluationOutcome } from '../../../shared/domain/lifecycle/facts';
import { INSPECTION_TYPE_FACTS, INSPECTION_TYPES } from '../../../shared/domain/inspection/inspectionTypes';
import { CERTIFICATE_BASES, CERTIFICATE_BASIS_NAMES } from '../../../shared/domain/slings/kinds';
import { HOLD_REASONS, REASON_FACTS } from '../../../shared/domain/lifecycle/reasons';
import { CUSTODY_NAMES, STATE_FACTS } from '../../../shared/domain/lifecycle/states';
import { DEPART_CAUSE_NAMES, DEPART_CAUSES } from '../../../shared/schemas/actions';
import { REPRINT_REASON_FACTS, REPRINT_REASONS } from '../../../shared/schemas/labels';
import type { LedgerRow } from '../../../shared/schemas/ledger';
import { formatTagCode } from '../../lib/format';
import { describeCorrection, describeEdit } from './describeChanges';

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
  outcome: z.enum(EVALUATION_OUTCOMES),
  evaluator: z.string(),
  inspection: z.enum(INSPECTION_TYPES),
  findings: z.array(z.object({ message: z.string() })),
  stricter: z.object({ note: z.string() }),
  certificate: z.object({ basis: z.enum(CERTIFICATE_BASES), number: z.string() }),
  replaces: z.string(),
} as const;
type Parts = { [Name in keyof typeof PARTS]?: z.infer<(typeof PARTS)[Name]> };

const VERDICT_WORDS = {
  pass: 'Passed.',
  refer: 'Referred to a qualified person.',
  reject: 'Rejected.',
} as const;

const OUTCOME_WORDS = {
  fit: 'The evaluator calls it fit.',
  repaired: 'The evaluator repaired it.',
  unfit: 'The evaluator calls it unfit.',
  not_examined: 'The evaluator did not examine it.',
  destroyed: 'The evaluator destroyed it.',
} as const satisfies Record<EvaluationOutcome, string>;

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
    parts.inspection && INSPECTION_TYPE_FACTS[parts.inspection].name,
    parts.verdict && VERDICT_WORDS[parts.verdict],
    ...(parts.findings ?? []).map(({ message }) => message),
    parts.stricter && `Stricter than the rules: ${parts.stricter.note}`,
    ...(row.type === 'corrected' ? describeCorrection(row.data.before, row.data.after) : []),
    row.type === 'edited' ? describeEdit(row.data.changes) : null,
    parts.certificate && `${CERTIFICATE_BASIS_NAMES[parts.certificate.basis]}, ${parts.certificate.number}`,
    parts.evaluator && `To ${parts.evaluator}`,
    parts.outcome && OUTCOME_WORDS[parts.outcome],
    ...(parts.reasons ?? []).map(describeReason),
    ...(parts.cleared ?? []).map((reason) => `Cleared: ${describeReason(reason)}`),
    ...(parts.closed ?? []).map((reason) => `Closed: ${describeReason(reason)}`),
    parts.method,
    parts.cause && DEPART_CAUSE_NAMES[parts.cause],
    parts.reason && describeReprint(parts.reason),
    parts.note,
    parts.code && `Label ${formatTagCode(parts.code)}`,
    parts.replaces && `In place of ${formatTagCode(parts.replaces)}`,
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
