import type { ReactNode } from 'react';
import { KIND_FACTS } from '../../../../shared/domain/slings/kinds';
import type { DesignationInput } from '../../../../shared/schemas/people';
import { formatDate, getToday } from '../../../lib/format';

/** An inspector's designations as the employer gave them. */
export function DesignationList({ designations }: { designations: readonly DesignationInput[] }): ReactNode {
  const today = getToday();
  return (
    <ul className="flex flex-col">
      {designations.map((designation, i) => {
        const hasLapsed = designation.until !== null && designation.until < today;
        return (
          <li key={i} className="border-b border-rule py-2.5">
            <p className="font-semibold">
              {designation.isQualified ? 'Qualified person' : 'Competent person'}
              {hasLapsed && <span className="text-danger"> · lapsed</span>}
            </p>
            <p>{designation.kinds.map((kind) => KIND_FACTS[kind].name).join(', ')}</p>
            <p className="text-[0.9375rem] text-muted">
              By {designation.designatedBy}, {formatDate(designation.designatedOn)}
              {designation.until ? ` to ${formatDate(designation.until)}` : ', until withdrawn'}
            </p>
          </li>
        );
      })}
    </ul>
  );
}
