import { describe, expect, it } from 'vitest';
import { slingsQuery } from '../../../../shared/schemas/slings';
import { toSlingSearch } from '../../../../src/features/slings/api/slingFilters';
import { BOARD_SECTIONS } from '../../../../src/features/slings/board/sections';
import { WAITING } from '../../../../src/features/slings/home/waiting';
import { parseFilters } from '../../../../src/features/slings/hooks/useRegisterFilters';

describe('the register’s filters', () => {
  it('come out of the address as they went in', () => {
    const filters = { state: 'held', secured: 'false', siteId: 2, q: 'TF 88', sort: 'stateSince' } as const;
    expect(parseFilters(new URLSearchParams(toSlingSearch(filters)))).toEqual(filters);
  });

  it('pass over what no filter understands and keep the rest', () => {
    const search = new URLSearchParams('state=melted&kind=wire-rope&siteId=x&due=soon&page=4');
    expect(parseFilters(search)).toEqual({ kind: 'wire-rope', due: 'soon' });
  });

  it('leave the address empty when nothing is set', () => {
    expect(toSlingSearch({ q: '', state: undefined })).toBe('');
    expect(parseFilters(new URLSearchParams(''))).toEqual({});
  });
});

describe('lists behind numbers', () => {
  it('ask the server only for what it knows', () => {
    for (const { filters } of [...BOARD_SECTIONS, ...WAITING]) {
      const search = Object.fromEntries(new URLSearchParams(toSlingSearch(filters)));
      expect(slingsQuery.safeParse(search).success).toBe(true);
      expect(parseFilters(new URLSearchParams(search))).toEqual(filters);
    }
  });

  it('put what is held and not secured first', () => {
    expect(BOARD_SECTIONS[0]?.filters).toMatchObject({ state: 'held', secured: 'false' });
    expect(WAITING[0]?.filters).toMatchObject({ state: 'held', secured: 'false' });
  });
});
