import type { Transaction } from 'sequelize';
import type { LabelData, QrLevel } from '../../labels';
import { describeSling } from '../../shared/domain/slings/describe';
import { formatLoad, LOAD_UNITS, type LoadUnit } from '../../shared/domain/units/units';
import type { LabelRun as LabelRunView } from '../../shared/schemas/labels';
import type { SessionUser } from '../../shared/schemas/people';
import { NotFoundError } from '../errors';
import { LabelRun } from '../models/LabelRun';
import { Site } from '../models/Site';
import { SlingRecord } from '../models/SlingRecord';
import { Tag } from '../models/Tag';
import { kindAndSpecOf } from './lifecycleFacts';

/** @throws NotFoundError when the run holds a sling of a site where this person doesn't work */
export async function getLabelRun(user: SessionUser, id: number): Promise<LabelRun> {
  const run = await LabelRun.findByPk(id);
  if (!run) throw new NotFoundError('run of labels');
  const tags = await Tag.findAll({ attributes: ['slingId'], where: { runId: id } });
  const slings = await SlingRecord.findAll({
    attributes: ['siteId'],
    where: { id: tags.map((tag) => tag.slingId) },
    group: ['siteId'],
  });
  if (!slings.every((sling) => user.siteIds.includes(sling.siteId))) throw new NotFoundError('run of labels');
  return run;
}

async function loadTags(
  runId: number,
  transaction?: Transaction,
): Promise<{ tag: Tag; sling: SlingRecord }[]> {
  const options = transaction ? { transaction } : {};
  const tags = await Tag.findAll({ where: { runId }, order: [['runPosition', 'ASC']], ...options });
  const slings = await SlingRecord.findAll({ where: { id: tags.map((tag) => tag.slingId) }, ...options });
  const byId = new Map(slings.map((sling) => [sling.id, sling]));
  return tags.flatMap((tag) => {
    const sling = byId.get(tag.slingId);
    return sling ? [{ tag, sling }] : [];
  });
}

export async function presentLabelRun(run: LabelRun, transaction?: Transaction): Promise<LabelRunView> {
  const tags = await loadTags(run.id, transaction);
  return {
    id: run.id,
    stock: run.stock,
    startAt: run.startAt,
    createdAt: run.createdAt.toISOString(),
    createdBy: run.createdByName,
    tags: tags.map(({ tag, sling }) => ({
      slingId: sling.id,
      code: tag.code,
      number: sling.number,
      status: tag.status,
    })),
    warnings: run.warnings,
  };
}

/** What stands on each label of the run that is not void, in the order of the run. */
export async function loadLabelData(run: LabelRun): Promise<LabelData[]> {
  const tags = (await loadTags(run.id)).filter(({ tag }) => tag.status !== 'void');
  const sites = await Site.findAll({ where: { id: [...new Set(tags.map(({ sling }) => sling.siteId))] } });
  const names = new Map(sites.map((site) => [site.id, site.name]));
  return tags.map(({ tag, sling }) => ({
    code: tag.code,
    payload: tag.payload,
    level: tag.qrLevel as QrLevel,
    version: tag.qrVersion,
    mask: tag.qrMask,
    number: sling.number,
    kindName: describeSling({ ...kindAndSpecOf(sling), legs: sling.legs }),
    loads: listLoads(sling),
    company: names.get(sling.siteId) ?? '',
  }));
}

/** Rated loads in the unit in which the vertical one was typed from the maker's tag. */
function listLoads(sling: SlingRecord): LabelData['loads'] {
  const entered = sling.enteredUnits['ratedLoads.verticalKg'];
  const unit: LoadUnit = LOAD_UNITS.find((known) => known === entered) ?? 'kg';
  const loads: [string, string | null][] = [
    ['Vertical', sling.verticalKg],
    ['Choker', sling.chokerKg],
    ['Basket', sling.basketKg],
  ];
  if (sling.bridleAngleDeg !== null) {
    loads.push([`Bridle ${Number(sling.bridleAngleDeg)}°`, sling.bridleKg]);
  }
  return loads.flatMap(([label, kg]) => (kg === null ? [] : [{ label, text: formatLoad(Number(kg), unit) }]));
}
