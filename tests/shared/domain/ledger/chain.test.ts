import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  canonicalJson,
  canonicalRow,
  CHAIN_START,
  followChain,
  type LedgerContent,
} from '../../../../shared/domain/ledger/chain';

const sha256 = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');
type Row = LedgerContent & { hash: string };

function buildChain(length: number): Row[] {
  const rows: Row[] = [];
  for (let seq = 1; seq <= length; seq += 1) {
    const content: LedgerContent = {
      slingId: 7,
      slingSeq: seq,
      type: seq === 1 ? 'registered' : 'edited',
      at: `2026-03-10T10:00:0${seq}.000Z`,
      actor: { id: 3, name: 'Ama Tull' },
      from: seq === 1 ? null : 'received',
      to: 'received',
      condemned: false,
      custody: { kind: 'in_store', locationId: null },
      data: { note: `Row ${seq}`, figures: [1, 2.5] },
      prevHash: rows.at(-1)?.hash ?? CHAIN_START,
    };
    rows.push({ ...content, hash: sha256(canonicalRow(content)) });
  }
  return rows;
}
const start = { seq: 0, hash: CHAIN_START };
const check = (rows: Row[]) => followChain(rows, start, sha256);
const faultSeq = (rows: Row[]): number | undefined => check(rows).fault?.slingSeq;

describe('canonical JSON (RFC 8785)', () => {
  // RFC 8785, section 3.2.2 and 3.2.3: the worked example and its sorting.
  it('gives the form of the RFC’s example', () => {
    const text = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    expect(canonicalJson(JSON.parse(text))).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  it('sorts names by UTF-16 code units', () => {
    const sorted = canonicalJson({
      '\u20ac': 1,
      '\r': 2,
      '\ufb33': 3,
      '1': 4,
      '\ud83d\ude00': 5,
      '\u0080': 6,
      '\u00f6': 7,
    });
    expect(Object.values(JSON.parse(sorted) as object).length).toBe(7);
    expect([...sorted.matchAll(/:(\d)/g)].map(([, figure]) => Number(figure))).toEqual([2, 4, 6, 7, 1, 5, 3]);
  });

  it('does not depend on the order in which fields were written', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
        const reversed = Object.fromEntries(Object.entries(value).reverse());
        expect(canonicalJson(reversed)).toBe(canonicalJson(value));
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
      { seed: 8785 },
    );
  });

  it('refuses what has no JSON form', () => {
    expect(() => canonicalJson(undefined)).toThrow(TypeError);
  });
});

describe('the chain of a sling', () => {
  it('holds as it was written, and tells its head', () => {
    const rows = buildChain(5);
    expect(check(rows)).toEqual({ fault: null, seq: 5, hash: rows[4]?.hash });
    expect(check([])).toEqual({ fault: null, seq: 0, hash: CHAIN_START });
  });

  it('can be followed in pieces', () => {
    const rows = buildChain(5);
    const first = check(rows.slice(0, 2));
    if (first.fault) throw new Error('The first piece holds.');
    expect(followChain(rows.slice(2), first, sha256)).toMatchObject({ fault: null, seq: 5 });
  });

  const changes: [string, Partial<Row>][] = [
    ['who acted', { actor: { id: 4, name: 'Ama Tull' } }],
    ['the name', { actor: { id: 3, name: 'Ama Tall' } }],
    ['the time', { at: '2026-03-10T10:00:03.001Z' }],
    ['the event', { type: 'moved' }],
    ['the state before', { from: 'held' }],
    ['the state after', { to: 'in_service' }],
    ['the condemnation', { condemned: true }],
    ['the custody', { custody: { kind: 'cage', locationId: null } }],
    ['the place', { custody: { kind: 'in_store', locationId: 2 } }],
    ['the data', { data: { note: 'Row 3', figures: [1, 2.6] } }],
    ['the sling', { slingId: 8 }],
    ['its hash', { hash: 'f'.repeat(64) }],
    ['the hash before', { prevHash: 'f'.repeat(64) }],
  ];
  it.each(changes)('names the row in which %s was changed', (_what, change) => {
    const rows = buildChain(5).map((row) => (row.slingSeq === 3 ? { ...row, ...change } : row));
    expect(faultSeq(rows)).toBe(3);
  });

  it('names the row after one that was changed and given a new hash', () => {
    const rows = buildChain(5).map((row) => {
      if (row.slingSeq !== 3) return row;
      const forged = { ...row, to: 'in_service' as const };
      return { ...forged, hash: sha256(canonicalRow(forged)) };
    });
    expect(faultSeq(rows)).toBe(4);
  });

  it.each([1, 2, 4])('names row %i when it is missing', (seq) => {
    expect(faultSeq(buildChain(5).filter((row) => row.slingSeq !== seq))).toBe(seq);
  });

  it('names the first of two rows that changed places', () => {
    const [a, b, c, d] = buildChain(4);
    if (!a || !b || !c || !d) throw new Error('Four rows.');
    expect(faultSeq([a, c, b, d])).toBe(2);
    expect(faultSeq([a, { ...c, slingSeq: 2 }, { ...b, slingSeq: 3 }, d])).toBe(2);
  });

  it('names a row that is there twice', () => {
    const [a, b] = buildChain(2);
    if (!a || !b) throw new Error('Two rows.');
    expect(faultSeq([a, b, b])).toBe(3);
  });
});
