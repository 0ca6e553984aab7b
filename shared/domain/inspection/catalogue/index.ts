import type { SlingKind } from '../../slings/kinds';
import type { Criterion } from '../criterion';
import { CHAIN_CRITERIA } from './chain';
import { COMMON_CRITERIA } from './common';
import { FIBRE_ROPE_CRITERIA } from './fibreRope';
import { FITTING_CRITERIA } from './fittings';
import { MESH_CRITERIA } from './mesh';
import { ROUND_CRITERIA } from './round';
import { WEB_CRITERIA } from './web';
import { WIRE_ROPE_CRITERIA } from './wireRope';

/** Every criterion, in the order in which a sling is looked at: body, fittings, maker's tag and the rest. */
export const CATALOGUE: readonly Criterion[] = [
  ...CHAIN_CRITERIA,
  ...WIRE_ROPE_CRITERIA,
  ...MESH_CRITERIA,
  ...WEB_CRITERIA,
  ...ROUND_CRITERIA,
  ...FIBRE_ROPE_CRITERIA,
  ...FITTING_CRITERIA,
  ...COMMON_CRITERIA,
];

const byId = new Map(CATALOGUE.map((criterion) => [criterion.id, criterion]));

export function findCriterion(id: string): Criterion | null {
  return byId.get(id) ?? null;
}

export function listCriteria(kind: SlingKind): Criterion[] {
  return CATALOGUE.filter(({ kinds }) => kinds.includes(kind));
}
