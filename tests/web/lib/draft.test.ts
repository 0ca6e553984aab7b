import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { clearDraft, readDraft, writeDraft } from '../../../src/lib/draft';

const schema = z.object({ number: z.string() });

beforeEach(() => {
  const kept = new Map<string, string>();
  vi.stubGlobal('localStorage', {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
    removeItem: (key: string) => void kept.delete(key),
  });
});
afterEach(() => vi.unstubAllGlobals());

it('gives back what was kept until it is cleared', () => {
  writeDraft('new-sling', { number: 'MQ-1' });
  expect(readDraft('new-sling', schema)).toEqual({ number: 'MQ-1' });
  expect(readDraft('another', schema)).toBeNull();
  clearDraft('new-sling');
  expect(readDraft('new-sling', schema)).toBeNull();
});

it('drops a draft that no longer fits the form', () => {
  writeDraft('new-sling', { number: 7 });
  expect(readDraft('new-sling', schema)).toBeNull();
});

it('does without where the browser keeps nothing', () => {
  vi.stubGlobal('localStorage', undefined);
  expect(() => writeDraft('x', {})).not.toThrow();
  expect(readDraft('x', schema)).toBeNull();
});
