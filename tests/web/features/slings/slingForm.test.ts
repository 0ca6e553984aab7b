import { describe, expect, it } from 'vitest';
import { SLING_KINDS, type SlingKind } from '../../../../shared/domain/slings/kinds';
import { asksForCertificate } from '../../../../src/features/slings/form/asksForCertificate';
import { toFormPath } from '../../../../src/features/slings/form/faults';
import { checkForm } from '../../../../src/features/slings/form/resolver';
import {
  makeEmptyFitting,
  makeEmptyForm,
  type SlingFormValues,
} from '../../../../src/features/slings/form/values';

const FILLED_SPECS: SlingFormValues['specs'] = {
  'alloy-chain': { grade: '80', chainMm: { figure: '10', unit: 'mm' }, endless: false },
  'wire-rope': {
    construction: 'strand_laid',
    className: '6x36',
    diameterMm: { figure: '5/8', unit: 'in' },
    core: 'iwrc',
    ropeGrade: 'eips',
    splice: 'turnback',
    ferrule: '',
  },
  'metal-mesh': {
    duty: 'heavy',
    widthMm: { figure: '6', unit: 'in' },
    wireMm: { figure: '2', unit: 'mm' },
    coated: true,
  },
  'synthetic-web': { fibre: 'polyester', widthMm: { figure: '75', unit: 'mm' }, plies: '2', type: 'endless' },
  'synthetic-round': { fibre: 'high_performance', size: '3' },
  'synthetic-rope': { fibre: 'nylon', diameterMm: { figure: '24', unit: 'mm' } },
};

function fillForm(kind: SlingKind, change: Partial<SlingFormValues> = {}): SlingFormValues {
  const empty = makeEmptyForm({ load: 'lb', length: 'ft' }, '2026-03-12');
  return {
    ...empty,
    kind,
    number: 'MQ-9001',
    maker: 'Tarn Forge',
    makerSerial: 'TF-88213',
    siteId: '1',
    reachMm: { figure: '10', unit: 'ft' },
    specs: FILLED_SPECS,
    ratedLoads: { ...empty.ratedLoads, verticalKg: { figure: '7,000', unit: 'lb' } },
    ...change,
  };
}
const faultsOf = (values: SlingFormValues): Record<string, string> =>
  Object.fromEntries((checkForm(values).faults ?? []).map(({ path, message }) => [path, message]));

