import type { ReactNode } from 'react';
import type { WebSpec } from '../../../../shared/domain/slings/spec';
import { clamp, drop, loop } from './geometry';
import { INK, LITE, PAPER, STEEL, StrapRun, type LegProps, type StrapLook } from './runs';

const WEB = 'var(--draw-web)';
const WEB_LITE = 'var(--draw-web-lite)';
const widthOf = (widthMm: number): number => clamp(13 + widthMm * 0.13, 14, 44);

export function WebLoop({ spec, end }: LegProps<WebSpec>): ReactNode {
  const width = clamp(widthOf(spec.widthMm) * 0.62, 11, 24);
  return (
    <g>
      <StrapRun curve={loop(0, end, 30)} look={{ width, fill: WEB, line: WEB_LITE }} />
      <Stitching x={-30} top={end * 0.34} height={52} width={width - 5} />
      <MakersTag x={30} y={end * 0.45} />
    </g>
  );
}

const WEB_EYE = 62;

export function WebLeg({ spec, end }: LegProps<WebSpec>): ReactNode {
  const isReversed = spec.type === 'reversed_eye';
  const body = widthOf(spec.widthMm) * (isReversed ? 1.5 : 1);
  const eye: StrapLook = { width: clamp(body * 0.42, 8, 15), fill: WEB, line: WEB_LITE };
  const isTriangle = spec.type === 'triangle_triangle' || spec.type === 'triangle_choker';
  const inset = isTriangle ? 34 : WEB_EYE;
  return (
    <g>
      {!isTriangle && (
        <>
          <WebEye look={eye} isTwisted={spec.type === 'eye_eye_twisted'} />
          <g transform={`translate(0 ${end}) scale(-1 -1)`}>
            <WebEye look={eye} isTwisted={spec.type === 'eye_eye_twisted'} />
          </g>
        </>
      )}
      <WebBody
        top={inset - 8}
        bottom={end - inset + 8}
        width={body}
        plies={spec.plies}
        hasSeam={isReversed}
      />
      {isTriangle && (
        <>
          <WebTriangle half={body / 2} isChoker={false} />
          <g transform={`translate(0 ${end}) scale(1 -1)`}>
            <WebTriangle half={body / 2} isChoker={spec.type === 'triangle_choker'} />
          </g>
        </>
      )}
      <Stitching x={0} top={inset} height={36} width={body - 7} />
      <Stitching x={0} top={end - inset - 36} height={36} width={body - 7} />
      <MakersTag x={body / 2} y={end * 0.42} />
    </g>
  );
}

function WebEye({ look, isTwisted }: { look: StrapLook; isTwisted: boolean }): ReactNode {
  return (
    <g>
      <StrapRun curve={drop(WEB_EYE, look.width / 2, isTwisted ? 13 : 20)} look={look} />
      {isTwisted && (
        // The strap turns by a quarter: its edge crosses the eye's foot
        <path
          d={`M-7 ${WEB_EYE - 22}Q3 ${WEB_EYE - 14} 8 ${WEB_EYE - 4}`}
          fill="none"
          stroke={WEB_LITE}
          strokeWidth={2.4}
          strokeLinecap="round"
        />
      )}
    </g>
  );
}

function WebBody({
  top,
  bottom,
  width,
  plies,
  hasSeam,
}: {
  top: number;
  bottom: number;
  width: number;
  plies: number;
  hasSeam: boolean;
}): ReactNode {
  const half = width / 2;
  const stripes = hasSeam ? [-0.28, 0.28] : [-0.22, 0.22];
  return (
    <g>
      {plies > 1 && (
        <rect
          x={-half + 2.5}
          y={top + 2}
          width={width}
          height={bottom - top - 4}
          fill={WEB_LITE}
          stroke={INK}
          strokeWidth={1}
        />
      )}
      <rect x={-half} y={top} width={width} height={bottom - top} fill={WEB} stroke={INK} strokeWidth={1.3} />
      <g stroke={WEB_LITE} strokeWidth={1.3}>
        {stripes.map((share) => (
          <path key={share} d={`M${share * width} ${top}V${bottom}`} />
        ))}
        {hasSeam && (
          <path d={`M0 ${top}V${bottom}`} stroke={INK} strokeWidth={1.1} strokeDasharray="4 2.500" />
        )}
      </g>
    </g>
  );
}

/** Bears at (0, 0); the strap is sewn around its foot. The choker's opening lets the other triangle through. */
function WebTriangle({ half, isChoker }: { half: number; isChoker: boolean }): ReactNode {
  const w = half + (isChoker ? 14 : 8);
  return (
    <g stroke={INK} strokeWidth={1.5} strokeLinejoin="round">
      <path d={`M-6-7h12q4 0 6 4L${w} 27q1 9-6 9H${-w + 6}q-7 0-6-9L-12-3q2-4 6-4Z`} fill={STEEL} />
      <path
        d={isChoker ? `M-4 2h8L${w - 9} 20h${-2 * w + 18}Z` : `M0 2 ${w - 10} 21h${-2 * w + 20}Z`}
        fill={PAPER}
        strokeWidth={1.2}
      />
      <rect x={-half} y={24} width={half * 2} height={20} rx={3} fill={WEB} strokeWidth={1.3} />
      <path
        d={`M${-half + 3} 28.500h${2 * half - 6}`}
        stroke={LITE}
        strokeWidth={1.2}
        strokeDasharray="3 2"
      />
    </g>
  );
}

/** The sewn overlap: lengthwise rows of stitches. */
function Stitching({
  x,
  top,
  height,
  width,
}: {
  x: number;
  top: number;
  height: number;
  width: number;
}): ReactNode {
  const rows = Math.max(2, Math.round(width / 4.5));
  const gap = width / (rows - 1);
  const d = Array.from(
    { length: rows },
    (_, i) => `M${(x - width / 2 + i * gap).toFixed(1)} ${top}v${height}`,
  ).join('');
  return (
    <g fill="none" stroke={PAPER}>
      <path d={d} strokeWidth={1.1} strokeDasharray="2.600 1.800" />
      <path
        d={`M${x - width / 2} ${top}h${width}M${x - width / 2} ${top + height}h${width}`}
        strokeWidth={1.1}
        strokeDasharray="2.600 1.800"
      />
    </g>
  );
}

/** The maker's tag, sewn in at the side. */
function MakersTag({ x, y }: { x: number; y: number }): ReactNode {
  return (
    <g transform={`translate(${x - 3} ${y})`} stroke={INK}>
      <rect width={19} height={34} rx={1} fill={PAPER} strokeWidth={1.2} />
      <path d="M4 8h11M4 13.500h11M4 19h7M4 26h11" strokeWidth={1.2} fill="none" />
    </g>
  );
}
