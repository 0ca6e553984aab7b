import { z } from 'zod';
import { fileIdSchema } from './common';

export const STORED_TYPES = ['image/jpeg', 'application/pdf'] as const;

/** `sha256` is of what is kept; `originalSha256` of what was sent (images are encoded anew). */
export const storedFileSchema = z.object({
  id: fileIdSchema,
  sha256: z.string(),
  originalSha256: z.string(),
  contentType: z.enum(STORED_TYPES),
  size: z.number(),
});
export type StoredFile = z.infer<typeof storedFileSchema>;
