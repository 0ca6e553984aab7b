import type { ReactNode } from 'react';
import type { SlingKind } from '../../../shared/domain/slings/kinds';

const L = {
  fill: 'none',
  stroke: 'currentColor',
  strokeWidth: 2.4,
  strokeLinecap: 'round',
  strokeLinejoin: 'round',
} as const;
const THIN = { ...L, strokeWidth: 1.6 } as const;

const DRAWINGS: Record<SlingKind, ReactNode> = {
  'alloy-chain': (
    <>
      <rect x="17.500" y="3" width="9" height="13" rx="4.500" {...L} />
      <path d="M22 13v8" {...L} strokeWidth="4" />
      <rect x="17.500" y="18" width="9" height="13" rx="4.500" {...L} />
      <path
        d="M22 28v3.500c6 1 8.500 6 5.500 9.200-3.500 3.300-9.500 1.500-9.800-3.600"
        {...L}
        strokeWidth="3"
      />
    </>
  ),
  'wire-rope': (
    <>
      <path d="M22 16C13 9 15 2.500 22 2.500S31 9 22 16ZM22 28c-9 7-7 13.500 0 13.500S31 35 22 28Z" {...L} />
      <path d="M22 15v14" {...L} strokeWidth="6.500" />
      <path d="m19.500 20.500 5-2.500m-5 6 5-2.500m-5 6 5-2.500" stroke="var(--card)" strokeWidth="1.300" />
    </>
  ),
  'metal-mesh': (
    <>
      <path d="M16 3h12l5 9H11ZM16 41h12l5-9H11Z" {...L} />
      <path d="m13 12 4 5-4 5 4 5-4 5m6-20 4 5-4 5 4 5-4 5m6-20 4 5-4 5 4 5-4 5" {...THIN} />
      <path d="M13 12v20M31 12v20" {...THIN} />
    </>
  ),
  'synthetic-web': (
    <>
      <path d="M17 14c-3-6-1.500-11 5-11s8 5 5 11M17 30c-3 6-1.500 11 5 11s8-5 5-11" {...L} />
      <rect
        x="15"
        y="13"
        width="14"
        height="18"
        fill="currentColor"
        fillOpacity=".25"
        stroke="currentColor"
        strokeWidth="2.200"
      />
      <path d="M19.500 14v5m5-5v5m-5 6v5m5-5v5" {...THIN} strokeDasharray="1.500 2" />
    </>
  ),
  'synthetic-round': (
    <>
      <rect x="13" y="4" width="18" height="36" rx="9" {...L} strokeWidth="5" />
      <rect
        x="27"
        y="17"
        width="9"
        height="11"
        fill="var(--card)"
        stroke="currentColor"
        strokeWidth="1.600"
      />
      <path d="M29.500 21h4m-4 3h4" {...THIN} strokeWidth="1.200" />
    </>
  ),
  'synthetic-rope': (
    <>
      <path d="M22 17C12 11 14 3 22 3s10 8 0 14" {...L} strokeWidth="3.400" />
      <path d="M22 16v25.500" {...L} strokeWidth="8" strokeLinecap="butt" />
      <path
        d="m18.500 22 7-4m-7 9.500 7-4m-7 9.500 7-4m-7 9.500 7-4"
        stroke="var(--card)"
        strokeWidth="1.500"
      />
    </>
  ),
};

/** A small drawing of a kind, for tiles and lists; its word stands beside it. */
export function KindIcon({ kind, className }: { kind: SlingKind; className?: string }): ReactNode {
  return (
    <svg viewBox="0 0 44 44" className={className ?? 'size-8 shrink-0'} aria-hidden="true">
      {DRAWINGS[kind]}
    </svg>
  );
}
