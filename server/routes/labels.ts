import { findStock, LABEL_STOCKS, labelsPerPage, renderLabels, renderTestPage } from '../../labels';
import { z } from 'zod';
import { listOf } from '../../shared/schemas/common';
import {
  confirmTagRequest,
  createLabelRunRequest,
  labelRunSchema,
  labelStockSchema,
  scanResponse,
  taggedSlingResponse,
  voidTagRequest,
} from '../../shared/schemas/labels';
import { confirmTag, getTagCode, voidLabel } from '../commands/handleTags';
import { drawTags, printLabels, type DrawnTag } from '../commands/printLabels';
import { asActor, type ActorContext } from '../context';
import { AppError, NotFoundError } from '../errors';
import { asSignedIn } from '../middleware/authenticate';
import { Tag } from '../models/Tag';
import { getLabelRun, loadLabelData, presentLabelRun } from '../queries/labelRuns';
import { getSling } from '../queries/slingDetail';
import { raw, read, write } from '../routing/define';
import type { Answer } from '../routing/route';
import { codeParams, idParams } from './params';

const stockParams = z.object({ id: z.string().max(60) });

async function answerTagged(actor: ActorContext, slingId: number, code: string): Promise<Answer> {
  const sling = await getSling(actor, slingId, actor.transaction);
  const tag = await Tag.findByPk(code, { transaction: actor.transaction });
  return { body: { tag: { code, status: tag?.status ?? 'void' }, sling }, version: sling.version };
}

export const labelRoutes = [
  read({
    route: 'GET /api/label-stocks',
    summary: 'The stocks of labels that can be printed on',
    response: listOf(labelStockSchema),
    handle: () =>
      Promise.resolve({
        body: {
          items: LABEL_STOCKS.map((stock) => ({
            id: stock.id,
            name: stock.name,
            kind: stock.kind,
            widthMm: stock.widthMm,
            heightMm: stock.heightMm,
            dpi: stock.dpi,
            qrMm: stock.qrMm,
            perSheet: labelsPerPage(stock),
          })),
        },
      }),
  }),
  raw({
    route: 'GET /api/label-stocks/:id/test-page',
    summary: 'A page that shows the smallest code a printer can do',
    params: stockParams,
    produces: 'application/pdf',
    async handle(_services, { params, response }) {
      const stock = findStock(params.id);
      if (!stock) throw new NotFoundError('stock of labels');
      const pdf = await renderTestPage(stock);
      response
        .type('application/pdf')
        .set('Content-Disposition', 'inline; filename="printer-test.pdf"')
        .send(pdf);
    },
  }),
  write<unknown, z.infer<typeof createLabelRunRequest>, undefined, DrawnTag[]>({
    route: 'POST /api/label-runs',
    summary: 'Issue a label for each sling',
    body: createLabelRunRequest,
    response: labelRunSchema,
    prepare: (context, { body }) => drawTags(context, body.slingIds.length),
    async handle(context, { body, prepared }) {
      const run = await printLabels(asActor(context), body, prepared);
      return { status: 201, body: await presentLabelRun(run, context.transaction) };
    },
  }),
  read({
    route: 'GET /api/label-runs/:id',
    summary: 'A run of labels with the status of each',
    params: idParams,
    response: labelRunSchema,
    async handle({ user }, { params }) {
      return { body: await presentLabelRun(await getLabelRun(user, params.id)) };
    },
  }),
  raw({
    route: 'GET /api/label-runs/:id/pdf',
    summary: 'The labels of a run to print; void ones are left out',
    params: idParams,
    produces: 'application/pdf',
    async handle(_services, { params, request, response }) {
      const run = await getLabelRun(asSignedIn(request), params.id);
      const stock = findStock(run.stock);
      if (!stock) throw new NotFoundError('stock of labels');
      const labels = await loadLabelData(run);
      if (labels.length === 0) throw new AppError('conflict', 'Every label of this run is void.');
      const pdf = await renderLabels(labels, stock, { startAt: run.startAt });
      response
        .type('application/pdf')
        .set('Content-Disposition', `inline; filename="labels-${run.id}.pdf"`)
        .send(pdf);
    },
  }),
  read({
    route: 'GET /api/tags/:code',
    summary: 'What a scanned or typed code stands for',
    params: codeParams,
    response: scanResponse,
    async handle(context, { params }) {
      const code = getTagCode(params.code);
      const tag = await Tag.findByPk(code, { attributes: ['code', 'status', 'slingId'] });
      if (!tag) throw new NotFoundError('label');
      const sling = await getSling(context, tag.slingId);
      return { body: { tag: { code, status: tag.status }, sling }, version: sling.version };
    },
  }),
  write({
    route: 'POST /api/tags/:code/confirm',
    summary: 'Confirm a printed label that was scanned on the sling',
    params: codeParams,
    body: confirmTagRequest,
    response: taggedSlingResponse,
    load: (_context, params) => getKnownCode(params.code),
    async handle(context, { body, loaded }) {
      const actor = asActor(context);
      return answerTagged(actor, await confirmTag(actor, loaded, body), loaded);
    },
  }),
  write({
    route: 'POST /api/tags/:code/void',
    summary: 'Void a label',
    params: codeParams,
    body: voidTagRequest,
    response: taggedSlingResponse,
    load: (_context, params) => getKnownCode(params.code),
    async handle(context, { body, loaded }) {
      const actor = asActor(context);
      return answerTagged(actor, await voidLabel(actor, loaded, body.reason, body.note), loaded);
    },
  }),
];

async function getKnownCode(text: string) {
  const code = getTagCode(text);
  if (!(await Tag.findByPk(code, { attributes: ['code'] }))) throw new NotFoundError('label');
  return code;
}
