import { describe, expect, it } from 'vitest';
import type { Answer, ExaminedSling } from '../../../../shared/domain/inspection/criterion';
import type { RuleSetId } from '../../../../shared/domain/inspection/ruleSets';
import {
  applyStricter,
  computeVerdict,
  type VerdictResult,
} from '../../../../shared/domain/inspection/verdict';
import { HOOK, slingOf } from './slings';

function judge(
  sling: ExaminedSling,
  answers: Answer[],
  ruleSets: RuleSetId[] = ['osha', 'asme'],
): VerdictResult {
  return computeVerdict({ sling, answers, ruleSets, complete: false, restClean: false });
}
const saw = (criterionId: string, fittingId?: number): Answer => ({ criterionId, seen: true, fittingId });

describe('computeVerdict on published cases', () => {
  it('rejects melting of a web, ex-web-melt: 29 CFR 1926.251(e)(8) [read R3]', () => {
    const { verdict, findings } = judge(
      slingOf('synthetic-web'),
      [saw('web.melt_char')],
      ['osha_construction'],
    );
    expect(verdict).toBe('reject');
    expect(findings[0]).toMatchObject({
      ruleSet: 'osha_construction',
      sources: [{ document: '29 CFR 1926.251', clause: '(e)(8)', mark: 'read' }],
      holdReason: 'criterion',
      isFromOtherSet: false,
    });
  });

  it('rejects an exposed core, ex-round-core-exposed: ASME B30.9 via WAC 296-155-33825 Table 17 [read R6]', () => {
    expect(judge(slingOf('synthetic-round'), [saw('round.core_exposed')], ['asme']).verdict).toBe('reject');
  });

  it('passes a scuffed cover with a note, ex-round-cover-scuff', () => {
    const { verdict, findings } = judge(slingOf('synthetic-round'), [saw('round.cover_scuff')], ['asme']);
    expect(verdict).toBe('pass');
    expect(findings[0]).toMatchObject({ outcome: 'note', holdReason: null });
  });

  it('refers a cut cover whose core is not exposed (criteria.md)', () => {
    const { verdict, findings } = judge(slingOf('synthetic-round'), [saw('round.cover_cut')]);
    expect(verdict).toBe('refer');
    expect(findings[0]?.holdReason).toBe('referred');
  });

  it.each(['osha', 'osha_construction', 'asme', 'en', 'as'] as const)(
    'rejects a missing tag under %s (ex-any-no-tag)',
    (set) => {
      const { verdict, findings } = judge(slingOf('synthetic-round'), [saw('tag.missing_illegible')], [set]);
      expect(verdict).toBe('reject');
      expect(findings[0]).toMatchObject({
        ruleSet: set,
        isFromOtherSet: false,
        holdReason: 'makers_tag_missing',
      });
    },
  );

  it('holds a failed latch with its own reason and a makeshift repair as unauthorised', () => {
    const { findings } = judge(slingOf('alloy-chain'), [saw('hook.latch', 2), saw('any.improper_repair')]);
    expect(findings.map(({ holdReason }) => holdReason)).toEqual(['latch', 'unauthorised_repair']);
    expect(findings[0]?.fittingId).toBe(2);
  });
});

describe('no silence', () => {
  it('lets another set speak for a wire rope under EN alone, and says so', () => {
    const [finding] = judge(slingOf('wire-rope'), [saw('rope.kink_crush_birdcage')], ['en']).findings;
    expect(finding).toMatchObject({ outcome: 'reject', ruleSet: 'osha', isFromOtherSet: true });
    expect(finding?.message).toContain('say nothing on it');
    expect(finding?.others).toContainEqual({ ruleSet: 'en', outcome: 'silent' });
    expect(finding?.others).toContainEqual({ ruleSet: 'asme', outcome: 'reject' });
  });

  it('rejects warning yarns as common practice, since no published list has them', () => {
    const [finding] = judge(slingOf('synthetic-web'), [saw('web.warning_yarn')]).findings;
    expect(finding).toMatchObject({
      outcome: 'reject',
      ruleSet: 'practice',
      sources: [{ mark: 'common_practice' }],
    });
  });

  it('refers heat, known or not, as no limit is on file for it yet', () => {
    const sling = slingOf('alloy-chain');
    expect(judge(sling, [saw('any.heat')]).verdict).toBe('refer');
    expect(judge(sling, [{ criterionId: 'any.heat', measured: 350 }]).verdict).toBe('refer');
    expect(judge(sling, [{ criterionId: 'any.heat', seen: false }]).verdict).toBe('pass');
  });

  it('refers any doubt under every rule set', () => {
    for (const set of ['osha', 'asme', 'en', 'as'] as const) {
      expect(judge(slingOf('synthetic-rope'), [saw('any.doubt')], [set]).verdict).toBe('refer');
    }
  });
});

