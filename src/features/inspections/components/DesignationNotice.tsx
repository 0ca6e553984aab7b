import type { ReactNode } from 'react';
import { findDesignation } from '../../../../shared/domain/inspection/designations';
import { KIND_FACTS, type SlingKind } from '../../../../shared/domain/slings/kinds';
import { Notice } from '../../../components/ui/Notice';
import { formatDate } from '../../../lib/format';
import { useUser } from '../../../lib/session';

/** Whether the employer designated this inspector for the kind, on the day of the inspection. */
export function DesignationNotice({
  kind,
  inspectedOn,
}: {
  kind: SlingKind;
  inspectedOn: string;
}): ReactNode {
  const { designations } = useUser();
  const kindName = KIND_FACTS[kind].name.toLowerCase();
  const designation = findDesignation(designations, kind, inspectedOn);
  if (!designation) {
    return (
      <Notice tone="warn" title={`You hold no designation for a ${kindName} on ${formatDate(inspectedOn)}`}>
        What you find is recorded under your name. You can’t accept, release or return this sling until an
        administrator has entered a designation of yours that covers the kind.
      </Notice>
    );
  }
  return (
    <p className="text-muted">
      You are designated for this kind{designation.isQualified ? ', as a qualified person' : ''}, by{' '}
      {designation.designatedBy}
      {designation.until ? `, until ${formatDate(designation.until)}` : ''}.
    </p>
  );
}
