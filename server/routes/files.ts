import { randomUUID } from 'node:crypto';
import type { Request, Response } from 'express';
import multer from 'multer';
import sharp from 'sharp';
import { z } from 'zod';
import { LIMITS } from '../../shared/limits';
import { fileIdSchema } from '../../shared/schemas/common';
import { storedFileSchema, type StoredFile } from '../../shared/schemas/files';
import type { Services } from '../context';
import { AppError, NotFoundError } from '../errors';
import { acceptUpload } from '../files/acceptUpload';
import { findUser } from '../middleware/authenticate';
import { FileRecord } from '../models/FileRecord';
import { Tag } from '../models/Tag';
import { getTagCode } from '../commands/handleTags';
import { raw, readRepeatKey, sendAnswer } from '../routing/define';
import type { Answer } from '../routing/route';
import { transact } from '../routing/transact';
import { codeParams } from './params';

const receive = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: LIMITS.fileBytes, files: 1, fields: 4, parts: 6 },
}).single('file');

async function readUpload(request: Request, response: Response): Promise<Express.Multer.File> {
  if (!request.is('multipart/form-data')) {
    throw new AppError('unsupported-type', 'Send the file as multipart/form-data, in the field "file".');
  }
  await new Promise<void>((resolve, reject) => {
    receive(request, response, (error: unknown) => {
      if (error instanceof multer.MulterError) reject(error);
      else if (error) reject(new AppError('malformed', 'The upload broke off or is not well-formed.'));
      else resolve();
    });
  });
  if (!request.file || request.file.size === 0) {
    throw new AppError('malformed', 'Send one file, in the multipart field "file".');
  }
  return request.file;
}

async function keepUpload(
  services: Services,
  request: Request,
  file: Express.Multer.File,
  publicCode: string | null,
): Promise<Answer> {
  const { bytes, contentType, sha256, originalSha256 } = await acceptUpload(file.buffer);
  await services.files.put(sha256, bytes);
  const user = findUser(request);
  return transact(
    { ...services, user },
    readRepeatKey(request, originalSha256),
    async ({ at, transaction }) => {
      const record = await FileRecord.create(
        {
          id: randomUUID(),
          sha256,
          originalSha256,
          contentType,
          size: bytes.length,
          // The field arrives as bytes that were read as Latin-1.
          originalName: Buffer.from(file.originalname, 'latin1').toString('utf8').slice(0, 255),
          createdBy: user?.id ?? null,
          publicCode,
          createdAt: at,
        },
        { transaction },
      );
      const body: StoredFile = { id: record.id, sha256, originalSha256, contentType, size: bytes.length };
      return { status: 201, body };
    },
  );
}

const fileParams = z.object({ id: fileIdSchema });
const fileQuery = z.strictObject({ w: z.enum(['160', '320', '640', '1280']).optional() });

const uploadForm = {
  body: z.object({ file: z.string().meta({ format: 'binary', description: 'JPEG, PNG, WebP or PDF' }) }),
  consumes: 'multipart/form-data',
};

export const fileRoutes = [
  raw({
    route: 'POST /api/files',
    summary: 'Upload a photo or a PDF (multipart field "file", up to 10 MB)',
    ...uploadForm,
    response: storedFileSchema,
    limit: 'upload',
    async handle(services, { request, response }) {
      const file = await readUpload(request, response);
      sendAnswer(response, await keepUpload(services, request, file, null));
    },
  }),
  raw({
    route: 'GET /api/files/:id',
    summary: 'A kept file; ?w= gives a smaller picture',
    params: fileParams,
    query: fileQuery,
    produces: '*/*',
    async handle(services, { params, query, response }) {
      const record = await FileRecord.findByPk(params.id);
      if (!record) throw new NotFoundError('file');
      const bytes = await services.files.read(record.sha256);
      const isPicture = record.contentType === 'image/jpeg';
      response
        .type(record.contentType)
        .set('Cache-Control', 'private, max-age=86400, immutable')
        // Whatever got past the checks can run nothing here.
        .set('Content-Security-Policy', "default-src 'none'; sandbox")
        .set('Content-Disposition', isPicture ? 'inline' : `attachment; filename="file-${record.id}.pdf"`)
        .send(
          isPicture && query.w
            ? await sharp(bytes)
                .resize({ width: Number(query.w) })
                .jpeg()
                .toBuffer()
            : bytes,
        );
    },
  }),
  raw({
    route: 'POST /api/public/tags/:code/files',
    summary: 'A photo for a damage report, without sign-in',
    params: codeParams,
    ...uploadForm,
    response: storedFileSchema,
    limit: 'publicWrite',
    async handle(services, { params, request, response }) {
      const code = getTagCode(params.code);
      if (!(await Tag.findByPk(code, { attributes: ['code'] }))) throw new NotFoundError('label');
      const file = await readUpload(request, response);
      sendAnswer(response, await keepUpload(services, request, file, code));
    },
  }),
];
