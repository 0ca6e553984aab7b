import { getToday } from '../../../lib/format';
import { useSites } from '../../../lib/places';

/** Today's date at the site, `YYYY-MM-DD`; the device's while the site is unknown. */
export function useToday(siteId: number | undefined): string {
  const site = useSites().data?.items.find(({ id }) => id === siteId);
  return getToday(new Date(), site?.timeZone);
}
