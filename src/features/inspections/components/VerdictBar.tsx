import type { ReactNode } from 'react';
import type { Verdict } from '../../../../shared/domain/inspection/severity';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { cx } from '../../../lib/cx';
import { VERDICT_TONES, VERDICT_WORDS } from '../verdictWords';
import { VerdictMark } from './VerdictMark';

export interface VerdictBarProps {
  verdict: Verdict;
  /** False while a pass would be said too early. */
  isComplete: boolean;
  answered: number;
  total: number;
  isPending: boolean;
  /** A photo is still going out. */
  isSending: boolean;
}

/** The verdict so far and the press that records it, at the thumb. */
export function VerdictBar({
  verdict,
  isComplete,
  answered,
  total,
  isPending,
  isSending,
}: VerdictBarProps): ReactNode {
  const isKnown = isComplete || verdict !== 'pass';
  return (
    <ActionBar>
      <div
        role="status"
        className={cx(
          'flex min-h-target items-center gap-2.5 rounded border-2 px-3 leading-tight',
          isKnown ? VERDICT_TONES[verdict] : 'border-rule bg-card text-muted',
        )}
      >
        {isKnown && <VerdictMark verdict={verdict} className="size-7 shrink-0" />}
        <span>
          <b className="block font-bold">{isKnown ? VERDICT_WORDS[verdict].word : 'No verdict yet'}</b>
          <span className="text-[0.875rem] whitespace-nowrap text-ink">
            {answered} of {total} answered
          </span>
        </span>
      </div>
      <Button
        type="submit"
        className="min-h-14 lg:min-w-64"
        pending={isPending || isSending}
        pendingText={isSending ? 'A photo is being sent' : 'Recording'}
      >
        Finish and record
      </Button>
    </ActionBar>
  );
}
