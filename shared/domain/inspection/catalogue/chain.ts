import { b309, construction, en, osha, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['alloy-chain'], part: 'body' } as const;
/** Chain list of B30.9 as restated in WAC 296-155 (trade-facts 2.3, [read R6]). */
const asme = b309('9-1.9.5, restated in WAC 296-155', 'read');
/** Use rules of EN 818-6 as a grade 10 manual prints them (trade-facts 4.4, [read-2 R61]). */
const en818 = en('EN 818-6', 'discard list, as restated', 'read_2');

export const CHAIN_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'chain.bent_twisted_link',
    name: 'Bent, twisted or stretched link',
    question: 'Is any link bent, twisted or visibly stretched?',
    help: 'Lay the chain flat without twist and sight along it: every second link lies in one line.',
    rules: [osha('(d), (e)(3)(iii)', 'read'), construction('(a)(6)', 'read'), asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.crack',
    name: 'Cracked or broken link, or a defective weld',
    question: 'Is any link cracked or broken, or is a weld defective?',
    help: 'Clean the link first and look across the weld and the inside of the bends under good light.',
    rules: [osha('(d), (e)(3)(iii)', 'read'), construction('(a)(6)', 'read'), asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.nick_gouge',
    name: 'Nick, cut or gouge in a link',
    question: 'Is any link nicked, cut or gouged?',
    help: 'Run a gloved thumb along the straight sides and feel for sharp notches across the link.',
    rules: [asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.weld_spatter',
    name: 'Weld spatter on a link',
    question: 'Is there weld spatter on the chain?',
    help: 'Look for drops of metal that stick to the links, often near where someone welded.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'chain.stiff_links',
    name: 'Links that do not move freely',
    question: 'Are there links that do not hinge freely on each other?',
    help: 'Let the chain run through your hands link by link and work every joint both ways.',
    rules: [asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.corrosion',
    name: 'Heavy pitting or corrosion',
    question: 'Is the chain heavily pitted or corroded?',
    help: 'A film of rust that wipes off is not meant: look for pits and flakes after cleaning.',
    rules: [asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.heat_discoloured',
    name: 'Colour or scale from heat',
    question: 'Does any part of the chain show colours or scale from heat?',
    help: 'Look for straw, blue or grey patches, scale, and arc strikes.',
    rules: [asme, en818],
  }),
  seenCriterion({
    ...base,
    id: 'chain.legs_unequal',
    name: 'Legs of unequal length',
    question: 'Do the legs differ noticeably in length?',
    help: 'Hang the sling from its master link, or lay the legs side by side, and compare the ends.',
    appliesTo: (sling) => sling.legs === undefined || sling.legs > 1,
    rules: [en818],
  }),
];
