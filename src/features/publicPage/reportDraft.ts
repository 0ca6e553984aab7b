import { z } from 'zod';
import { fileIdSchema } from '../../../shared/schemas/common';

export const reportDraftSchema = z.object({
  name: z.string(),
  note: z.string(),
  photoIds: z.array(fileIdSchema),
});
export type ReportDraft = z.infer<typeof reportDraftSchema>;

export const EMPTY_REPORT: ReportDraft = { name: '', note: '', photoIds: [] };
