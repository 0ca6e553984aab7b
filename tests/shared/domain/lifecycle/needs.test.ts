import { describe, expect, it } from 'vitest';
import { answerAction, answerActions, findSamePerson } from '../../../../shared/domain/lifecycle/answer';
import { SLING_ACTIONS, type SlingAction } from '../../../../shared/domain/lifecycle/actions';
import type { Actor, LifecycleFacts } from '../../../../shared/domain/lifecycle/facts';
import type { KindAndSpec } from '../../../../shared/domain/slings/spec';
import {
  evaluation,
  held,
  INSPECTOR,
  inspection,
  MANAGER,
  OTHER_INSPECTOR,
  reason,
  received,
  returned,
  STOREKEEPER,
} from './facts';

const rulesOf = (action: SlingAction, facts: LifecycleFacts, actor: Actor = INSPECTOR): string[] =>
  answerAction(action, facts, actor)
    .unmet.map(({ rule }) => rule)
    .sort();

/** Each row is one thing taken away from facts that lack nothing; the rules are all that is then unmet. */
type Missing = [string, Partial<LifecycleFacts>, string[]];

const web: KindAndSpec = {
  kind: 'synthetic-web',
  spec: { fibre: 'polyester', widthMm: 60, plies: 2, type: 'eye_eye_flat' },
};
const wireRope = (
  splice: 'flemish' | 'hand_tucked' | 'turnback' | 'swaged_socket' | 'poured_socket' | 'welded_end',
) =>
  ({
    kind: 'wire-rope',
    spec: {
      construction: 'strand_laid',
      className: '6x36',
      diameterMm: 16,
      core: 'iwrc',
      ropeGrade: 'eips',
      splice,
    },
  }) as const;
const mesh: KindAndSpec = { kind: 'metal-mesh', spec: { duty: 'heavy', widthMm: 150, wireMm: 3.4 } };

describe('accept', () => {
  it('is open when nothing is missing', () => {
    expect(answerAction('accept', received(), INSPECTOR)).toEqual({
      action: 'accept',
      open: true,
      unmet: [],
    });
  });

  it.each<Missing>([
    ['a live label', { hasLiveLabel: false }, ['live_label']],
    ['the maker’s tag', { makersTag: 'missing' }, ['makers_tag']],
    ['a legible maker’s tag', { makersTag: 'illegible' }, ['makers_tag']],
    ['a rated load', { ratedLoads: { verticalKg: 0 } }, ['rated_load']],
    ['the certificate', { certificates: [] }, ['certificate']],
    ['an inspection', { inspections: [] }, ['initial_inspection']],
    [
      'an initial one',
      { inspections: [inspection('release', 4), inspection('periodic', 5)] },
      ['initial_inspection'],
    ],
    [
      'a passing one',
      { inspections: [inspection('initial', 4, { verdict: 'refer' })] },
      ['initial_inspection'],
    ],
    [
      'a complete one',
      { inspections: [inspection('initial', 4, { isComplete: false })] },
      ['initial_inspection'],
    ],
    [
      'a pass as the last word',
      { inspections: [inspection('initial', 4), inspection('initial', 5, { verdict: 'reject' })] },
      ['initial_inspection'],
    ],
  ])('is refused without %s, and for that alone', (_what, changes, rules) => {
    expect(rulesOf('accept', received(changes))).toEqual(rules);
  });

  it('is refused to an inspector without a designation for the kind', () => {
    expect(rulesOf('accept', received(), { ...INSPECTOR, designation: null })).toEqual(['designation']);
  });

  it.each([
    ['alloy-chain', received().sling, true],
    ['metal-mesh', mesh, true],
    ['turnback', wireRope('turnback'), true],
    ['swaged socket', wireRope('swaged_socket'), true],
    ['poured socket', wireRope('poured_socket'), true],
    ['welded end', wireRope('welded_end'), true],
    ['flemish eye', wireRope('flemish'), false],
    ['hand-tucked', wireRope('hand_tucked'), false],
    ['web', web, false],
  ] as const)('of a sling with %s asks for a certificate: section 4', (_name, sling, isAsked) => {
    expect(rulesOf('accept', received({ sling, certificates: [] }))).toEqual(isAsked ? ['certificate'] : []);
  });
});

