import { toNestErrors } from '@hookform/resolvers';
import type { Resolver } from 'react-hook-form';
import {
  fromKg,
  fromMm,
  LENGTH_UNITS,
  LOAD_UNITS,
  type UnitChoice,
} from '../../../../shared/domain/units/units';
import { correctionRequest } from '../../../../shared/schemas/corrections';
import type { Sling } from '../../../../shared/schemas/slings';
import { toFlatErrors } from './faults';
import { readLoads, readMeasure, readNumber } from './measures';
import type { LengthMeasure, LoadMeasure, LoadsValues } from './values';

/** The correction form: identity and rating as they stand, to be overtyped where they are wrong. */
export interface CorrectionValues {
  number: string;
  maker: string;
  makerSerial: string;
  makersTag: string;
  serviceClass: string;
  siteId: string;
  reachMm: LengthMeasure;
  ratedLoads: LoadsValues;
  reason: string;
  photoIds: string[];
  paperId: string | null;
}

/** Enough for what was typed in any unit, without the binary noise of the way back. */
const DECIMALS = 6;
const toFigure = (value: number): string => String(Number(value.toFixed(DECIMALS)));

/** The record as a form, each figure in the unit that it was entered in. */
export function toCorrectionValues(sling: Sling, units: UnitChoice): CorrectionValues {
  const load = (path: string, kg: number | undefined): LoadMeasure => {
    const unit = LOAD_UNITS.find((name) => name === sling.enteredUnits[path]) ?? units.load;
    return { figure: kg === undefined ? '' : toFigure(fromKg(kg, unit)), unit };
  };
  const lengthUnit = LENGTH_UNITS.find((name) => name === sling.enteredUnits.reachMm) ?? units.length;
  const { verticalKg, chokerKg, basketKg, bridle } = sling.ratedLoads;
  return {
    number: sling.number,
    maker: sling.maker,
    makerSerial: sling.makerSerial ?? '',
    makersTag: sling.makersTag,
    serviceClass: sling.serviceClass,
    siteId: String(sling.siteId),
    reachMm: { figure: toFigure(fromMm(sling.reachMm, lengthUnit)), unit: lengthUnit },
    ratedLoads: {
      verticalKg: load('ratedLoads.verticalKg', verticalKg),
      chokerKg: load('ratedLoads.chokerKg', chokerKg),
      basketKg: load('ratedLoads.basketKg', basketKg),
      bridle: {
        kg: load('ratedLoads.bridle.kg', bridle?.kg),
        angleDeg: String(bridle?.angleDeg ?? 60),
      },
    },
    reason: '',
    photoIds: [],
    paperId: null,
  };
}

/** A request with what differs from the record alone; unchecked. */
export function buildCorrection(values: CorrectionValues, before: CorrectionValues, legs: number): unknown {
  const isChanged = (name: keyof CorrectionValues): boolean =>
    JSON.stringify(values[name]) !== JSON.stringify(before[name]);
  return {
    changes: {
      ...(isChanged('number') ? { number: values.number } : {}),
      ...(isChanged('maker') ? { maker: values.maker } : {}),
      ...(isChanged('makerSerial') ? { makerSerial: values.makerSerial } : {}),
      ...(isChanged('makersTag') ? { makersTag: values.makersTag } : {}),
      ...(isChanged('serviceClass') ? { serviceClass: values.serviceClass } : {}),
      ...(isChanged('siteId') ? { siteId: readNumber(values.siteId) } : {}),
      ...(isChanged('reachMm') ? { reachMm: readMeasure(values.reachMm) } : {}),
      ...(isChanged('ratedLoads') ? { ratedLoads: readLoads(values.ratedLoads, legs) } : {}),
    },
    reason: values.reason,
    evidenceFileIds: [...values.photoIds, ...(values.paperId ? [values.paperId] : [])],
  };
}

export function makeCorrectionResolver(before: CorrectionValues, legs: number): Resolver<CorrectionValues> {
  return (values, _context, options) => {
    const parsed = correctionRequest.safeParse(buildCorrection(values, before, legs), { reportInput: true });
    if (parsed.success) return { values, errors: {} };
    const flat = Object.fromEntries(
      Object.entries(toFlatErrors(parsed.error.issues)).map(([path, error]) => [
        toCorrectionPath(path),
        error,
      ]),
    );
    return { values: {}, errors: toNestErrors(flat, options) };
  };
}

/** `changes.number` stands in the form as `number`, evidence as photos; "nothing is changed" belongs to the first field. */
export function toCorrectionPath(path: string): string {
  if (path === 'changes') return 'number';
  if (path.startsWith('evidenceFileIds')) return 'photoIds';
  return path.replace(/^changes\./, '');
}
