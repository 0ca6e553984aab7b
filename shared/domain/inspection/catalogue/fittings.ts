import { SLING_KINDS } from '../../slings/kinds';
import { b309, b3010, b3026, construction, en, osha, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: SLING_KINDS, part: 'fitting', perFitting: 'fitting' } as const;
const hookBase = { kinds: SLING_KINDS, part: 'hook' } as const;
const CHAIN = ['alloy-chain'] as const;
const WIRE_ROPE = ['wire-rope'] as const;
const WEB = ['synthetic-web'] as const;
const FIBRE_ROPE = ['synthetic-rope'] as const;

export const FITTING_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...hookBase,
    id: 'hook.crack',
    perFitting: 'hook',
    name: 'Cracked hook',
    question: 'Is this hook cracked?',
    help: 'Clean it and look at the inside of the bend, the neck and round the pin holes.',
    rules: [
      // trade-facts 1.3, [read-2 R11 p.298, R12]
      osha('(e)(9)(ii)', 'read_2', { kinds: CHAIN }),
      osha('(f)(5)(vi)', 'read_2', { kinds: WIRE_ROPE }),
      b3010('removal criteria', 'from_memory'),
      en('EN 818-6', 'discard list, as restated', 'read_2', { kinds: CHAIN }),
    ],
  }),
  seenCriterion({
    ...hookBase,
    id: 'hook.latch',
    perFitting: 'latched_hook',
    name: 'Latch missing or not working',
    question: 'Is this hook’s latch missing, or does it fail to close or lock?',
    help: 'Open it and let go: it closes the throat by itself, and a self-locking hook locks.',
    holdReason: 'latch',
    rules: [
      // trade-facts 3, [read R6, R56]
      b3010('10-1.2, restated in WAC 296-155-55800 Table 12', 'read'),
      // trade-facts 4.4, [read-2 R61]: throat opened so far that the latch can disengage
      en('EN 818-6', 'discard list, as restated', 'read_2', { kinds: CHAIN }),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'fitting.crack_distortion',
    name: 'Cracked, bent or distorted fitting',
    question: 'Is this fitting cracked, broken, bent, twisted or otherwise out of shape?',
    help: 'Compare it with a new one or its mate; look at the bends, the eye and the pin.',
    rules: [
      // trade-facts 1.3
      osha('(e)(9)(i)', 'read_2', { kinds: CHAIN }),
      osha('(f)(5)(v)', 'read', { kinds: WIRE_ROPE }),
      osha('(h)(5)(vi)', 'read_2', { kinds: FIBRE_ROPE }),
      osha('(i)(9)', 'read_2', { kinds: WEB }),
      construction('(e)(8)', 'read_2', { kinds: WEB }),
      // trade-facts 3, EM 385-1-1 15.E.01 [read R13]
      b3026('removal criteria, restated in EM 385-1-1 15.E.01', 'read'),
      en('EN 818-6', 'discard list, as restated', 'read_2', { kinds: CHAIN }),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'fitting.corrosion_gouge',
    name: 'Pitted, corroded or gouged fitting',
    question: 'Is this fitting pitted, corroded, gouged, nicked or sharp-edged?',
    help: 'Look above all where it touches the sling: a sharp edge cuts fibres, a notch starts a crack.',
    rules: [
      osha('(f)(5)(vii)', 'read', { kinds: WIRE_ROPE }),
      // trade-facts 2.3: fittings in the lists of web, roundsling and mesh, components in that of chain [read R6]
      b309('9-1.9.5, restated in WAC 296-155', 'read', { kinds: CHAIN }),
      b309('9-2.9.5, as restated', 'read_2', { kinds: WIRE_ROPE }),
      b309('9-3.9.5, restated in WAC 296-155', 'read', { kinds: ['metal-mesh'] }),
      b309('9-4.9.5, as restated', 'read_2', { kinds: FIBRE_ROPE }),
      b309('9-5.9.5, restated in WAC 296-155', 'read', { kinds: WEB }),
      b309('9-6.9.5, restated in WAC 296-155-33825 Table 17', 'read', { kinds: ['synthetic-round'] }),
      en('EN 818-6', 'discard list, as restated', 'read_2', { kinds: CHAIN }),
    ],
  }),
  seenCriterion({
    ...base,
    id: 'fitting.wrong_pin',
    perFitting: 'shackle',
    name: 'Wrong pin in a shackle',
    question: 'Has this shackle a pin that is not its own, such as a bolt?',
    help: 'The pin carries the maker’s mark and matches the body; it seats fully by hand.',
    // trade-facts 3, EM 385-1-1 15.E.01 [read R13]
    rules: [b3026('removal criteria, restated in EM 385-1-1 15.E.01', 'read')],
  }),
];
