import type { ReactNode } from 'react';
import type { SlingSummary } from '../../../../../shared/schemas/slings';

/** Slings chosen for a label run. */
export interface Picking {
  ids: ReadonlySet<number>;
  toggle: (id: number) => void;
}

/** Chooses one sling; a target of full size around a small box. */
export function PickBox({ sling, picking }: { sling: SlingSummary; picking: Picking }): ReactNode {
  return (
    <label className="-ml-2 grid size-12 shrink-0 cursor-pointer place-items-center">
      <input
        type="checkbox"
        className="size-5.5 accent-petrol"
        aria-label={`Choose ${sling.number} for a label run`}
        checked={picking.ids.has(sling.id)}
        onChange={() => picking.toggle(sling.id)}
      />
    </label>
  );
}
