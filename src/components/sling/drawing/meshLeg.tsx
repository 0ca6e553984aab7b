import type { ReactNode } from 'react';
import type { MeshSpec } from '../../../../shared/domain/slings/spec';
import { clamp } from './geometry';
import { INK, LITE, PAPER, STEEL, type LegProps } from './runs';

const HANDLE = 52;

/** Interlocking spirals across the width, joined by cross rods; a plain handle above, a choker handle below. */
export function MeshLeg({ spec, end }: LegProps<MeshSpec>): ReactNode {
  const half = clamp(spec.widthMm * 0.13, 15, 44);
  const pitch = spec.duty === 'heavy' ? 11 : spec.duty === 'medium' ? 9 : 7.5;
  const [top, bottom] = [HANDLE + 4, end - HANDLE - 4];
  const rows = Math.max(4, Math.round((bottom - top) / pitch));
  const step = (bottom - top) / rows;
  const columns = Math.round((half * 2) / 6);
  const gap = (half * 2) / columns;
  const wire = clamp(spec.wireMm * 0.7, 1.1, 2.2);
  return (
    <g>
      {spec.coated && (
        <rect
          x={-half - 4}
          y={top}
          width={half * 2 + 8}
          height={bottom - top}
          rx={3}
          fill="var(--draw-web)"
          fillOpacity={0.28}
          stroke={INK}
          strokeWidth={1}
        />
      )}
      <g fill="none" stroke={INK} strokeLinecap="round">
        {Array.from({ length: rows }, (_, r) => {
          const y = top + r * step;
          const lean = r % 2 === 0 ? gap * 0.62 : -gap * 0.62;
          const d = Array.from({ length: columns }, (_unused, c) => {
            const x = -half + (c + 0.5) * gap;
            return `M${(x - lean / 2).toFixed(1)} ${(y - 0.8).toFixed(1)}l${lean.toFixed(1)} ${(step + 1.6).toFixed(1)}`;
          }).join('');
          return <path key={r} d={d} strokeWidth={wire + 0.5} stroke={r % 2 === 0 ? INK : STEEL} />;
        })}
        <path
          d={Array.from(
            { length: rows + 1 },
            (_, r) => `M${-half} ${(top + r * step).toFixed(1)}h${half * 2}`,
          ).join('')}
          strokeWidth={1}
          stroke={STEEL}
        />
        <path d={`M${-half} ${top}V${bottom}M${half} ${top}V${bottom}`} strokeWidth={1.5} />
      </g>
      <MeshHandle half={half} isChoker={false} />
      <g transform={`translate(0 ${end}) scale(1 -1)`}>
        <MeshHandle half={half} isChoker />
      </g>
    </g>
  );
}

/** Bears at (0, 0), its foot holds the mesh. The choker handle has a second, wider opening that the other passes through. */
function MeshHandle({ half, isChoker }: { half: number; isChoker: boolean }): ReactNode {
  const w = half + 6;
  return (
    <g stroke={INK} strokeWidth={1.6} strokeLinejoin="round">
      <path
        d={`M-11-7h22q5 0 6.500 4L${w} ${HANDLE - 6}v12h${-2 * w}v-12L-17.500-3q1.500-4 6.500-4Z`}
        fill={STEEL}
      />
      <path
        d={isChoker ? `M-9 0h18L${w - 13} 26h${-2 * w + 26}Z` : 'M-8 0h16l4 9-5 9h-14l-5-9Z'}
        fill={PAPER}
        strokeWidth={1.3}
      />
      {isChoker && (
        <rect x={-w + 10} y={31} width={2 * w - 20} height={8} rx={3.5} fill={PAPER} strokeWidth={1.2} />
      )}
      <path d={`M${-w + 3} ${HANDLE}h${2 * w - 6}`} stroke={LITE} strokeWidth={2.5} />
    </g>
  );
}
