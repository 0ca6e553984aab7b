import { QueryTypes, type Sequelize } from 'sequelize';
import type { SlingsQuery } from '../../shared/schemas/slings';
import { SOON_DAYS } from '../../shared/domain/inspection/due';
import { AppError } from '../errors';
import { Site } from '../models/Site';
import { dayInZone } from './siteDay';
import { SUMMARY_COLUMNS, SUMMARY_JOINS, type SummaryRow } from './slingSummary';

interface SortFacts {
  column: string;
  direction: 'ASC' | 'DESC';
  valueOf: (row: SummaryRow) => string | null;
}

/** What each order sorts by, each with an index of its site; the id breaks ties. Never inspected ones come last. */
const SORTS: Record<SlingsQuery['sort'], SortFacts> = {
  number: { column: 's.number', direction: 'ASC', valueOf: (row) => row.number },
  '-number': { column: 's.number', direction: 'DESC', valueOf: (row) => row.number },
  nextDueOn: {
    column: 's.due_sort_on',
    direction: 'ASC',
    valueOf: (row) => row.nextDueOn ?? '9999-12-31',
  },
  stateSince: { column: 's.state_since', direction: 'ASC', valueOf: (row) => toSqlTime(row.stateSince) },
  '-createdAt': { column: 's.id', direction: 'DESC', valueOf: (row) => String(row.id) },
};

const toSqlTime = (at: Date): string => at.toISOString().replace('T', ' ').replace('Z', '');

interface Where {
  sql: string[];
  values: unknown[];
}

/**
 * A page of the register, by key: the cursor names the last row, so pages never shift under a reader. Each site is
 * read on its own along its index and the pages are merged: one query over several sites would sort them whole.
 */
export async function listSlings(
  sequelize: Sequelize,
  siteIds: readonly number[],
  query: SlingsQuery,
  at: Date,
): Promise<{ rows: SummaryRow[]; nextCursor: string | null }> {
  const ids = query.siteId === undefined ? siteIds : siteIds.filter((id) => id === query.siteId);
  const sites = await Site.findAll({ attributes: ['id', 'timeZone'], where: { id: [...ids] } });
  if (sites.length === 0) return { rows: [], nextCursor: null };
  const sort = SORTS[query.sort];
  const order = `ORDER BY ${sort.column} ${sort.direction}, s.id ${sort.direction} LIMIT ?`;
  const take = query.limit + 1;
  const branches = sites.map((site) => {
    const where = describeSite(site, query, sort, at);
    return {
      sql: `(SELECT s.id FROM slings s WHERE ${where.sql.join(' AND ')} ${order})`,
      values: [...where.values, take],
    };
  });
  const rows = await sequelize.query<SummaryRow>(
    `SELECT ${SUMMARY_COLUMNS} FROM (${branches.map(({ sql }) => sql).join(' UNION ALL ')}) page
     JOIN slings s ON s.id = page.id ${SUMMARY_JOINS} ${order}`,
    { replacements: [...branches.flatMap(({ values }) => values), take], type: QueryTypes.SELECT },
  );
  const page = rows.slice(0, query.limit);
  const last = page.at(-1);
  return { rows: page, nextCursor: rows.length > query.limit && last ? writeCursor(sort, last) : null };
}

function describeSite(site: Site, query: SlingsQuery, sort: SortFacts, at: Date): Where {
  const where: Where = { sql: ['s.site_id = ?'], values: [site.id] };
  addFilters(where, query);
  addDueFilter(where, query, dayInZone(at, site.timeZone));
  addSearch(where, query.q, site.id);
  addCursor(where, sort, query.cursor);
  return where;
}