describe('what a verdict keeps and lacks', () => {
  it('keeps the rule sets and editions it was made with, the maker’s always among them', () => {
    const { ruleSets } = judge(slingOf('alloy-chain'), [], ['asme', 'osha']);
    expect(ruleSets.map(({ id }) => id)).toEqual(['osha', 'asme', 'maker']);
    expect(ruleSets.every(({ edition }) => edition.length > 0)).toBe(true);
  });

  it('lists what was not answered, per fitting, and takes no rest-clean where all is asked', () => {
    const sling = slingOf('alloy-chain', [HOOK]);
    const input = { sling, answers: [saw('hook.crack', 2)], ruleSets: ['osha'] as const, restClean: true };
    const complete = computeVerdict({ ...input, complete: true });
    expect(complete.missing).toContainEqual({ criterionId: 'hook.latch', fittingId: 2 });
    expect(complete.missing).not.toContainEqual({ criterionId: 'hook.crack', fittingId: 2 });
    const frequent = computeVerdict({ ...input, complete: false });
    expect(frequent.missing).toEqual([]);
    expect(frequent.verdict).toBe('reject');
  });

  it.each([
    ['an unknown criterion', { criterionId: 'chain.colour', seen: true }, 'answers.0.criterionId'],
    ['another kind’s criterion', { criterionId: 'web.knot', seen: true }, 'answers.0.criterionId'],
    ['no answer', { criterionId: 'chain.crack' }, 'answers.0.seen'],
    [
      'a figure where something is seen',
      { criterionId: 'chain.crack', seen: true, measured: 3 },
      'answers.0.measured',
    ],
    ['two answers on heat', { criterionId: 'any.heat', seen: false, measured: 300 }, 'answers.0.seen'],
    ['no fitting', { criterionId: 'hook.crack', seen: true }, 'answers.0.fittingId'],
    ['an unknown fitting', { criterionId: 'hook.crack', seen: true, fittingId: 9 }, 'answers.0.fittingId'],
    [
      'a fitting that is no hook',
      { criterionId: 'hook.crack', seen: true, fittingId: 1 },
      'answers.0.fittingId',
    ],
    [
      'a fitting for the body',
      { criterionId: 'chain.crack', seen: true, fittingId: 1 },
      'answers.0.fittingId',
    ],
  ] as [string, Answer, string][])('names the field for %s', (_, answer, path) => {
    const { errors } = judge(slingOf('alloy-chain'), [answer]);
    expect(errors.map((error) => error.path)).toEqual([path]);
  });

  it('takes one criterion twice only for two places', () => {
    const sling = slingOf('alloy-chain');
    const at = (positionMm: number): Answer => ({ ...saw('chain.crack'), at: { leg: 1, positionMm } });
    expect(judge(sling, [saw('chain.crack'), saw('chain.crack')]).errors[0]?.path).toBe(
      'answers.1.criterionId',
    );
    expect(judge(sling, [at(100), at(100)]).errors).toHaveLength(1);
    expect(judge(sling, [at(100), at(900)])).toMatchObject({ errors: [], findings: [{}, {}] });
  });
});

describe('applyStricter', () => {
  it('takes a stricter verdict and says what it holds with', () => {
    expect(applyStricter('pass', { verdict: 'refer', note: 'odd sound' })).toEqual({
      verdict: 'refer',
      isStricter: true,
      holdReason: 'referred',
    });
    expect(applyStricter('refer', { verdict: 'reject', note: 'bent' }).holdReason).toBe('criterion');
  });

  it('never takes a laxer one', () => {
    expect(applyStricter('reject', { verdict: 'pass', note: 'looks fine' })).toEqual({
      verdict: 'reject',
      isStricter: false,
      holdReason: null,
    });
    expect(applyStricter('reject', undefined).verdict).toBe('reject');
  });
});
