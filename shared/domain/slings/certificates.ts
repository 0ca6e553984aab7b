import { KIND_FACTS } from './kinds';
import type { KindAndSpec } from './spec';

/** Wire rope ends whose strength hangs on how they were made: a certificate is asked for before acceptance (product design, section 4). */
const CERTIFIED_SPLICES = ['turnback', 'swaged_socket', 'poured_socket', 'welded_end'] as const;

export function needsCertificate(sling: KindAndSpec): boolean {
  if (KIND_FACTS[sling.kind].needsCertificate) return true;
  return sling.kind === 'wire-rope' && CERTIFIED_SPLICES.some((splice) => splice === sling.spec.splice);
}
