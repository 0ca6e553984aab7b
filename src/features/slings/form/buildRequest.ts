import type { SlingKind } from '../../../../shared/domain/slings/kinds';
import { isHook } from '../../../../shared/domain/slings/spec';
import { fittingInputSchema } from '../../../../shared/schemas/slings';
import type { EnteredUnits } from '../../../../shared/schemas/spec';
import { listUnits, readLoads, readMeasure, readNumber, readText } from './measures';
import type { CertificateValues, FittingValues, Measure, SlingFormValues, SpecValues } from './values';

/** The form as a request body, unchecked: `createSlingRequest` says what is wrong with it. */
export function buildRequest(values: SlingFormValues): Record<string, unknown> {
  const legs = Number(values.legs);
  return {
    number: values.number,
    kind: values.kind || undefined,
    maker: values.maker,
    makerSerial: readText(values.makerSerial),
    stockNumber: readText(values.stockNumber),
    lot: readText(values.lot),
    makersTag: values.makersTag,
    madeOn: readText(values.madeOn),
    receivedOn: values.receivedOn,
    firstUseOn: readText(values.firstUseOn),
    siteId: readNumber(values.siteId),
    homeLocationId: readNumber(values.homeLocationId),
    serviceClass: values.serviceClass,
    owner: buildOwner(values.owner),
    legs,
    reachMm: readMeasure(values.reachMm),
    spec: values.kind ? SPEC_BUILDERS[values.kind](values.specs) : undefined,
    ratedLoads: readLoads(values.ratedLoads, legs),
    fittings: values.fittings.map(buildFitting),
    ...(values.hasCertificate ? { proofCertificate: buildCertificate(values.proofCertificate) } : {}),
    ...(values.makerLimits.length > 0
      ? { makerLimits: values.makerLimits.map((entry) => ({ ...entry, limit: readNumber(entry.limit) })) }
      : {}),
    discardOn: readText(values.discardOn),
    cost: readNumber(values.cost),
    notes: readText(values.notes),
    ...(values.photoIds.length > 0 ? { photoIds: values.photoIds } : {}),
    enteredUnits: listEnteredUnits(values),
  };
}

const SPEC_BUILDERS: { [K in SlingKind]: (specs: SpecValues) => Record<string, unknown> } = {
  'alloy-chain': ({ 'alloy-chain': spec }) => ({
    grade: readNumber(spec.grade),
    chainMm: readMeasure(spec.chainMm),
    ...(spec.endless ? { endless: true } : {}),
  }),
  'wire-rope': ({ 'wire-rope': spec }) => ({
    construction: readText(spec.construction),
    className: spec.className,
    diameterMm: readMeasure(spec.diameterMm),
    core: readText(spec.core),
    ropeGrade: readText(spec.ropeGrade),
    splice: readText(spec.splice),
    ferrule: readText(spec.ferrule),
  }),
  'metal-mesh': ({ 'metal-mesh': spec }) => ({
    duty: readText(spec.duty),
    widthMm: readMeasure(spec.widthMm),
    wireMm: readMeasure(spec.wireMm),
    ...(spec.coated ? { coated: true } : {}),
  }),
  'synthetic-web': ({ 'synthetic-web': spec }) => ({
    fibre: readText(spec.fibre),
    widthMm: readMeasure(spec.widthMm),
    plies: readNumber(spec.plies),
    type: readText(spec.type),
  }),
  'synthetic-round': ({ 'synthetic-round': spec }) => ({
    fibre: readText(spec.fibre),
    size: readText(spec.size),
  }),
  'synthetic-rope': ({ 'synthetic-rope': spec }) => ({
    fibre: readText(spec.fibre),
    diameterMm: readMeasure(spec.diameterMm),
  }),
};

function buildOwner({ kind, name, offHireOn }: SlingFormValues['owner']): Record<string, unknown> {
  return kind === 'own' ? { kind } : { kind, name: readText(name), offHireOn: readText(offHireOn) };
}

/** Throat and latch belong to hooks alone; what was typed before the type was changed stays in the form. */
function buildFitting(fitting: FittingValues): Record<string, unknown> {
  const type = fittingInputSchema.shape.type.safeParse(fitting.type);
  const isHookType = type.success && isHook({ type: type.data });
  return {
    position: fitting.position,
    type: fitting.type,
    sizeMm: readMeasure(fitting.sizeMm),
    ...(isHookType ? { throatMm: readMeasure(fitting.throatMm), hasLatch: fitting.hasLatch } : {}),
    detachable: fitting.detachable,
  };
}

export function buildCertificate(certificate: CertificateValues): Record<string, unknown> {
  return {
    basis: certificate.basis,
    loadKg: readMeasure(certificate.loadKg),
    testedOn: certificate.testedOn,
    number: certificate.number,
    ...(certificate.fileId ? { fileId: certificate.fileId } : {}),
  };
}

function listEnteredUnits(values: SlingFormValues): EnteredUnits {
  const { ratedLoads: loads } = values;
  const spec = values.kind ? Object.entries(values.specs[values.kind]) : [];
  return listUnits([
    ['reachMm', values.reachMm],
    ['ratedLoads.verticalKg', loads.verticalKg],
    ['ratedLoads.chokerKg', loads.chokerKg],
    ['ratedLoads.basketKg', loads.basketKg],
    ...(Number(values.legs) > 1 ? ([['ratedLoads.bridle.kg', loads.bridle.kg]] as const) : []),
    ...spec.flatMap(([name, value]) => (isMeasure(value) ? [[`spec.${name}`, value] as const] : [])),
    ...values.fittings.flatMap((fitting, i) => [
      [`fittings.${i}.sizeMm`, fitting.sizeMm] as const,
      [`fittings.${i}.throatMm`, fitting.throatMm] as const,
    ]),
    ...(values.hasCertificate
      ? ([['proofCertificate.loadKg', values.proofCertificate.loadKg]] as const)
      : []),
  ]);
}

function isMeasure(value: unknown): value is Measure {
  return typeof value === 'object' && value !== null && 'figure' in value && 'unit' in value;
}
