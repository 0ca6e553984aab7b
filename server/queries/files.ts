import type { WriteContext } from '../context';
import { invalidField } from '../errors';
import { FileRecord } from '../models/FileRecord';

/** A file as evidence in a ledger row: its id and the hash of what is kept. */
export interface Evidence {
  fileId: string;
  sha256: string;
}

/** The files that exist among these, in the order asked for. */
export async function findEvidence(context: WriteContext, fileIds: readonly string[]): Promise<Evidence[]> {
  if (fileIds.length === 0) return [];
  const files = await FileRecord.findAll({ where: { id: [...fileIds] }, transaction: context.transaction });
  const byId = new Map(files.map((file) => [file.id, file]));
  return fileIds.flatMap((fileId) => {
    const file = byId.get(fileId);
    return file ? [{ fileId, sha256: file.sha256 }] : [];
  });
}

/** @throws InvalidError 422 at `path` when one of them is not kept here */
export async function getEvidence(
  context: WriteContext,
  fileIds: readonly string[],
  path: string,
): Promise<Evidence[]> {
  const unique = [...new Set(fileIds)];
  const found = await findEvidence(context, unique);
  if (found.length < unique.length) throw invalidField(path, 'A file is not here: please upload it again.');
  return found;
}

/** @throws InvalidError 422 when a picture is asked for and something else was sent */
export async function getPhotos(
  context: WriteContext,
  fileIds: readonly string[],
  path: string,
): Promise<Evidence[]> {
  if (fileIds.length === 0) return [];
  const evidence = await getEvidence(context, fileIds, path);
  const others = await FileRecord.count({
    where: { id: evidence.map((file) => file.fileId), contentType: 'application/pdf' },
    transaction: context.transaction,
  });
  if (others > 0) throw invalidField(path, 'Photos are asked for here, not PDF files.');
  return evidence;
}
