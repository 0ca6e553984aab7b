import { describe, expect, it } from 'vitest';
import { needsCertificate } from '../../../../shared/domain/slings/certificates';
import { describeSling } from '../../../../shared/domain/slings/describe';
import { KIND_FACTS, SLING_KINDS } from '../../../../shared/domain/slings/kinds';
import { FITTING_TYPES, isHook, ROPE_SPLICES, type KindAndSpec } from '../../../../shared/domain/slings/spec';

const rope = (splice: (typeof ROPE_SPLICES)[number]): KindAndSpec => ({
  kind: 'wire-rope',
  spec: {
    construction: 'strand_laid',
    className: '6x36',
    diameterMm: 16,
    core: 'iwrc',
    ropeGrade: 'eips',
    splice,
  },
});
const SLINGS: Record<string, KindAndSpec> = {
  'alloy-chain': { kind: 'alloy-chain', spec: { grade: 80, chainMm: 10 } },
  'wire-rope': rope('flemish'),
  'metal-mesh': { kind: 'metal-mesh', spec: { duty: 'heavy', widthMm: 150, wireMm: 3.4, coated: true } },
  'synthetic-web': {
    kind: 'synthetic-web',
    spec: { fibre: 'nylon', widthMm: 50, plies: 2, type: 'endless' },
  },
  'synthetic-round': { kind: 'synthetic-round', spec: { fibre: 'high_performance', size: '3' } },
  'synthetic-rope': { kind: 'synthetic-rope', spec: { fibre: 'polyester', diameterMm: 24 } },
};
const having = (fact: keyof (typeof KIND_FACTS)['alloy-chain']): string[] =>
  SLING_KINDS.filter((kind) => KIND_FACTS[kind][fact]);

describe('the six kinds', () => {
  it('are those of the agreed API', () => {
    expect(SLING_KINDS).toEqual(Object.keys(SLINGS));
  });

  it('are never repaired but for chain and mesh (rule 5)', () => {
    expect(having('isRepairable')).toEqual(['alloy-chain', 'metal-mesh']);
  });

  it('carry a serial on the tags of chain and mesh (product design, section 3)', () => {
    expect(having('needsMakerSerial')).toEqual(['alloy-chain', 'metal-mesh']);
  });

  it('are textile where heat and chemicals are never cleared', () => {
    expect(having('isSynthetic')).toEqual(['synthetic-web', 'synthetic-round', 'synthetic-rope']);
  });
});

describe('a certificate before acceptance', () => {
  it('is asked for of chain and mesh, and of no other kind as such', () => {
    const asked = Object.entries(SLINGS).filter(([, sling]) => needsCertificate(sling));
    expect(asked.map(([kind]) => kind)).toEqual(['alloy-chain', 'metal-mesh']);
  });

  it('is asked for of ropes with turnback splices, sockets and welded ends (product design, section 4)', () => {
    expect(ROPE_SPLICES.filter((splice) => needsCertificate(rope(splice)))).toEqual([
      'turnback',
      'swaged_socket',
      'poured_socket',
      'welded_end',
    ]);
  });
});

describe('the line that tells a sling apart', () => {
  it.each([
    ['alloy-chain', 2, '2-leg chain sling, grade 80, 10 mm'],
    ['wire-rope', 1, 'Wire rope sling, 6x36 IWRC, 16 mm'],
    ['metal-mesh', 1, 'Wire mesh sling, heavy duty, 150 mm, coated'],
    ['synthetic-web', 1, 'Web sling, nylon, 50 mm, 2-ply, endless'],
    ['synthetic-round', 1, 'Roundsling, high performance, size 3'],
    ['synthetic-rope', 4, '4-leg rope sling, polyester, 24 mm'],
  ])('of a %s with %i legs is “%s”', (kind, legs, line) => {
    const sling = SLINGS[kind];
    if (!sling) throw new Error('There is one of each kind.');
    expect(describeSling({ ...sling, legs })).toBe(line);
  });
});

describe('hooks', () => {
  it('are the first two types of fitting (agreed API)', () => {
    expect(FITTING_TYPES.filter((type) => isHook({ type }))).toEqual(['hook', 'self_locking_hook']);
  });
});
