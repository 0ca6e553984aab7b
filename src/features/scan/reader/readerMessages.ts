import { z } from 'zod';
import type { ReadingEffort } from '../../../../shared/reader/codeReader';

const EFFORTS = ['live', 'still'] as const satisfies readonly ReadingEffort[];

/** Page to worker: one picture, four bytes a pixel; the buffer is handed over, not copied. */
export const readJobSchema = z.object({
  id: z.number(),
  rgba: z.instanceof(ArrayBuffer),
  width: z.number().int().positive(),
  height: z.number().int().positive(),
  effort: z.enum(EFFORTS),
});
export type ReadJob = z.infer<typeof readJobSchema>;

/** Worker to page. */
export const readReplySchema = z.object({ id: z.number(), text: z.string().nullable() });
export type ReadReply = z.infer<typeof readReplySchema>;
