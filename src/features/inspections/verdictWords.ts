import type { Verdict } from '../../../shared/domain/inspection/severity';

export const VERDICT_WORDS = {
  pass: { word: 'PASS', means: 'Nothing was found that stops it.' },
  refer: { word: 'REFER', means: 'A qualified person has to decide. It is held until then.' },
  reject: { word: 'REJECT', means: 'Remove from service. It is held.' },
} as const satisfies Record<Verdict, { word: string; means: string }>;

/** On card and paper; state colours are kept for states. */
export const VERDICT_TONES = {
  pass: 'border-petrol bg-petrol-wash text-petrol',
  refer: 'border-signal-yellow bg-warn-wash text-warn',
  reject: 'border-danger bg-danger-wash text-danger',
} as const satisfies Record<Verdict, string>;
