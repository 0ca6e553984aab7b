import type { Transaction } from 'sequelize';
import { Site } from '../models/Site';

/** Making one costs more than using it, and each request asks. */
const calendars = new Map<string, Intl.DateTimeFormat>();

/** The date on the wall at the site, YYYY-MM-DD. */
export function dayInZone(at: Date, timeZone: string): string {
  let calendar = calendars.get(timeZone);
  if (!calendar) {
    calendar = new Intl.DateTimeFormat('en-CA', {
      timeZone,
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
    });
    calendars.set(timeZone, calendar);
  }
  return calendar.format(at);
}

export async function findToday(siteId: number, at: Date, transaction?: Transaction): Promise<string> {
  const site = await Site.findByPk(siteId, transaction ? { transaction } : {});
  return dayInZone(at, site?.timeZone ?? 'UTC');
}
