import { ACTION_FACTS, type SlingAction } from '../../../../shared/domain/lifecycle/actions';
import type { Sling } from '../../../../shared/schemas/slings';

export interface ActionLine {
  action: SlingAction;
  name: string;
  /** Why it isn't open; empty when it is. */
  reasons: string[];
}

/** These are done on a shipment or with a second person's inspection, not from the record. */
const WITHOUT_PAGE: readonly SlingAction[] = ['send', 'destroyed_by_evaluator', 'withdraw_as_error'];

/** What the table holds for this sling's state: open ones, and the rest with what is missing. Hold stands by itself. */
export function listActions({ allowedActions }: Pick<Sling, 'allowedActions'>): {
  open: ActionLine[];
  elsewhere: ActionLine[];
  closed: ActionLine[];
} {
  const inState = allowedActions
    .filter(({ action, unmet }) => action !== 'hold' && !unmet.some(({ rule }) => rule === 'state'))
    .map(({ action, open, unmet }) => ({
      action,
      open,
      name: ACTION_FACTS[action].name,
      reasons: unmet.map(({ message }) => message),
    }));
  const hasPage = ({ action }: ActionLine): boolean => !WITHOUT_PAGE.includes(action);
  return {
    open: inState.filter((line) => line.open && hasPage(line)),
    elsewhere: inState.filter((line) => line.open && !hasPage(line)),
    closed: inState.filter((line) => !line.open),
  };
}
