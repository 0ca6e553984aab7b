import { criteriaFor, criteriaOfKind } from '../../shared/domain/inspection/rows';
import { defaultRuleSets, type RuleSetId } from '../../shared/domain/inspection/ruleSets';
import { computeVerdict } from '../../shared/domain/inspection/verdict';
import { pageOf, pageQuery } from '../../shared/schemas/common';
import {
  createInspectionRequest,
  createInspectionResponse,
  criteriaParams,
  criteriaQuery,
  criteriaResponse,
  inspectionSchema,
  verdictRequest,
  verdictResponse,
} from '../../shared/schemas/inspection';
import { idParam } from '../../shared/schemas/common';
import { inspectSling } from '../commands/inspectSling';
import { getSlingId } from '../commands/lockSling';
import { asActor } from '../context';
import { InvalidError, invalidField } from '../errors';
import { Site } from '../models/Site';
import { listInspections, presentInspection } from '../queries/inspections';
import { getSling } from '../queries/slingDetail';
import { read, write } from '../routing/define';
import { idParams } from './params';

const inspectionsQuery = pageQuery.extend({ cursor: idParam.optional() });

export const inspectionRoutes = [
  read({
    route: 'GET /api/criteria/:kind',
    summary: 'What is looked at on this kind, or on one sling',
    params: criteriaParams,
    query: criteriaQuery,
    response: criteriaResponse,
    async handle(context, { params, query }) {
      if (query.slingId === undefined) return { body: { items: criteriaOfKind(params.kind) } };
      const sling = await getSling(context, query.slingId);
      if (sling.kind !== params.kind)
        throw invalidField('slingId', `The sling is of another kind: ${sling.kind}.`);
      return { body: { items: criteriaFor(sling) } };
    },
  }),
  write({
    route: 'POST /api/verdicts',
    summary: 'What these answers would come to; keeps nothing',
    body: verdictRequest,
    response: verdictResponse,
    async handle(context, { body }) {
      const { user } = asActor(context);
      const { kind, spec, fittings, legs, answers } = body;
      const ruleSets: readonly RuleSetId[] = body.ruleSets ?? (await findSiteRuleSets(user.siteIds));
      const result = computeVerdict({
        sling: { kind, spec, fittings, ...(legs === undefined ? {} : { legs }) } as Parameters<
          typeof computeVerdict
        >[0]['sling'],
        answers,
        ruleSets,
        complete: false,
        restClean: true,
      });
      if (result.errors.length > 0) throw new InvalidError(result.errors);
      return { body: { verdict: result.verdict, findings: result.findings, ruleSets: result.ruleSets } };
    },
  }),
  read({
    route: 'GET /api/slings/:id/inspections',
    summary: 'The inspections of a sling, newest first',
    params: idParams,
    query: inspectionsQuery,
    response: pageOf(inspectionSchema),
    async handle(context, { params, query }) {
      const id = await getSlingId(context, params.id);
      return { body: await listInspections(id, query.cursor, query.limit) };
    },
  }),
  write({
    route: 'POST /api/slings/:id/inspections',
    summary: 'Keep an inspection; a reject or refer holds the sling at once',
    params: idParams,
    body: createInspectionRequest,
    response: createInspectionResponse,
    load: (context, params) => getSlingId(context, params.id),
    async handle(context, { body, loaded, ifMatch }) {
      const actor = asActor(context);
      const inspection = await inspectSling(actor, loaded, body, ifMatch);
      const sling = await getSling(actor, loaded, actor.transaction);
      return {
        status: 201,
        body: { inspection: presentInspection(inspection), sling },
        version: sling.version,
      };
    },
  }),
];

/** The sets of the person's first site; somebody without a site gets the US ones. */
async function findSiteRuleSets(siteIds: readonly number[]): Promise<readonly RuleSetId[]> {
  const site = siteIds[0] === undefined ? null : await Site.findByPk(siteIds[0]);
  return site?.ruleSets ?? defaultRuleSets('us');
}
