import { useSearchParams } from 'react-router-dom';
import type { Site } from '../../../../shared/schemas/places';
import { useSites } from '../../../lib/places';

/** The site that the address names, among those where the person works; undefined is all of them. */
export function useSiteChoice(): { sites: readonly Site[]; siteId: number | undefined } {
  const [search] = useSearchParams();
  const sites = useSites().data?.items ?? [];
  const asked = Number(search.get('siteId'));
  return { sites, siteId: sites.find(({ id }) => id === asked)?.id };
}