function addFilters(where: Where, query: SlingsQuery): void {
  const add = (sql: string, ...values: unknown[]): void => {
    where.sql.push(sql);
    where.values.push(...values);
  };
  if (query.state) add('s.state = ?', query.state);
  if (query.kind) add('s.kind = ?', query.kind);
  if (query.custody) add('s.custody_kind = ?', query.custody);
  if (query.secured === 'true') add("s.custody_kind = 'cage'");
  if (query.secured === 'false') add("s.custody_kind <> 'cage'");
  if (query.condemned) add('s.condemned = ?', query.condemned === 'true');
  // Looked up row by row along the order's index: with EXISTS, MariaDB reads all labels first.
  const live = '(SELECT code FROM tags WHERE live_key = s.id)';
  const printed = '(SELECT code FROM tags WHERE printed_key = s.id)';
  if (query.label === 'live') add(`${live} IS NOT NULL`);
  if (query.label === 'printed') add('s.id IN (SELECT printed_key FROM tags)');
  if (query.label === 'none') {
    add(`${live} IS NULL AND ${printed} IS NULL`);
    // One that is gone needs no label any more.
    if (!query.state) add("s.state NOT IN ('destroyed', 'departed')");
  }
}

/** @param today the site's own date */
function addDueFilter(where: Where, { due }: SlingsQuery, today: string): void {
  if (!due) return;
  const soonUntil = `DATE_ADD(?, INTERVAL ${SOON_DAYS} DAY)`;
  const ranges = {
    overdue: 's.due_sort_on < ?',
    soon: `s.due_sort_on >= ? AND s.due_sort_on <= ${soonUntil}`,
    ok: `s.due_sort_on > ${soonUntil} AND s.next_due_on IS NOT NULL`,
  };
  where.sql.push(ranges[due]);
  where.values.push(...(due === 'soon' ? [today, today] : [today]));
}

const WORD_COLUMNS = 'number, maker_serial, stock_number, lot, maker';

/** By the beginning of number, serial, lot or maker, by words that begin so in any of them, or by tag code. */
function addSearch(where: Where, q: string | undefined, siteId: number): void {
  const text = q?.trim();
  if (!text) return;
  const parts: string[] = [];
  const find = (condition: string, ...values: string[]): void => {
    parts.push(`SELECT id FROM slings WHERE site_id = ? AND ${condition}`);
    where.values.push(siteId, ...values);
  };
  const prefix = `${text.replace(/[\\%_]/g, '\\$&')}%`;
  for (const column of ['number', 'maker_serial', 'lot', 'maker']) find(`${column} LIKE ?`, prefix);
  const words = text.match(/[\p{L}\p{N}]+/gu) ?? [];
  const long = words.filter((word) => word.length >= 3);
  if (long.length > 0) {
    // The index holds no word under three letters: those are looked for in what it finds.
    const short = words.filter((word) => word.length < 3);
    find(
      `MATCH (${WORD_COLUMNS}) AGAINST (? IN BOOLEAN MODE)` +
        short.map(() => ` AND CONCAT_WS(' ', ${WORD_COLUMNS}) REGEXP ?`).join(''),
      long.map((word) => `+${word}*`).join(' '),
      ...short.map((word) => `(^|[^\\p{L}\\p{N}])${word}`),
    );
  }
  const code = text
    .toUpperCase()
    .replace(/[^0-9A-Z]/g, '')
    .replaceAll('O', '0')
    .replace(/[IL]/g, '1');
  if (code.length >= 4) {
    parts.push('SELECT sling_id FROM tags WHERE code LIKE ?');
    where.values.push(`${code}%`);
  }
  where.sql.push(`s.id IN (SELECT id FROM (${parts.join(' UNION ')}) AS hits)`);
}

function addCursor(where: Where, sort: SortFacts, cursor: string | undefined): void {
  if (cursor === undefined) return;
  const { value, id } = readCursor(cursor);
  const sign = sort.direction === 'ASC' ? '>' : '<';
  where.sql.push(`(${sort.column} ${sign} ? OR (${sort.column} = ? AND s.id ${sign} ?))`);
  where.values.push(value, value, id);
}

function writeCursor(sort: SortFacts, row: SummaryRow): string {
  return Buffer.from(JSON.stringify([sort.valueOf(row), row.id])).toString('base64url');
}

/** @throws AppError 400 for a cursor that this list did not give */
function readCursor(cursor: string): { value: string; id: number } {
  try {
    const parsed: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString());
    if (Array.isArray(parsed) && typeof parsed[0] === 'string' && typeof parsed[1] === 'number') {
      return { value: parsed[0], id: parsed[1] };
    }
  } catch {
    // Falls through to the refusal below: a made-up cursor and a cut-off one look alike.
  }
  throw new AppError('malformed', 'The cursor is not one of this list.');
}
