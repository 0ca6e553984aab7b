const MM_PER_INCH = 25.4;
const POINTS_PER_INCH = 72;

export function dotsToMm(dots: number, dpi: number): number {
  return (dots * MM_PER_INCH) / dpi;
}

/** Not rounded: the caller decides which way. */
export function mmToDots(mm: number, dpi: number): number {
  return (mm * dpi) / MM_PER_INCH;
}

/** The nearest place on the printer's grid. */
export function snapToDot(mm: number, dpi: number): number {
  return dotsToMm(Math.round(mmToDots(mm, dpi)), dpi);
}

export function mmToPoints(mm: number): number {
  return (mm * POINTS_PER_INCH) / MM_PER_INCH;
}
