/** The six kinds of sling that the product knows (names fixed by the agreed API). */
export const SLING_KINDS = [
  'alloy-chain',
  'wire-rope',
  'metal-mesh',
  'synthetic-web',
  'synthetic-round',
  'synthetic-rope',
] as const;
export type SlingKind = (typeof SLING_KINDS)[number];

export interface KindFacts {
  /** Short name for lists and labels. */
  name: string;
  /** Textile slings: chemicals and heat are never cleared at the store. */
  isSynthetic: boolean;
  /** May the maker or a qualified repairer repair it at all (product rule 5)? */
  isRepairable: boolean;
  /** The maker's tag of this kind carries a serial number (B30.9: a record per serial-numbered sling). */
  needsMakerSerial: boolean;
  /** A certificate must be on file before it may be accepted, whatever its ends. */
  needsCertificate: boolean;
}

export const KIND_FACTS = {
  'alloy-chain': {
    name: 'Chain sling',
    isSynthetic: false,
    isRepairable: true,
    needsMakerSerial: true,
    needsCertificate: true,
  },
  'wire-rope': {
    name: 'Wire rope sling',
    isSynthetic: false,
    isRepairable: false,
    needsMakerSerial: false,
    needsCertificate: false,
  },
  'metal-mesh': {
    name: 'Wire mesh sling',
    isSynthetic: false,
    isRepairable: true,
    needsMakerSerial: true,
    needsCertificate: true,
  },
  'synthetic-web': {
    name: 'Web sling',
    isSynthetic: true,
    isRepairable: false,
    needsMakerSerial: false,
    needsCertificate: false,
  },
  'synthetic-round': {
    name: 'Roundsling',
    isSynthetic: true,
    isRepairable: false,
    needsMakerSerial: false,
    needsCertificate: false,
  },
  'synthetic-rope': {
    name: 'Rope sling',
    isSynthetic: true,
    isRepairable: false,
    needsMakerSerial: false,
    needsCertificate: false,
  },
} as const satisfies Record<SlingKind, KindFacts>;

export const SERVICE_CLASSES = ['normal', 'severe', 'special'] as const;
export type ServiceClass = (typeof SERVICE_CLASSES)[number];

export const MAKERS_TAG_STATES = ['legible', 'illegible', 'missing'] as const;
export type MakersTag = (typeof MAKERS_TAG_STATES)[number];

export const CERTIFICATE_BASES = ['assembly', 'components', 'declaration_of_conformity'] as const;
export type CertificateBasis = (typeof CERTIFICATE_BASES)[number];
export const CERTIFICATE_BASIS_NAMES = {
  assembly: 'Proof test of the assembly',
  components: 'Certificates of its components',
  declaration_of_conformity: 'Declaration of conformity',
} as const satisfies Record<CertificateBasis, string>;
