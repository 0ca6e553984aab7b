import { describe, expect, it } from 'vitest';
import { buildDestroySchema, methodOf, OTHER_METHOD } from '../../../../src/features/actions/destroyValues';
import { listParts, toFates } from '../../../../src/features/actions/parts';

const fittings = [
  { id: 31, position: 'upper', type: 'master_link', sizeMm: 22, detachable: false },
  { id: 32, position: 'lower', type: 'hook', detachable: true },
] as const;
const parts = listParts({ legs: 2, fittings: [...fittings] });
const photoIds = ['0b9e3a3e-6d0f-4b43-9c7a-2f6f3b8f2a11'];
const filled = {
  method: 'Crushed beyond use',
  otherMethod: '',
  photoIds,
  fates: { fitting32: 'salvaged', leg1: 'destroyed', leg2: 'destroyed' },
} as const;

describe('the parts of a sling that is destroyed', () => {
  it('are its fittings and, where there are several, its legs', () => {
    expect(parts.map(({ name }) => name)).toEqual([
      'Master link, 22 mm, upper end',
      'Hook, lower end',
      'Leg 1',
      'Leg 2',
    ]);
    expect(listParts({ legs: 1, fittings: [] })).toEqual([]);
  });

  it('each get a fate; what cannot be taken off is destroyed whatever was chosen', () => {
    expect(
      toFates(parts, { fitting31: 'salvaged', fitting32: 'salvaged', leg1: 'destroyed', leg2: 'salvaged' }),
    ).toEqual({
      fittings: [
        { fittingId: 31, fate: 'destroyed' },
        { fittingId: 32, fate: 'salvaged' },
      ],
      legs: [
        { leg: 1, fate: 'destroyed' },
        { leg: 2, fate: 'salvaged' },
      ],
    });
  });
});

describe('before a destruction is looked over', () => {
  const faults = (values: unknown): string[] =>
    buildDestroySchema(parts)
      .safeParse(values)
      .error?.issues.map(({ path }) => path.join('.')) ?? [];

  it('nothing is missing when all is filled in', () => {
    expect(faults(filled)).toEqual([]);
  });

  it('asks for the fate of every part that can be taken off', () => {
    expect(faults({ ...filled, fates: { leg1: 'destroyed' } })).toEqual(['fates.fitting32', 'fates.leg2']);
  });

  it('asks for a photo and for the words of another method', () => {
    expect(faults({ ...filled, photoIds: [] })).toEqual(['photoIds']);
    expect(faults({ ...filled, method: OTHER_METHOD })).toEqual(['otherMethod']);
    expect(methodOf({ ...filled, method: OTHER_METHOD, otherMethod: 'Shredded', photoIds })).toBe('Shredded');
  });
});
