import type { KindAndSpec } from '../../../../shared/domain/slings/spec';
import {
  CONSTRUCTION_NAMES,
  CORE_NAMES,
  DUTY_NAMES,
  FERRULE_NAMES,
  FIBRE_NAMES,
  ROPE_GRADE_NAMES,
  ROUND_FIBRE_NAMES,
  SPLICE_NAMES,
  WEB_TYPE_NAMES,
} from '../form/options';

interface Fact {
  term: string;
  value: string | undefined;
}

/** What the kind's own spec says, in words. `asRead` gives a length in the unit that it was typed in, by its path. */
export function listSpecFacts(sling: KindAndSpec, asRead: (path: string, mm: number) => string): Fact[] {
  const size = (term: string, name: string, mm: number): Fact => ({
    term,
    value: asRead(`spec.${name}`, mm),
  });
  switch (sling.kind) {
    case 'alloy-chain':
      return [
        { term: 'Grade', value: String(sling.spec.grade) },
        size('Chain size', 'chainMm', sling.spec.chainMm),
        { term: 'Endless', value: sling.spec.endless ? 'Yes' : undefined },
      ];
    case 'wire-rope':
      return [
        size('Rope diameter', 'diameterMm', sling.spec.diameterMm),
        { term: 'Rope class', value: sling.spec.className },
        { term: 'Construction', value: CONSTRUCTION_NAMES[sling.spec.construction] },
        { term: 'Core', value: CORE_NAMES[sling.spec.core] },
        { term: 'Rope grade', value: ROPE_GRADE_NAMES[sling.spec.ropeGrade] },
        { term: 'Splice or end', value: SPLICE_NAMES[sling.spec.splice] },
        { term: 'Ferrule', value: sling.spec.ferrule && FERRULE_NAMES[sling.spec.ferrule] },
      ];
    case 'metal-mesh':
      return [
        { term: 'Duty', value: DUTY_NAMES[sling.spec.duty] },
        size('Width', 'widthMm', sling.spec.widthMm),
        size('Wire diameter', 'wireMm', sling.spec.wireMm),
        { term: 'Coated', value: sling.spec.coated ? 'Yes' : undefined },
      ];
    case 'synthetic-web':
      return [
        { term: 'Type', value: WEB_TYPE_NAMES[sling.spec.type] },
        { term: 'Fibre', value: FIBRE_NAMES[sling.spec.fibre] },
        size('Width', 'widthMm', sling.spec.widthMm),
        { term: 'Plies', value: String(sling.spec.plies) },
      ];
    case 'synthetic-round':
      return [
        { term: 'Core yarn', value: ROUND_FIBRE_NAMES[sling.spec.fibre] },
        { term: 'Size', value: sling.spec.size },
      ];
    case 'synthetic-rope':
      return [
        { term: 'Fibre', value: FIBRE_NAMES[sling.spec.fibre] },
        size('Rope diameter', 'diameterMm', sling.spec.diameterMm),
      ];
  }
}
