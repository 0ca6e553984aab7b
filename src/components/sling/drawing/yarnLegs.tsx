import type { ReactNode } from 'react';
import type { FibreRopeSpec, RoundSpec } from '../../../../shared/domain/slings/spec';
import { clamp, drop, lineDown, loop } from './geometry';
import { INK, PAPER, RopeRun, STEEL, type LegProps, type RopeLook } from './runs';

const SLEEVE = 'var(--draw-sleeve)';

/** A roundsling: a loop of yarn in its sleeve, its seam along the outside. `half` is narrow where it hangs as a leg. */
export function RoundLoop({ spec, end, half }: LegProps<RoundSpec> & { half: number }): ReactNode {
  const width = half > 20 ? 21 : 13;
  const path = loop(0, end, half);
  return (
    <g>
      <g fill="none">
        <path d={path.d} stroke={INK} strokeWidth={width} />
        <path d={path.d} stroke={SLEEVE} strokeWidth={width - 2.6} />
        <path d={path.d} stroke={PAPER} strokeOpacity={0.55} strokeWidth={1.4} strokeDasharray="6 4" />
        {spec.fibre === 'high_performance' && (
          <path
            d={path.d}
            stroke={INK}
            strokeOpacity={0.35}
            strokeWidth={width - 2.6}
            strokeDasharray="1.400 7"
          />
        )}
      </g>
      {half > 20 && <SleeveTag x={half} y={end * 0.36} width={width} />}
    </g>
  );
}

const FIBRE_EYE = 56;

export function FibreRopeLeg({
  spec,
  end,
  hasThimble,
}: LegProps<FibreRopeSpec> & { hasThimble: boolean }): ReactNode {
  const look: RopeLook = {
    width: clamp(8 + spec.diameterMm * 0.2, 10, 17),
    fill: 'var(--draw-fibre)',
    stroke: 'var(--draw-fibre-dark)',
    lay: 'laid',
  };
  return (
    <g>
      <RopeRun curve={lineDown(0, FIBRE_EYE - 2, end - FIBRE_EYE + 2)} look={look} />
      <FibreEye look={look} hasThimble={hasThimble} />
      <g transform={`translate(0 ${end}) scale(1 -1)`}>
        <FibreEye look={look} hasThimble={hasThimble} />
      </g>
    </g>
  );
}

/** An eye splice: strands tucked back, the rope thicker there and tapering out. */
function FibreEye({ look, hasThimble }: { look: RopeLook; hasThimble: boolean }): ReactNode {
  const half = look.width / 2;
  const wide = half + 4;
  return (
    <g>
      <RopeRun curve={drop(FIBRE_EYE, half, 19)} look={look} />
      {hasThimble && (
        <path d={drop(FIBRE_EYE - 9, look.width + 2, 12.5).d} fill="none" stroke={STEEL} strokeWidth={3.6} />
      )}
      <path
        d={`M${-wide} ${FIBRE_EYE - 4}q-2 16 ${wide - half} 42h${look.width}q${wide - half + 2}-26 ${wide - half}-42Z`}
        fill={look.fill}
        stroke={INK}
        strokeWidth={1.3}
        strokeLinejoin="round"
      />
      <g fill="none" stroke={look.stroke} strokeWidth={1.5} strokeLinecap="round">
        {Array.from({ length: 5 }, (_, i) => (
          <path
            key={i}
            d={`M${-wide + 2} ${FIBRE_EYE + 7 + i * 6.5}q${wide}-1 ${wide * 2 - 4 - i * 0.8}-8`}
          />
        ))}
      </g>
    </g>
  );
}

/** The maker's tag around the sleeve. */
function SleeveTag({ x, y, width }: { x: number; y: number; width: number }): ReactNode {
  const w = width + 4;
  return (
    <g transform={`translate(${x - w / 2} ${y})`} stroke={INK} strokeWidth={1.3}>
      <rect width={w} height={46} fill={PAPER} />
      <path d={`M4 10h${w - 8}M4 18h${w - 8}M4 26h${w * 0.45}M4 36h${w - 8}`} fill="none" />
    </g>
  );
}
