import { z } from 'zod';
import type { CriterionRow } from '../../../shared/domain/inspection/rows';
import { VERDICTS, isWorseVerdict, type Verdict } from '../../../shared/domain/inspection/severity';
import { fileIdSchema } from '../../../shared/schemas/common';
import type { CreateInspectionRequest } from '../../../shared/schemas/inspection';
import { parseTypedNumber } from '../../lib/format';

const rowDraftSchema = z.object({
  choice: z.enum(['clean', 'seen']),
  /** Temperature reached, °C as typed; empty: not known. */
  celsius: z.string(),
  note: z.string(),
  photoIds: z.array(fileIdSchema),
});
export type RowDraft = z.infer<typeof rowDraftSchema>;

export const inspectionDraftSchema = z.object({
  /** By row key; a row that is not in here is not answered. */
  rows: z.record(z.string(), rowDraftSchema),
  restClean: z.boolean(),
  /** Empty: today. */
  inspectedOn: z.string(),
  /** Empty: as the answers give it. */
  stricter: z.enum(['', ...VERDICTS]),
  stricterNote: z.string(),
});
export type InspectionDraft = z.infer<typeof inspectionDraftSchema>;

export const EMPTY_INSPECTION: InspectionDraft = {
  rows: {},
  restClean: false,
  inspectedOn: '',
  stricter: '',
  stricterNote: '',
};

type Answer = CreateInspectionRequest['answers'][number];
export type Row = Pick<CriterionRow, 'id' | 'fittingId' | 'answer'> & { clean: Answer };

export const rowKey = ({ id, fittingId }: Pick<CriterionRow, 'id' | 'fittingId'>): string =>
  fittingId === undefined ? id : `${id}#${fittingId}`;

/** Answers one row; the note and photos of an earlier "seen" stay, should the inspector come back to it. */
export function answerRow(draft: InspectionDraft, key: string, part: Partial<RowDraft>): InspectionDraft {
  const before = draft.rows[key] ?? { choice: 'clean', celsius: '', note: '', photoIds: [] };
  return { ...draft, rows: { ...draft.rows, [key]: { ...before, ...part } } };
}

/** Sets those of the rows that are not answered yet to "not seen"; no answer that was given is touched. */
export function answerRestClean(draft: InspectionDraft, keys: readonly string[]): InspectionDraft {
  return keys
    .filter((key) => !draft.rows[key])
    .reduce((next, key) => answerRow(next, key, { choice: 'clean' }), draft);
}

/** The temperature typed for a row, or null where none or no number is there. */
export function readCelsius(row: RowDraft): number | null {
  const minus = /^\s*[-−]/.test(row.celsius);
  const value = parseTypedNumber(row.celsius.replace(/^\s*[-−]/, ''));
  return value === null ? null : minus ? -value : value;
}

/** The answers as the API takes them, in the order of the rows. */
export function toAnswers(draft: InspectionDraft, rows: readonly Row[]): Answer[] {
  return rows.flatMap((row) => {
    const given = draft.rows[rowKey(row)];
    if (!given) return [];
    return [given.choice === 'clean' ? row.clean : toFinding(row, given)];
  });
}

function toFinding(row: Row, given: RowDraft): Answer {
  const celsius = row.answer === 'temperature' ? readCelsius(given) : null;
  const note = given.note.trim();
  return {
    criterionId: row.id,
    ...(row.fittingId === undefined ? {} : { fittingId: row.fittingId }),
    ...(celsius === null ? { seen: true } : { measured: celsius }),
    ...(note ? { note } : {}),
    ...(given.photoIds.length > 0 ? { photoIds: given.photoIds } : {}),
  };
}

/** The inspector's own verdict where it goes further than the computed one; undefined where it doesn't. */
export function toStricter(draft: InspectionDraft, computed: Verdict): CreateInspectionRequest['stricter'] {
  if (draft.stricter === '' || !isWorseVerdict(draft.stricter, computed)) return undefined;
  return { verdict: draft.stricter, note: draft.stricterNote.trim() };
}
