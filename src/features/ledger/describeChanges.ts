import { z } from 'zod';
import { formatLength, formatLoad } from '../../../shared/domain/units/units';

const changesSchema = z.record(z.string(), z.unknown());

const FIELD_NAMES: Record<string, string | undefined> = {
  number: 'Number',
  maker: 'Maker',
  makerSerial: 'Maker’s serial',
  makersTag: 'Maker’s tag',
  serviceClass: 'Service class',
  siteId: 'Site',
  reachMm: 'Reach',
  verticalKg: 'Rated load, vertical',
  chokerKg: 'Rated load, choker',
  basketKg: 'Rated load, basket',
  kg: 'Rated load, bridle',
  angleDeg: 'Bridle angle',
  notes: 'Notes',
  homeLocationId: 'Home location',
  cost: 'Cost',
};

/** A correction's fields with what stood before and what stands now: "Maker’s serial: TF-88203 → TF-88230". */
export function describeCorrection(before: unknown, after: unknown): string[] {
  const old = flatten(before);
  return [...flatten(after)].flatMap(([field, value]) => {
    const was = old.get(field);
    // Rated loads are corrected as a whole: those that stay are no news
    if (was === value) return [];
    const name = FIELD_NAMES[field] ?? field;
    // Sites are known by number in the ledger: which site it is now stands on the record
    if (field === 'siteId') return [`${name} changed`];
    return [`${name}: ${was === undefined ? 'none' : show(field, was)} → ${show(field, value)}`];
  });
}

/** The names of what an edit touched; its texts stand on the record. */
export function describeEdit(changes: unknown): string | null {
  const names = [...flatten(changes).keys()].map((field) => FIELD_NAMES[field] ?? field);
  return names.length > 0 ? names.join(', ') : null;
}

/** One level of nesting (rated loads, bridle) laid flat; only plain values count. */
function flatten(value: unknown): Map<string, string | number> {
  const flat = new Map<string, string | number>();
  const parsed = changesSchema.safeParse(value);
  if (!parsed.success) return flat;
  for (const [name, part] of Object.entries(parsed.data)) {
    if (typeof part === 'string' || typeof part === 'number') flat.set(name, part);
    else if (part === null) flat.set(name, 'none');
    else for (const [inner, deep] of flatten(part)) flat.set(inner, deep);
  }
  return flat;
}

function show(field: string, value: string | number): string {
  if (typeof value === 'string') return value || 'none';
  if (field === 'kg' || field.endsWith('Kg')) return formatLoad(value, 'kg');
  if (field.endsWith('Mm')) return formatLength(value, 'mm');
  return field === 'angleDeg' ? `${value}°` : String(value);
}
