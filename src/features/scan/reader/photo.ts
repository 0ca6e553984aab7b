import { PhotoError } from './labelReader';

/** Beyond this a photo only costs memory: phones give 12 megapixels and more (labels fill part of the picture). */
const LONGEST_SIDE_PX = 2600;

/** @throws PhotoError when it is no picture */
export async function readPixels(photo: Blob): Promise<ImageData> {
  const bitmap = await openBitmap(photo);
  try {
    const factor = Math.min(1, LONGEST_SIDE_PX / Math.max(bitmap.width, bitmap.height));
    const canvas = document.createElement('canvas');
    canvas.width = Math.max(1, Math.round(bitmap.width * factor));
    canvas.height = Math.max(1, Math.round(bitmap.height * factor));
    const context = canvas.getContext('2d', { willReadFrequently: true });
    if (!context) throw new PhotoError('No drawing surface.');
    context.drawImage(bitmap, 0, 0, canvas.width, canvas.height);
    return context.getImageData(0, 0, canvas.width, canvas.height);
  } finally {
    bitmap.close();
  }
}

async function openBitmap(photo: Blob): Promise<ImageBitmap> {
  try {
    return await createImageBitmap(photo);
  } catch (cause) {
    throw new PhotoError('Not a picture.', { cause });
  }
}
