import { describe, expect, it } from 'vitest';
import { criteriaFor } from '../../../../shared/domain/inspection/rows';
import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../../shared/domain/inspection/inspectionTypes';
import { computeVerdict, type VerdictResult } from '../../../../shared/domain/inspection/verdict';
import { createInspectionRequest, criteriaResponse } from '../../../../shared/schemas/inspection';
import { findFaults, type Faults } from '../../../../src/features/inspections/findFaults';
import {
  answerRestClean,
  answerRow,
  EMPTY_INSPECTION,
  rowKey,
  toAnswers,
  toStricter,
  type InspectionDraft,
} from '../../../../src/features/inspections/inspectionDraft';
import { listTypes } from '../../../../src/features/inspections/inspectionTypes';
import { questionId } from '../../../../src/features/inspections/questionId';
import { groupRows } from '../../../../src/features/inspections/rowGroups';

const fittings = [
  { id: 1, position: 'upper', type: 'master_link', sizeMm: 22, detachable: false },
  { id: 2, position: 'lower', type: 'self_locking_hook', sizeMm: 10, detachable: true },
  { id: 3, position: 'lower', type: 'self_locking_hook', sizeMm: 10, detachable: true },
] as const;
const sling = { kind: 'alloy-chain', spec: { grade: 80, chainMm: 10 }, legs: 2, fittings } as const;
const rows = criteriaResponse.parse({ items: criteriaFor(sling) }).items;
const keys = rows.map(rowKey);
const allClean = answerRestClean(EMPTY_INSPECTION, keys);
const CRACK = 'chain.crack';

function verdictOf(draft: InspectionDraft, type: InspectionType): VerdictResult {
  return computeVerdict({
    sling,
    answers: toAnswers(draft, rows),
    ruleSets: ['osha', 'asme'],
    complete: INSPECTION_TYPE_FACTS[type].isComplete,
    restClean: draft.restClean,
  });
}
const faultsOf = (
  draft: InspectionDraft,
  type: InspectionType = 'initial',
  inspectedOn = '2026-12-01',
): Faults =>
  findFaults({ type, rows, draft, result: verdictOf(draft, type), inspectedOn, today: '2026-12-01' });

describe('answers of an examination', () => {
  it('tell alike fittings apart', () => {
    expect(new Set(keys).size).toBe(rows.length);
    const titles = groupRows(rows, [...fittings]).map(({ title }) => title);
    expect(titles).toContain('Self-locking hook, 10 mm, lower end (2 of 2)');
  });

  it('set to "not seen" in one go never touch what was seen', () => {
    const seen = answerRow(EMPTY_INSPECTION, CRACK, { choice: 'seen', note: 'third link' });
    const draft = answerRestClean(seen, keys);
    expect(toAnswers(draft, rows)).toHaveLength(rows.length);
    expect(toAnswers(draft, rows).find(({ criterionId }) => criterionId === CRACK)).toEqual({
      criterionId: CRACK,
      seen: true,
      note: 'third link',
    });
    expect(verdictOf(draft, 'initial').verdict).toBe('reject');
  });

  it('make a request that the API takes', () => {
    const draft = answerRow(allClean, 'any.heat', { choice: 'seen', celsius: '210' });
    const parsed = createInspectionRequest.safeParse({ type: 'initial', answers: toAnswers(draft, rows) });
    expect(parsed.success).toBe(true);
    expect(toAnswers(draft, rows).find(({ criterionId }) => criterionId === 'any.heat')).toEqual({
      criterionId: 'any.heat',
      measured: 210,
    });
  });

  it('say that heat was seen where nobody knows how hot it was', () => {
    const draft = answerRow(allClean, 'any.heat', { choice: 'seen' });
    expect(toAnswers(draft, rows).find(({ criterionId }) => criterionId === 'any.heat')).toEqual({
      criterionId: 'any.heat',
      seen: true,
    });
  });
});

describe('what keeps an inspection from being recorded', () => {
  it('is nothing once every question of a complete one is answered', () => {
    expect(faultsOf(allClean).first).toBeNull();
    expect(verdictOf(allClean, 'initial').verdict).toBe('pass');
  });

  it('is the first question without an answer, in a complete one', () => {
    const faults = faultsOf(answerRestClean(EMPTY_INSPECTION, keys.slice(1)));
    expect(faults.first).toBe(questionId(keys[0] ?? ''));
    expect(faults.areMissingFaults).toBe(true);
  });

  it('is a frequent one that passes without a word on the rest', () => {
    expect(faultsOf(EMPTY_INSPECTION, 'frequent').restClean).toMatch(/looked at the rest/);
    expect(faultsOf({ ...EMPTY_INSPECTION, restClean: true }, 'frequent').first).toBeNull();
  });

  it('is not a frequent one that found something, whatever else was looked at', () => {
    expect(faultsOf(answerRow(EMPTY_INSPECTION, CRACK, { choice: 'seen' }), 'frequent').first).toBeNull();
  });

  it('is "the rest is clean" in no complete one', () => {
    expect(faultsOf({ ...EMPTY_INSPECTION, restClean: true }, 'periodic').areMissingFaults).toBe(true);
  });

  it('is a date in the future or a temperature that is none', () => {
    expect(faultsOf(allClean, 'initial', '2026-12-02').inspectedOn).toBeDefined();
    const draft = answerRow(allClean, 'any.heat', { choice: 'seen', celsius: 'hot' });
    expect(faultsOf(draft).first).toBe('question-any-heat');
  });

  it('is a stricter verdict without a word why; a laxer one is not sent at all', () => {
    expect(faultsOf({ ...allClean, stricter: 'reject' }).stricterNote).toBeDefined();
    expect(faultsOf({ ...allClean, stricter: 'reject', stricterNote: 'no trust in it' }).first).toBeNull();
    expect(toStricter({ ...allClean, stricter: 'refer', stricterNote: 'x' }, 'reject')).toBeUndefined();
  });
});

describe('the types offered', () => {
  const none = { due: null, allowedActions: [] };
  it('follow from the state', () => {
    expect(listTypes({ ...none, state: 'received' })).toEqual(['initial']);
    expect(listTypes({ ...none, state: 'held' })).toEqual(['release']);
    expect(listTypes({ ...none, state: 'returned' })).toEqual(['release']);
    expect(listTypes({ ...none, state: 'destroyed' })).toEqual([]);
  });

  it('begin with the periodic one as soon as it is due', () => {
    expect(listTypes({ ...none, state: 'in_service', due: 'ok' })[0]).toBe('frequent');
    expect(listTypes({ ...none, state: 'in_service', due: 'soon' })[0]).toBe('periodic');
  });

  it('add the initial one to a sling that was held before it was ever accepted', () => {
    const unmet = [{ rule: 'initial_inspection', message: 'Needs an initial inspection that passes.' }];
    const allowedActions = [{ action: 'release', open: false, unmet }] as const;
    expect(listTypes({ due: null, state: 'held', allowedActions: [...allowedActions] })).toEqual([
      'release',
      'initial',
    ]);
  });
});
