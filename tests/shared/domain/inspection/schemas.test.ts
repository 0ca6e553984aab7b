import { describe, expect, it } from 'vitest';
import { computeVerdict } from '../../../../shared/domain/inspection/verdict';
import {
  createInspectionRequest,
  verdictRequest,
  verdictResponse,
} from '../../../../shared/schemas/inspection';

const body = {
  kind: 'alloy-chain',
  spec: { grade: 80, chainMm: 13 },
  fittings: [{ id: 'upper', type: 'hook' }],
  answers: [{ criterionId: 'hook.crack', seen: true, fittingId: 'upper' }],
};

describe('verdict schemas', () => {
  it('takes a request as agreed and answers in the agreed form', () => {
    const { answers, ruleSets = ['osha' as const], ...sling } = verdictRequest.parse(body);
    const {
      verdict,
      findings,
      ruleSets: used,
    } = computeVerdict({
      sling,
      answers,
      ruleSets,
      complete: false,
      restClean: false,
    });
    const response = { verdict, findings, ruleSets: used };
    expect(verdictResponse.parse(response)).toEqual(response);
    expect(verdict).toBe('reject');
  });

  it.each([
    ['a kind that is not one', { ...body, kind: 'chain' }],
    ['a spec of another kind', { ...body, spec: { fibre: 'nylon', diameterMm: 20 } }],
    ['a rule set that cannot be chosen', { ...body, ruleSets: ['practice'] }],
    ['no rule set', { ...body, ruleSets: [] }],
    ['an unknown field of an answer', { ...body, answers: [{ criterionId: 'hook.crack', found: true }] }],
    ['text for a figure', { ...body, answers: [{ criterionId: 'hook.crack', measured: '12' }] }],
  ])('refuses %s', (_, wrong) => {
    expect(verdictRequest.safeParse(wrong).success).toBe(false);
  });

  it('wants a note for a stricter verdict', () => {
    const inspection = { type: 'frequent', answers: [], restClean: true };
    expect(createInspectionRequest.safeParse(inspection).success).toBe(true);
    const stricter = { verdict: 'refer', note: ' ' };
    expect(createInspectionRequest.safeParse({ ...inspection, stricter }).success).toBe(false);
  });
});
