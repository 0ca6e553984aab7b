import { describe, expect, it } from 'vitest';
import type { LedgerRow } from '../../../../shared/schemas/ledger';
import { describeRow, nameRow } from '../../../../src/features/ledger/describeRow';
import { listEvidence } from '../../../../src/features/ledger/listEvidence';

const FILE = '3f2b1c1e-8a94-4b7a-9b53-4a1d2d7e9a10';
const OTHER = '3f2b1c1e-8a94-4b7a-9b53-4a1d2d7e9a11';
const ROW: LedgerRow = {
  seq: 90,
  id: 90,
  slingId: 4,
  slingSeq: 7,
  type: 'hold',
  at: '2026-11-03T08:00:00.000Z',
  actor: { id: 9, name: 'Ambrose Kettle' },
  from: 'in_service',
  to: 'held',
  condemned: false,
  custody: { kind: 'in_store', locationId: 1 },
  data: {
    reasons: [{ code: 'damage_suspected', note: 'Link worn on leg 2' }, { code: 'latch' }],
    photos: [{ fileId: FILE, sha256: 'aa' }],
  },
  prevHash: 'cd',
  hash: 'ab',
};
const noName = (): undefined => undefined;

describe('describeRow', () => {
  it('tells from and to, each reason and its note', () => {
    expect(nameRow(ROW)).toBe('Held');
    expect(describeRow(ROW, noName)).toEqual([
      'In service → held',
      'Damage suspected: Link worn on leg 2',
      'Hook latch',
    ]);
  });

  it('names the place of an act that is about one', () => {
    const secured: LedgerRow = {
      ...ROW,
      type: 'secure',
      from: 'held',
      custody: { kind: 'cage', locationId: 3 },
      data: {},
    };
    expect(describeRow(secured, (id) => (id === 3 ? 'Cage 2' : undefined))).toEqual(['In Cage 2']);
    expect(describeRow({ ...secured, data: { location: 'Cage 9' } }, noName)).toEqual(['In Cage 9']);
  });

  it('tells what a correction changed, from and to, and leaves out what stayed', () => {
    const corrected: LedgerRow = {
      ...ROW,
      type: 'corrected',
      from: 'held',
      data: {
        before: { makerSerial: 'TF-88203', ratedLoads: { verticalKg: 3150, chokerKg: 2520 } },
        after: {
          makerSerial: 'TF-88230',
          ratedLoads: { verticalKg: 3000, chokerKg: 2520, bridle: { kg: 5100, angleDeg: 60 } },
        },
        reason: 'Misread.',
      },
    };
    expect(describeRow(corrected, noName)).toEqual([
      'Maker’s serial: TF-88203 → TF-88230',
      'Rated load, vertical: 3,150 kg → 3,000 kg',
      'Rated load, bridle: none → 5,100 kg',
      'Bridle angle: none → 60°',
      'Misread.',
    ]);
  });

  it('names what an edit touched without repeating its texts', () => {
    const edited: LedgerRow = {
      ...ROW,
      type: 'edited',
      from: 'held',
      data: { changes: { notes: 'x', homeLocationId: null } },
    };
    expect(describeRow(edited, noName)).toEqual(['Notes, Home location']);
  });

  it('tells an inspection by its type, verdict and findings', () => {
    const inspected: LedgerRow = {
      ...ROW,
      type: 'inspected',
      from: 'held',
      data: { inspection: 'release', verdict: 'reject', findings: [{ message: 'Chain worn to 8.5 mm' }] },
    };
    expect(describeRow(inspected, noName)).toEqual([
      'Release inspection',
      'Rejected.',
      'Chain worn to 8.5 mm',
    ]);
  });

  it('shows an act and data that it does not know without failing', () => {
    const strange: LedgerRow = {
      ...ROW,
      type: 'weighed',
      from: 'held',
      data: { reasons: 'none', note: 7, kg: 12 },
    };
    expect(nameRow(strange)).toBe('weighed');
    expect(describeRow(strange, noName)).toEqual([]);
  });
});

describe('listEvidence', () => {
  it('finds files at any depth, each once, in their order', () => {
    const data = {
      photos: [{ fileId: FILE }],
      cleared: [{ evidence: { fileId: OTHER, sha256: 'x' } }, { evidence: { fileId: FILE } }],
    };
    expect(listEvidence(data)).toEqual([FILE, OTHER]);
  });

  it('takes nothing that is no file id', () => {
    expect(listEvidence({ fileId: '../../etc', note: FILE, lineId: 4, evidence: null })).toEqual([]);
  });
});
