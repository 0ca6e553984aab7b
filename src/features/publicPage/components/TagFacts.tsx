import type { ReactNode } from 'react';
import { KIND_FACTS } from '../../../../shared/domain/slings/kinds';
import { formatLoad } from '../../../../shared/domain/units/units';
import type { PublicTag } from '../../../../shared/schemas/publicPage';
import { HitchIcon, type Hitch } from '../../../components/sling/hitches';
import { formatDateWithDistance } from '../../../lib/format';

/** Kind, rated loads and next due date, where the label tells them. Loads in both units: nobody knows who reads it. */
export function TagFacts({ tag }: { tag: PublicTag }): ReactNode {
  const { kind, ratedLoads, nextDueOn } = tag;
  if (!kind && !ratedLoads && !nextDueOn) return null;
  const loads: { hitch: Hitch; word: string; kg: number | undefined }[] = ratedLoads
    ? [
        { hitch: 'vertical', word: 'Vertical', kg: ratedLoads.verticalKg },
        { hitch: 'choker', word: 'Choker', kg: ratedLoads.chokerKg },
        { hitch: 'basket', word: 'Basket', kg: ratedLoads.basketKg },
        {
          hitch: 'bridle',
          word: `Bridle, ${ratedLoads.bridle?.angleDeg ?? 60}° from horizontal`,
          kg: ratedLoads.bridle?.kg,
        },
      ]
    : [];
  return (
    <section
      aria-label="The sling"
      className="plate-face rounded-[14px] border border-plate-edge p-4 text-plate-ink"
    >
      {kind && <p className="text-xl font-bold">{KIND_FACTS[kind].name}</p>}
      {nextDueOn && (
        <p className="text-plate-muted">Next inspection due {formatDateWithDistance(nextDueOn)}</p>
      )}
      {ratedLoads && (
        <dl aria-label="Rated loads" className="mt-3 divide-y divide-plate-edge border-t border-plate-edge">
          {loads.map(
            ({ hitch, word, kg }) =>
              kg !== undefined && (
                <div key={hitch} className="flex items-center gap-3 py-2">
                  <dt className="flex flex-1 items-center gap-3 font-medium">
                    <HitchIcon hitch={hitch} className="size-9 shrink-0" />
                    {word}
                  </dt>
                  <dd className="text-right leading-tight">
                    <b className="text-xl">{formatLoad(kg, 'kg')}</b>
                    <span className="block text-plate-muted">{formatLoad(kg, 'lb')}</span>
                  </dd>
                </div>
              ),
          )}
        </dl>
      )}
    </section>
  );
}
