import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { describeSling } from '../../../../../shared/domain/slings/describe';
import type { SlingSummary } from '../../../../../shared/schemas/slings';
import { StateMark } from '../../../../components/sling/StateMark';
import { paths } from '../../../../config/paths';
import { useUnits } from '../../../../lib/session';
import { describePlace } from '../describe';
import { DueText } from './DueText';
import { PickBox, type Picking } from './PickBox';

/** The register on a phone: the whole card opens the record. */
export function SlingCards({
  slings,
  picking,
}: {
  slings: readonly SlingSummary[];
  picking: Picking | null;
}): ReactNode {
  return (
    <ul className="flex flex-col border-t-2 border-ink">
      {slings.map((sling) => (
        <li key={sling.id} className="flex border-b border-rule">
          {picking && (
            <span className="pt-1.5 pl-1">
              <PickBox sling={sling} picking={picking} />
            </span>
          )}
          <SlingCard sling={sling} />
        </li>
      ))}
    </ul>
  );
}

function SlingCard({ sling }: { sling: SlingSummary }): ReactNode {
  const { formatLoad } = useUnits();
  return (
    <Link to={paths.sling(sling.id)} className="block min-w-0 flex-1 px-1 py-3 hover:bg-wash">
      <span className="flex flex-wrap items-center justify-between gap-x-3">
        <b className="min-w-0 text-lg break-words">{sling.number}</b>
        <StateMark sling={sling} />
      </span>
      <span className="block">
        {describeSling(sling)},{' '}
        <span className="whitespace-nowrap">{formatLoad(sling.ratedLoads.verticalKg)}</span>
      </span>
      <span className="block text-[0.9375rem] text-muted">
        {describePlace(sling)}
        {' · '}
        {sling.nextDueOn ? (
          <>
            due <DueText sling={sling} />
          </>
        ) : (
          'no inspection yet'
        )}
        {sling.tag?.status !== 'live' &&
          ` · ${sling.tag?.status === 'printed' ? 'label not confirmed' : 'no label'}`}
      </span>
    </Link>
  );
}
