import type { ReactNode } from 'react';
import { describeSling } from '../../../shared/domain/slings/describe';
import type { KindAndSpec, RatedLoads } from '../../../shared/domain/slings/spec';
import { cx } from '../../lib/cx';
import { useUnits } from '../../lib/session';
import { HitchIcon, type Hitch } from './hitches';

export type PlateSling = KindAndSpec & {
  number: string;
  legs: number;
  reachMm: number;
  ratedLoads: RatedLoads;
  maker: string;
  makerSerial?: string | undefined;
};

/**
 * The sling's tag plate. `heading` is the level of the number's heading. `isJoined`: a band follows at once, so the lower
 * corners stay square.
 */
export function Plate({
  sling,
  isJoined = false,
  heading: Heading = 'h1',
}: {
  sling: PlateSling;
  isJoined?: boolean;
  heading?: 'h1' | 'h2' | 'p';
}): ReactNode {
  const { formatLength } = useUnits();
  return (
    <section
      aria-label={`Sling ${sling.number}`}
      className={cx(
        'plate-face relative overflow-hidden border border-plate-edge text-plate-ink',
        isJoined ? 'rounded-t-[14px] border-b-0' : 'rounded-[14px]',
      )}
    >
      <PunchedHole />
      <div className="pt-3.5 pr-4 pb-3 pl-16">
        <Heading className="text-[clamp(1.75rem,8vw,2.5rem)] leading-none font-bold tracking-[0.01em] break-words">
          {sling.number}
        </Heading>
        <p className="mt-1.5 leading-snug text-plate-muted">
          {describeSling(sling)}, reach{' '}
          <span className="whitespace-nowrap">{formatLength(sling.reachMm)}</span>
        </p>
        <p className="mt-0.5 text-[0.9375rem] text-plate-muted">
          {sling.maker}
          {sling.makerSerial && (
            <>
              , serial <span className="font-medium break-all text-plate-ink">{sling.makerSerial}</span>
            </>
          )}
        </p>
      </div>
      <RatedLoadRow loads={sling.ratedLoads} />
    </section>
  );
}

/** The rated loads under their hitch drawings; a hitch that isn't rated says so. */
function RatedLoadRow({ loads }: { loads: RatedLoads }): ReactNode {
  const { formatLoad } = useUnits();
  const entries: { hitch: Hitch; word: string; kg: number | undefined }[] = [
    { hitch: 'vertical', word: 'vertical', kg: loads.verticalKg },
    { hitch: 'choker', word: 'choker', kg: loads.chokerKg },
    { hitch: 'basket', word: 'basket', kg: loads.basketKg },
  ];
  if (loads.bridle)
    entries.push({ hitch: 'bridle', word: `bridle, ${loads.bridle.angleDeg}°`, kg: loads.bridle.kg });
  const shown = entries.map((entry) => ({
    ...entry,
    text: entry.kg === undefined ? null : formatLoad(entry.kg),
  }));
  // "12.34 short tons" and the like don't fit three abreast on a phone, and a unit never wraps
  const isLong = shown.some(({ text }) => text !== null && text.length > 10);
  return (
    <dl
      aria-label="Rated loads"
      className={cx(
        'grid gap-px border-t border-plate-edge bg-plate-edge',
        entries.length > 3 || isLong
          ? 'grid-cols-2 sm:grid-cols-[repeat(auto-fit,minmax(8rem,1fr))]'
          : 'grid-cols-3',
        shown.length === 3 && isLong && 'max-sm:*:first:col-span-2',
      )}
    >
      {shown.map((entry) => (
        <RatedLoad key={entry.hitch} hitch={entry.hitch} word={entry.word} text={entry.text} />
      ))}
    </dl>
  );
}

function RatedLoad({ hitch, word, text }: { hitch: Hitch; word: string; text: string | null }): ReactNode {
  const [figure, ...unit] = text?.split(' ') ?? [];
  return (
    <div className="flex min-w-0 flex-col bg-plate px-3 py-2">
      <dt className="flex items-center gap-1.5 text-[0.875rem] leading-tight font-medium text-plate-muted">
        <HitchIcon hitch={hitch} className="size-7 shrink-0 text-plate-ink" />
        {word}
      </dt>
      <dd className="mt-0.5 leading-tight whitespace-nowrap">
        {figure === undefined ? (
          <span className="text-plate-muted">not rated</span>
        ) : (
          <>
            <b className="text-[1.25rem]">{figure}</b>
            <span className="text-[0.9375rem] font-medium text-plate-muted">&nbsp;{unit.join('\u00a0')}</span>
          </>
        )}
      </dd>
    </div>
  );
}

function PunchedHole(): ReactNode {
  return (
    <svg viewBox="0 0 40 40" className="absolute top-3.5 left-3.5 size-9" aria-hidden="true">
      <circle cx="20" cy="20" r="19" fill="var(--plate-bush)" stroke="var(--plate-edge)" />
      <circle cx="20" cy="20" r="13" fill="var(--paper)" stroke="var(--plate-edge)" />
      <path
        d="M7.500 20a12.500 12.500 0 0 1 25 0"
        fill="none"
        stroke="#000"
        strokeOpacity=".28"
        strokeWidth="2"
      />
    </svg>
  );
}
