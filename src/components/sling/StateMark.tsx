import type { ReactNode } from 'react';
import { STATE_FACTS, type SlingState } from '../../../shared/domain/lifecycle/states';
import { cx } from '../../lib/cx';
import { lookOf, MARK_COLOURS, type MarkShape } from './stateLook';

const SHAPES: Record<MarkShape, ReactNode> = {
  square: <rect x="3" y="3" width="18" height="18" fill="currentColor" />,
  barred_circle: (
    <g fill="none" stroke="currentColor" strokeWidth="3.4">
      <circle cx="12" cy="12" r="9" />
      <path d="M5.6 5.6 18.4 18.4" />
    </g>
  ),
  triangle: (
    <path
      d="M12 3 21.8 20.6H2.2Z"
      fill="currentColor"
      stroke="var(--mark-edge, transparent)"
      strokeLinejoin="round"
    />
  ),
  solid_circle: <circle cx="12" cy="12" r="9.6" fill="currentColor" />,
  cut_square: <path d="M3 3h14.6L3 17.6ZM21 6.4V21H6.4Z" fill="currentColor" />,
  dashed_square: (
    <rect
      x="3.6"
      y="3.6"
      width="16.8"
      height="16.8"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.4"
      strokeDasharray="4.2 3.2"
      strokeDashoffset="2"
    />
  ),
  leaving_arrow: (
    <g fill="none" stroke="currentColor" strokeWidth="2.4">
      <path d="M13 3.6H3.6v16.8H20.4V11" />
      <path d="M9.5 14.5 20.5 3.5M13.8 3.5h6.7v6.7" />
    </g>
  ),
};

/** The bare shape in currentColor; always beside its word. */
export function MarkShapeIcon({ shape, className }: { shape: MarkShape; className?: string }): ReactNode {
  return (
    <svg viewBox="0 0 24 24" className={cx('shrink-0', className ?? 'size-6')} aria-hidden="true">
      {SHAPES[shape]}
    </svg>
  );
}

export interface StateMarkProps {
  sling: { state: SlingState; mayUse: boolean; condemned?: boolean };
  className?: string;
}

/** Colour, shape and word for lists: "Held", "Condemned", "In service", "Do not use". */
export function StateMark({ sling, className }: StateMarkProps): ReactNode {
  const look = lookOf(sling);
  return (
    <span className={cx('inline-flex items-center gap-2 font-medium whitespace-nowrap', className)}>
      <span className={cx(MARK_COLOURS[look.colour], 'mark-on-paper')}>
        <MarkShapeIcon shape={look.shape} className="size-5" />
      </span>
      {stateWord(sling)}
    </span>
  );
}

/** The word for what this sling is now. */
export function stateWord(sling: { state: SlingState; mayUse: boolean; condemned?: boolean }): string {
  if (sling.state === 'held' && sling.condemned) return 'Condemned';
  if (sling.state === 'in_service' && !sling.mayUse) return 'Do not use';
  return STATE_FACTS[sling.state].word;
}
