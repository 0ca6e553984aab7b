import sharp from 'sharp';
import { acceptUpload } from '../../files/acceptUpload';
import { FileRecord } from '../../models/FileRecord';
import type { World } from '../acts/world';
import { listPictures, type PictureName } from './pictures';

/** A version 4 UUID from the story's own bytes, so that it is the same each time. */
function drawFileId(bytes: Uint8Array): string {
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}

type FileWorld = Pick<World, 'files' | 'transaction' | 'random'>;

/** Keeps a file the way an upload is kept. @returns its id */
export async function keepFile(
  { files, transaction, random }: FileWorld,
  file: { original: Buffer; name: string; createdBy: number; at: Date },
): Promise<string> {
  const { bytes, contentType, sha256, originalSha256 } = await acceptUpload(file.original);
  await files.put(sha256, bytes);
  const record = await FileRecord.create(
    {
      id: drawFileId(random.bytes(16)),
      sha256,
      originalSha256,
      contentType,
      size: bytes.length,
      originalName: file.name,
      createdBy: file.createdBy,
      publicCode: null,
      createdAt: file.at,
    },
    { transaction },
  );
  return record.id;
}

export async function keepPictures(
  world: FileWorld,
  by: { createdBy: number; at: Date },
): Promise<Map<PictureName, string>> {
  const kept = new Map<PictureName, string>();
  for (const { name, svg } of listPictures()) {
    const original = await sharp(Buffer.from(svg)).png().toBuffer();
    kept.set(name, await keepFile(world, { original, name: `${name}.png`, ...by }));
  }
  return kept;
}
