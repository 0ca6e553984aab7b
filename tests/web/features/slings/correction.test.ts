import { describe, expect, it } from 'vitest';
import { correctionRequest } from '../../../../shared/schemas/corrections';
import { toKg } from '../../../../shared/domain/units/units';
import {
  buildCorrection,
  toCorrectionPath,
  type CorrectionValues,
} from '../../../../src/features/slings/form/correction';

const PHOTO = '3f2b1c1e-8a94-4b7a-9b53-4a1d2d7e9a10';
const BEFORE: CorrectionValues = {
  number: 'MQ-0417',
  maker: 'Tarn Forge',
  makerSerial: 'TF-88213',
  makersTag: 'legible',
  serviceClass: 'normal',
  siteId: '1',
  reachMm: { figure: '10', unit: 'ft' },
  ratedLoads: {
    verticalKg: { figure: '7000', unit: 'lb' },
    chokerKg: { figure: '', unit: 'lb' },
    basketKg: { figure: '', unit: 'lb' },
    bridle: { kg: { figure: '', unit: 'lb' }, angleDeg: '60' },
  },
  reason: '',
  photoIds: [],
  paperId: null,
};

describe('a correction', () => {
  it('sends what differs from the record alone', () => {
    const values = { ...BEFORE, makerSerial: 'TF-88231', reason: 'Digits swapped.', photoIds: [PHOTO] };
    const parsed = correctionRequest.safeParse(buildCorrection(values, BEFORE, 1));
    expect(parsed.data).toEqual({
      changes: { makerSerial: 'TF-88231' },
      reason: 'Digits swapped.',
      evidenceFileIds: [PHOTO],
    });
  });

  it('sends all rated loads when one of them changes', () => {
    const ratedLoads = { ...BEFORE.ratedLoads, verticalKg: { figure: '6500', unit: 'lb' as const } };
    const built = buildCorrection({ ...BEFORE, ratedLoads, reason: 'x', photoIds: [PHOTO] }, BEFORE, 1);
    const changes = correctionRequest.parse(built).changes;
    expect(changes.ratedLoads?.verticalKg).toBeCloseTo(toKg(6500, 'lb'), 9);
  });

  it('is refused without a change, without a reason and without evidence', () => {
    const parsed = correctionRequest.safeParse(buildCorrection(BEFORE, BEFORE, 1));
    const paths = parsed.error?.issues.map(({ path }) => toCorrectionPath(path.join('.')));
    expect(paths).toEqual(expect.arrayContaining(['number', 'reason', 'photoIds']));
  });
});
