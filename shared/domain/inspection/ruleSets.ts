/**
 * The rule sets whose limits are kept apart. A site chooses among the choosable ones; `maker` is always on;
 * `practice` holds what the trade does without a published clause and speaks only where every other set is silent.
 */
export const CHOOSABLE_RULE_SETS = ['osha', 'osha_construction', 'asme', 'en', 'as'] as const;
export type ChoosableRuleSetId = (typeof CHOOSABLE_RULE_SETS)[number];
export const RULE_SET_IDS = [...CHOOSABLE_RULE_SETS, 'maker', 'practice'] as const;
export type RuleSetId = (typeof RULE_SET_IDS)[number];

export type RuleRegion = 'us' | 'uk_eu';

export interface RuleSet {
  id: RuleSetId;
  name: string;
  /** The edition that the figures are taken from, as far as it is known. */
  edition: string;
  document: string;
  /** Sites of these regions start with it. */
  defaultFor: readonly RuleRegion[];
  /** Two readings at 90° of one place: which one counts (criteria.md). */
  twoReadings: 'smaller' | 'mean';
}

/** Editions: trade-facts, head of sections 1 and 2. Most documents were read through public restatements. */
export const RULE_SETS = {
  osha: {
    id: 'osha',
    name: 'OSHA general industry',
    edition: 'as amended 2011',
    document: '29 CFR 1910.184',
    defaultFor: ['us'],
    twoReadings: 'smaller',
  },
  osha_construction: {
    id: 'osha_construction',
    name: 'OSHA construction',
    edition: 'as amended 2012',
    document: '29 CFR 1926.251',
    defaultFor: [],
    twoReadings: 'smaller',
  },
  asme: {
    id: 'asme',
    name: 'ASME B30',
    edition: 'as publicly restated, 2010 to 2018',
    document: 'ASME B30.9, B30.10, B30.26',
    defaultFor: ['us'],
    twoReadings: 'smaller',
  },
  en: {
    id: 'en',
    name: 'EN and LOLER',
    edition: 'as publicly restated; LOLER 1998',
    document: 'EN 818-6, EN 1492-1, EN 1492-2, SI 1998/2307',
    defaultFor: ['uk_eu'],
    twoReadings: 'mean',
  },
  as: {
    id: 'as',
    name: 'Australian standards',
    edition: 'as publicly restated',
    document: 'AS 3775, AS 1353, AS 4497, dogging guide',
    defaultFor: [],
    twoReadings: 'mean',
  },
  maker: {
    id: 'maker',
    name: 'The maker',
    edition: 'as entered on the sling',
    document: 'the maker’s own limits',
    defaultFor: ['us', 'uk_eu'],
    twoReadings: 'smaller',
  },
  practice: {
    id: 'practice',
    name: 'Common practice',
    edition: 'no published source',
    document: 'trade practice',
    defaultFor: [],
    twoReadings: 'smaller',
  },
} as const satisfies Record<RuleSetId, RuleSet>;

/** The sets that a site of this region starts with; `maker` needs no choosing. */
export function defaultRuleSets(region: RuleRegion): ChoosableRuleSetId[] {
  return CHOOSABLE_RULE_SETS.filter((id) => {
    const regions: readonly RuleRegion[] = RULE_SETS[id].defaultFor;
    return regions.includes(region);
  });
}

/** The sets that a verdict is made with, in the fixed order: the chosen ones and always the maker's. */
export function activeRuleSets(chosen: readonly RuleSetId[]): RuleSetId[] {
  return RULE_SET_IDS.filter((id) => id === 'maker' || (id !== 'practice' && chosen.includes(id)));
}
