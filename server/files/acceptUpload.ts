import { fileTypeFromBuffer } from 'file-type';
import sharp from 'sharp';
import type { StoredFile } from '../../shared/schemas/files';
import { LIMITS } from '../../shared/limits';
import { AppError } from '../errors';
import { sha256 } from '../security/sha256';
import { checkPdf } from './checkPdf';

export interface AcceptedUpload {
  bytes: Buffer;
  contentType: StoredFile['contentType'];
  sha256: string;
  originalSha256: string;
}

const IMAGE_TYPES = ['image/jpeg', 'image/png', 'image/webp'];

/**
 * Looks at what the bytes are, whatever they are called, and keeps only what is safe to show: pictures are
 * decoded and encoded anew (no metadata, nothing hidden), PDFs must be whole and passive.
 * @throws AppError 415 for another type, 413 for a picture of too many pixels, 422 for a broken file
 */
export async function acceptUpload(original: Buffer): Promise<AcceptedUpload> {
  const type = await fileTypeFromBuffer(original);
  const originalSha256 = sha256(original);
  if (type && IMAGE_TYPES.includes(type.mime)) {
    const bytes = await encodeAnew(original);
    return { bytes, contentType: 'image/jpeg', sha256: sha256(bytes), originalSha256 };
  }
  if (type?.mime === 'application/pdf') {
    checkPdf(original);
    return { bytes: original, contentType: 'application/pdf', sha256: originalSha256, originalSha256 };
  }
  throw new AppError('unsupported-type', 'Only JPEG, PNG and WebP pictures and PDF files are taken.');
}

async function encodeAnew(original: Buffer): Promise<Buffer> {
  try {
    const picture = sharp(original, { limitInputPixels: LIMITS.imagePixels, failOn: 'error', pages: 1 });
    return await picture
      .rotate()
      .resize({
        width: LIMITS.imageEdgePx,
        height: LIMITS.imageEdgePx,
        fit: 'inside',
        withoutEnlargement: true,
      })
      .flatten({ background: '#ffffff' })
      .jpeg({ quality: 82, mozjpeg: true })
      .toBuffer();
  } catch (error) {
    if (error instanceof Error && /pixel limit/i.test(error.message)) {
      throw new AppError('too-large', 'The picture has too many pixels.');
    }
    throw new AppError('invalid', 'The picture is broken and cannot be read. Please take it again.');
  }
}
