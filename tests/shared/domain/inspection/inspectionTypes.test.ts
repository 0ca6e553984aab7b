import { describe, expect, it } from 'vitest';
import type { Answer } from '../../../../shared/domain/inspection/criterion';
import {
  INSPECTION_TYPE_FACTS,
  listInspectionErrors,
  type InspectionType,
} from '../../../../shared/domain/inspection/inspectionTypes';
import { criteriaFor } from '../../../../shared/domain/inspection/rows';
import { computeVerdict } from '../../../../shared/domain/inspection/verdict';
import { slingOf } from './slings';

const sling = slingOf('synthetic-web', []);
const clean = criteriaFor(sling).map((row) => row.clean);

function errorsOf(type: InspectionType, answers: Answer[], restClean: boolean): string[] {
  const complete = INSPECTION_TYPE_FACTS[type].isComplete;
  const result = computeVerdict({ sling, answers, ruleSets: ['osha'], complete, restClean });
  return listInspectionErrors(type, restClean, result).map(({ path }) => path);
}

describe('listInspectionErrors', () => {
  it.each(['initial', 'periodic', 'release'] as const)(
    'wants every criterion answered in a %s inspection',
    (type) => {
      expect(errorsOf(type, clean, false)).toEqual([]);
      expect(errorsOf(type, clean.slice(2), false)).toEqual(['answers', 'answers']);
      expect(errorsOf(type, clean.slice(1), true)).toEqual(['restClean', 'answers']);
    },
  );

  it('lets a frequent inspection say that the rest is clean', () => {
    expect(errorsOf('frequent', [], true)).toEqual([]);
    expect(errorsOf('frequent', [], false)).toEqual(['restClean']);
    expect(errorsOf('frequent', clean, false)).toEqual([]);
  });

  it('takes a frequent inspection that found damage as it is', () => {
    expect(errorsOf('frequent', [{ criterionId: 'web.knot', seen: true }], false)).toEqual([]);
  });

  it('passes on what is wrong with an answer', () => {
    expect(errorsOf('frequent', [{ criterionId: 'chain.crack', seen: true }], true)).toEqual([
      'answers.0.criterionId',
    ]);
  });
});
