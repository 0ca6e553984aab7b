import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { criteriaFor } from '../../../../shared/domain/inspection/rows';
import { CHOOSABLE_RULE_SETS } from '../../../../shared/domain/inspection/ruleSets';
import { isWorseVerdict, VERDICTS } from '../../../../shared/domain/inspection/severity';
import { applyStricter, computeVerdict } from '../../../../shared/domain/inspection/verdict';
import { SLING_KINDS } from '../../../../shared/domain/slings/kinds';
import { slingOf } from './slings';

/** A sling of any kind, whether each question's answer is bad, and chosen rule sets. */
const examination = fc.constantFrom(...SLING_KINDS).chain((kind) => {
  const sling = slingOf(kind);
  const rows = criteriaFor(sling);
  return fc.record({
    sling: fc.constant(sling),
    bad: fc.array(fc.boolean(), { minLength: rows.length, maxLength: rows.length }),
    worsened: fc.nat({ max: rows.length - 1 }),
    ruleSets: fc.subarray([...CHOOSABLE_RULE_SETS], { minLength: 1 }),
    rows: fc.constant(rows),
  });
});

describe('properties of the verdict', () => {
  it('never gets better when an answer gets worse', () => {
    fc.assert(
      fc.property(examination, ({ sling, rows, bad, worsened, ruleSets }) => {
        const judge = (isBad: (index: number) => boolean) =>
          computeVerdict({
            sling,
            answers: rows.map(({ clean }, index) => ({ ...clean, seen: isBad(index) })),
            ruleSets,
            complete: true,
            restClean: false,
          }).verdict;
        const before = judge((index) => bad[index] === true);
        const after = judge((index) => bad[index] === true || index === worsened);
        expect(isWorseVerdict(before, after)).toBe(false);
      }),
      { numRuns: 200 },
    );
  });

  it('leaves no bad answer without a finding, rest-clean or not, whatever sets are chosen', () => {
    fc.assert(
      fc.property(examination, fc.boolean(), ({ sling, rows, bad, ruleSets }, restClean) => {
        const seen = rows.filter((_, index) => bad[index]);
        const answers = seen.map(({ clean }) => ({ ...clean, seen: true }));
        const { findings, errors } = computeVerdict({ sling, answers, ruleSets, complete: false, restClean });
        expect(errors).toEqual([]);
        expect(findings.map(({ criterionId, fittingId }) => [criterionId, fittingId])).toEqual(
          seen.map(({ id, fittingId }) => [id, fittingId]),
        );
      }),
      { numRuns: 200 },
    );
  });

  it('never gets laxer by what the inspector adds', () => {
    for (const computed of VERDICTS) {
      for (const verdict of VERDICTS) {
        const final = applyStricter(computed, { verdict, note: 'n' });
        expect(isWorseVerdict(computed, final.verdict)).toBe(false);
        expect(isWorseVerdict(verdict, final.verdict)).toBe(false);
      }
    }
  });
});
