import { b309, construction, osha, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['wire-rope'], part: 'body' } as const;
/** Wire rope list of B30.9 as a supplier restates it (trade-facts 2.3, [read-2 SUP-A]). */
const asme = b309('9-2.9.5, as restated', 'read_2');
/** "Excessive wear, corrosion or defect" (trade-facts 1.3, [read-2 SUP-A]). */
const constructionDefect = construction('(c)(4)(iv)', 'read_2');

export const WIRE_ROPE_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'rope.kink_crush_birdcage',
    name: 'Kink, crushing or birdcage',
    question: 'Is the rope kinked, crushed, bird-caged or otherwise out of its shape?',
    help: 'Look for a sharp bend that stays, a flat place, or strands that stand away from the core like a cage.',
    rules: [osha('(f)(5)(iii)', 'read'), constructionDefect, asme],
  }),
  seenCriterion({
    ...base,
    id: 'rope.corrosion',
    name: 'Corrosion of the rope',
    question: 'Is the rope or its end attachment corroded?',
    help: 'Bend the rope gently and look between the strands for pits, rust dust and wires that have lost their shine.',
    rules: [osha('(f)(5)(vii)', 'read'), constructionDefect, asme],
  }),
  seenCriterion({
    ...base,
    id: 'rope.heat',
    name: 'Heat damage of the rope',
    question: 'Is there any sign of heat damage on the rope?',
    help: 'Look for blue or brown wires, melted grease, arc strikes and a burnt core.',
    rules: [osha('(f)(5)(iv)', 'read'), constructionDefect, asme],
  }),
  seenCriterion({
    ...base,
    id: 'rope.end_attachment',
    name: 'Cracked, deformed or worn end attachment',
    question: 'Is a ferrule, splice, socket or eye cracked, deformed, worn or pulled?',
    help: 'Look at both ends of every leg: the ferrule for cracks, the rope where it enters it for slip and broken wires.',
    rules: [osha('(f)(5)(v)', 'read'), constructionDefect, asme],
  }),
  seenCriterion({
    ...base,
    id: 'rope.local_abrasion',
    name: 'Severe local abrasion or scraping',
    question: 'Is the rope severely abraded or scraped at any place?',
    help: 'Look for a flat, shiny stretch where the outside wires have lost their roundness.',
    rules: [constructionDefect, asme],
  }),
];
