import { b309, construction, osha, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['synthetic-rope'], part: 'body' } as const;
/** B30.9 chapter 9-4 as a sling inspection course restates it (trade-facts 2.3, [read-2 R50]). */
const asme = b309('9-4.9.5, as restated', 'read_2');
/** The six items of the fibre rope paragraph, in a slide summary of the construction twin too (trade-facts 1.3, [read-2 R38, R53]). */
const constructionList = construction('(d)', 'read_2');

export const FIBRE_ROPE_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'fibre.cut_break',
    name: 'Cut or broken fibres',
    question: 'Are fibres cut, gouged or broken?',
    help: 'Look along the whole rope and in the eyes; one cut strand is enough.',
    rules: [osha('(h)(5)(iii)', 'read_2'), constructionList, asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.abrasion',
    name: 'Abnormal wear',
    question: 'Is the rope abnormally worn or abraded at any place?',
    help: 'Compare with an unused stretch near the splice; look where the rope passes over edges and hooks.',
    rules: [osha('(h)(5)(i)', 'read_2'), constructionList, asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.fuzz',
    name: 'Fuzz over most of the length',
    question: 'Is the rope evenly fuzzy over most of its length?',
    help: 'A light nap in places is normal; the whole rope covered with broken filaments is not.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.powder',
    name: 'Powdered fibre between strands',
    question: 'Is there powdered fibre between the strands?',
    help: 'Twist the rope open at several places and look for dust between the strands.',
    rules: [osha('(h)(5)(ii)', 'read_2'), constructionList],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.dirt_soaked',
    name: 'Grit or foreign matter in the rope',
    question: 'Is there much dirt or grit inside, or has something soaked into the rope?',
    help: 'Open the strands and look for grit, paint, oil or chemicals that do not brush out.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.melt_char',
    name: 'Melted, hard or charred area',
    question: 'Is there a melted, hard or charred area?',
    help: 'Feel for hard, shiny places, above all where the rope slid over something under load.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.rot_discoloured',
    name: 'Rotten, discoloured, brittle or stiff fibre',
    question: 'Is the fibre rotten, discoloured, brittle or stiff?',
    help: 'Bend the rope and rub the fibres: sound ones stay supple and do not break.',
    rules: [osha('(h)(5)(v)', 'read_2'), constructionList, asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.kink',
    name: 'Kink or hockle',
    question: 'Is there a kink or hockle in the rope?',
    help: 'Lay the rope out without load: a strand that stands out in a loop is a hockle.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'fibre.strand_variation',
    name: 'Strands uneven in size or roundness',
    question: 'Do the strands vary in size or roundness?',
    help: 'Run the rope through a closed hand and feel for thick and thin places.',
    rules: [osha('(h)(5)(iv)', 'read_2'), constructionList],
  }),
];
