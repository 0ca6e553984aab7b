import type { ReactNode } from 'react';
import { RULE_SETS } from '../../../../shared/domain/inspection/ruleSets';
import { LOCATION_PURPOSES } from '../../../../shared/domain/lifecycle/states';
import type { Location, Site } from '../../../../shared/schemas/places';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { FactList, Panel } from '../../../components/ui/Panel';
import { PURPOSE_NAMES } from '../purposes';

/** One site: its rules, and where its slings can be. */
export function SitePanel({
  site,
  locations,
  onAddLocation,
}: {
  site: Site;
  locations: readonly Location[];
  /** Absent for those who may not add one. */
  onAddLocation?: (() => void) | undefined;
}): ReactNode {
  const hasCage = locations.some(({ purpose }) => purpose === 'cage');
  return (
    <Panel title={site.name} aside={site.timeZone.replaceAll('_', ' ')}>
      <FactList
        facts={[
          { term: 'Rule sets', value: site.ruleSets.map((id) => RULE_SETS[id].name).join(', ') },
          ...LOCATION_PURPOSES.map((purpose) => ({
            term: PURPOSE_NAMES[purpose].name,
            value:
              locations
                .filter((location) => location.purpose === purpose)
                .map(({ name }) => name)
                .join(', ') || 'None',
          })),
        ]}
      />
      {!hasCage && (
        <Notice tone="warn" title="No cage" className="mt-3">
          Held slings can’t be secured here until there is one.
        </Notice>
      )}
      {onAddLocation && (
        <Button tone="quiet" className="mt-3" onClick={onAddLocation}>
          Add a location
        </Button>
      )}
    </Panel>
  );
}
