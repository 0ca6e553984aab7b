import type { ActionResponse } from '../../../shared/schemas/actions';
import type { Location } from '../../../shared/schemas/places';
import type { Sling } from '../../../shared/schemas/slings';

/** What the form of every action gets. */
export interface ActFormProps {
  sling: Sling;
  /** All places of the sites where the person works. */
  locations: readonly Location[];
  onDone: (answer: ActionResponse) => void;
  /** Loads the sling as it is now. */
  onReload: () => Promise<unknown>;
}
