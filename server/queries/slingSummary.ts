import { Op, QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { dueState } from '../../shared/domain/inspection/due';
import { listMayNotUse } from '../../shared/domain/lifecycle/mayUse';
import type { HoldReason } from '../../shared/domain/lifecycle/reasons';
import type { CustodyKind, SlingState } from '../../shared/domain/lifecycle/states';
import type { MakersTag, SlingKind } from '../../shared/domain/slings/kinds';
import type { KindAndSpec, RatedLoads, SpecByKind } from '../../shared/domain/slings/spec';
import type { SlingSummary } from '../../shared/schemas/slings';
import { HoldReasonRow } from '../models/HoldReasonRow';
import { Site } from '../models/Site';
import { dayInZone } from './siteDay';

export interface SummaryRow {
  id: number;
  number: string;
  kind: SlingKind;
  spec: SpecByKind[SlingKind];
  maker: string;
  makerSerial: string | null;
  siteId: number;
  legs: number;
  reachMm: string;
  verticalKg: string;
  chokerKg: string | null;
  basketKg: string | null;
  bridleKg: string | null;
  bridleAngleDeg: string | null;
  state: SlingState;
  condemned: boolean | number;
  stateSince: Date;
  makersTag: MakersTag;
  custodyKind: CustodyKind;
  custodyLocationId: number | null;
  custodyLocationName: string | null;
  custodySince: Date;
  nextDueOn: string | null;
  discardOn: string | null;
  offHireOn: string | null;
  ledgerCount: number;
  liveCode: string | null;
  printedCode: string | null;
}

/** The columns of a summary, over `slings s` and the joins below. */
export const SUMMARY_COLUMNS = `s.id, s.number, s.kind, s.spec, s.maker, s.maker_serial AS makerSerial,
  s.site_id AS siteId, s.legs, s.reach_mm AS reachMm, s.vertical_kg AS verticalKg, s.choker_kg AS chokerKg,
  s.basket_kg AS basketKg, s.bridle_kg AS bridleKg, s.bridle_angle_deg AS bridleAngleDeg, s.state, s.condemned,
  s.state_since AS stateSince, s.makers_tag AS makersTag, s.custody_kind AS custodyKind,
  s.custody_location_id AS custodyLocationId, cl.name AS custodyLocationName, s.custody_since AS custodySince,
  s.next_due_on AS nextDueOn, s.discard_on AS discardOn, s.off_hire_on AS offHireOn,
  s.ledger_count AS ledgerCount, tl.code AS liveCode, tp.code AS printedCode`;

export const SUMMARY_JOINS = `LEFT JOIN locations cl ON cl.id = s.custody_location_id
  LEFT JOIN tags tl ON tl.live_key = s.id
  LEFT JOIN tags tp ON tp.printed_key = s.id`;

export async function findSummary(
  sequelize: Sequelize,
  id: number,
  transaction?: Transaction,
): Promise<SummaryRow | null> {
  const [row] = await sequelize.query<SummaryRow>(
    `SELECT ${SUMMARY_COLUMNS} FROM slings s ${SUMMARY_JOINS} WHERE s.id = ?`,
    { replacements: [id], type: QueryTypes.SELECT, ...(transaction ? { transaction } : {}) },
  );
  return row ?? null;
}

/** Today's date at each of these sites. */
export async function findToday(
  siteIds: readonly number[],
  at: Date,
  transaction?: Transaction,
): Promise<Map<number, string>> {
  const sites = await Site.findAll({
    attributes: ['id', 'timeZone'],
    where: { id: [...new Set(siteIds)] },
    ...(transaction ? { transaction } : {}),
  });
  return new Map(sites.map((site) => [site.id, dayInZone(at, site.timeZone)]));
}

/** Turns rows of the register into what the API sends, with two more queries however many rows there are. */
export async function presentSummaries(rows: readonly SummaryRow[], at: Date): Promise<SlingSummary[]> {
  if (rows.length === 0) return [];
  const [days, reasons] = await Promise.all([
    findToday(
      rows.map((row) => row.siteId),
      at,
    ),
    HoldReasonRow.findAll({
      attributes: ['slingId', 'code'],
      where: { slingId: { [Op.in]: rows.map((row) => row.id) }, clearedAt: null },
      order: [['id', 'ASC']],
    }),
  ]);
  const codes = new Map<number, HoldReason[]>();
  for (const { slingId, code } of reasons) codes.set(slingId, [...(codes.get(slingId) ?? []), code]);
  return rows.map((row) =>
    presentSummary(row, days.get(row.siteId) ?? dayInZone(at, 'UTC'), codes.get(row.id) ?? []),
  );
}

export function presentSummary(row: SummaryRow, today: string, openReasonCodes: HoldReason[]): SlingSummary {
  const condemned = Boolean(row.condemned);
  const mayNotUse = listMayNotUse(
    {
      state: row.state,
      condemned,
      hasLiveLabel: row.liveCode !== null,
      makersTag: row.makersTag,
      nextDueOn: row.nextDueOn,
      discardOn: row.discardOn,
      offHireOn: row.offHireOn,
    },
    today,
  );
  return {
    ...({ kind: row.kind, spec: row.spec } as KindAndSpec),
    id: row.id,
    number: row.number,
    maker: row.maker,
    ...(row.makerSerial === null ? {} : { makerSerial: row.makerSerial }),
    siteId: row.siteId,
    legs: row.legs,
    reachMm: Number(row.reachMm),
    ratedLoads: presentRatedLoads(row),
    state: row.state,
    condemned,
    mayUse: mayNotUse.length === 0,
    mayNotUse,
    custody: {
      kind: row.custodyKind,
      ...(row.custodyLocationId === null ? {} : { locationId: row.custodyLocationId }),
      ...(row.custodyLocationName === null ? {} : { locationName: row.custodyLocationName }),
      since: row.custodySince.toISOString(),
    },
    tag: presentTag(row),
    nextDueOn: row.nextDueOn,
    due: row.nextDueOn === null ? null : dueState(row.nextDueOn, today),
    stateSince: row.stateSince.toISOString(),
    openReasonCodes,
    version: row.ledgerCount,
  };
}

/** The live label, or the printed one that waits to be confirmed. */
function presentTag({ liveCode, printedCode }: SummaryRow): SlingSummary['tag'] {
  if (liveCode !== null) return { code: liveCode, status: 'live' };
  return printedCode === null ? null : { code: printedCode, status: 'printed' };
}

export function presentRatedLoads(
  row: Pick<SummaryRow, 'verticalKg' | 'chokerKg' | 'basketKg' | 'bridleKg' | 'bridleAngleDeg'>,
): RatedLoads {
  return {
    verticalKg: Number(row.verticalKg),
    ...(row.chokerKg === null ? {} : { chokerKg: Number(row.chokerKg) }),
    ...(row.basketKg === null ? {} : { basketKg: Number(row.basketKg) }),
    ...(row.bridleKg === null || row.bridleAngleDeg === null
      ? {}
      : { bridle: { kg: Number(row.bridleKg), angleDeg: Number(row.bridleAngleDeg) } }),
  };
}
