/** Decimals go to the database as text, so that none of their digits is lost on the way. */
export function toDecimal(value: number | undefined): string | null {
  return value === undefined ? null : String(value);
}
