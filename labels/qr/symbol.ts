import QRCode from 'qrcode';
import { z } from 'zod';

/** How the code of one label is drawn. Chosen once when the tag is issued and kept with it, so that every print is alike. */
export const qrSymbol = z.object({
  level: z.enum(['Q', 'H']),
  version: z.int().min(1).max(40),
  mask: z.int().min(0).max(7),
});
export type QrSymbol = z.infer<typeof qrSymbol>;
export type QrLevel = QrSymbol['level'];

/** White modules that ISO/IEC 18004 asks for on every side. */
export const QUIET_ZONE_MODULES = 4;

/** Version 3 at H beat version 2 at M and version 3 at Q: more correction pays while it costs no version (labels.md). */
export const PINNED_VERSION = 3;
const PINNED_LEVELS = ['H', 'Q'] as const;

/** The alphanumeric set of ISO/IEC 18004. */
const ALPHANUMERIC = /^[0-9A-Z $%*+\-./:]*$/;

/** Dark and light modules, without the quiet zone. */
export interface QrMatrix {
  readonly side: number;
  isDark(row: number, column: number): boolean;
}

/** @returns modules per side: 17 + 4 × version (ISO/IEC 18004) */
export function sideOfVersion(version: number): number {
  return 17 + 4 * version;
}

/**
 * Version 3 at H for at most 35 characters of the alphanumeric set, at Q for at most 47, else the smallest version
 * at Q, with a warning for the settings page.
 * @throws Error when the payload fits no QR code at all
 */
export function pickVersion(payload: string): { level: QrLevel; version: number; warning: string | null } {
  for (const level of PINNED_LEVELS) {
    if (fits(payload, level, PINNED_VERSION)) return { level, version: PINNED_VERSION, warning: null };
  }
  const { version } = QRCode.create(segmentsOf(payload), { errorCorrectionLevel: 'Q' });
  return {
    level: 'Q',
    version,
    warning: `The public address is so long that codes need ${sideOfVersion(version)} modules a side instead of ${sideOfVersion(PINNED_VERSION)}. They read worse when worn. A shorter address helps.`,
  };
}

/** @throws Error when the payload doesn't fit the symbol */
export function buildMatrix(payload: string, { level, version, mask }: QrSymbol): QrMatrix {
  const { modules } = QRCode.create(segmentsOf(payload), {
    errorCorrectionLevel: level,
    version,
    maskPattern: toMaskPattern(mask),
  });
  return {
    side: modules.size,
    isDark: (row, column) => modules.get(row, column) === 1,
  };
}

/** The mask that ISO/IEC 18004's penalty rules prefer. */
export function findStandardMask(payload: string, level: QrLevel, version: number): number {
  const { maskPattern } = QRCode.create(segmentsOf(payload), { errorCorrectionLevel: level, version });
  return maskPattern ?? 0;
}

const MASKS = [0, 1, 2, 3, 4, 5, 6, 7] as const;

function toMaskPattern(mask: number): (typeof MASKS)[number] {
  const pattern = MASKS.find((known) => known === mask);
  if (pattern === undefined) throw new RangeError(`There is no QR mask ${String(mask)}.`);
  return pattern;
}

/** One segment, never a mix: which modules the fixed part of the address sets is then the same on all labels. */
function segmentsOf(payload: string): QRCode.QRCodeSegment[] {
  return ALPHANUMERIC.test(payload)
    ? [{ data: payload, mode: 'alphanumeric' }]
    : [{ data: new TextEncoder().encode(payload), mode: 'byte' }];
}

function fits(payload: string, level: QrLevel, version: number): boolean {
  try {
    QRCode.create(segmentsOf(payload), { errorCorrectionLevel: level, version, maskPattern: 0 });
    return true;
  } catch {
    return false;
  }
}
