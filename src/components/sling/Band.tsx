import type { ReactNode } from 'react';
import { STATE_FACTS, type SlingState } from '../../../shared/domain/lifecycle/states';
import { cx } from '../../lib/cx';
import { lookOf, SIGNAL_FILLS } from './stateLook';
import { MarkShapeIcon } from './StateMark';

export interface BandProps {
  sling: { state: SlingState; condemned: boolean; mayUse: boolean };
  /** One sentence: what that means now, "Since 3 Nov, 28 days. Broken wires. In Cage 2." */
  children: ReactNode;
  /** The one action that this person most likely wants. */
  action?: ReactNode;
  /** Stands right under a plate. */
  isJoined?: boolean;
}

/** The state over the full width: its colour, its shape, its word, one sentence, one action. */
export function Band({ sling, children, action, isJoined = false }: BandProps): ReactNode {
  const look = lookOf(sling);
  return (
    <section
      aria-label="State"
      className={cx('overflow-hidden', isJoined ? 'rounded-b-[14px]' : 'rounded-[14px]')}
    >
      <div
        className={cx(
          'on-signal grid grid-cols-[2.5rem_1fr] items-center gap-x-3.5 gap-y-1.5 px-4.5 py-4',
          isJoined ? 'rounded-b-[14px]' : 'rounded-[14px]',
          SIGNAL_FILLS[look.colour],
          (look.colour === 'grey' || look.colour === 'black') && 'border-2 border-white/50',
          look.colour === 'grey' && 'border-dashed',
        )}
      >
        <MarkShapeIcon shape={look.shape} className="size-9.5" />
        <h2 className="text-[1.625rem] leading-[1.1] font-bold tracking-[0.02em]">{bandWord(sling)}</h2>
        <p className="col-span-2 text-[1.1875rem] leading-snug font-bold">{children}</p>
        {action && <div className="col-span-2 mt-2">{action}</div>}
      </div>
    </section>
  );
}

/** The band's word, in capitals: the state, and DO NOT USE with it wherever a person could take it for usable. */
export function bandWord({ state, condemned, mayUse }: BandProps['sling']): string {
  if (state === 'held') return condemned ? 'CONDEMNED · DO NOT USE' : 'HELD · DO NOT USE';
  if (state === 'in_service') return mayUse ? 'IN SERVICE' : 'DO NOT USE';
  return STATE_FACTS[state].word.toUpperCase();
}
