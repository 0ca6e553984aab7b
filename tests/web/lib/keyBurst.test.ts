import { describe, expect, it } from 'vitest';
import { createKeyBurst } from '../../../src/lib/keyBurst';

function type(text: string, gapMs: number, end = 'Enter'): string | null {
  const burst = createKeyBurst();
  let atMs = 1000;
  for (const key of text) {
    expect(burst.take(key, atMs)).toBeNull();
    atMs += gapMs;
  }
  return burst.take(end, atMs);
}

describe('a handheld scanner that types', () => {
  it('is known by its speed', () => {
    expect(type('HTTPS://STORE.EXAMPLE/T/7K3M9QW2XA', 8)).toBe('HTTPS://STORE.EXAMPLE/T/7K3M9QW2XA');
    expect(type('7K3M9QW2XA', 20, 'Tab')).toBe('7K3M9QW2XA');
  });

  it('is not a person who types', () => {
    expect(type('7K3M9QW2XA', 90)).toBeNull();
  });

  it('is not a few keys hit at once', () => {
    expect(type('abc', 5)).toBeNull();
  });

  it('keeps no key from before a pause', () => {
    const burst = createKeyBurst();
    burst.take('x', 0);
    [...'7K3M9QW2XA'].forEach((key, i) => burst.take(key, 500 + i * 5));
    expect(burst.take('Enter', 560)).toBe('7K3M9QW2XA');
  });

  it('looks past the shift key', () => {
    const burst = createKeyBurst();
    ['Shift', 'A', 'Shift', 'B', 'C', 'D', 'E', 'F'].forEach((key, i) => burst.take(key, i * 5));
    expect(burst.take('Enter', 45)).toBe('ABCDEF');
  });
});
