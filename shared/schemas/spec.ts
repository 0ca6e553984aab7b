import { z } from 'zod';
import {
  CHAIN_GRADES,
  MESH_DUTIES,
  ROPE_CONSTRUCTIONS,
  ROPE_CORES,
  ROPE_FERRULES,
  ROPE_GRADES,
  ROPE_SPLICES,
  ROUND_FIBRES,
  WEB_FIBRES,
  WEB_TYPES,
  type KindAndSpec,
} from '../domain/slings/spec';
import { LENGTH_UNITS, LOAD_UNITS } from '../domain/units/units';
import { requiredText, text } from './common';

/** Diameters, wires and widths: far above any sling made, so that a slip of the unit is caught. */
const sizeMm = (max: number) =>
  z.number().positive('More than zero.').max(max, `At most ${max} mm: check the unit.`);

export const chainSpecSchema = z.strictObject({
  grade: z.literal(CHAIN_GRADES),
  chainMm: sizeMm(100),
  endless: z.boolean().optional(),
});
export const wireRopeSpecSchema = z.strictObject({
  construction: z.enum(ROPE_CONSTRUCTIONS),
  className: requiredText(20),
  diameterMm: sizeMm(300),
  core: z.enum(ROPE_CORES),
  ropeGrade: z.enum(ROPE_GRADES),
  splice: z.enum(ROPE_SPLICES),
  ferrule: z.enum(ROPE_FERRULES).optional(),
});
export const meshSpecSchema = z.strictObject({
  duty: z.enum(MESH_DUTIES),
  widthMm: sizeMm(2000),
  wireMm: sizeMm(20),
  coated: z.boolean().optional(),
});
export const webSpecSchema = z.strictObject({
  fibre: z.enum(WEB_FIBRES),
  widthMm: sizeMm(2000),
  plies: z.number().int('A whole number.').min(1, 'At least one.').max(12, 'At most twelve.'),
  type: z.enum(WEB_TYPES),
});
export const roundSpecSchema = z.strictObject({ fibre: z.enum(ROUND_FIBRES), size: text(20).optional() });
export const fibreRopeSpecSchema = z.strictObject({ fibre: z.enum(WEB_FIBRES), diameterMm: sizeMm(300) });

/** `kind` decides which spec belongs to it. */
export const kindAndSpecSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('alloy-chain'), spec: chainSpecSchema }),
  z.object({ kind: z.literal('wire-rope'), spec: wireRopeSpecSchema }),
  z.object({ kind: z.literal('metal-mesh'), spec: meshSpecSchema }),
  z.object({ kind: z.literal('synthetic-web'), spec: webSpecSchema }),
  z.object({ kind: z.literal('synthetic-round'), spec: roundSpecSchema }),
  z.object({ kind: z.literal('synthetic-rope'), spec: fibreRopeSpecSchema }),
]) satisfies z.ZodType<KindAndSpec>;

/** Field path → unit it was typed in, such as {"ratedLoads.verticalKg": "lb"}. */
export const enteredUnitsSchema = z.record(z.string().max(60), z.enum([...LOAD_UNITS, ...LENGTH_UNITS]));
export type EnteredUnits = z.infer<typeof enteredUnitsSchema>;
