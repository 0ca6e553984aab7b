import { b309, construction, en, osha, practice, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['synthetic-web'], part: 'body' } as const;
/** Paragraphs on removal of synthetic web slings (trade-facts 1.3, [read R3]). */
const oshaList = osha('(i)(9)', 'read');
const constructionList = construction('(e)(8)', 'read');
/** B30.9, web (trade-facts 2.3, [read-2 SUP-J; R6; read R42]). */
const asme = b309('9-5.9.5 (9-5.9.4 in 2010)', 'read');
/** A European supplier's use text for textile slings (trade-facts 4.5, [read-2 R59]). */
const en1492 = en('EN 1492-1', 'use text, as restated', 'read_2');

export const WEB_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'web.acid_caustic',
    name: 'Burn from acid or caustic',
    question: 'Are there burns or soft places from acid or caustic?',
    help: 'Look for stains, bleached or stiff patches and fibres that powder when rubbed.',
    rules: [oshaList, constructionList, asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'web.melt_char',
    name: 'Melting or charring',
    question: 'Is any part melted, charred or glazed?',
    help: 'Feel for hard, shiny strips; friction against a load glazes the face, weld sparks leave small holes.',
    rules: [oshaList, constructionList, asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'web.cut_hole_tear',
    name: 'Cut, hole, tear or snag',
    question: 'Is there a cut, hole, tear, puncture or snag?',
    help: 'Pull the web across your hand and look at both faces and both edges; edge cuts count most.',
    rules: [oshaList, constructionList, asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'web.stitching',
    name: 'Broken or worn stitching',
    question: 'Is stitching in a splice broken or worn?',
    help: 'Look at every row of the load-bearing splices, also under the eye’s cover.',
    rules: [oshaList, constructionList, asme],
  }),
  seenCriterion({
    ...base,
    id: 'web.abrasion',
    name: 'Excessive abrasive wear',
    question: 'Is the web badly worn at any place?',
    help: 'Even fluff is normal; look for a local place where the surface yarns are worn through.',
    rules: [asme, en1492],
  }),
  seenCriterion({
    ...base,
    id: 'web.knot',
    name: 'Knot in the web',
    question: 'Is there a knot in any part of the sling?',
    help: 'A knot that was pulled tight counts even when someone has opened it again.',
    rules: [asme],
  }),
  seenCriterion({
    ...base,
    id: 'web.warning_yarn',
    name: 'Warning yarns showing',
    question: 'Can you see the coloured warning yarns of the core?',
    help: 'Many webs have red yarns inside; where they show, the web was overloaded or is worn through.',
    rules: [practice('training slides on sling inspection; not in the published lists')],
  }),
  seenCriterion({
    ...base,
    id: 'web.stiff_discoloured',
    name: 'Discoloured, brittle or stiff places',
    question: 'Is the web discoloured, brittle or stiff anywhere?',
    help: 'Bleached colour points to sunlight, dark stiff places to heat or chemicals: bend the web and listen.',
    rules: [asme],
  }),
];
