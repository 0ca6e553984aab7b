import { z } from 'zod';
import { fileIdSchema, requiredText, text } from '../../../shared/schemas/common';
import { LIMITS } from '../../../shared/limits';
import type { Part } from './parts';

/** The method's tile for what none of the usual ways covers. */
export const OTHER_METHOD = 'other';

const destroyValues = z.object({
  method: z.string().min(1, 'How was it destroyed?'),
  otherMethod: text(LIMITS.name),
  photoIds: z.array(fileIdSchema).min(1, 'A photo of the destroyed sling is needed.'),
  /** By part; null while nothing is chosen, as a form's radios have it. */
  fates: z.record(z.string(), z.enum(['destroyed', 'salvaged']).nullable()),
});
export type DestroyValues = z.infer<typeof destroyValues>;

/** Everything but the signature, which is asked after the summary. */
export function buildDestroySchema(parts: readonly Part[]) {
  return destroyValues.superRefine(({ method, otherMethod, fates }, context) => {
    if (method === OTHER_METHOD && !requiredText(LIMITS.name).safeParse(otherMethod).success) {
      context.addIssue({ code: 'custom', path: ['otherMethod'], message: 'Say how it was destroyed.' });
    }
    for (const part of parts.filter(({ isDetachable }) => isDetachable)) {
      if (!fates[part.key]) {
        context.addIssue({
          code: 'custom',
          path: ['fates', part.key],
          message: `${part.name}: destroyed or salvaged?`,
        });
      }
    }
  });
}

export function methodOf(values: DestroyValues): string {
  return values.method === OTHER_METHOD ? values.otherMethod : values.method;
}
