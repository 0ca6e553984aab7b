import { z } from 'zod';
import { CHOOSABLE_REASONS, REASON_FACTS, type HoldReason } from '../../../shared/domain/lifecycle/reasons';
import type { ActionBodies } from '../../../shared/schemas/actions';
import { fileIdSchema } from '../../../shared/schemas/common';

export const holdDraftSchema = z.object({
  codes: z.array(z.enum(CHOOSABLE_REASONS)),
  /** Only asked for, and only sent, where a reason says nothing without it. */
  note: z.string(),
  photoIds: z.array(fileIdSchema),
});
export type HoldDraft = z.infer<typeof holdDraftSchema>;

export const EMPTY_HOLD: HoldDraft = { codes: [], note: '', photoIds: [] };

/** Is this a reason that a person may choose? For codes that come from an address. */
export function isChoosable(code: string | null): code is HoldReason {
  return CHOOSABLE_REASONS.some((each) => each === code);
}

export const needsNote = (draft: HoldDraft): boolean =>
  draft.codes.some((code) => REASON_FACTS[code].needsNote);

/** Switches one reason on or off, kept in the order of the tiles. */
export function toggleReason(draft: HoldDraft, code: HoldReason): HoldDraft {
  const isOn = draft.codes.includes(code);
  return {
    ...draft,
    codes: CHOOSABLE_REASONS.filter((each) => (each === code ? !isOn : draft.codes.includes(each))),
  };
}

export function toHoldBody({ codes, note, photoIds }: HoldDraft): ActionBodies['hold'] {
  return {
    reasons: codes.map((code) => ({ code, ...(REASON_FACTS[code].needsNote ? { note: note.trim() } : {}) })),
    ...(photoIds.length > 0 ? { photoIds } : {}),
  };
}
