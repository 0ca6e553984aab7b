import { SLING_KINDS } from '../../slings/kinds';
import { australian, b309, construction, en, osha, practice, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: SLING_KINDS } as const;
const CHAIN = ['alloy-chain'] as const;
const MESH = ['metal-mesh'] as const;
const WEB = ['synthetic-web'] as const;
const ROUND = ['synthetic-round'] as const;
const FIBRE_ROPE = ['synthetic-rope'] as const;

/** What is asked of every kind: the maker's tag, repairs, heat, and any other doubt. */
export const COMMON_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'tag.missing_illegible',
    part: 'makers_tag',
    name: 'Maker’s tag missing or illegible',
    question: 'Is the maker’s tag missing, or can any of it not be read?',
    help: 'Read the maker, the rated loads and the size or material on the tag itself, not from the record.',
    holdReason: 'makers_tag_missing',
    rules: [
      // trade-facts 1.1, [read-2 R37, Michigan R 408.14911(3)]
      osha('(c)(14)', 'read_2'),
      construction('(a)(2)(iii)', 'read_2'),
      // trade-facts 2.3, worked example ex-any-no-tag
      b309('removal criteria of every chapter, restated in WAC 296-155-33825 Table 17', 'read'),
      en('EN 818-6', 'discard list, as restated', 'read_2', { kinds: CHAIN }),
      en('EN 1492-1, EN 1492-2', 'use text', 'from_memory', { kinds: [...WEB, ...ROUND] }),
      en('SI 1998/2307 (LOLER)', 'reg 7, marking', 'from_memory', {
        kinds: ['wire-rope', 'metal-mesh', 'synthetic-rope'],
      }),
      australian('AS 3775, AS 1353, AS 4497', 'marking', 'from_memory'),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'any.improper_repair',
    part: 'any',
    name: 'Improper repair',
    question: 'Has anyone repaired it with bolts, knots, welds or makeshift links?',
    help: 'Look for anything that the maker did not put there: a bolt, a mechanical link, a weld, a stitch, a patch.',
    holdReason: 'unauthorised_repair',
    rules: [
      // trade-facts 1.7
      osha('(e)(7)', 'from_memory', { kinds: CHAIN }),
      osha('(g)(8)', 'read', { kinds: MESH }),
      osha('(h)(6)', 'read_2', { kinds: FIBRE_ROPE }),
      osha('(i)(8)', 'from_memory', { kinds: WEB }),
      // trade-facts 2.6: read for web (R42), the other chapters from memory
      b309('9-5.9, repair only by the maker or a qualified person', 'read', { kinds: WEB }),
      b309('repair only by the maker or a qualified person', 'from_memory', {
        kinds: SLING_KINDS.filter((kind) => kind !== 'synthetic-web'),
      }),
      // trade-facts 4.5, [read-2 R59]: never repaired by the user
      en('EN 1492-1, EN 1492-2', 'use text, as restated', 'read_2', { kinds: [...WEB, ...ROUND] }),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'any.heat',
    part: 'any',
    name: 'Exposed to heat',
    question: 'Was it exposed to heat beyond ordinary use?',
    help: 'Ask the crew and look at the job: furnaces, hot loads, welding. Give the temperature reached where it is known.',
    answer: 'temperature',
    unit: 'C',
    rules: [practice('the temperature reached is not known', { outcome: 'refer' })],
  }),
  seenCriterion({
    ...base,
    id: 'any.doubt',
    part: 'any',
    name: 'Another cause for doubt',
    question: 'Is there anything else that makes you doubt it?',
    help: 'Say what it is in the note: a qualified person decides.',
    // trade-facts 2.3: "anything that raises doubt" applies to every type [read R6]
    rules: [b309('removal criteria of every chapter, restated in WAC 296-155', 'read', { outcome: 'refer' })],
  }),
];
