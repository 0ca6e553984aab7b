/** Sizes that form, API and database share. */
export const LIMITS = {
  number: 40,
  shortText: 80,
  name: 120,
  note: 2000,
  email: 254,
  password: { min: 12, max: 200 },
  legs: { min: 1, max: 4 },
  /** The heaviest rated load taken, kg: far above any sling in the published tables. */
  loadKg: 1_000_000,
  lengthMm: 999_999,
  /** The least load (kg) and length (mm) taken: less would be kept as nothing. */
  least: 0.01,
  fittings: 24,
  photosPerAct: 12,
  labelsPerRun: 1000,
  pageDefault: 50,
  pageMax: 200,
  fileBytes: 10 * 1024 * 1024,
  jsonBytes: 512 * 1024,
  imagePixels: 50_000_000,
  imageEdgePx: 2400,
} as const;
