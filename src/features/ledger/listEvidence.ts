import { fileIdSchema } from '../../../shared/schemas/common';

/** Files named anywhere in a row's data (`{fileId, sha256}`), in their order, each once. */
export function listEvidence(data: unknown): string[] {
  const found = new Set<string>();
  collect(data, found);
  return [...found];
}

function collect(value: unknown, found: Set<string>): void {
  if (Array.isArray(value)) {
    for (const item of value) collect(item, found);
    return;
  }
  if (typeof value !== 'object' || value === null) return;
  for (const [name, part] of Object.entries(value)) {
    const id = name === 'fileId' ? fileIdSchema.safeParse(part) : null;
    if (id?.success) found.add(id.data);
    else collect(part, found);
  }
}
