import { z } from 'zod';

const sizeMm = z.number().positive().max(500);

/** Where the labels stand on a cut sheet. */
export const sheetGeometry = z.object({
  page: z.enum(['A4', 'Letter']),
  pageWidthMm: sizeMm,
  pageHeightMm: sizeMm,
  columns: z.int().min(1).max(20),
  rows: z.int().min(1).max(40),
  marginLeftMm: z.number().min(0),
  marginTopMm: z.number().min(0),
  gapAcrossMm: z.number().min(0),
  gapDownMm: z.number().min(0),
});
export type SheetGeometry = z.infer<typeof sheetGeometry>;

/**
 * A kind of blank label and the printer it is for. `moduleDots` is how many printer dots one module of the code
 * takes: always whole ones, so that no edge falls between dots.
 */
export const labelStock = z.object({
  id: z.string().regex(/^[a-z0-9-]+$/),
  name: z.string().min(1),
  /** `flat`: tags and flat bodies. `round`: rope tags and thin sleeves, where a larger code wraps out of sight. */
  use: z.enum(['flat', 'round']),
  /** `single` and `roll`: one label a page. `sheet`: many on a page. */
  kind: z.enum(['single', 'sheet', 'roll']),
  widthMm: sizeMm,
  heightMm: sizeMm,
  /** The printer's dots per inch. */
  dpi: z.union([z.literal(203), z.literal(300), z.literal(600)]),
  moduleDots: z.int().min(2).max(40),
  /** Side of the code with its quiet zone at the pinned version. */
  qrMm: sizeMm,
  sheet: sheetGeometry.nullable(),
});
export type LabelStock = z.infer<typeof labelStock>;
export type PrinterDpi = LabelStock['dpi'];
