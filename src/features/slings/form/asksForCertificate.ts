import { needsCertificate } from '../../../../shared/domain/slings/certificates';
import type { SlingKind } from '../../../../shared/domain/slings/kinds';
import { ROPE_SPLICES, type WireRopeSpec } from '../../../../shared/domain/slings/spec';
import { KIND_FACTS } from '../../../../shared/domain/slings/kinds';

/** Only the splice decides on a wire rope; the other figures of a form that is half filled in do not matter. */
const ANY_ROPE: Omit<WireRopeSpec, 'splice'> = {
  construction: 'strand_laid',
  className: '',
  diameterMm: 0,
  core: 'iwrc',
  ropeGrade: 'eips',
};

/** Will acceptance ask for a certificate, as far as the form is filled in? */
export function asksForCertificate(kind: SlingKind | '', spliceText: string): boolean {
  if (kind === '') return false;
  if (kind !== 'wire-rope') return KIND_FACTS[kind].needsCertificate;
  const splice = ROPE_SPLICES.find((name) => name === spliceText);
  return splice !== undefined && needsCertificate({ kind, spec: { ...ANY_ROPE, splice } });
}
