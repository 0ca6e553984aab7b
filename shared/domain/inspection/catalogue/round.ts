import { b309, en, practice, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['synthetic-round'], part: 'body' } as const;
/** B30.9 chapter 9-6 as restated in WAC 296-155-33825 Table 17 (trade-facts 2.3, [read R6]). OSHA has no list for this kind. */
const asme = b309('9-6.9.5, restated in WAC 296-155-33825 Table 17', 'read');
/** A European supplier's use text for textile slings (trade-facts 4.5, [read-2 R59]). */
const en1492 = en('EN 1492-2', 'use text, as restated', 'read_2');

export const ROUND_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'round.core_exposed',
    name: 'Core yarns exposed',
    question: 'Are core yarns exposed by a hole, tear, cut, snag or abrasion of the cover?',
    help: 'Turn the whole sling through your hands; white yarn that shows through the cover is the core.',
    rules: [asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'round.core_damaged',
    name: 'Core yarns broken or damaged',
    question: 'Are core yarns broken or damaged?',
    help: 'Feel through the cover for lumps, thin places and hard spots.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'round.acid_caustic',
    name: 'Burn from acid or caustic',
    question: 'Are there burns or soft places from acid or caustic?',
    help: 'Look for stains, bleached patches and a cover that powders when rubbed.',
    rules: [asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'round.melt_char',
    name: 'Melting, charring or heat damage',
    question: 'Is any part melted, charred or damaged by heat?',
    help: 'Feel for hard, shiny patches on the cover and stiff places of the core beneath.',
    rules: [asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'round.weld_spatter',
    name: 'Weld spatter that exposes the core',
    question: 'Has weld spatter burned through so that core yarns show?',
    help: 'Look for small round holes with hard, dark edges.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'round.knot',
    name: 'Knot in the sling',
    question: 'Is there a knot in the sling?',
    help: 'A knot in the sling itself is meant; small knots of the core yarns inside the cover do not count.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'round.cover_cut',
    name: 'Cover cut, core not exposed',
    question: 'Is the cover cut, torn or locally worn through, with no core yarn showing?',
    help: 'Damage of the cover points to damage of the core beneath: a qualified person looks at it.',
    rules: [
      en('EN 1492-2', 'use text, as restated', 'read_2', { outcome: 'refer' }),
      practice('the core cannot be judged through its cover', { outcome: 'refer' }),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'round.cover_scuff',
    name: 'Cover scuffed',
    question: 'Is the cover scuffed, with nothing cut or worn through?',
    help: 'General chafe is normal in use; note where it is so that the next inspector can compare.',
    rules: [en('EN 1492-2', 'use text, as restated', 'read_2', { outcome: 'note' })],
  }),
];
