import {
  createSlingRequest,
  type CreateSlingInput,
  type CreateSlingRequest,
} from '../../../shared/schemas/slings';
import type { EnteredUnits } from '../../../shared/schemas/spec';
import { toKg } from '../../../shared/domain/units/units';
import type { DemoClock } from '../clock';
import type { SlingModel } from '../models';
import type { DemoSling } from '../plan/fleet';
import type { SitePlaces } from './world';

/** Proof load of an assembly: twice the rated load (trade-facts 1.7, 2.6). */
const PROOF_FACTOR = 2;
const MADE_DAYS_BEFORE = 75;
/** The maker's own limit for webs and roundslings (invented). */
const TEXTILE_LIFE_YEARS = 8;

/** To five decimals, as the database keeps loads. */
const inKg = (load: number, unit: SlingModel['unit']): number => Number(toKg(load, unit).toFixed(5));

/** The sling as the storekeeper typed it in on the day it came. */
export function buildSlingRequest(
  sling: DemoSling,
  clock: DemoClock,
  places: SitePlaces,
): CreateSlingRequest {
  const { model, receivedAgo, hire, serviceClass } = sling.lot;
  const { fittings, loads, unit } = model;
  const index = Number(sling.number.slice(-4));
  const madeOn = clock.dayOf(receivedAgo + MADE_DAYS_BEFORE);
  const input = {
    number: sling.number,
    kind: model.kind,
    spec: model.spec,
    maker: model.maker,
    ...identify(model, index, madeOn),
    lot: `${madeOn.slice(2, 4)}${madeOn.slice(5, 7)}-${model.id.toUpperCase()}`,
    madeOn,
    receivedOn: clock.dayOf(receivedAgo),
    ...(hire
      ? { owner: { kind: 'hired', name: hire.owner, offHireOn: clock.dayOf(hire.offHireAgo) } }
      : { owner: { kind: 'own' } }),
    siteId: places.id,
    homeLocationId: places.racks[index % places.racks.length],
    serviceClass,
    legs: model.legs,
    reachMm: model.reachesMm[receivedAgo % model.reachesMm.length],
    ratedLoads: {
      verticalKg: inKg(loads.vertical, unit),
      ...(loads.choker === undefined ? {} : { chokerKg: inKg(loads.choker, unit) }),
      ...(loads.basket === undefined ? {} : { basketKg: inKg(loads.basket, unit) }),
      ...(loads.bridle
        ? { bridle: { kg: inKg(loads.bridle.load, unit), angleDeg: loads.bridle.angleDeg } }
        : {}),
    },
    fittings: [...fittings],
    makersTag: 'legible',
    ...(isWebOrRound(model)
      ? { discardOn: clock.dayOf(receivedAgo + MADE_DAYS_BEFORE - TEXTILE_LIFE_YEARS * 365) }
      : {}),
    ...certify(model, index, madeOn),
    enteredUnits: listUnits(model),
  } as CreateSlingInput;
  return createSlingRequest.parse(input);
}

const isWebOrRound = ({ kind }: SlingModel): boolean =>
  kind === 'synthetic-web' || kind === 'synthetic-round';

function identify(model: SlingModel, index: number, madeOn: string): Partial<CreateSlingInput> {
  if (model.serialPrefix === null) return { stockNumber: model.id.toUpperCase() };
  return { makerSerial: `${model.serialPrefix}${madeOn.slice(2, 4)}-${String(31_000 + index * 7)}` };
}

function certify(model: SlingModel, index: number, madeOn: string): Partial<CreateSlingInput> {
  if (model.certificate === null) return {};
  return {
    proofCertificate: {
      basis: model.certificate,
      testedOn: madeOn,
      number: `${model.maker.slice(0, 1)}C-${madeOn.slice(0, 4)}-${String(index).padStart(4, '0')}`,
      ...(model.certificate === 'assembly'
        ? { loadKg: inKg(PROOF_FACTOR * model.loads.vertical, model.unit) }
        : {}),
    },
  };
}

function listUnits({ loads, unit, kind }: SlingModel): EnteredUnits {
  return {
    'ratedLoads.verticalKg': unit,
    ...(loads.choker === undefined ? {} : { 'ratedLoads.chokerKg': unit }),
    ...(loads.basket === undefined ? {} : { 'ratedLoads.basketKg': unit }),
    ...(loads.bridle ? { 'ratedLoads.bridle.kg': unit } : {}),
    reachMm: 'm',
    ...(kind === 'metal-mesh' ? { 'spec.widthMm': 'in' } : {}),
  };
}
