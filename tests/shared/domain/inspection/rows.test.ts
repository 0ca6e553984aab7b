import { describe, expect, it } from 'vitest';
import { criteriaFor, criteriaOfKind } from '../../../../shared/domain/inspection/rows';
import { computeVerdict } from '../../../../shared/domain/inspection/verdict';
import { criteriaResponse } from '../../../../shared/schemas/inspection';
import { SLING_KINDS } from '../../../../shared/domain/slings/kinds';
import { HOOK, MASTER_LINK, slingOf } from './slings';

describe('criteriaFor', () => {
  it.each(SLING_KINDS)('passes a %s whose clean answers are all sent back as they are', (kind) => {
    const sling = slingOf(kind);
    const answers = criteriaFor(sling).map(({ clean }) => clean);
    const result = computeVerdict({
      sling,
      answers,
      ruleSets: ['osha', 'en'],
      complete: true,
      restClean: false,
    });
    expect(result).toMatchObject({ verdict: 'pass', findings: [], missing: [], errors: [] });
  });

  it('gives one row per fitting, only of the fittings that are meant', () => {
    const second = { ...HOOK, id: 7 };
    const rows = criteriaFor(slingOf('alloy-chain', [MASTER_LINK, HOOK, second]));
    expect(rows.filter(({ id }) => id === 'hook.crack').map(({ fittingId }) => fittingId)).toEqual([2, 7]);
    expect(rows.filter(({ id }) => id === 'fitting.crack_distortion').map(({ part }) => part)).toEqual([
      'master_link',
      'fitting',
      'fitting',
    ]);
    expect(rows.some(({ id }) => id === 'fitting.wrong_pin')).toBe(false);
  });

  it('asks for the latch only of a hook that has one', () => {
    const idsOf = (hook: typeof HOOK): string[] =>
      criteriaFor(slingOf('alloy-chain', [hook])).map(({ id }) => id);
    expect(idsOf(HOOK)).toContain('hook.latch');
    expect(idsOf({ id: 2, type: 'self_locking_hook' })).toContain('hook.latch');
    expect(idsOf({ ...HOOK, hasLatch: false })).not.toContain('hook.latch');
  });

  it('compares leg lengths only where there are two legs or more', () => {
    const sling = slingOf('alloy-chain');
    expect(criteriaFor(sling).map(({ id }) => id)).toContain('chain.legs_unequal');
    expect(criteriaFor({ ...sling, legs: 1 }).map(({ id }) => id)).not.toContain('chain.legs_unequal');
  });

  it('shows only limits and sources that hold for the kind', () => {
    const hook = (kind: 'alloy-chain' | 'wire-rope') =>
      criteriaOfKind(kind).find(({ id }) => id === 'hook.crack');
    const clauses = (kind: 'alloy-chain' | 'wire-rope') =>
      hook(kind)
        ?.sources.filter(({ ruleSet }) => ruleSet === 'osha')
        .map(({ clause }) => clause);
    expect(clauses('alloy-chain')).toEqual(['(e)(9)(ii)']);
    expect(clauses('wire-rope')).toEqual(['(f)(5)(vi)']);
    expect(hook('wire-rope')?.limits.map(({ ruleSet }) => ruleSet)).toEqual(['osha', 'asme']);
  });

  it.each(SLING_KINDS)('answers for %s in the agreed form', (kind) => {
    for (const items of [criteriaOfKind(kind), criteriaFor(slingOf(kind))]) {
      expect(criteriaResponse.parse({ items })).toEqual({ items });
    }
  });
});
