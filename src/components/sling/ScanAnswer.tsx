import { useEffect, useRef, type ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { DO_NOT_USE_LOOK, SIGNAL_FILLS, STATE_LOOKS } from './stateLook';
import { MarkShapeIcon } from './StateMark';

export interface ScanAnswerProps {
  mayUse: boolean;
  /** Sling's number and description, or why nothing is known. */
  title: ReactNode;
  /** Why, or when it is due: short lines. */
  lines?: readonly ReactNode[];
  /** Buttons on the fill; give them `on-signal` tones (white on clear). */
  action?: ReactNode;
}

/** The answer over the upper half of the screen: readable at arm's length, and read out at once. */
export function ScanAnswer({ mayUse, title, lines = [], action }: ScanAnswerProps): ReactNode {
  const look = mayUse ? STATE_LOOKS.in_service : DO_NOT_USE_LOOK;
  const ref = useRef<HTMLElement>(null);
  useEffect(() => {
    // Newer browsers answer a promise, which must not become the effect's clean-up
    ref.current?.scrollIntoView({ block: 'start' });
  }, []);
  return (
    <section
      ref={ref}
      role="alert"
      className={cx(
        'on-signal flex min-h-[50dvh] flex-col justify-end px-5.5 pt-8 pb-6 sm:px-8',
        SIGNAL_FILLS[look.colour],
      )}
    >
      <MarkShapeIcon shape={look.shape} className="size-20 -ml-2" />
      <p className="mt-3 mb-2 text-[clamp(2.75rem,14.5vw,5.500rem)] leading-[0.95] font-bold tracking-[0.01em]">
        {mayUse ? 'USE' : 'DO NOT USE'}
      </p>
      <p className="text-[1.375rem] leading-tight font-bold">{title}</p>
      {lines.map((line, i) => (
        <p key={i} className="mt-1.5 text-[1.1875rem] leading-snug font-bold">
          {line}
        </p>
      ))}
      {action && <div className="mt-4">{action}</div>}
    </section>
  );
}
