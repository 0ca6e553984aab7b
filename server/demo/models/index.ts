import { CHAIN_MODELS } from './chain';
import type { SlingModel } from './model';
import { FIBRE_ROPE_MODELS, ROUND_MODELS, WEB_MODELS } from './textile';
import { MESH_MODELS, WIRE_ROPE_MODELS } from './wireRopeAndMesh';

export type { SlingModel } from './model';

/** Everything on the racks of Marram Quay: 420 slings of all six kinds. */
export const SLING_MODELS: readonly SlingModel[] = [
  ...CHAIN_MODELS,
  ...WEB_MODELS,
  ...ROUND_MODELS,
  ...WIRE_ROPE_MODELS,
  ...MESH_MODELS,
  ...FIBRE_ROPE_MODELS,
];
