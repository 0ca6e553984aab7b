import { describe, expect, it } from 'vitest';
import {
  evaluation,
  INSPECTOR,
  inspection,
  mesh,
  OTHER_INSPECTOR,
  reason,
  returned,
  rulesOf,
  web,
  wireRope,
  type Missing,
} from './facts';

describe('return to service', () => {
  it('is open when nothing is missing', () => {
    expect(rulesOf('return_to_service', returned())).toEqual([]);
  });

  const repaired = { outcome: 'repaired', repairer: 'Fennel & Stroud', proofLoadKg: 6300 } as const;

  it.each<Missing>([
    ['the evaluator’s word', { evaluation: evaluation({ outcome: null }) }, ['evaluation_outcome']],
    ['an examination', { evaluation: evaluation({ outcome: 'not_examined' }) }, ['evaluation_outcome']],
    ['a good word', { evaluation: evaluation({ outcome: 'unfit' }) }, ['evaluation_outcome']],
    ['the report', { evaluation: evaluation({ hasReport: false }) }, ['evaluation_report']],
    ['an inspection since it came back', { inspections: [inspection('release', 8)] }, ['release_inspection']],
    ['a release inspection', { inspections: [inspection('periodic', 10)] }, ['release_inspection']],
    [
      'a passing one',
      { inspections: [inspection('release', 10, { verdict: 'refer' })] },
      ['release_inspection'],
    ],
    ['a live label', { hasLiveLabel: false }, ['live_label']],
    ['a legible maker’s tag', { makersTag: 'illegible' }, ['makers_tag']],
    ['peace since it was sent', { openReasons: [reason('latch', 9)] }, ['open_reason']],
    ['the repairer', { evaluation: evaluation({ ...repaired, repairer: null }) }, ['repairer']],
    ['a named repairer', { evaluation: evaluation({ ...repaired, repairer: '' }) }, ['repairer']],
    ['a proof test', { evaluation: evaluation({ ...repaired, proofLoadKg: null }) }, ['proof_test']],
    // Twice the vertical rated load of 3,150 kg (29 CFR 1910.184(e)(4), trade facts 1.7).
    [
      'load enough in the proof test',
      { evaluation: evaluation({ ...repaired, proofLoadKg: 6299.9 }) },
      ['proof_test'],
    ],
    ['anything, repaired and tested', { evaluation: evaluation(repaired) }, []],
    [
      'a lawful repair',
      { sling: web, evaluation: evaluation(repaired) },
      ['proof_test', 'repair_not_allowed'],
    ],
    [
      'a lawful rope repair',
      { sling: wireRope('flemish'), evaluation: evaluation(repaired) },
      ['proof_test', 'repair_not_allowed'],
    ],
    ['anything, mesh repaired and tested', { sling: mesh, evaluation: evaluation(repaired) }, []],
  ])('without %s is refused for just that', (_what, changes, rules) => {
    expect(rulesOf('return_to_service', returned(changes))).toEqual(rules);
  });

  const newPaper = [{ basis: 'assembly', loadKg: 4000, seq: 9 }] as const;
  const lower = evaluation({ ratedLoads: { verticalKg: 2000, chokerKg: 1600 } });
  it.each<Missing>([
    [
      'the same rated loads',
      { evaluation: evaluation({ ratedLoads: { verticalKg: 3150, chokerKg: 2520 } }) },
      [],
    ],
    [
      'a higher one',
      {
        evaluation: evaluation({ ratedLoads: { verticalKg: 3151, chokerKg: 2520 } }),
        certificates: newPaper,
      },
      ['rated_load'],
    ],
    [
      'a higher choker load alone',
      {
        evaluation: evaluation({ ratedLoads: { verticalKg: 3150, chokerKg: 2600 } }),
        certificates: newPaper,
      },
      ['rated_load'],
    ],
    [
      'a basket load where none was',
      { evaluation: evaluation({ ratedLoads: { verticalKg: 3150, basketKg: 1 } }), certificates: newPaper },
      ['rated_load'],
    ],
    ['a lower one and the old certificate', { evaluation: lower }, ['rated_load']],
    [
      'a lower choker load alone and the old certificate',
      { evaluation: evaluation({ ratedLoads: { verticalKg: 3150, chokerKg: 2000 } }) },
      ['rated_load'],
    ],
    ['a lower one and a certificate since it was sent', { evaluation: lower, certificates: newPaper }, []],
  ])('with %s', (_what, changes, rules) => {
    expect(rulesOf('return_to_service', returned(changes))).toEqual(rules);
  });

  it('with a lower one needs the new maker’s tag', () => {
    const facts = returned({ evaluation: lower, certificates: newPaper, makersTag: 'illegible' });
    expect(rulesOf('return_to_service', facts)).toEqual(['makers_tag', 'rated_load']);
  });

  it('counts any inspector’s release inspection, but the actor must be designated', () => {
    expect(rulesOf('return_to_service', returned(), OTHER_INSPECTOR)).toEqual([]);
    expect(rulesOf('return_to_service', returned(), { ...INSPECTOR, designation: null })).toEqual([
      'designation',
    ]);
  });
});
