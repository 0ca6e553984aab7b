import { describe, expect, it } from 'vitest';
import { groupWhileTyping } from '../../../../src/features/scan/codeTyping';

describe('typing a code', () => {
  it.each([
    ['ce9s', 'CE9S'],
    ['ce9sa', 'CE9S-A'],
    ['CE9S-AWR', 'CE9S-AWR'],
    ['ce9s awr 9', 'CE9S-AWR-9'],
    ['ce9sawr9bf', 'CE9S-AWR-9BF'],
    ['CE9S–AWR–9BF', 'CE9S-AWR-9BF'],
  ])('groups %s as %s', (typed, shown) => {
    expect(groupWhileTyping(typed)).toBe(shown);
  });

  it('leaves a pasted link and anything longer as it is', () => {
    expect(groupWhileTyping('https://s.example/T/X')).toBe('https://s.example/T/X');
    expect(groupWhileTyping('ce9sawr9bfx')).toBe('ce9sawr9bfx');
  });
});
