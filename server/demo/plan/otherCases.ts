import type { SlingKind } from '../../../shared/domain/slings/kinds';
import type { ActionBodies } from '../../../shared/schemas/actions';
import type { ReprintReason } from '../../../shared/schemas/labels';

/** What happens to a sling that nobody doubts. */
export type OtherCase = { kind: SlingKind; ago: number } & (
  | { then: 'lost'; note: string }
  | { then: 'found'; lostAgo: number; note: string }
  | { then: 'departed'; cause: ActionBodies['depart']['cause']; note: string }
  | { then: 'relabelled'; reason: ReprintReason }
);

export const OTHER_CASES: readonly OtherCase[] = [
  {
    kind: 'synthetic-web',
    ago: 310,
    then: 'lost',
    note: 'Not back from the jacket lift; crew and deck searched twice.',
  },
  { kind: 'wire-rope', ago: 182, then: 'lost', note: 'Went over the quay side with the old spreader.' },
  {
    kind: 'synthetic-round',
    ago: 74,
    then: 'lost',
    note: 'Left on a barge that sailed; the agent has not seen it.',
  },
  {
    kind: 'synthetic-web',
    ago: 19,
    then: 'lost',
    note: 'Missing at the count of Rack B, nobody signed it out.',
  },
  { kind: 'wire-rope', ago: 118, then: 'found', lostAgo: 160, note: 'Lay behind the blade racks.' },
  {
    kind: 'alloy-chain',
    ago: 240,
    then: 'departed',
    cause: 'sold',
    note: 'Sold with the old spreader frame.',
  },
  {
    kind: 'synthetic-web',
    ago: 88,
    then: 'departed',
    cause: 'transferred_out',
    note: 'To the pre-assembly yard upriver.',
  },
  { kind: 'alloy-chain', ago: 205, then: 'relabelled', reason: 'illegible' },
  { kind: 'synthetic-web', ago: 143, then: 'relabelled', reason: 'lost' },
  { kind: 'wire-rope', ago: 110, then: 'relabelled', reason: 'illegible' },
  { kind: 'synthetic-round', ago: 67, then: 'relabelled', reason: 'lost' },
  { kind: 'alloy-chain', ago: 39, then: 'relabelled', reason: 'retagged' },
];