describe('the registration form', () => {
  it.each(SLING_KINDS)('makes a request that the schema takes for %s', (kind) => {
    expect(checkForm(fillForm(kind)).faults).toBeNull();
  });

  it('stores kg and mm exactly and remembers the unit of each figure typed', () => {
    const { request } = checkForm(fillForm('wire-rope'));
    expect(request?.reachMm).toBe(3048);
    expect(request?.ratedLoads.verticalKg).toBe(3175.14659);
    expect(request?.spec).toMatchObject({ diameterMm: 15.875 });
    expect(request?.enteredUnits).toEqual({
      reachMm: 'ft',
      'ratedLoads.verticalKg': 'lb',
      'spec.diameterMm': 'in',
    });
  });

  it('sends a bridle with its angle only where more than one leg carries', () => {
    const bridled = (legs: string): SlingFormValues => {
      const values = fillForm('alloy-chain', { legs });
      values.ratedLoads.bridle = { kg: { figure: '5500', unit: 'kg' }, angleDeg: '60' };
      return values;
    };
    expect(checkForm(bridled('2')).request?.ratedLoads.bridle).toEqual({ kg: 5500, angleDeg: 60 });
    const single = checkForm(bridled('1')).request;
    expect(single?.ratedLoads.bridle).toBeUndefined();
    expect(single?.enteredUnits).not.toHaveProperty('ratedLoads.bridle.kg');
  });

  it('refuses a bridle under 30 degrees at its angle', () => {
    const values = fillForm('alloy-chain', { legs: '2' });
    values.ratedLoads.bridle = { kg: { figure: '5500', unit: 'kg' }, angleDeg: '29' };
    expect(faultsOf(values)).toHaveProperty(['ratedLoads.bridle.angleDeg']);
  });

  it('asks hooks alone for throat and latch', () => {
    const hook = { ...makeEmptyFitting('mm'), throatMm: { figure: '29.5', unit: 'mm' as const } };
    const { request } = checkForm(
      fillForm('alloy-chain', { fittings: [hook, { ...hook, type: 'shackle' }] }),
    );
    expect(request?.fittings[0]).toMatchObject({ throatMm: 29.5, hasLatch: true });
    expect(request?.fittings[1]).not.toHaveProperty('throatMm');
    expect(request?.fittings[1]).not.toHaveProperty('hasLatch');
  });

  it('says what is wrong at the field, in words', () => {
    const faults = faultsOf(
      fillForm('alloy-chain', {
        number: ' ',
        reachMm: { figure: 'ten', unit: 'ft' },
        siteId: '',
        specs: {
          ...FILLED_SPECS,
          'alloy-chain': { grade: '', chainMm: { figure: '', unit: 'mm' }, endless: false },
        },
      }),
    );
    expect(faults).toEqual({
      number: 'Please fill this in.',
      'reachMm.figure': 'A number, such as 3,150 or 3.15.',
      siteId: 'Please fill this in.',
      'specs.alloy-chain.grade': 'Please choose one.',
      'specs.alloy-chain.chainMm.figure': 'Please fill this in.',
    });
  });

  it('takes nothing that can not be read as a load, rather than leave it out', () => {
    const values = fillForm('alloy-chain');
    values.ratedLoads.chokerKg = { figure: '3 tons', unit: 'kg' };
    expect(faultsOf(values)).toHaveProperty(['ratedLoads.chokerKg.figure']);
  });

  it('asks chain and mesh for the serial and the others for a serial or a stock number', () => {
    expect(faultsOf(fillForm('metal-mesh', { makerSerial: '', stockNumber: 'A-1' }))).toHaveProperty(
      'makerSerial',
    );
    expect(faultsOf(fillForm('synthetic-web', { makerSerial: '' }))).toHaveProperty('stockNumber');
    expect(checkForm(fillForm('synthetic-web', { makerSerial: '', stockNumber: 'A-1' })).faults).toBeNull();
  });

  it('keeps what is not ticked or not hired out of the request', () => {
    const { request } = checkForm(
      fillForm('synthetic-web', { owner: { kind: 'own', name: 'Saltmarsh Hire', offHireOn: '2027-01-01' } }),
    );
    expect(request?.owner).toEqual({ kind: 'own' });
    expect(request).not.toHaveProperty('proofCertificate');
  });

  it('names the lender of a hired sling', () => {
    expect(
      faultsOf(fillForm('synthetic-web', { owner: { kind: 'hired', name: '', offHireOn: '' } })),
    ).toEqual({
      'owner.name': 'Who is it hired from?',
    });
  });
});

describe('toFormPath', () => {
  it('finds the figure of a measure and the fields of the kind', () => {
    expect(toFormPath('ratedLoads.bridle.kg', 'alloy-chain')).toBe('ratedLoads.bridle.kg.figure');
    expect(toFormPath('fittings.2.throatMm', 'alloy-chain')).toBe('fittings.2.throatMm.figure');
    expect(toFormPath('spec.className', 'wire-rope')).toBe('specs.wire-rope.className');
    expect(toFormPath('makerSerial', 'wire-rope')).toBe('makerSerial');
  });
});

describe('asksForCertificate', () => {
  it('asks for chain, mesh and certified splices only', () => {
    expect(asksForCertificate('alloy-chain', '')).toBe(true);
    expect(asksForCertificate('wire-rope', 'turnback')).toBe(true);
    expect(asksForCertificate('wire-rope', 'hand_tucked')).toBe(false);
    expect(asksForCertificate('synthetic-round', 'turnback')).toBe(false);
  });
});
