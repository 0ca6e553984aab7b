export const SLING_STATES = [
  'received',
  'in_service',
  'held',
  'sent_for_evaluation',
  'returned',
  'destroyed',
  'lost',
  'departed',
] as const;
export type SlingState = (typeof SLING_STATES)[number];

export interface StateFacts {
  /** The word that always stands beside colour and shape. */
  word: string;
  /** What the state means for a person who holds the sling. */
  meaning: string;
  isTerminal: boolean;
}

export const STATE_FACTS = {
  received: {
    word: 'Received',
    meaning: 'On the books; not used before its initial inspection has passed.',
    isTerminal: false,
  },
  in_service: { word: 'In service', meaning: 'Identified and passed.', isTerminal: false },
  held: { word: 'Held', meaning: 'Removed from service, in quarantine.', isTerminal: false },
  sent_for_evaluation: {
    word: 'Sent for evaluation',
    meaning: 'With its maker or a qualified repairer.',
    isTerminal: false,
  },
  returned: {
    word: 'Returned',
    meaning: 'Back from evaluation; not used before it is inspected again.',
    isTerminal: false,
  },
  destroyed: { word: 'Destroyed', meaning: 'Made unusable.', isTerminal: true },
  lost: {
    word: 'Lost',
    meaning: 'Written off as not found. If you hold it in your hands, it comes back as held.',
    isTerminal: false,
  },
  departed: { word: 'Departed', meaning: 'No longer this store’s sling.', isTerminal: true },
} as const satisfies Record<SlingState, StateFacts>;

export const CUSTODY_KINDS = [
  'in_store',
  'issued',
  'cage',
  'evaluator',
  'in_transit',
  'unknown',
  'none',
] as const;
export type CustodyKind = (typeof CUSTODY_KINDS)[number];

export const CUSTODY_NAMES = {
  in_store: 'In store',
  issued: 'Issued to a crew',
  cage: 'In a cage',
  evaluator: 'With the evaluator',
  in_transit: 'Between sites',
  unknown: 'Whereabouts unknown',
  none: 'No longer here',
} as const satisfies Record<CustodyKind, string>;

export const LOCATION_PURPOSES = ['rack', 'cage', 'counter', 'look_over', 'goods_in'] as const;
export type LocationPurpose = (typeof LOCATION_PURPOSES)[number];
