import type { ReactNode } from 'react';
import {
  CHOOSABLE_REASONS,
  REASON_FACTS,
  type HoldReason,
} from '../../../../shared/domain/lifecycle/reasons';
import { ReasonDrawing } from '../../../components/sling/ReasonDrawing';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { useAct } from '../api/actOnSling';
import type { HoldFormProps } from './HoldForm';

interface QuickHoldProps extends Pick<HoldFormProps, 'sling' | 'onHeld'> {
  /** Several reasons, words or a photo first; with the reason that needs words, if that was tapped. */
  onMore: (reason: HoldReason | null) => void;
}

/** The second of two taps: the tile says why and holds at once. A photo comes after. */
export function QuickHold({ sling, onHeld, onMore }: QuickHoldProps): ReactNode {
  const act = useAct(sling, 'hold');
  const pressed = act.isPending ? act.variables.reasons[0]?.code : undefined;

  function hold(code: HoldReason): void {
    if (REASON_FACTS[code].needsNote) onMore(code);
    else act.mutate({ reasons: [{ code }] }, { onSuccess: onHeld });
  }

  return (
    <section aria-labelledby="why-hold" className="flex flex-col gap-4">
      <div>
        <h2 id="why-hold" className="text-xl font-semibold">
          Why? One tap holds it
        </h2>
        <p className="text-muted">You can add a photo and further reasons right after.</p>
      </div>
      <ul className="grid grid-cols-2 gap-2.5 md:grid-cols-3">
        {CHOOSABLE_REASONS.map((code) => (
          <li key={code}>
            <button
              type="button"
              disabled={act.isPending}
              aria-busy={pressed === code || undefined}
              onClick={() => hold(code)}
              className="flex size-full min-h-28 flex-col gap-2 rounded border-2 border-danger bg-card px-3.5 py-3 text-left leading-tight hover:bg-danger-wash disabled:opacity-60"
            >
              <span className="block size-12 text-danger [&>svg]:size-full" aria-hidden="true">
                <ReasonDrawing code={code} />
              </span>
              <span className="font-semibold">
                {pressed === code ? 'Being held' : REASON_FACTS[code].name}
                {REASON_FACTS[code].needsNote && (
                  <span className="block text-[0.9375rem] font-normal text-muted">Say what it is</span>
                )}
              </span>
            </button>
          </li>
        ))}
      </ul>
      <ProblemNotice problem={act.error} />
      {act.error && (
        <p className="font-medium">The hold is not recorded yet. Keep the sling out of use and tap again.</p>
      )}
      <Button tone="quiet" className="self-start" disabled={act.isPending} onClick={() => onMore(null)}>
        Several reasons, or a photo first
      </Button>
    </section>
  );
}
