import type { ReactNode } from 'react';
import { spread, type Curve } from './geometry';

export const INK = 'var(--draw-ink)';
export const STEEL = 'var(--draw-steel)';
export const LITE = 'var(--draw-lite)';
export const PAPER = 'var(--draw-paper)';

/** A leg in its own frame: hangs from (0, 0), its body ends at (0, end). */
export interface LegProps<Spec> {
  spec: Spec;
  end: number;
}

const place = (p: { x: number; y: number; deg: number }): string =>
  `translate(${p.x.toFixed(1)} ${p.y.toFixed(1)}) rotate(${p.deg.toFixed(1)})`;

/** A round bar, rope or strap along a curve: fill between two ink edges. */
export function Tube({
  d,
  width,
  fill,
  edge = 1.3,
}: {
  d: string;
  width: number;
  fill: string;
  edge?: number;
}): ReactNode {
  return (
    <g fill="none" strokeLinejoin="round">
      <path d={d} stroke={INK} strokeWidth={width} />
      <path d={d} stroke={fill} strokeWidth={width - 2 * edge} />
    </g>
  );
}

/** Chain along a curve: links alternate between face-on and edge-on. `wire` is the thickness of the link's bar. */
export function ChainRun({
  curve,
  wire,
  isClosed = false,
}: {
  curve: Curve;
  wire: number;
  isClosed?: boolean;
}): ReactNode {
  const pitch = wire * 3;
  let count = Math.max(2, Math.round(curve.length / pitch));
  if (isClosed && count % 2 === 1) count += 1;
  const step = curve.length / count;
  const links = spread(curve, count);
  const faceLength = step + wire * 0.9;
  const faceWidth = wire * 2.3;
  return (
    <g>
      {links.map((p, i) =>
        i % 2 === 0 ? (
          <g key={i} transform={place(p)} fill="none">
            {[
              { stroke: INK, width: wire },
              { stroke: STEEL, width: wire - 2 },
            ].map((s) => (
              <rect
                key={s.stroke}
                x={-faceLength / 2}
                y={-faceWidth / 2}
                width={faceLength}
                height={faceWidth}
                rx={faceWidth / 2}
                stroke={s.stroke}
                strokeWidth={s.width}
              />
            ))}
          </g>
        ) : null,
      )}
      {links.map((p, i) =>
        i % 2 === 1 ? (
          <rect
            key={i}
            transform={place(p)}
            x={-(step + wire * 1.7) / 2}
            y={-wire / 2}
            width={step + wire * 1.7}
            height={wire}
            rx={wire / 2}
            fill={STEEL}
            stroke={INK}
            strokeWidth={1}
          />
        ) : null,
      )}
    </g>
  );
}

export type Lay = 'laid' | 'braided';
export interface RopeLook {
  width: number;
  fill: string;
  stroke: string;
  lay: Lay;
}

/** Rope along a curve, its lay as slanted strokes (crossed where braided). */
export function RopeRun({
  curve,
  look,
  isClosed = false,
}: {
  curve: Curve;
  look: RopeLook;
  isClosed?: boolean;
}): ReactNode {
  const { width, fill, stroke, lay } = look;
  const count = Math.max(2, Math.round(curve.length / (width * (lay === 'braided' ? 0.95 : 0.62))));
  const half = width / 2 - 1.2;
  const run = width * 0.36;
  const one = `M${-run} ${half}C${-run * 0.4} ${half * 0.4} ${run * 0.4} ${-half * 0.4} ${run} ${-half}`;
  const other = `M${-run} ${-half}L${run} ${half}`;
  return (
    <g>
      <Tube d={curve.d + (isClosed ? 'Z' : '')} width={width} fill={fill} />
      <g fill="none" stroke={stroke} strokeWidth={1.15}>
        {spread(curve, count).map((p, i) => (
          <path key={i} transform={place(p)} d={lay === 'braided' ? `${one}${other}` : one} />
        ))}
      </g>
    </g>
  );
}

export interface StrapLook {
  width: number;
  fill: string;
  line: string;
}

/** Webbing along a curve: flat band with woven edge lines. */
export function StrapRun({ curve, look }: { curve: Curve; look: StrapLook }): ReactNode {
  return (
    <g fill="none" strokeLinejoin="round">
      <path d={curve.d} stroke={INK} strokeWidth={look.width} />
      <path d={curve.d} stroke={look.fill} strokeWidth={look.width - 2.2} />
      {look.width > 9 && (
        <>
          <path d={curve.d} stroke={look.line} strokeWidth={look.width * 0.5} />
          <path d={curve.d} stroke={look.fill} strokeWidth={look.width * 0.5 - 2} />
        </>
      )}
    </g>
  );
}
