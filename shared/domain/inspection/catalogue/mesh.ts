import { b309, osha, seenCriterion } from '../buildCriterion';
import type { Criterion } from '../criterion';

const base = { kinds: ['metal-mesh'], part: 'body' } as const;
/** Mesh list of B30.9 as restated in WAC 296-155 (trade-facts 2.3, [read R6, R11]). */
const asme = b309('9-3.9.5, restated in WAC 296-155', 'read');

export const MESH_CRITERIA: readonly Criterion[] = [
  seenCriterion({
    ...base,
    id: 'mesh.broken_weld_or_wire',
    name: 'Broken weld, brazed joint or wire',
    question: 'Is a weld or brazed joint along the edge broken, or any wire of the mesh?',
    help: 'Follow both edges from handle to handle, then look across the mesh for an open spiral.',
    rules: [osha('(g)(9)(i)', 'read'), asme],
  }),
  seenCriterion({
    ...base,
    id: 'mesh.stiff',
    name: 'Stiff mesh or locked spirals',
    question: 'Is the mesh stiff anywhere, or are spirals locked?',
    help: 'Roll the mesh over your arm along its whole length; it bends evenly when it is sound.',
    rules: [osha('(g)(9)(iii)', 'read'), asme],
  }),
  seenCriterion({
    ...base,
    part: 'fitting',
    id: 'mesh.handle_twist',
    name: 'Handle out of its plane',
    question: 'Is either handle distorted out of its plane?',
    help: 'Lay the handle on a flat surface and look for a gap under it.',
    rules: [osha('(g)(9)(vii)', 'read'), asme],
  }),
  seenCriterion({
    ...base,
    part: 'fitting',
    id: 'mesh.end_fitting',
    name: 'Damaged handle',
    question: 'Is either handle cracked, pitted, corroded, bent or gouged?',
    help: 'Look at both handles all round, above all at the eye and where the mesh joins.',
    rules: [asme],
  }),
];
