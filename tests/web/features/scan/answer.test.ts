import { describe, expect, it } from 'vitest';
import type { ScanResponse } from '../../../../shared/schemas/labels';
import { composeAnswer } from '../../../../src/features/scan/answer';

const TODAY = '2026-12-01';

function buildFound(
  status: ScanResponse['tag']['status'],
  overrides: Partial<ScanResponse['sling']> = {},
): ScanResponse {
  const sling = {
    id: 1,
    number: 'MQ-0233',
    kind: 'alloy-chain',
    spec: { grade: 80, chainMm: 10 },
    legs: 1,
    maker: 'Tarn Forge',
    makerSerial: 'TF-88',
    state: 'in_service',
    condemned: false,
    mayUse: true,
    mayNotUse: [],
    custody: { kind: 'in_store', since: '2026-10-03T08:00:00Z' },
    nextDueOn: '2027-02-14',
    stateSince: '2026-11-03T08:00:00Z',
    openReasons: [],
    ...overrides,
  };
  // Only what an answer reads of a sling; the whole record has forty fields more
  return { tag: { code: 'X', status }, sling } as unknown as ScanResponse;
}

describe('the answer to a scan', () => {
  it('says USE for a live label on a sling that may be used, with its due date', () => {
    expect(composeAnswer(buildFound('live'), TODAY)).toEqual({
      mayUse: true,
      title: 'MQ-0233, chain sling, grade 80, 10 mm',
      lines: ['Inspection due 14 Feb 2027, in 75 days.'],
    });
  });

  it('says DO NOT USE for a printed or void label, though the sling itself may be used', () => {
    for (const status of ['printed', 'void'] as const) {
      expect(composeAnswer(buildFound(status), TODAY).mayUse).toBe(false);
    }
  });

  it('says DO NOT USE for a sling in service that may not be used, and names each cause', () => {
    const mayNotUse = [
      { rule: 'inspection_due', message: 'Its inspection is due.' },
      { rule: 'makers_tag', message: 'Its maker’s tag is illegible.' },
    ];
    const answer = composeAnswer(buildFound('live', { mayUse: false, mayNotUse }), TODAY);
    expect(answer).toMatchObject({ mayUse: false, lines: mayNotUse.map(({ message }) => message) });
  });

  it('gives the reasons of a held sling and sends one that is not secured to a cage', () => {
    const found = buildFound('live', {
      state: 'held',
      mayUse: false,
      openReasons: [
        {
          id: 1,
          code: 'damage_suspected',
          confirmed: false,
          placedBy: null,
          placedAt: '2026-11-03T08:00:00Z',
          note: '',
          clearing: { isClearable: true, needsQualified: false, needsEvidence: false, how: '' },
        },
      ],
    });
    const { lines } = composeAnswer(found, TODAY);
    expect(lines[0]).toMatch(/^Held since 3 Nov( 2026)?: damage suspected\.$/);
    expect(lines[1]).toBe('Not in a cage yet: bring it there.');
  });

  it('keeps the number back where its end is what proves the label hangs right', () => {
    const answer = composeAnswer(buildFound('printed', { makerSerial: undefined }), TODAY);
    expect(JSON.stringify(answer)).not.toContain('MQ-0233');
  });

  it('says what a void label belonged to, and in which state that sling is now', () => {
    const { title, lines } = composeAnswer(buildFound('void', { state: 'destroyed', mayUse: false }), TODAY);
    expect(title).toBe('This label is void');
    expect(lines[0]).toContain('MQ-0233');
    expect(lines[0]).toContain('destroyed since 3 Nov');
  });
});
