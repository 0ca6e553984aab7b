import { useLocations, useSites } from '../../../lib/places';

export interface PlaceNames {
  site: (id: number) => string | undefined;
  location: (id: number | null | undefined) => string | undefined;
  timeZone: (siteId: number) => string | undefined;
  /** Is there more than one site to tell apart? */
  hasManySites: boolean;
}

/** Names of sites and locations by id, undefined while they load. */
export function usePlaceNames(): PlaceNames {
  const sites = useSites().data?.items ?? [];
  const locations = useLocations().data?.items ?? [];
  return {
    site: (id) => sites.find((site) => site.id === id)?.name,
    location: (id) => locations.find((location) => location.id === id)?.name,
    timeZone: (siteId) => sites.find((site) => site.id === siteId)?.timeZone,
    hasManySites: sites.length > 1,
  };
}
