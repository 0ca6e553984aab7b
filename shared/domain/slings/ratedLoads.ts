import type { RatedLoads } from './spec';

/**
 * How given rated loads (kg) stand to those on record. `higher`: any figure is above the record's, or stands where the
 * record has none; a bridle at another angle cannot be compared and counts as higher. A figure left out is a lower one.
 */
export function compareRatedLoads(record: RatedLoads, given: RatedLoads): 'same' | 'lower' | 'higher' {
  const pairs = [
    [record.verticalKg, given.verticalKg],
    [record.chokerKg, given.chokerKg],
    [record.basketKg, given.basketKg],
    [record.bridle?.kg, given.bridle?.kg],
  ] as const;
  const isOtherAngle = given.bridle !== undefined && given.bridle.angleDeg !== record.bridle?.angleDeg;
  if (isOtherAngle || pairs.some(([was = 0, now = 0]) => now > was)) return 'higher';
  return pairs.every(([was, now]) => was === now) ? 'same' : 'lower';
}
