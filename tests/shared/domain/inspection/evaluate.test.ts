import { describe, expect, it } from 'vitest';
import type { Answer, BoundLimit, Criterion, Speech } from '../../../../shared/domain/inspection/criterion';
import { evaluateRuleSet } from '../../../../shared/domain/inspection/evaluate';
import { HOOK, slingOf } from './slings';

type Figure = Pick<BoundLimit, 'ruleSet' | 'op' | 'of' | 'unit' | 'bound'>;

/** A measured criterion with these limits, judged for a 13 mm chain sling or its hook of 2 in throat. */
function speak(
  figures: Figure[],
  answer: Omit<Answer, 'criterionId'>,
  nominalFrom: 'chainMm' | 'throatMm',
): Speech {
  const criterion: Criterion = {
    id: 'test.figure',
    kinds: ['alloy-chain'],
    part: 'body',
    name: 'Figure',
    question: 'How much?',
    help: 'Measure it.',
    answer: 'measure',
    nominalFrom,
    limits: figures.map((figure) => ({ ...figure, edition: 'test', outcome: 'reject' })),
    sources: [],
    holdReason: 'criterion',
  };
  const ruleSet = figures[0]?.ruleSet ?? 'osha';
  const asked = {
    criterion,
    answer: { criterionId: criterion.id, ...answer },
    sling: slingOf('alloy-chain'),
    fitting: HOOK,
  };
  return evaluateRuleSet(ruleSet, asked).speech;
}

describe('limits in figures', () => {
  // Table N-184-1: 1/2 in (13 mm) chain, 25/64 in = 0.390625 in [read R4, R11]; cases ex-chain-osha-1_2-*
  const table: Figure = {
    ruleSet: 'osha',
    op: 'under',
    of: 'measured',
    unit: 'in',
    bound: { table: [{ sizeMm: 13, value: 0.390625 }], sizeFrom: 'chainMm' },
  };

  it.each([
    [0.39 * 25.4, 'reject'],
    [9.921875, 'pass'],
    [9.921874999, 'reject'],
    [9.9568, 'pass'],
  ] as const)('compares %s mm with 25/64 in exactly: %s', (measured, speech) => {
    expect(speak([table], { measured }, 'chainMm')).toBe(speech);
  });

  it('is silent for a size that the table lacks, and without a figure', () => {
    const other: Figure = {
      ...table,
      bound: { table: [{ sizeMm: 10, value: 0.296875 }], sizeFrom: 'chainMm' },
    };
    expect(speak([other], { measured: 1 }, 'chainMm')).toBe('silent');
    expect(speak([table], {}, 'chainMm')).toBe('silent');
  });

  it('takes the smaller of two readings for OSHA, the mean for EN (criteria.md)', () => {
    const readings = { measured: 11.6, measured2: 11.9 };
    const at = (ruleSet: 'osha' | 'en'): Figure => ({
      ruleSet,
      op: 'under',
      of: 'percent_of_nominal',
      unit: '%',
      bound: { value: 90 },
    });
    // 90 % of 13 mm is 11.7 mm: EN 818-6 [read-2 R61]
    expect(speak([at('osha')], readings, 'chainMm')).toBe('reject');
    expect(speak([at('en')], readings, 'chainMm')).toBe('pass');
    expect(speak([at('en')], { measured: 11.7 }, 'chainMm')).toBe('pass');
  });

  // 1910.184(e)(9)(ii): more than 15 % [read-2 R11]; cases ex-hook-osha-at15, ex-hook-osha-over15
  it.each([
    [2.3 * 25.4, 'pass'],
    [58.6, 'reject'],
  ] as const)('lets a throat of %s mm be opened by 15 %% and no more: %s', (measured, speech) => {
    const throat: Figure = {
      ruleSet: 'osha',
      op: 'over',
      of: 'gain_percent',
      unit: '%',
      bound: { value: 15 },
    };
    expect(speak([throat], { measured: Number(measured.toFixed(4)) }, 'throatMm')).toBe(speech);
  });

  it('reaches 5 % or a quarter inch, whichever is less (B30.10 via WAC [read R6]; case ex-hook-b3010-5pct)', () => {
    const limits: Figure[] = [
      { ruleSet: 'asme', op: 'at_least', of: 'gain_percent', unit: '%', bound: { value: 5 } },
      { ruleSet: 'asme', op: 'at_least', of: 'gain', unit: 'in', bound: { value: 0.25 } },
    ];
    expect(speak(limits, { measured: 53.34 }, 'throatMm')).toBe('reject');
    expect(speak(limits, { measured: 53.33 }, 'throatMm')).toBe('pass');
    expect(speak(limits, { nominal: 200, measured: 206.35 }, 'throatMm')).toBe('reject');
    expect(speak(limits, { nominal: 200, measured: 206.34 }, 'throatMm')).toBe('pass');
  });

  it('counts wires: over 10 % of all (1926.251(c)(4)(iv) [read-2 SUP-A]), and loss by wear', () => {
    const share: Figure = {
      ruleSet: 'osha_construction',
      op: 'over',
      of: 'share_percent',
      unit: '%',
      bound: { value: 10 },
    };
    expect(speak([share], { count: 19, total: 190 }, 'chainMm')).toBe('pass');
    expect(speak([share], { count: 20, total: 190 }, 'chainMm')).toBe('reject');
    const count: Figure = {
      ruleSet: 'osha',
      op: 'at_least',
      of: 'count',
      unit: 'wires',
      bound: { value: 10 },
    };
    expect(speak([count], { count: 9 }, 'chainMm')).toBe('pass');
    expect(speak([count], { count: 10 }, 'chainMm')).toBe('reject');
    const loss: Figure = { ruleSet: 'asme', op: 'over', of: 'loss_percent', unit: '%', bound: { value: 10 } };
    expect(speak([loss], { nominal: 0.3, measured: 0.27 }, 'chainMm')).toBe('pass');
    expect(speak([loss], { nominal: 0.3, measured: 0.2699 }, 'chainMm')).toBe('reject');
  });
});
