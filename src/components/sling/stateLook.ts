import type { SlingState } from '../../../shared/domain/lifecycle/states';

export type SignalColour = 'green' | 'red' | 'yellow' | 'blue' | 'black' | 'grey';
export type MarkShape =
  'square' | 'barred_circle' | 'triangle' | 'solid_circle' | 'cut_square' | 'dashed_square' | 'leaving_arrow';

export interface StateLook {
  colour: SignalColour;
  shape: MarkShape;
}

/** Colour and shape after the open safety-colour standards (ISO 3864, from memory); the word stands in STATE_FACTS. */
export const STATE_LOOKS = {
  received: { colour: 'blue', shape: 'solid_circle' },
  in_service: { colour: 'green', shape: 'square' },
  held: { colour: 'red', shape: 'barred_circle' },
  sent_for_evaluation: { colour: 'yellow', shape: 'triangle' },
  returned: { colour: 'blue', shape: 'solid_circle' },
  destroyed: { colour: 'black', shape: 'cut_square' },
  lost: { colour: 'grey', shape: 'dashed_square' },
  departed: { colour: 'grey', shape: 'leaving_arrow' },
} as const satisfies Record<SlingState, StateLook>;

/** Shown for a sling in service that may not be used: the answer is what counts, not the state. */
export const DO_NOT_USE_LOOK: StateLook = { colour: 'red', shape: 'barred_circle' };

/** What counts for the eye: in service but not usable looks like DO NOT USE. */
export function lookOf(sling: { state: SlingState; mayUse: boolean }): StateLook {
  return sling.state === 'in_service' && !sling.mayUse ? DO_NOT_USE_LOOK : STATE_LOOKS[sling.state];
}

/** Fill and text of a band. Yellow carries ink, the others white. */
export const SIGNAL_FILLS: Record<SignalColour, string> = {
  green: 'bg-signal-green text-white',
  red: 'bg-signal-red text-white',
  yellow: 'bg-signal-yellow text-[#17212b]',
  blue: 'bg-signal-blue text-white',
  black: 'bg-signal-black text-white',
  grey: 'bg-signal-grey text-white',
};

/** The mark's own colour on paper or card. */
export const MARK_COLOURS: Record<SignalColour, string> = {
  green: 'text-mark-green',
  red: 'text-mark-red',
  yellow: 'text-mark-yellow',
  blue: 'text-mark-blue',
  black: 'text-mark-black',
  grey: 'text-mark-grey',
};

/** The edge of a card on a board. */
export const EDGE_COLOURS: Record<SignalColour, string> = {
  green: 'border-t-mark-green',
  red: 'border-t-mark-red',
  yellow: 'border-t-mark-yellow',
  blue: 'border-t-mark-blue',
  black: 'border-t-mark-black',
  grey: 'border-t-mark-grey',
};
