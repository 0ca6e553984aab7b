import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { describeSling } from '../../../../../shared/domain/slings/describe';
import type { SlingSummary } from '../../../../../shared/schemas/slings';
import { StateMark } from '../../../../components/sling/StateMark';
import { DataTable, type Column } from '../../../../components/ui/DataTable';
import { paths } from '../../../../config/paths';
import { cx } from '../../../../lib/cx';
import { useUnits } from '../../../../lib/session';
import { describeLabel, describePlace } from '../describe';
import { DueText } from './DueText';
import { PickBox, type Picking } from './PickBox';

/** The register at a desk: one ruled line per sling. */
export function SlingTable({
  slings,
  picking,
}: {
  slings: readonly SlingSummary[];
  picking: Picking | null;
}): ReactNode {
  const { formatLoad } = useUnits();
  const columns: Column<SlingSummary>[] = [
    {
      id: 'number',
      header: 'Number',
      cell: (sling) => (
        <span className="flex items-center">
          {picking && <PickBox sling={sling} picking={picking} />}
          <Link
            to={paths.sling(sling.id)}
            className="flex min-h-target max-w-56 items-center font-bold wrap-anywhere text-petrol underline-offset-4 hover:underline"
          >
            {sling.number}
          </Link>
        </span>
      ),
    },
    { id: 'state', header: 'State', cell: (sling) => <StateMark sling={sling} className="min-h-12" /> },
    {
      id: 'what',
      header: 'Sling',
      className: 'min-w-64',
      cell: (sling) => (
        <span className="block py-1">
          {describeSling(sling)}
          <span className="block text-[0.9375rem] text-muted">
            {sling.maker}
            {sling.makerSerial && `, serial ${sling.makerSerial}`}
          </span>
        </span>
      ),
    },
    {
      id: 'load',
      header: 'Vertical',
      isFigure: true,
      cell: (sling) => (
        <span className="block py-2.5 whitespace-nowrap">{formatLoad(sling.ratedLoads.verticalKg)}</span>
      ),
    },
    {
      id: 'place',
      header: 'Place',
      cell: (sling) => <span className="block py-2.5">{describePlace(sling)}</span>,
    },
    {
      id: 'due',
      header: 'Next due',
      cell: (sling) => (
        <span className="block py-2.5">
          <DueText sling={sling} />
        </span>
      ),
    },
    {
      id: 'label',
      header: 'Label',
      className: 'max-xl:hidden',
      cell: (sling) => (
        <span className={cx('block py-2.5', sling.tag?.status !== 'live' && 'text-muted')}>
          {describeLabel(sling)}
        </span>
      ),
    },
  ];
  return <DataTable caption="Slings" columns={columns} rows={slings} rowKey={({ id }) => id} />;
}
