import { describe, expect, it } from 'vitest';
import { computeCheckCharacter } from '../../../../shared/domain/tags/iso7064';
import { showSafely, understand, wayOfAddress } from '../../../../src/features/scan/reading';

/** A made-up code, its check character computed by the rule itself. */
const PAYLOAD = 'CE9SAWR9B';
const CODE = PAYLOAD + computeCheckCharacter(PAYLOAD);

describe('understanding what was read', () => {
  it('takes a link with a well-formed code at any host, and keeps the host', () => {
    expect(understand(`HTTPS://Slings.Example:8443/T/${CODE}`, 'camera', 5)).toEqual({
      ok: true,
      reading: { code: CODE, via: 'camera', host: 'slings.example:8443', readAt: 5 },
    });
  });

  it('takes a bare code as people type it', () => {
    const typed = `${CODE.slice(0, 4)}-${CODE.slice(4, 7)}-${CODE.slice(7)}`.toLowerCase();
    expect(understand(typed, 'typed', 0)).toMatchObject({ ok: true, reading: { code: CODE, host: null } });
  });

  it('tells a wrong check character from a foreign code', () => {
    const wrong = PAYLOAD + (CODE.endsWith('Z') ? 'Y' : 'Z');
    expect(understand(wrong, 'typed', 0)).toMatchObject({ ok: false, refusal: { kind: 'wrong_check' } });
    expect(understand('https://www.example/x', 'camera', 0)).toMatchObject({
      ok: false,
      refusal: { kind: 'foreign', text: 'https://www.example/x' },
    });
  });

  it('counts a bare code in the address as typed, so that it cannot confirm a label', () => {
    expect(wayOfAddress(CODE)).toBe('typed');
    expect(wayOfAddress(`HTTPS://S.EXAMPLE/T/${CODE}`)).toBe('scanner');
  });
});

describe('showing a foreign code', () => {
  it('drops control and direction characters and keeps it to one line', () => {
    expect(showSafely('abc\u202Edef\u0000\n\u200Bxyz  end')).toBe('abc def xyz end');
  });

  it('cuts what a screen cannot hold', () => {
    expect(showSafely('x'.repeat(500), 20)).toBe(`${'x'.repeat(20)}…`);
  });
});
