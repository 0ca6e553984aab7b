import type { ReactNode } from 'react';
import { FITTING_NAMES, isHook, type RatedLoads } from '../../../../../shared/domain/slings/spec';
import { formatLength, formatLoad, LENGTH_UNITS, LOAD_UNITS } from '../../../../../shared/domain/units/units';
import type { Sling } from '../../../../../shared/schemas/slings';
import { FactList, Panel } from '../../../../components/ui/Panel';
import { formatDate } from '../../../../lib/format';
import { useUnits } from '../../../../lib/session';
import { usePlaceNames } from '../../hooks/usePlaceNames';
import { FITTING_POSITION_NAMES, MAKERS_TAG_NAMES, SERVICE_CLASS_NAMES } from '../../form/options';
import { listSpecFacts } from '../../record/specFacts';

/** Rated loads as this person reads them, and as the tag gives them where the unit differs. */
export function LoadsPanel({ sling }: { sling: Sling }): ReactNode {
  const units = useUnits();
  const loads = listLoads(sling.ratedLoads).map(({ path, term, kg }) => {
    const entered = LOAD_UNITS.find((unit) => unit === sling.enteredUnits[path]);
    const asTyped = entered && entered !== units.load ? ` (${formatLoad(kg, entered)} on the tag)` : '';
    return { term, value: units.formatLoad(kg) + asTyped };
  });
  return (
    <Panel title="Rated loads">
      <FactList facts={loads} />
    </Panel>
  );
}

function listLoads(loads: RatedLoads): { path: string; term: string; kg: number }[] {
  const { verticalKg, chokerKg, basketKg, bridle } = loads;
  return [
    { path: 'ratedLoads.verticalKg', term: 'Vertical', kg: verticalKg },
    ...(chokerKg === undefined ? [] : [{ path: 'ratedLoads.chokerKg', term: 'Choker', kg: chokerKg }]),
    ...(basketKg === undefined
      ? []
      : [{ path: 'ratedLoads.basketKg', term: 'Basket, legs vertical', kg: basketKg }]),
    ...(bridle
      ? [{ path: 'ratedLoads.bridle.kg', term: `Bridle, ${bridle.angleDeg}° from horizontal`, kg: bridle.kg }]
      : []),
  ];
}

/** Identity, build and belonging: all that the record knows beside loads and fittings. */
export function FactsPanel({ sling }: { sling: Sling }): ReactNode {
  const places = usePlaceNames();
  const units = useUnits();
  const asRead = (path: string, mm: number): string => {
    const entered = LENGTH_UNITS.find((unit) => unit === sling.enteredUnits[path]);
    return entered ? formatLength(mm, entered) : formatLength(mm, 'mm');
  };
  const facts: { term: string; value: string | undefined }[] = [
    { term: 'Maker', value: sling.maker },
    { term: 'Maker’s serial', value: sling.makerSerial },
    { term: 'Stock number', value: sling.stockNumber },
    { term: 'Lot', value: sling.lot },
    { term: 'Maker’s tag', value: MAKERS_TAG_NAMES[sling.makersTag] },
    { term: 'Legs', value: String(sling.legs) },
    { term: 'Reach', value: units.formatLength(sling.reachMm) },
    ...listSpecFacts(sling, asRead),
    { term: 'Service class', value: SERVICE_CLASS_NAMES[sling.serviceClass] },
    { term: 'Made on', value: sling.madeOn && formatDate(sling.madeOn) },
    { term: 'Received on', value: formatDate(sling.receivedOn) },
    { term: 'First used on', value: sling.firstUseOn && formatDate(sling.firstUseOn) },
    { term: 'Discard date', value: sling.discardOn ? formatDate(sling.discardOn) : undefined },
    { term: 'Owner', value: sling.owner.kind === 'own' ? 'Own' : `Hired from ${sling.owner.name ?? ''}` },
    { term: 'Off hire on', value: sling.owner.offHireOn && formatDate(sling.owner.offHireOn) },
    { term: 'Site', value: places.site(sling.siteId) },
  ];
  return (
    <Panel title="Record">
      <FactList facts={facts.flatMap(({ term, value }) => (value ? [{ term, value }] : []))} />
    </Panel>
  );
}

/** End fittings with the nominal figures that inspections compare with. */
export function FittingsPanel({ sling }: { sling: Sling }): ReactNode {
  if (sling.fittings.length === 0) return null;
  const asRead = (index: number, name: string, mm: number): string => {
    const entered = LENGTH_UNITS.find((unit) => unit === sling.enteredUnits[`fittings.${index}.${name}`]);
    return formatLength(mm, entered ?? 'mm');
  };
  return (
    <Panel title="End fittings">
      <ul>
        {sling.fittings.map((fitting, i) => (
          <li key={fitting.id} className="border-b border-rule py-2">
            <span className="font-medium">{FITTING_NAMES[fitting.type]}</span>
            <span className="text-muted">, {FITTING_POSITION_NAMES[fitting.position].toLowerCase()}</span>
            <span className="block text-[0.9375rem] text-muted">
              {[
                fitting.sizeMm !== undefined && `size ${asRead(i, 'sizeMm', fitting.sizeMm)}`,
                fitting.throatMm !== undefined && `throat ${asRead(i, 'throatMm', fitting.throatMm)}`,
                isHook(fitting) && (fitting.hasLatch ? 'with latch' : 'without latch'),
                fitting.detachable ? 'can be taken off' : 'fixed',
              ]
                .filter(Boolean)
                .join(', ')}
            </span>
          </li>
        ))}
      </ul>
    </Panel>
  );
}
