import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { describeSling } from '../../../../../shared/domain/slings/describe';
import type { SlingSummary } from '../../../../../shared/schemas/slings';
import { EDGE_COLOURS, lookOf, type SignalColour } from '../../../../components/sling/stateLook';
import { paths } from '../../../../config/paths';
import { cx } from '../../../../lib/cx';
import { formatAge } from '../../../../lib/format';
import { nameReasons } from '../../board/sections';
import { describePlace } from '../describe';

/** One sling in quarantine: since when, what, where, why, who acts next. */
export function BoardCard({ sling, next, now }: { sling: SlingSummary; next: string; now: Date }): ReactNode {
  // Condemned ones end as destroyed: the edge shows that, beside the word
  const colour: SignalColour = sling.condemned ? 'black' : lookOf(sling).colour;
  const reasons = nameReasons(sling);
  return (
    <li>
      <Link
        to={paths.sling(sling.id)}
        className={cx('block border border-t-4 border-rule bg-card p-3 hover:bg-wash', EDGE_COLOURS[colour])}
      >
        <span className="flex items-baseline justify-between gap-3">
          <b className="min-w-0 text-lg leading-tight break-words">{sling.number}</b>
          <span className="shrink-0 font-semibold">
            <span className="sr-only">for </span>
            {formatAge(sling.stateSince, now)}
          </span>
        </span>
        <span className="mt-0.5 block text-[0.9375rem] text-muted">
          {describeSling(sling)} · {describePlace(sling)}
        </span>
        {sling.condemned && <span className="block font-semibold">Condemned</span>}
        {reasons && <span className="block">{reasons}</span>}
        <span className="mt-2 block border-t border-dashed border-rule pt-2 font-semibold text-petrol">
          {next}
        </span>
      </Link>
    </li>
  );
}
