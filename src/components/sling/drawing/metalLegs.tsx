import type { ReactNode } from 'react';
import type { ChainSpec, WireRopeSpec } from '../../../../shared/domain/slings/spec';
import { clamp, drop, lineDown, loop } from './geometry';
import { ChainRun, INK, LITE, PAPER, RopeRun, STEEL, Tube, type LegProps, type RopeLook } from './runs';

const wireOf = (chainMm: number): number => clamp(3 + chainMm * 0.1, 3.4, 6);

export function ChainLeg({ spec, end }: LegProps<ChainSpec>): ReactNode {
  return <ChainRun curve={lineDown(0, 2, end)} wire={wireOf(spec.chainMm)} />;
}

export function ChainLoop({ spec, end }: LegProps<ChainSpec>): ReactNode {
  return <ChainRun curve={loop(0, end, 34)} wire={wireOf(spec.chainMm)} isClosed />;
}

function ropeLook(spec: WireRopeSpec): RopeLook {
  const width = clamp(6 + spec.diameterMm * 0.2, 7, 14) * (spec.construction === 'cable_laid' ? 1.15 : 1);
  const lay = spec.construction.startsWith('braided') ? 'braided' : 'laid';
  return { width, fill: STEEL, stroke: LITE, lay };
}

export function RopeGrommet({ spec, end }: LegProps<WireRopeSpec>): ReactNode {
  return <RopeRun curve={loop(0, end, 34)} look={ropeLook(spec)} isClosed />;
}

const EYE = 54;

export function WireRopeLeg({
  spec,
  end,
  hasThimble,
}: LegProps<WireRopeSpec> & { hasThimble: boolean }): ReactNode {
  const look = ropeLook(spec);
  const isSocket =
    spec.splice === 'swaged_socket' || spec.splice === 'poured_socket' || spec.splice === 'welded_end';
  const inset = isSocket ? 34 : EYE;
  return (
    <g>
      <RopeRun curve={lineDown(0, inset - 2, end - inset + 2)} look={look} />
      {isSocket ? (
        <>
          <EndFitting splice={spec.splice} width={look.width} />
          <g transform={`translate(0 ${end}) scale(1 -1)`}>
            <EndFitting splice={spec.splice} width={look.width} />
          </g>
        </>
      ) : (
        <>
          <RopeEye look={look} spec={spec} hasThimble={hasThimble} />
          <g transform={`translate(0 ${end}) scale(1 -1)`}>
            <RopeEye look={look} spec={spec} hasThimble={hasThimble} />
          </g>
        </>
      )}
    </g>
  );
}

function RopeEye({
  look,
  spec,
  hasThimble,
}: {
  look: RopeLook;
  spec: WireRopeSpec;
  hasThimble: boolean;
}): ReactNode {
  const eye = drop(EYE, look.width * 0.5, 17);
  const inner = drop(EYE - 8, look.width + 2.5, 12);
  return (
    <g>
      <RopeRun curve={eye} look={look} />
      {hasThimble && <Tube d={inner.d} width={5} fill={LITE} edge={1.1} />}
      <Splice spec={spec} width={look.width} />
    </g>
  );
}

/** What holds the eye together, below its throat. */
function Splice({ spec, width }: { spec: WireRopeSpec; width: number }): ReactNode {
  const half = width * 0.5 + 3;
  const fill = spec.ferrule === 'steel' ? STEEL : LITE;
  if (spec.splice === 'hand_tucked') {
    return (
      <g stroke={INK} strokeLinejoin="round">
        <path
          d={`M${-half} ${EYE - 3}L${-width / 2} ${EYE + 36}H${width / 2}L${half} ${EYE - 3}Z`}
          fill={STEEL}
          strokeWidth={1.3}
        />
        {Array.from({ length: 8 }, (_, i) => (
          <path
            key={i}
            d={`M${-half + 1 + i * 0.35} ${EYE + 5 + i * 4.2}L${half - 1 - i * 0.35} ${EYE - 0.5 + i * 4.2}`}
            stroke={LITE}
            strokeWidth={1.5}
          />
        ))}
      </g>
    );
  }
  const d =
    spec.splice === 'flemish'
      ? `M${-half} ${EYE - 4}h${half * 2}v13l-3 14h${-half * 2 + 6}l-3-14Z`
      : `M${-half} ${EYE}q0-5 3-5h${half * 2 - 6}q3 0 3 5v15q0 5-3 5h${-half * 2 + 6}q-3 0-3-5Z`;
  return (
    <g>
      <path d={d} fill={fill} stroke={INK} strokeWidth={1.4} strokeLinejoin="round" />
      <path
        d={`M${-half + 3.2} ${EYE + 0.5}v13`}
        stroke={PAPER}
        strokeOpacity={0.7}
        strokeWidth={1.6}
        strokeLinecap="round"
      />
    </g>
  );
}

/** A socket or welded end in place of an eye; bears at (0, 0). */
function EndFitting({ splice, width }: { splice: WireRopeSpec['splice']; width: number }): ReactNode {
  const w = width / 2;
  const body = { fill: LITE, stroke: INK, strokeWidth: 1.4, strokeLinejoin: 'round' } as const;
  if (splice === 'welded_end') {
    return (
      <g>
        <Tube d="M-9 8a9 9 0 1 1 18 0v8a9 9 0 0 1-18 0Z" width={6} fill={STEEL} />
        <path d={`M-6 24h12l${w - 3} 16h${-2 * w - 6}Z`} {...body} />
      </g>
    );
  }
  const isPoured = splice === 'poured_socket';
  return (
    <g>
      <path
        d="M-12 18V2a4 4 0 0 1 4-4h1a4 4 0 0 1 4 4v12h6V2a4 4 0 0 1 4-4h1a4 4 0 0 1 4 4v16Z"
        {...body}
        fill={STEEL}
      />
      <path d="M-15 4.500h30" stroke={INK} strokeWidth={6} strokeLinecap="round" />
      <path d="M-14.500 4.500h29" stroke={LITE} strokeWidth={3.4} strokeLinecap="round" />
      {isPoured ? (
        <path d={`M-13 16h26l${-13 + w + 2} 24h${-2 * w - 4}Z`} {...body} />
      ) : (
        <path d={`M${-w - 4} 16h${2 * w + 8}v22l-2 6h${-2 * w - 4}l-2-6Z`} {...body} />
      )}
    </g>
  );
}
