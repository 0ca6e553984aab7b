/** All zones that the browser knows, the device's own among them. */
export function listTimeZones(): string[] {
  const own = findOwnTimeZone();
  const known = Intl.supportedValuesOf('timeZone');
  return known.includes(own) ? known : [own, ...known];
}

export const findOwnTimeZone = (): string => new Intl.DateTimeFormat().resolvedOptions().timeZone;
