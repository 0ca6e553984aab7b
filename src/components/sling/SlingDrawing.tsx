import { useId, type ReactNode } from 'react';
import { describeSling } from '../../../shared/domain/slings/describe';
import { formatCount } from '../../lib/format';
import { FITTING_DROPS, FittingDrawing, Oblong } from './drawing/fittings';
import {
  isLoop,
  layOut,
  placeOnLeg,
  type DrawnSling,
  type LegPlace,
  type SlingLayout,
} from './drawing/layout';
import { MeshLeg } from './drawing/meshLeg';
import { ChainLeg, ChainLoop, RopeGrommet, WireRopeLeg } from './drawing/metalLegs';
import { WebLeg, WebLoop } from './drawing/webLegs';
import { FibreRopeLeg, RoundLoop } from './drawing/yarnLegs';

export interface Pin {
  /** The number that the list beside the drawing carries. */
  n: number;
  /** Legs count from 1, left to right. */
  leg: number;
  /** From the upper bearing place along the leg. */
  positionMm: number;
}

export interface SlingDrawingProps {
  sling: DrawnSling;
  /** Findings, as numbered pins. */
  pins?: readonly Pin[];
  className?: string;
}

/** The sling drawn from its own data. Give it a height by class (`h-80`); it keeps its proportions. */
export function SlingDrawing({ sling, pins = [], className }: SlingDrawingProps): ReactNode {
  const titleId = useId();
  const layout = layOut(sling);
  return (
    <svg
      role="img"
      aria-labelledby={titleId}
      viewBox={`0 0 ${layout.width} ${Math.ceil(layout.height)}`}
      className={className ?? 'h-80 max-w-full'}
    >
      <title id={titleId}>
        {`Drawing: ${describeSling(sling)}${pins.length ? `, with ${formatCount(pins.length, 'finding')} marked` : ''}`}
      </title>
      <Upper layout={layout} />
      {layout.legs.map((leg, i) => (
        <g key={i} transform={`translate(${leg.top.x} ${leg.top.y}) rotate(${leg.deg.toFixed(2)})`}>
          <Leg sling={sling} leg={leg} />
        </g>
      ))}
      {pins.map((pin) => (
        <PinMark key={pin.n} n={pin.n} at={placeOnLeg(layout, pin.leg, pin.positionMm, sling.reachMm)} />
      ))}
    </svg>
  );
}

/** What the crane's hook takes, and for three and four legs the two links below it. */
function Upper({ layout }: { layout: SlingLayout }): ReactNode {
  const { upper, middle, subLinks } = layout;
  return (
    <g>
      {subLinks.map((link) => (
        <g key={link.deg} transform={`translate(${link.at.x} ${link.at.y}) rotate(${link.deg})`}>
          <Oblong halfWidth={8} top={-3} bottom={32} bar={5.4} />
        </g>
      ))}
      {upper &&
        (upper.type === 'master_link' || upper.type === 'eye' || upper.type === 'coupling_link' ? (
          <g transform={`translate(${middle} 0)`}>
            <Oblong halfWidth={18} top={9} bottom={62} bar={8.4} />
          </g>
        ) : (
          <g transform={`translate(${middle} 60) scale(1.15 -1.15)`}>
            <FittingDrawing fitting={upper} />
          </g>
        ))}
    </g>
  );
}

function Leg({ sling, leg }: { sling: DrawnSling; leg: LegPlace }): ReactNode {
  const lowerDrop = leg.lower && !isLoop(sling) ? FITTING_DROPS[leg.lower.type] : 0;
  const end = leg.length - lowerDrop;
  return (
    <g>
      <LegBody sling={sling} end={end} />
      {leg.lower && lowerDrop > 0 && (
        <g transform={`translate(0 ${end}) scale(${leg.isMirrored ? -1 : 1} 1)`}>
          <FittingDrawing fitting={leg.lower} />
        </g>
      )}
    </g>
  );
}

function LegBody({ sling, end }: { sling: DrawnSling; end: number }): ReactNode {
  const hasThimble = sling.fittings.some((fitting) => fitting.type === 'thimble');
  const isWhole = isLoop(sling);
  switch (sling.kind) {
    case 'alloy-chain':
      return isWhole ? <ChainLoop spec={sling.spec} end={end} /> : <ChainLeg spec={sling.spec} end={end} />;
    case 'wire-rope':
      return isWhole ? (
        <RopeGrommet spec={sling.spec} end={end} />
      ) : (
        <WireRopeLeg spec={sling.spec} end={end} hasThimble={hasThimble} />
      );
    case 'metal-mesh':
      return <MeshLeg spec={sling.spec} end={end} />;
    case 'synthetic-web':
      return sling.spec.type === 'endless' ? (
        <WebLoop spec={sling.spec} end={end} />
      ) : (
        <WebLeg spec={sling.spec} end={end} />
      );
    case 'synthetic-round':
      return <RoundLoop spec={sling.spec} end={end} half={isWhole ? 34 : 11} />;
    case 'synthetic-rope':
      return <FibreRopeLeg spec={sling.spec} end={end} hasThimble={hasThimble} />;
  }
}

function PinMark({ n, at }: { n: number; at: { x: number; y: number } }): ReactNode {
  return (
    <g transform={`translate(${at.x.toFixed(1)} ${at.y.toFixed(1)})`}>
      <circle r={12.5} fill="#9B2423" stroke="var(--draw-paper)" strokeWidth={2} />
      <text y={5} textAnchor="middle" fontSize={14} fontWeight={700} fill="#ffffff">
        {n}
      </text>
    </g>
  );
}
