import { describe, expect, it } from 'vitest';
import { answerAction, answerActions, findSamePerson } from '../../../../shared/domain/lifecycle/answer';
import { SLING_ACTIONS } from '../../../../shared/domain/lifecycle/actions';
import type { Actor, LifecycleFacts } from '../../../../shared/domain/lifecycle/facts';
import {
  evaluation,
  held,
  INSPECTOR,
  inspection,
  MANAGER,
  mesh,
  OTHER_INSPECTOR,
  reason,
  received,
  returned,
  rulesOf,
  STOREKEEPER,
  web,
  wireRope,
  type Missing,
} from './facts';

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
