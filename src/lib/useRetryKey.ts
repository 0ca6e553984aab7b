import { useRef } from 'react';
import { makeIdempotencyKey } from './idempotencyKey';
import { ApiProblem } from './problem';

/**
 * One idempotency key per submit: the same body tried again after a lost answer acts once at the server; another body, or a
 * refusal, begins a new submit.
 */
export function useRetryKey(): { take: (body: unknown) => string; settle: (error: unknown) => void } {
  const kept = useRef<{ text: string; key: string } | null>(null);
  return {
    take: (body) => {
      const text = JSON.stringify(body);
      if (kept.current?.text !== text) kept.current = { text, key: makeIdempotencyKey() };
      return kept.current.key;
    },
    settle: (error) => {
      const isAnswered = !(error instanceof ApiProblem) || (error.status >= 400 && error.status < 500);
      if (isAnswered) kept.current = null;
    },
  };
}
