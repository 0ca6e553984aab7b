import { describe, expect, it } from 'vitest';
import { safeReturnPath } from '../../../../src/features/people/returnPath';

describe('the way back after signing in', () => {
  it('leads to a page of this app', () => {
    expect(safeReturnPath('/slings/12?tab=a')).toBe('/slings/12?tab=a');
  });

  it.each([null, '', 'https://evil.example', '//evil.example', '/\\evil.example', 'javascript:alert(1)'])(
    'never leads elsewhere (%s)',
    (to) => {
      expect(safeReturnPath(to)).toBe('/');
    },
  );
});
