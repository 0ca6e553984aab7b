import {
  CUSTODY_KINDS,
  CUSTODY_NAMES,
  SLING_STATES,
  STATE_FACTS,
} from '../../../../../shared/domain/lifecycle/states';
import { KIND_FACTS, SLING_KINDS } from '../../../../../shared/domain/slings/kinds';
import type { SLING_SORTS } from '../../../../../shared/schemas/slings';
import { DUE_WORDS } from '../describe';
import type { Option } from '../../form/options';

export const STATE_OPTIONS: Option[] = SLING_STATES.map((state) => ({
  value: state,
  label: STATE_FACTS[state].word,
}));
export const KIND_OPTIONS: Option[] = SLING_KINDS.map((kind) => ({
  value: kind,
  label: KIND_FACTS[kind].name,
}));
export const DUE_OPTIONS: Option[] = Object.entries(DUE_WORDS).map(([value, label]) => ({ value, label }));
export const CUSTODY_OPTIONS: Option[] = CUSTODY_KINDS.map((kind) => ({
  value: kind,
  label: CUSTODY_NAMES[kind],
}));
export const LABEL_OPTIONS: Option[] = [
  { value: 'none', label: 'None yet' },
  { value: 'printed', label: 'Printed, not confirmed' },
  { value: 'live', label: 'Live' },
];
export const SECURED_OPTIONS: Option[] = [
  { value: 'false', label: 'Not in a cage' },
  { value: 'true', label: 'In a cage' },
];
export const CONDEMNED_OPTIONS: Option[] = [
  { value: 'false', label: 'To decide' },
  { value: 'true', label: 'Condemned' },
];
export const SORT_NAMES = {
  number: 'Number, up',
  '-number': 'Number, down',
  nextDueOn: 'Next due first',
  stateSince: 'Longest in its state',
  '-createdAt': 'Newest on the books',
} as const satisfies Record<(typeof SLING_SORTS)[number], string>;
