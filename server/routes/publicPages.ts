import {
  damageReportRequest,
  damageReportResponse,
  publicTagResponse,
} from '../../shared/schemas/publicPage';
import { parseTagCode } from '../../shared/domain/tags/tagCode';
import { getTagCode } from '../commands/handleTags';
import { reportDamage } from '../commands/reportDamage';
import { NotFoundError } from '../errors';
import { Tag } from '../models/Tag';
import { answerPublicTag, UNKNOWN_LABEL, WRONG_CODE } from '../queries/publicTag';
import { raw, write } from '../routing/define';
import { codeParams } from './params';

export const publicRoutes = [
  raw({
    route: 'GET /api/public/tags/:code',
    summary: 'USE or DO NOT USE, for anybody who scans a label',
    params: codeParams,
    response: publicTagResponse,
    limit: 'publicRead',
    async handle(services, { params, response }) {
      const parsed = parseTagCode(params.code);
      if (!parsed.ok) {
        response.json(WRONG_CODE);
        return;
      }
      const tag = await Tag.findByPk(parsed.code);
      response
        .set('Cache-Control', 'no-store')
        .json(tag ? await answerPublicTag(services, tag) : UNKNOWN_LABEL);
    },
  }),
  write({
    route: 'POST /api/public/tags/:code/reports',
    summary: 'Report damage without an account; holds the sling at once',
    params: codeParams,
    body: damageReportRequest,
    response: damageReportResponse,
    limit: 'publicWrite',
    async load(_context, params) {
      const code = getTagCode(params.code);
      if (!(await Tag.findByPk(code, { attributes: ['code'] }))) throw new NotFoundError('label');
      return code;
    },
    async handle(context, { body, loaded }) {
      const { isHeld } = await reportDamage(context, loaded, body);
      const message = isHeld
        ? 'This sling is now held. Do not use it; give it to the store.'
        : 'Your report is kept. This label is not in use: do not use the sling, and give it to the store.';
      return { status: 201, body: { received: true, message } };
    },
  }),
];
