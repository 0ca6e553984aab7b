import { describe, expect, it } from 'vitest';
import { findDesignation, type Designation } from '../../../../shared/domain/inspection/designations';

const designation = (changes: Partial<Designation> = {}): Designation => ({
  kinds: ['alloy-chain', 'wire-rope'],
  designatedBy: 'Marit Quayle',
  designatedOn: '2026-01-10',
  until: '2026-12-31',
  isQualified: false,
  ...changes,
});

describe('findDesignation', () => {
  it('covers the kind from its first to its last day', () => {
    for (const day of ['2026-01-10', '2026-07-01', '2026-12-31']) {
      expect(findDesignation([designation()], 'alloy-chain', day), day).not.toBeNull();
    }
  });

  it('is null before, after, and for another kind', () => {
    expect(findDesignation([designation()], 'alloy-chain', '2026-01-09')).toBeNull();
    expect(findDesignation([designation()], 'alloy-chain', '2027-01-01')).toBeNull();
    expect(findDesignation([designation()], 'synthetic-web', '2026-07-01')).toBeNull();
    expect(findDesignation([], 'alloy-chain', '2026-07-01')).toBeNull();
  });

  it('holds on without an end, and prefers a qualified one', () => {
    const qualified = designation({ until: null, isQualified: true });
    expect(findDesignation([designation(), qualified], 'wire-rope', '2026-07-01')).toBe(qualified);
    expect(findDesignation([designation(), qualified], 'wire-rope', '2031-07-01')).toBe(qualified);
  });
});
