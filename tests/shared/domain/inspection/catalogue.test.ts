import { describe, expect, it } from 'vitest';
import { CATALOGUE, findCriterion, listCriteria } from '../../../../shared/domain/inspection/catalogue';
import { RULE_SET_IDS, defaultRuleSets } from '../../../../shared/domain/inspection/ruleSets';
import { SLING_KINDS } from '../../../../shared/domain/slings/kinds';

/** criteria.md: every id that is answered seen / not seen, with its outcome where the set that lists it speaks. */
const FIXED = [
  ...'bent_twisted_link crack nick_gouge weld_spatter stiff_links corrosion heat_discoloured'
    .split(' ')
    .map((n) => `chain.${n}`),
  ...'kink_crush_birdcage corrosion heat end_attachment'.split(' ').map((n) => `rope.${n}`),
  ...'broken_weld_or_wire stiff handle_twist'.split(' ').map((n) => `mesh.${n}`),
  ...'acid_caustic melt_char cut_hole_tear stitching abrasion knot warning_yarn stiff_discoloured'
    .split(' ')
    .map((n) => `web.${n}`),
  ...'core_exposed core_damaged acid_caustic melt_char weld_spatter knot cover_cut cover_scuff'
    .split(' ')
    .map((n) => `round.${n}`),
  ...'cut_break abrasion powder melt_char rot_discoloured kink strand_variation'
    .split(' ')
    .map((n) => `fibre.${n}`),
  'hook.crack',
  'hook.latch',
  'fitting.crack_distortion',
  'tag.missing_illegible',
  'any.improper_repair',
  'any.heat',
  'any.doubt',
];

describe('catalogue', () => {
  it('holds every fixed criterion that is seen (criteria.md)', () => {
    expect(FIXED.filter((id) => findCriterion(id) === null)).toEqual([]);
  });

  it('has unique ids of the form part.name', () => {
    const ids = CATALOGUE.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.filter((id) => !/^[a-z]+\.[a-z0-9_]+$/.test(id))).toEqual([]);
  });

  it('gives every limit a source of the same rule set for the same kinds', () => {
    for (const criterion of CATALOGUE) {
      for (const { ruleSet, kinds } of criterion.limits) {
        const source = criterion.sources.find((s) => s.ruleSet === ruleSet && s.kinds === kinds);
        expect(source?.clause, `${criterion.id} ${ruleSet}`).toBeTruthy();
      }
    }
  });

  it('has at least one rule set that speaks on every criterion of every kind', () => {
    for (const kind of SLING_KINDS) {
      for (const { id, limits } of listCriteria(kind)) {
        expect(
          limits.some(({ kinds }) => kinds?.includes(kind) ?? true),
          `${kind} ${id}`,
        ).toBe(true);
      }
    }
  });

  it('never names one rule set twice for one kind', () => {
    for (const kind of SLING_KINDS) {
      for (const { id, limits } of listCriteria(kind)) {
        const sets = limits
          .filter(({ kinds }) => kinds?.includes(kind) ?? true)
          .map(({ ruleSet }) => ruleSet);
        expect(new Set(sets).size, `${kind} ${id}`).toBe(sets.length);
      }
    }
  });

  it('lets OSHA say nothing on roundsling bodies: the type is not covered, 1910.184(a) [read R8b]', () => {
    const round = CATALOGUE.filter(({ id }) => id.startsWith('round.'));
    expect(round.flatMap(({ limits }) => limits.map(({ ruleSet }) => ruleSet))).not.toContain('osha');
  });

  it('rejects a missing tag by every published rule set, for every kind (criteria.md)', () => {
    const tag = findCriterion('tag.missing_illegible');
    for (const kind of SLING_KINDS) {
      const sets = tag?.limits.filter(({ kinds }) => kinds?.includes(kind) ?? true) ?? [];
      expect(sets.map(({ ruleSet }) => ruleSet).sort(), kind).toEqual([
        'as',
        'asme',
        'en',
        'osha',
        'osha_construction',
      ]);
      expect(sets.every(({ outcome }) => outcome === 'reject')).toBe(true);
    }
  });

  it('starts US sites with OSHA and ASME, UK and EU sites with EN (criteria.md)', () => {
    expect(defaultRuleSets('us')).toEqual(['osha', 'asme']);
    expect(defaultRuleSets('uk_eu')).toEqual(['en']);
    expect(RULE_SET_IDS).toContain('maker');
  });
});
