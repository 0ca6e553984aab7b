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

/** What each order sorts by; the id breaks ties. Null due dates (never inspected) come last. */
const SORTS: Record<SlingsQuery['sort'], SortFacts> = {
  number: { column: 's.number', direction: 'ASC', valueOf: (row) => row.number },
  '-number': { column: 's.number', direction: 'DESC', valueOf: (row) => row.number },
  nextDueOn: {
    column: "COALESCE(s.next_due_on, '9999-12-31')",
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

/** A page of the register, by key: the cursor names the last row, so pages never shift under a reader. */
export async function listSlings(
  sequelize: Sequelize,
  siteIds: readonly number[],
  query: SlingsQuery,
  at: Date,
): Promise<{ rows: SummaryRow[]; nextCursor: string | null }> {
  const sites = query.siteId === undefined ? siteIds : siteIds.filter((id) => id === query.siteId);
  if (sites.length === 0) return { rows: [], nextCursor: null };
  const sort = SORTS[query.sort];
  const where: Where = { sql: ['s.site_id IN (?)'], values: [sites] };
  addFilters(where, query);
  await addDueFilter(where, query, sites, at);
  addSearch(where, query.q);
  addCursor(where, sort, query.cursor);
  const rows = await sequelize.query<SummaryRow>(
    `SELECT ${SUMMARY_COLUMNS} FROM slings s ${SUMMARY_JOINS}
     WHERE ${where.sql.join(' AND ')}
     ORDER BY ${sort.column} ${sort.direction}, s.id ${sort.direction} LIMIT ?`,
    { replacements: [...where.values, query.limit + 1], type: QueryTypes.SELECT },
  );
  const page = rows.slice(0, query.limit);
  const last = page.at(-1);
  return { rows: page, nextCursor: rows.length > query.limit && last ? writeCursor(sort, last) : null };
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
  if (query.label === 'live') add('tl.code IS NOT NULL');
  if (query.label === 'printed') add('tp.code IS NOT NULL');
  if (query.label === 'none') {
    add('tl.code IS NULL AND tp.code IS NULL');
    // One that is gone needs no label any more.
    if (!query.state) add("s.state NOT IN ('destroyed', 'departed')");
  }
}

/** "Today" differs by site: sites whose calendars agree share one condition. */
async function addDueFilter(
  where: Where,
  query: SlingsQuery,
  siteIds: readonly number[],
  at: Date,
): Promise<void> {
  if (!query.due) return;
  const sites = await Site.findAll({ where: { id: [...siteIds] } });
  const byDay = new Map<string, number[]>();
  for (const site of sites) {
    const day = dayInZone(at, site.timeZone);
    byDay.set(day, [...(byDay.get(day) ?? []), site.id]);
  }
  const range = {
    overdue: 's.next_due_on < ?',
    soon: `s.next_due_on BETWEEN ? AND DATE_ADD(?, INTERVAL ${SOON_DAYS} DAY)`,
    ok: `s.next_due_on > DATE_ADD(?, INTERVAL ${SOON_DAYS} DAY)`,
  }[query.due];
  const parts: string[] = [];
  for (const [day, ids] of byDay) {
    parts.push(`(s.site_id IN (?) AND ${range})`);
    where.values.push(ids, ...Array.from({ length: range.split('?').length - 1 }, () => day));
  }
  where.sql.push(`(${parts.join(' OR ')})`);
}

/** How many finds of each kind a search looks at: whoever finds more types another character. */
const SEARCH_LIMIT = 1000;

const WORD_COLUMNS = 'number, maker_serial, stock_number, lot, maker';

/** By the beginning of number, serial or lot, by whole words in any of them, or by tag code. */
function addSearch(where: Where, q: string | undefined): void {
  const text = q?.trim();
  if (!text) return;
  const prefix = `${text.replace(/[\\%_]/g, '\\$&')}%`;
  const parts = ['number', 'maker_serial', 'lot', 'maker'].map(
    (column) => `(SELECT id FROM slings WHERE ${column} LIKE ? LIMIT ${SEARCH_LIMIT})`,
  );
  where.values.push(prefix, prefix, prefix, prefix);
  const words = text.match(/[\p{L}\p{N}]+/gu) ?? [];
  const long = words.filter((word) => word.length >= 3);
  if (long.length > 0) {
    // The index holds no word under three letters: those are looked for in what it finds.
    const short = words.filter((word) => word.length < 3);
    const begins = short.map(() => ` AND CONCAT_WS(' ', ${WORD_COLUMNS}) REGEXP ?`).join('');
    parts.push(
      `(SELECT id FROM slings WHERE MATCH (${WORD_COLUMNS}) AGAINST (? IN BOOLEAN MODE)${begins} LIMIT ${SEARCH_LIMIT})`,
    );
    where.values.push(
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
    parts.push(`(SELECT sling_id FROM tags WHERE code LIKE ? LIMIT ${SEARCH_LIMIT})`);
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
