import type { ReactNode } from 'react';
import type { FittingType } from '../../../../shared/domain/slings/spec';
import { INK, LITE, PAPER, STEEL } from './runs';

const BODY = { fill: STEEL, stroke: INK, strokeWidth: 1.4, strokeLinejoin: 'round' } as const;

/** From the place where a fitting hangs down to where it bears the load, in drawing units. */
export const FITTING_DROPS: Record<FittingType, number> = {
  hook: 41,
  self_locking_hook: 42,
  shackle: 33,
  master_link: 44,
  coupling_link: 22,
  ring: 24,
  thimble: 0,
  eye: 24,
  choker_fitting: 34,
  triangle: 32,
  other: 20,
};

export interface FittingLook {
  type: FittingType;
  hasLatch?: boolean | undefined;
}

/** One fitting hanging from (0, 0). A hook's tip points to the left; turn it with scale(-1 1). */
export function FittingDrawing({ fitting }: { fitting: FittingLook }): ReactNode {
  switch (fitting.type) {
    case 'hook':
      return <HookShape hasLatch={fitting.hasLatch ?? false} />;
    case 'self_locking_hook':
      return <SelfLockingHook />;
    case 'shackle':
      return <Shackle />;
    case 'master_link':
      return <Oblong halfWidth={14} top={-3} bottom={47} bar={6.5} />;
    case 'coupling_link':
      return <CouplingLink />;
    case 'ring':
      return <Tubular cx={0} cy={11} r={12} bar={5} />;
    case 'eye':
      return <Oblong halfWidth={7} top={-3} bottom={27} bar={5} />;
    case 'choker_fitting':
      return <ChokerFitting />;
    case 'triangle':
      return <TriangleLink />;
    case 'other':
      return <path d="M-7 0h14l5 6v9l-5 6H-7l-5-6V6Z" {...BODY} />;
    case 'thimble':
      // A thimble lines the rope's own eye and is drawn there.
      return null;
  }
}

/** An oblong link from `top` to `bottom`, measured to the middle of its bar. */
export function Oblong({
  halfWidth,
  top,
  bottom,
  bar,
}: {
  halfWidth: number;
  top: number;
  bottom: number;
  bar: number;
}): ReactNode {
  const box = { x: -halfWidth, y: top, width: halfWidth * 2, height: bottom - top, rx: halfWidth };
  return (
    <g fill="none">
      <rect {...box} stroke={INK} strokeWidth={bar} />
      <rect {...box} stroke={STEEL} strokeWidth={bar - 2.6} />
      <path
        d={`M${-halfWidth} ${top + halfWidth + 2}V${bottom - halfWidth - 2}`}
        stroke={LITE}
        strokeWidth={Math.max(0.9, bar * 0.16)}
        strokeLinecap="round"
      />
    </g>
  );
}

function Tubular({ cx, cy, r, bar }: { cx: number; cy: number; r: number; bar: number }): ReactNode {
  return (
    <g fill="none">
      <circle cx={cx} cy={cy} r={r} stroke={INK} strokeWidth={bar} />
      <circle cx={cx} cy={cy} r={r} stroke={STEEL} strokeWidth={bar - 2.4} />
    </g>
  );
}

function HookShape({ hasLatch }: { hasLatch: boolean }): ReactNode {
  return (
    <g>
      <Tubular cx={0} cy={3} r={5.6} bar={5} />
      <path
        d="M4.200 8.500C4.800 15 15.500 18.500 17 30C18.400 41.500 9 50.500-2.500 50.500C-13 50.500-19.500 43.500-19.500 35.500C-19.500 31-17.800 27.500-15.600 24.800L-11.800 27.600C-12.400 36.500-8.500 41-2.500 41C4 41 7.800 36 6.800 30C5.600 23-3.600 19-4.200 8.500Z"
        {...BODY}
      />
      <path
        d="M9.500 22.500C13 28 13.600 36 8.500 42.500"
        fill="none"
        stroke={LITE}
        strokeWidth={1.4}
        strokeLinecap="round"
      />
      {hasLatch && (
        <>
          <path d="M1.800 15.500-13.400 28.400" stroke={INK} strokeWidth={4.4} strokeLinecap="round" />
          <path d="M1.800 15.500-13.400 28.400" stroke={LITE} strokeWidth={2.2} strokeLinecap="round" />
          <circle cx={1.8} cy={15.5} r={2.3} fill={PAPER} stroke={INK} strokeWidth={1.2} />
        </>
      )}
    </g>
  );
}

function SelfLockingHook(): ReactNode {
  return (
    <g>
      <Tubular cx={0} cy={3} r={5.6} bar={5} />
      <path
        d="M0 8.500C13 11 19.500 21 18.500 32C17.400 44 8 51.500-1.500 51.500C-11 51.500-18 45-18.600 36L-12 33.500C-10.500 39-7 42-1.500 42C4.500 42 9.500 37.500 9.500 31C9.500 23 4 17.500-4 16.500Z"
        {...BODY}
      />
      <path
        d="M0 8.500C-12 10.500-19.500 21-19 33L-11.600 36.500C-12.500 27-10 19.500-3 16.500Z"
        fill={LITE}
        stroke={INK}
        strokeWidth={1.4}
        strokeLinejoin="round"
      />
      <circle cx={-0.5} cy={12.8} r={2.2} fill={PAPER} stroke={INK} strokeWidth={1.2} />
      <path d="M5.500 14.500 9 20" stroke={PAPER} strokeWidth={2.2} strokeLinecap="round" />
    </g>
  );
}

function Shackle(): ReactNode {
  return (
    <g>
      <g fill="none" strokeLinecap="round">
        <path d="M-8 2V9C-16 21-12.500 36.500 0 36.500S16 21 8 9V2" stroke={INK} strokeWidth={7.5} />
        <path d="M-8 2V9C-16 21-12.500 36.500 0 36.500S16 21 8 9V2" stroke={STEEL} strokeWidth={4.9} />
      </g>
      <rect x={-15} y={-2} width={30} height={6} rx={1.5} fill={LITE} stroke={INK} strokeWidth={1.2} />
      <path d="M11-4.500h4.500v11H11Z" {...BODY} />
    </g>
  );
}

function CouplingLink(): ReactNode {
  return (
    <g>
      <Oblong halfWidth={6.5} top={-3} bottom={25} bar={4.6} />
      <path d="M-10.500 11h21" stroke={INK} strokeWidth={5} strokeLinecap="round" />
      <path d="M-10 11h20" stroke={LITE} strokeWidth={2.6} strokeLinecap="round" />
    </g>
  );
}

/** A fitting that slides on the body: an eye above, an open throat below that takes the body. */
function ChokerFitting(): ReactNode {
  return (
    <g>
      <path d="M-6-5h12l12 24-4 17h-28l-4-17Z" {...BODY} />
      <circle cx={0} cy={4} r={4.6} fill={PAPER} stroke={INK} strokeWidth={1.2} />
      <rect x={-11} y={17} width={22} height={11} rx={5} fill={PAPER} stroke={INK} strokeWidth={1.2} />
    </g>
  );
}

function TriangleLink(): ReactNode {
  return (
    <g>
      <path d="M-4-4h8l16 36a4 4 0 0 1-4 5h-32a4 4 0 0 1-4-5Z" {...BODY} />
      <path d="M0 6 11.500 28h-23Z" fill={PAPER} stroke={INK} strokeWidth={1.2} strokeLinejoin="round" />
    </g>
  );
}
