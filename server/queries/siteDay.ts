import type { Transaction } from 'sequelize';
import { Site } from '../models/Site';

/** The date on the wall at the site, YYYY-MM-DD. */
export function dayInZone(at: Date, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(at);
}

export async function findToday(siteId: number, at: Date, transaction?: Transaction): Promise<string> {
  const site = await Site.findByPk(siteId, transaction ? { transaction } : {});
  return dayInZone(at, site?.timeZone ?? 'UTC');
}