describe('release', () => {
  it('is open when nothing is missing', () => {
    expect(answerAction('release', held(), INSPECTOR)).toEqual({ action: 'release', open: true, unmet: [] });
  });

  it.each<Missing>([
    ['a live label', { hasLiveLabel: false }, ['live_label']],
    ['a legible maker’s tag', { makersTag: 'illegible' }, ['makers_tag']],
    ['an inspection', { inspections: [] }, ['release_inspection']],
    [
      'a release inspection',
      { inspections: [inspection('periodic', 7), inspection('initial', 8)] },
      ['release_inspection'],
    ],
    [
      'a passing one',
      { inspections: [inspection('release', 7, { verdict: 'refer' })] },
      ['release_inspection'],
    ],
    [
      'a complete one',
      { inspections: [inspection('release', 7, { isComplete: false })] },
      ['release_inspection'],
    ],
    [
      'one of their own',
      { inspections: [inspection('release', 7, { inspectorId: 3 })] },
      ['release_inspection'],
    ],
    [
      'one after the last reason',
      { openReasons: [reason('latch', 6), reason('latch', 8)] },
      ['release_inspection'],
    ],
    ['one after the reason’s own row', { openReasons: [reason('latch', 7)] }, ['release_inspection']],
  ])('is refused without %s, and for that alone', (_what, changes, rules) => {
    expect(rulesOf('release', held(changes))).toEqual(rules);
  });

  it('is refused to an inspector without a designation for the kind', () => {
    expect(rulesOf('release', held(), { ...INSPECTOR, designation: null })).toEqual(['designation']);
  });

  it('is refused while a confirmed reason is open', () => {
    const openReasons = [
      reason('damage_suspected', 5),
      reason('unauthorised_repair', 6, { confirmed: true }),
    ];
    expect(rulesOf('release', held({ openReasons }))).toContain('confirmed_reason');
  });

  it('is not in the table for a condemned sling, whatever else is met', () => {
    expect(rulesOf('release', held({ condemned: true, condemnedBy: 9 }))).toEqual(['state']);
  });

  it('leaves the maker’s tag to the evidence when that is a reason being cleared', () => {
    const openReasons = [reason('makers_tag_missing', 6)];
    expect(rulesOf('release', held({ openReasons, makersTag: 'missing' }))).toEqual([]);
  });

  describe('of a sling that was never accepted', () => {
    const never = (changes: Partial<LifecycleFacts> = {}) => held({ lastInServiceSeq: null, ...changes });

    it.each<Missing>([
      ['nothing', {}, []],
      ['the initial inspection', { inspections: [inspection('release', 7)] }, ['initial_inspection']],
      ['the certificate', { certificates: [] }, ['certificate']],
      ['a rated load', { ratedLoads: { verticalKg: 0 } }, ['rated_load']],
      ['a live label', { hasLiveLabel: false }, ['live_label']],
      ['a legible maker’s tag', { makersTag: 'missing' }, ['makers_tag']],
    ])('without %s is refused for just that', (_what, changes, rules) => {
      expect(rulesOf('release', never(changes))).toEqual(rules);
    });

    it('asks for those no more once it was in service', () => {
      const changes = { certificates: [], inspections: [inspection('release', 7)] };
      expect(rulesOf('release', held(changes))).toEqual([]);
    });
  });

  describe('of a sling that was sent since it was last in service', () => {
    const back = (changes: Partial<LifecycleFacts> = {}) =>
      returned({ state: 'held', openReasons: [reason('found', 9)], ...changes });

    it.each<Missing>([
      ['nothing', {}, []],
      ['the evaluator’s word', { evaluation: evaluation({ outcome: null }) }, ['evaluation_outcome']],
      ['any evaluation', { evaluation: null }, ['evaluation_outcome', 'evaluation_report']],
      ['a good word', { evaluation: evaluation({ outcome: 'unfit' }) }, ['evaluation_outcome']],
      ['the report', { evaluation: evaluation({ hasReport: false }) }, ['evaluation_report']],
      [
        'proof of the repair',
        { evaluation: evaluation({ outcome: 'repaired' }) },
        ['proof_test', 'repairer'],
      ],
      ['an inspection since it came back', { cameBackSeq: 11 }, ['release_inspection']],
    ])('without %s is refused for just that', (_what, changes, rules) => {
      expect(rulesOf('release', back(changes))).toEqual(rules);
    });

    it('asks for those no more once it was in service again', () => {
      expect(rulesOf('release', back({ lastInServiceSeq: 9, evaluation: null }))).toEqual([]);
    });
  });
});

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

