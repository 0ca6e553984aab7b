import type { ReactNode } from 'react';
import { INSPECTION_TYPE_FACTS } from '../../../../../shared/domain/inspection/inspectionTypes';
import { Panel } from '../../../../components/ui/Panel';
import { ErrorState, SkeletonLines } from '../../../../components/ui/states';
import { cx } from '../../../../lib/cx';
import { formatDate } from '../../../../lib/format';
import type { Inspection } from '../../../../../shared/schemas/inspection';
import { useInspections } from '../../api/listInspections';

const VERDICT_WORDS = {
  pass: 'Passed',
  refer: 'Referred to a qualified person',
  reject: 'Rejected',
} as const;

/** Every inspection of this sling, newest first, with what was found. */
export function InspectionsPanel({ slingId }: { slingId: number }): ReactNode {
  const query = useInspections(slingId);
  return (
    <Panel title="Inspections">
      {query.isPending && <SkeletonLines lines={3} />}
      {query.isError && !query.data && (
        <ErrorState error={query.error} onRetry={() => void query.refetch()} />
      )}
      {query.data?.items.length === 0 && (
        <p className="text-muted">None yet. The first one is the initial inspection.</p>
      )}
      <ul>
        {query.data?.items
          .toSorted((a, b) => b.recordedAt.localeCompare(a.recordedAt))
          .map((inspection) => (
            <InspectionLine key={inspection.id} inspection={inspection} />
          ))}
      </ul>
    </Panel>
  );
}

function InspectionLine({ inspection }: { inspection: Inspection }): ReactNode {
  const { verdict, findings, stricter } = inspection;
  return (
    <li className="border-b border-rule py-2">
      <p className="flex flex-wrap justify-between gap-x-4">
        <span className="font-medium">{INSPECTION_TYPE_FACTS[inspection.type].name}</span>
        <span className={cx('font-semibold', verdict !== 'pass' && 'text-danger')}>
          {VERDICT_WORDS[verdict]}
        </span>
      </p>
      <p className="text-[0.9375rem] text-muted">
        {formatDate(inspection.inspectedOn)}, {inspection.inspector.name}
        {inspection.nextDueOn && `, next due ${formatDate(inspection.nextDueOn)}`}
      </p>
      {findings.length > 0 && (
        <ul className="mt-1 list-disc pl-5">
          {findings.map(({ criterionId, fittingId, message }) => (
            <li key={`${criterionId}.${fittingId ?? ''}`}>{message}</li>
          ))}
        </ul>
      )}
      {stricter && <p className="mt-1">Stricter than the rules: {stricter.note}</p>}
    </li>
  );
}
