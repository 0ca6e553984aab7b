const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;
const DAY_MS = 86_400_000;

/** "12 Mar 2026" from `YYYY-MM-DD`. Own month names: browsers disagree on "Sep" and "Sept". */
export function formatDate(date: string): string {
  const [year, month, day] = date.slice(0, 10).split('-').map(Number);
  const name = MONTHS[(month ?? 0) - 1];
  return name && day ? `${day} ${name} ${year}` : date;
}

/** Whole days from `from` to `to`, both `YYYY-MM-DD`; negative when `to` is earlier. */
export function countDays(from: string, to: string): number {
  return Math.round(
    (Date.parse(`${to.slice(0, 10)}T00:00Z`) - Date.parse(`${from.slice(0, 10)}T00:00Z`)) / DAY_MS,
  );
}

/** The calendar day here, `YYYY-MM-DD`. */
export function getToday(now: Date = new Date(), timeZone?: string): string {
  const p = readParts(now, timeZone);
  return `${p.year}-${String(p.month).padStart(2, '0')}-${String(p.day).padStart(2, '0')}`;
}

/** "12 Mar 2026, in 9 days", "…, today", "…, 3 days ago". */
export function formatDateWithDistance(date: string, today: string = getToday()): string {
  return `${formatDate(date)}, ${formatDistance(countDays(today, date))}`;
}

function formatDistance(days: number): string {
  if (days === 0) return 'today';
  if (days === 1) return 'tomorrow';
  if (days === -1) return 'yesterday';
  return days > 0 ? `in ${days} days` : `${-days} days ago`;
}

/** "12 Mar 2026, 14:05" from an instant, in the site's zone where given, else the device's. */
export function formatDateTime(instant: string, timeZone?: string): string {
  const p = readParts(new Date(instant), timeZone);
  return `${p.day} ${MONTHS[p.month - 1] ?? ''} ${p.year}, ${p.hour}:${p.minute}`;
}

/** "12 Mar, 14:05" for tables whose year is plain; with the year when it isn't this one. */
export function formatShortTime(instant: string, now: Date = new Date(), timeZone?: string): string {
  const p = readParts(new Date(instant), timeZone);
  const year = p.year === readParts(now, timeZone).year ? '' : ` ${p.year}`;
  return `${p.day} ${MONTHS[p.month - 1] ?? ''}${year}, ${p.hour}:${p.minute}`;
}

/** "3 Nov" or "3 Nov 2025": a day in running text. */
export function formatDay(instant: string, now: Date = new Date(), timeZone?: string): string {
  const p = readParts(new Date(instant), timeZone);
  const year = p.year === readParts(now, timeZone).year ? '' : ` ${p.year}`;
  return `${p.day} ${MONTHS[p.month - 1] ?? ''}${year}`;
}

/** How long since: "12 min", "5 h", "28 days". */
export function formatAge(since: string, now: Date = new Date()): string {
  const minutes = Math.max(0, Math.floor((now.getTime() - Date.parse(since)) / 60_000));
  if (minutes < 60) return `${minutes} min`;
  const hours = Math.floor(minutes / 60);
  if (hours < 48) return `${hours} h`;
  return `${Math.floor(hours / 24)} days`;
}

/** Tag code in its groups, `XXXX-XXX-XXX`; any other length is given back as it is. */
export function formatTagCode(code: string): string {
  const bare = code.replace(/[\s-]/g, '').toUpperCase();
  return bare.length === 10 ? `${bare.slice(0, 4)}-${bare.slice(4, 7)}-${bare.slice(7)}` : code;
}

/** "1 sling", "2 slings"; give the plural where it isn't made with s. */
export function formatCount(count: number, one: string, many = `${one}s`): string {
  return `${count.toLocaleString('en-GB')} ${count === 1 ? one : many}`;
}

/**
 * A number as people type it, or null. A comma is a thousands mark only where it stands as one ("3,150"); otherwise it
 * is read as a decimal mark ("3,5").
 */
export function parseTypedNumber(text: string): number | null {
  const bare = text.trim().replace(/[\s\u00a0]/g, '');
  if (/^\d{1,3}(,\d{3})+(\.\d+)?$/.test(bare)) return Number(bare.replaceAll(',', ''));
  if (/^\d+([.,]\d+)?$/.test(bare)) return Number(bare.replace(',', '.'));
  return null;
}

interface Parts {
  year: number;
  month: number;
  day: number;
  hour: string;
  minute: string;
}

function readParts(at: Date, timeZone?: string): Parts {
  const found = new Map(
    new Intl.DateTimeFormat('en-GB', {
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
      ...(timeZone ? { timeZone } : {}),
    })
      .formatToParts(at)
      .map((part) => [part.type, part.value] as const),
  );
  return {
    year: Number(found.get('year')),
    month: Number(found.get('month')),
    day: Number(found.get('day')),
    hour: found.get('hour') ?? '',
    minute: found.get('minute') ?? '',
  };
}
