import type { ReactNode } from 'react';
import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../../shared/domain/inspection/inspectionTypes';
import { Segments } from '../../../components/ui/Segments';
import { TYPE_HINTS } from '../inspectionTypes';

/** The types that make sense now, in the address; with one alone there is nothing to choose. */
export function TypeTabs({
  types,
  current,
}: {
  types: readonly InspectionType[];
  current: InspectionType;
}): ReactNode {
  return (
    <div className="mb-6 flex flex-col gap-2">
      {types.length === 1 ? (
        <h2 className="text-xl font-bold">{INSPECTION_TYPE_FACTS[current].name}</h2>
      ) : (
        <Segments
          label="Type of inspection"
          segments={types.map((type) => ({
            to: `?type=${type}`,
            label: INSPECTION_TYPE_FACTS[type].name,
            isCurrent: type === current,
          }))}
        />
      )}
      <p className="text-muted">{TYPE_HINTS[current]}</p>
    </div>
  );
}
