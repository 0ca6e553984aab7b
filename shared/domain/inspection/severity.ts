import type { Outcome, Speech } from './criterion';

export const VERDICTS = ['pass', 'refer', 'reject'] as const;
export type Verdict = (typeof VERDICTS)[number];

const SPEECH_RANK = { silent: -1, pass: 0, note: 1, refer: 2, reject: 3 } as const satisfies Record<
  Speech,
  number
>;
const VERDICT_OF = { note: 'pass', refer: 'refer', reject: 'reject' } as const satisfies Record<
  Outcome,
  Verdict
>;

/** Is `a` worse for the sling than `b`? */
export function isWorseVerdict(a: Verdict, b: Verdict): boolean {
  return VERDICTS.indexOf(a) > VERDICTS.indexOf(b);
}

/** Is `a` stricter than `b`? Silence is less than a pass. */
export function isStricterSpeech(a: Speech, b: Speech): boolean {
  return SPEECH_RANK[a] > SPEECH_RANK[b];
}

/** The strictest wins; no findings pass. A note alone does not stop a sling. */
export function verdictOf(outcomes: readonly Outcome[]): Verdict {
  return outcomes.reduce<Verdict>((worst, outcome) => {
    const verdict = VERDICT_OF[outcome];
    return isWorseVerdict(verdict, worst) ? verdict : worst;
  }, 'pass');
}
