/** Days before the due date from which it is shown as due soon (common practice, no source). */
export const SOON_DAYS = 30;
/** Chain: never more than 12 months, 29 CFR 1910.184(e)(3)(i); the others yearly in normal service, ASME B30.9. */
export const DEFAULT_INTERVAL_MONTHS = 12;

export const DUE_STATES = ['overdue', 'soon', 'ok'] as const;
export type DueState = (typeof DUE_STATES)[number];

/**
 * The day on which the next complete inspection is due: calendar months later, clamped to the month's last day.
 * @param lastPassedOn YYYY-MM-DD
 * @throws RangeError for what is not a date
 */
export function nextDueOn(lastPassedOn: string, months: number = DEFAULT_INTERVAL_MONTHS): string {
  const [year, month, day] = parseDate(lastPassedOn);
  const lastOfMonth = new Date(Date.UTC(year, month - 1 + months + 1, 0));
  return formatDate(new Date(lastOfMonth.setUTCDate(Math.min(day, lastOfMonth.getUTCDate()))));
}

/**
 * How near the due date is. On the day itself it is `soon`, not yet `overdue`: the interval is kept when the inspection
 * is done that day (worked example ex-due-osha-chain). It may not be used on that day all the same: see `listMayNotUse`.
 * @param today the site's date, YYYY-MM-DD
 */
export function dueState(nextDue: string, today: string): DueState {
  if (nextDue < today) return 'overdue';
  const [year, month, day] = parseDate(today);
  const soonUntil = formatDate(new Date(Date.UTC(year, month - 1, day + SOON_DAYS)));
  return nextDue <= soonUntil ? 'soon' : 'ok';
}

function parseDate(date: string): [year: number, month: number, day: number] {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date);
  const [year, month, day] = match ? match.slice(1).map(Number) : [];
  if (year === undefined || month === undefined || day === undefined)
    throw new RangeError(`not a date: ${date}`);
  if (formatDate(new Date(Date.UTC(year, month - 1, day))) !== date)
    throw new RangeError(`not a date: ${date}`);
  return [year, month, day];
}

const formatDate = (date: Date): string => date.toISOString().slice(0, 10);