describe('the other actions', () => {
  it('sends only what is secured, and only with a shipment', () => {
    expect(rulesOf('send', held(), MANAGER)).toEqual(['shipment']);
    expect(rulesOf('send', held({ custody: 'in_store' }), MANAGER)).toEqual(['secured', 'shipment']);
  });

  it.each([
    [evaluation({ outcome: 'destroyed', hasDestructionCertificate: true }), []],
    [evaluation({ outcome: 'destroyed' }), ['destruction_certificate']],
    [evaluation({ outcome: 'unfit', hasDestructionCertificate: true }), ['destruction_certificate']],
    [null, ['destruction_certificate']],
  ])('destroys at the evaluator’s only with the certificate', (seen, rules) => {
    const facts = returned({ state: 'sent_for_evaluation', evaluation: seen });
    expect(rulesOf('destroyed_by_evaluator', facts, MANAGER)).toEqual(rules);
  });

  it('lets a held sling leave only to its owner, and a rejected own one never', () => {
    const rejected = [reason('criterion', 6, { confirmed: true })];
    expect(rulesOf('depart', received(), MANAGER)).toEqual([]);
    expect(rulesOf('depart', held(), MANAGER)).toEqual(['held_leaves_to_owner']);
    expect(rulesOf('depart', held({ openReasons: rejected }), MANAGER)).toEqual([
      'confirmed_reason',
      'held_leaves_to_owner',
    ]);
    expect(rulesOf('depart', returned({ openReasons: rejected }), MANAGER)).toEqual(['confirmed_reason']);
    expect(rulesOf('depart', held({ ownerKind: 'hired', openReasons: rejected }), MANAGER)).toEqual([]);
    expect(rulesOf('depart', held({ ownerKind: 'hired', condemned: true }), MANAGER)).toEqual(['state']);
  });

  it('asks nothing that could stop a hold, a cage, a return or a find (rule 1)', () => {
    const nothing: Partial<LifecycleFacts> = {
      hasLiveLabel: false,
      makersTag: 'missing',
      certificates: [],
      inspections: [],
      evaluation: null,
    };
    const away = received({ ...nothing, state: 'sent_for_evaluation', custody: 'evaluator' });
    const lost = received({ ...nothing, state: 'lost', custody: 'unknown' });
    expect(rulesOf('hold', received(nothing), STOREKEEPER)).toEqual([]);
    expect(rulesOf('hold', away, STOREKEEPER)).toEqual([]);
    expect(rulesOf('hold', lost, STOREKEEPER)).toEqual([]);
    expect(rulesOf('secure', held(nothing), STOREKEEPER)).toEqual([]);
    expect(rulesOf('receive_back', away, STOREKEEPER)).toEqual([]);
    expect(rulesOf('found', lost, STOREKEEPER)).toEqual([]);
  });

  it('answers every action once, in the table’s order, and never opens one with something unmet', () => {
    for (const facts of [received(), held(), returned(), held({ condemned: true })]) {
      const answers = answerActions(facts, MANAGER);
      expect(answers.map(({ action }) => action)).toEqual([...SLING_ACTIONS]);
      for (const { open, unmet } of answers) expect(open).toBe(unmet.length === 0);
    }
  });
});

describe('two people (rule 3)', () => {
  it('refuses a release to whoever placed any of the open reasons', () => {
    const openReasons = [reason('latch', 5), reason('found', 6, { placedBy: INSPECTOR.id })];
    const facts = held({ openReasons });
    expect(findSamePerson('release', facts, INSPECTOR)?.rule).toBe('same_person');
    expect(findSamePerson('release', facts, OTHER_INSPECTOR)).toBeNull();
    expect(rulesOf('release', facts)).toEqual(['same_person']);
  });

  it('counts the person, not the role: a storekeeper who is an inspector too is refused', () => {
    const both: Actor = { ...INSPECTOR, id: STOREKEEPER.id, roles: ['storekeeper', 'inspector', 'manager'] };
    expect(findSamePerson('release', held(), both)?.rule).toBe('same_person');
  });

  it('has no same person where the system placed the reason', () => {
    const openReasons = [reason('record_in_doubt', 6, { placedBy: null })];
    expect(findSamePerson('release', held({ openReasons }), INSPECTOR)).toBeNull();
  });

  it('refuses destruction to whoever condemned the sling, and to nobody else', () => {
    const facts = held({ condemned: true, condemnedBy: MANAGER.id });
    expect(findSamePerson('destroy', facts, MANAGER)?.rule).toBe('same_person');
    expect(rulesOf('destroy', facts, MANAGER)).toEqual(['same_person']);
    expect(rulesOf('destroy', facts, STOREKEEPER)).toEqual([]);
  });
});
