import { useState, type ReactNode } from 'react';
import { mayCall } from '../../../shared/domain/access/routes';
import type { Site } from '../../../shared/schemas/places';
import { Button } from '../../components/ui/Button';
import { Dialog } from '../../components/ui/Dialog';
import { PageHeader } from '../../components/ui/PageHeader';
import { EmptyState, ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { useLocations, useSites } from '../../lib/places';
import { LocationForm } from '../../features/places/components/LocationForm';
import { SiteForm } from '../../features/places/components/SiteForm';
import { SitePanel } from '../../features/places/components/SitePanel';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  const { roles } = useUser();
  const sites = useSites();
  const locations = useLocations();
  const [open, setOpen] = useState<'site' | Site | null>(null);
  const close = (): void => setOpen(null);
  const error = sites.error ?? locations.error;
  const mayAddSite = mayCall('POST /api/sites', roles);
  const mayAddLocation = mayCall('POST /api/locations', roles);
  return (
    <>
      <PageHeader
        title="Sites and locations"
        back={{ to: paths.account, label: 'Account' }}
        sub={mayAddSite ? undefined : 'Where you work. Administrators add sites and locations.'}
        actions={mayAddSite && <Button onClick={() => setOpen('site')}>Add a site</Button>}
      />
      {error && (
        <ErrorState error={error} onRetry={() => void Promise.all([sites.refetch(), locations.refetch()])} />
      )}
      {!error && !(sites.data && locations.data) && <SkeletonLines lines={9} />}
      {sites.data && locations.data && (
        <div className="grid gap-8 lg:grid-cols-2 lg:gap-x-12">
          {sites.data.items.map((site) => (
            <SitePanel
              key={site.id}
              site={site}
              locations={locations.data.items.filter(({ siteId }) => siteId === site.id)}
              onAddLocation={mayAddLocation ? () => setOpen(site) : undefined}
            />
          ))}
        </div>
      )}
      {sites.data?.items.length === 0 && (
        <EmptyState title="You work at no site yet">
          An administrator gives you one, on the page “Users”. Slings show up then.
        </EmptyState>
      )}
      <Dialog open={open === 'site'} onClose={close} title="Add a site">
        <SiteForm onMade={close} />
      </Dialog>
      <Dialog
        open={open !== null && open !== 'site'}
        onClose={close}
        title={open && open !== 'site' ? `Add a location at ${open.name}` : ''}
      >
        {open && open !== 'site' && <LocationForm site={open} onMade={close} />}
      </Dialog>
    </>
  );
}
