import type { CriterionPart } from '../../../shared/domain/inspection/criterion';
import { FITTING_NAMES } from '../../../shared/domain/slings/spec';
import type { CriteriaResponse } from '../../../shared/schemas/inspection';
import type { Sling } from '../../../shared/schemas/slings';

export type CriterionRowView = CriteriaResponse['items'][number];

/** One thing to look at with the questions about it, in the order in which a sling is gone over. */
export interface RowGroup {
  key: string;
  title: string;
  rows: CriterionRowView[];
}

const POSITION_WORDS = { upper: 'upper end', lower: 'lower end', other: 'elsewhere' } as const;
const PART_TITLES = {
  body: 'Body of the sling',
  fitting: 'Fittings',
  hook: 'Hooks',
  master_link: 'Master link',
  makers_tag: 'Maker’s tag',
  any: 'The sling as a whole',
} as const satisfies Record<CriterionPart, string>;

/** Rows of one fitting stand together under its name; the others under their part. */
export function groupRows(rows: readonly CriterionRowView[], fittings: Sling['fittings']): RowGroup[] {
  const groups = new Map<string, RowGroup>();
  for (const row of rows) {
    const key = row.fittingId === undefined ? row.part : `fitting${row.fittingId}`;
    const group = groups.get(key) ?? { key, title: nameGroup(row, fittings), rows: [] };
    groups.set(key, { ...group, rows: [...group.rows, row] });
  }
  return [...groups.values()];
}

function nameGroup(row: CriterionRowView, fittings: Sling['fittings']): string {
  return row.fittingId === undefined ? PART_TITLES[row.part] : nameFitting(row.fittingId, fittings);
}

/** "Hook, 13 mm, lower end (2 of 4)": alike fittings are told apart by their place in the record. */
export function nameFitting(fittingId: number | string, fittings: Sling['fittings']): string {
  const fitting = fittings.find(({ id }) => id === fittingId);
  if (!fitting) return 'Fitting';
  const size = fitting.sizeMm === undefined ? '' : `, ${fitting.sizeMm} mm`;
  const alike = fittings.filter(
    ({ type, position }) => type === fitting.type && position === fitting.position,
  );
  const place = alike.length > 1 ? ` (${alike.indexOf(fitting) + 1} of ${alike.length})` : '';
  return `${FITTING_NAMES[fitting.type]}${size}, ${POSITION_WORDS[fitting.position]}${place}`;
}
