import type { ReactNode } from 'react';

export type Hitch = 'vertical' | 'choker' | 'basket' | 'bridle';

const LOAD = { fill: 'currentColor', fillOpacity: 0.2, stroke: 'currentColor', strokeWidth: 2 } as const;
const LEG = {
  fill: 'none',
  stroke: 'currentColor',
  strokeWidth: 3,
  strokeLinecap: 'round',
  strokeLinejoin: 'round',
} as const;
const HOOK = (
  <path
    d="M22 1.5v4.2a3.6 3.6 0 1 1-3.6 3.6"
    fill="none"
    stroke="currentColor"
    strokeWidth="2"
    strokeLinecap="round"
  />
);

const DRAWINGS: Record<Hitch, ReactNode> = {
  vertical: (
    <>
      {HOOK}
      <path d="M22 12.8V26" {...LEG} />
      <rect x="10" y="27" width="24" height="13" {...LOAD} />
      <path d="M19 27a3 3 0 0 1 6 0" fill="none" stroke="currentColor" strokeWidth="2" />
    </>
  ),
  choker: (
    <>
      {HOOK}
      <path d="M22 12.8v7.4" {...LEG} />
      <circle cx="22" cy="31" r="8" {...LOAD} />
      <path
        d="M22 20.2c6.2 0 10.8 4.6 10.8 10.6S28 41.6 22 41.6 11.2 36.800 11.2 30.8c0-3.600 1.8-6.800 4.6-8.700"
        {...LEG}
      />
      <path d="M14.600 25.200 22 19.600l4.200 4.200" {...LEG} />
    </>
  ),
  basket: (
    <>
      {HOOK}
      <path d="M20.600 12.400 12 23v8a10 10 0 0 0 20 0v-8l-8.600-10.600" {...LEG} />
      <circle cx="22" cy="30.400" r="7" {...LOAD} />
    </>
  ),
  bridle: (
    <>
      {HOOK}
      <path d="M22 12.800 9 28M22 12.800 35 28" {...LEG} />
      <rect x="5" y="29" width="34" height="11" {...LOAD} />
    </>
  ),
};

/** Our own small drawing of a hitch, in currentColor. Decorative: its word stands beside it. */
export function HitchIcon({ hitch, className }: { hitch: Hitch; className?: string }): ReactNode {
  return (
    <svg viewBox="0 0 44 44" className={className ?? 'size-8'} aria-hidden="true">
      {DRAWINGS[hitch]}
    </svg>
  );
}
