import type { ReactNode } from 'react';
import type { HoldReason } from '../../../shared/domain/lifecycle/reasons';

const L = {
  fill: 'none',
  stroke: 'currentColor',
  strokeWidth: 2.4,
  strokeLinecap: 'round',
  strokeLinejoin: 'round',
} as const;
const THIN = { ...L, strokeWidth: 1.7 } as const;
const TAG = <path d="M8 13h20l9 9-9 9H8Z" {...L} />;
const TAG_HOLE = <circle cx="29.500" cy="22" r="2" {...THIN} />;
const QUESTION = (
  <>
    <path
      d="M17 17.500c0-3.400 2.200-5.500 5.200-5.500s5.300 1.900 5.300 4.800c0 3.900-5.300 4.200-5.300 8.200"
      {...L}
      strokeWidth="3"
    />
    <circle cx="22.200" cy="30.500" r="1.900" fill="currentColor" />
  </>
);
const RECORD = <path d="M10 4h17l8 8v28H10ZM27 4v8h8" {...L} />;

const DRAWINGS: Partial<Record<HoldReason, ReactNode>> = {
  // A strap with a torn edge
  damage_suspected: (
    <>
      <path d="M14 3v14l5 3-4 4 5 3-6 2v12M30 3v38" {...L} />
      <path d="M14 3h16M14 41h16" {...THIN} strokeDasharray="2 3" />
      <path d="m24 12-3 4m5 2-5 4m4 4-4 4" {...THIN} />
    </>
  ),
  // The place of a tag, empty
  makers_tag_missing: (
    <>
      <path d="M8 13h20l9 9-9 9H8Z" {...L} strokeDasharray="4 4" />
      <path d="m14 17 10 10m0-10L14 27" {...L} />
    </>
  ),
  // A tag whose lines are worn away
  makers_tag_illegible: (
    <>
      {TAG}
      {TAG_HOLE}
      <path
        d="M12.500 18.500h3m3.500 0h1.500M12.500 22h1.500m4 0h4M12.500 25.500h5"
        {...THIN}
        strokeOpacity=".6"
      />
      <path d="m10 36 22-30" {...L} strokeWidth="1.800" />
    </>
  ),
  // A leg stretched by too heavy a weight
  overload_or_shock: (
    <>
      <path d="M22 2v5m0 3v3m0 2.500v2" {...L} strokeWidth="3.200" />
      <path d="M12.500 20h19L36 41H8Z" {...L} fill="currentColor" fillOpacity=".16" />
      <path d="M22 25.500v9m-4-3.500 4 4 4-4" {...L} />
      <path d="m12 9 3 2.500m17-2.500-3 2.500" {...THIN} />
    </>
  ),
  // A flame, a drop
  heat_or_chemical: (
    <>
      <path
        d="M15 3c1 6 8.500 9 8.500 17.500 0 5-3.500 8.500-8.300 8.500S7 25.700 7 20.800c0-4 2-6 3.500-9 1 2.400 2 3.200 3.300 3.700C15.500 12 15.800 7.500 15 3Z"
        {...L}
      />
      <path
        d="M31 20c4.500 6 7 9.700 7 13.300a7 7 0 0 1-14 0c0-3.600 2.500-7.300 7-13.300Z"
        {...L}
        fill="currentColor"
        fillOpacity=".16"
      />
    </>
  ),
  // A bolt put through a link
  unauthorised_repair: (
    <>
      <rect x="15" y="3" width="14" height="19" rx="7" {...L} />
      <rect x="15" y="22" width="14" height="19" rx="7" {...L} />
      <path d="M6 22h32" {...L} strokeWidth="4.500" />
      <path d="M6 17v10M36 17.500h3v9h-3" {...L} />
    </>
  ),
  // A hook without its latch
  latch: (
    <>
      <circle cx="22" cy="6.500" r="3.800" {...L} />
      <path
        d="M22 11c0 6 9.500 7 9.500 16.500 0 7-5 11.500-10.500 11.500S10.500 35 10.500 30c0-3 1-5 2.500-6.500"
        {...L}
        strokeWidth="4"
      />
      <path d="m21.500 15-8 6.500" {...THIN} strokeDasharray="2.500 2.800" />
    </>
  ),
  // A tag with a question
  identity_unknown: (
    <>
      <rect x="7" y="5" width="30" height="34" rx="4" {...L} />
      {QUESTION}
    </>
  ),
  record_in_doubt: (
    <>
      {RECORD}
      <g transform="translate(4.500 7.500) scale(.8)">{QUESTION}</g>
    </>
  ),
  // A pencil: it is written in words
  other: (
    <>
      <path d="m9 28 19-19 7 7-19 19-9 2Z" {...L} />
      <path d="m24 13 7 7M6 41h32" {...L} strokeWidth="2" />
    </>
  ),
};

/** A small drawing of a reason to hold, for its tile; null where a reason isn't chosen by hand. */
export function ReasonDrawing({ code, className }: { code: HoldReason; className?: string }): ReactNode {
  const drawing = DRAWINGS[code];
  if (!drawing) return null;
  return (
    <svg viewBox="0 0 44 44" className={className ?? 'size-11 shrink-0'} aria-hidden="true">
      {drawing}
    </svg>
  );
}
