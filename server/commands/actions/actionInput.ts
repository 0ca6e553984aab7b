import type { SlingAction } from '../../../shared/domain/lifecycle/actions';
import type { Actor, LifecycleFacts } from '../../../shared/domain/lifecycle/facts';
import type { ActionBodies } from '../../../shared/schemas/actions';
import type { ActorContext } from '../../context';
import type { LedgerEntry } from '../../models/LedgerEntry';
import type { SlingRecord } from '../../models/SlingRecord';
import type { SlingParts } from '../../queries/lifecycleFacts';

/** What an action's effect gets: the locked sling, its facts, the person and the checked body. */
export interface ActionInput<A extends SlingAction> {
  context: ActorContext;
  sling: SlingRecord;
  facts: LifecycleFacts;
  parts: SlingParts;
  actor: Actor;
  today: string;
  body: ActionBodies[A];
}

export type ActionEffect<A extends SlingAction> = (input: ActionInput<A>) => Promise<LedgerEntry>;
