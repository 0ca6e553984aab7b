import { describe, expect, it } from 'vitest';
import { answerAction } from '../../../../shared/domain/lifecycle/answer';
import {
  CHOOSABLE_REASONS,
  clearingOf,
  HOLD_REASONS,
  REASON_FACTS,
  type HoldReason,
} from '../../../../shared/domain/lifecycle/reasons';
import { SLING_KINDS, type SlingKind } from '../../../../shared/domain/slings/kinds';
import type { KindAndSpec } from '../../../../shared/domain/slings/spec';
import { held, INSPECTOR, reason } from './facts';

/** Section 4, last paragraph but one, by hand: what clears each besides the release inspection and a note. */
type Clears = 'inspection' | 'qualified' | 'evidence' | 'qualified and evidence' | 'never';
const CLEARS: Record<HoldReason, Clears> = {
  criterion: 'never',
  damage_suspected: 'inspection',
  referred: 'qualified',
  makers_tag_missing: 'evidence',
  makers_tag_illegible: 'evidence',
  overload_or_shock: 'inspection',
  heat_or_chemical: 'qualified and evidence',
  unauthorised_repair: 'never',
  latch: 'inspection',
  // The notice's own closing clears it, never the counter.
  makers_notice: 'never',
  evaluation_unfit: 'never',
  found: 'inspection',
  record_in_doubt: 'inspection',
  identity_unknown: 'never',
  other: 'inspection',
};
const CONFIRMED: HoldReason[] = ['criterion', 'unauthorised_repair', 'evaluation_unfit'];
const BY_HAND: HoldReason[] = [
  'damage_suspected',
  'makers_tag_missing',
  'makers_tag_illegible',
  'overload_or_shock',
  'heat_or_chemical',
  'unauthorised_repair',
  'latch',
  'record_in_doubt',
  'other',
];
const SYNTHETIC: SlingKind[] = ['synthetic-web', 'synthetic-round', 'synthetic-rope'];

const cases = HOLD_REASONS.flatMap((code) =>
  SLING_KINDS.map((kind): [HoldReason, SlingKind, Clears] => [
    code,
    kind,
    code === 'heat_or_chemical' && SYNTHETIC.includes(kind) ? 'never' : CLEARS[code],
  ]),
);

describe('the reasons of a hold', () => {
  it('are those of the design', () => {
    expect([...HOLD_REASONS].sort()).toEqual(Object.keys(CLEARS).sort());
    expect([...CHOOSABLE_REASONS].sort()).toEqual([...BY_HAND].sort());
  });

  it.each(HOLD_REASONS)('%s is confirmed from the start only where the design says so', (code) => {
    expect(REASON_FACTS[code].isConfirmed).toBe(CONFIRMED.includes(code));
  });

  it('ask for words where nothing else says what it is', () => {
    expect(HOLD_REASONS.filter((code) => REASON_FACTS[code].needsNote)).toEqual(['other']);
  });

  it.each(cases)('%s on a %s sling is cleared by %s', (code, kind, clears) => {
    const { isClearable, needsEvidence, needsQualified, how } = clearingOf(code, kind);
    expect({
      isClearable,
      needsEvidence: isClearable && needsEvidence,
      needsQualified: isClearable && needsQualified,
    }).toEqual({
      isClearable: clears !== 'never',
      needsEvidence: clears.includes('evidence'),
      needsQualified: clears.includes('qualified'),
    });
    expect(how).not.toBe('');
  });

  it.each(cases)('%s on a %s sling gates the release: %s', (code, kind, clears) => {
    const sling = { kind, spec: {} } as KindAndSpec;
    const facts = held({ sling, openReasons: [reason(code, 6, { confirmed: CONFIRMED.includes(code) })] });
    const isOpenTo = (isQualified: boolean): boolean =>
      answerAction('release', facts, { ...INSPECTOR, designation: { isQualified } }).open;
    expect(isOpenTo(true)).toBe(clears !== 'never');
    expect(isOpenTo(false)).toBe(clears !== 'never' && !clears.includes('qualified'));
  });

  it.each(CONFIRMED)('%s that was withdrawn as error is cleared by the release inspection', (code) => {
    const isOpen = (confirmed: boolean): boolean =>
      answerAction('release', held({ openReasons: [reason(code, 6, { confirmed })] }), INSPECTOR).open;
    expect([isOpen(true), isOpen(false)]).toEqual([false, true]);
    expect(clearingOf(code, 'alloy-chain', false)).toMatchObject({ isClearable: true, needsEvidence: false });
  });
});
