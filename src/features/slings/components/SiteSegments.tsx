import type { ReactNode } from 'react';
import type { Site } from '../../../../shared/schemas/places';
import { Segments } from '../../../components/ui/Segments';

/** All sites or one, for people who work at several; nothing for the rest. */
export function SiteSegments({
  sites,
  siteId,
  path,
}: {
  sites: readonly Site[];
  siteId: number | undefined;
  path: string;
}): ReactNode {
  if (sites.length < 2) return null;
  return (
    <div className="no-print mb-4">
      <Segments
        label="Site"
        segments={[
          { to: path, label: 'All sites', isCurrent: siteId === undefined },
          ...sites.map(({ id, name }) => ({
            to: `${path}?siteId=${id}`,
            label: name,
            isCurrent: id === siteId,
          })),
        ]}
      />
    </div>
  );
}
