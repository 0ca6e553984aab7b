import { execFile } from 'node:child_process';
import { mkdtemp, open, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { createGrayImage, type GrayImage } from '../../shared/reader/grayImage';

const run = promisify(execFile);

/** A4 at 600 dpi is 35 MB a page. */
const MOST_BYTES = 1024 ** 3;

/** Renders every page with poppler's pdftoppm, as a printer driver would: one picture a page. */
export async function rasterisePdf(pdf: Buffer, dpi: number): Promise<GrayImage[]> {
  return withPdfFile(pdf, async (file) => {
    const { stdout } = await run('pdftoppm', ['-r', String(dpi), '-gray', file], {
      encoding: 'buffer',
      maxBuffer: MOST_BYTES,
    });
    return parsePgms(stdout);
  });
}

/** Text as a reader of the PDF gets it, page by page. */
export async function extractPdfText(pdf: Buffer): Promise<string[]> {
  return withPdfFile(pdf, async (file) => {
    const { stdout } = await run('pdftotext', ['-layout', file, '-'], { maxBuffer: MOST_BYTES });
    return stdout.split('\f').slice(0, -1);
  });
}

async function withPdfFile<T>(pdf: Buffer, use: (file: string) => Promise<T>): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'label-'));
  try {
    const file = join(folder, 'labels.pdf');
    await writeFile(file, pdf);
    return await use(file);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** pdftoppm writes its pages one behind the other as binary PGM. */
function parsePgms(bytes: Buffer): GrayImage[] {
  const images: GrayImage[] = [];
  let at = 0;
  while (at < bytes.length) {
    const head = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(bytes.toString('latin1', at, at + 64));
    if (!head) throw new Error('pdftoppm gave something else than PGM.');
    const [width, height] = [Number(head[1]), Number(head[2])];
    at += head[0].length;
    images.push({ data: new Uint8ClampedArray(bytes.subarray(at, at + width * height)), width, height });
    at += width * height;
  }
  return images;
}

/** Cuts a part out; what lies outside the picture is white. */
export function cropImage(
  image: GrayImage,
  left: number,
  top: number,
  width: number,
  height: number,
): GrayImage {
  const part = createGrayImage(width, height);
  for (let y = 0; y < height; y++) {
    const from = (y + top) * image.width + left;
    if (y + top < 0 || y + top >= image.height) continue;
    part.data.set(image.data.subarray(from, from + Math.min(width, image.width - left)), y * width);
  }
  return part;
}

export interface VideoOptions {
  widthPx?: number;
  heightPx?: number;
  framesPerSecond?: number;
  frames?: number;
  /** The picture turns to and fro by so much and comes nearer and further, as a held phone does. */
  turnDeg?: number;
  /** Share of its size by which it comes nearer and further. */
  zoom?: number;
}

const VIDEO = { widthPx: 1280, heightPx: 720, framesPerSecond: 10, frames: 20, turnDeg: 6, zoom: 0.15 };
const BACKGROUND_LUMA = 96;
/** Video luma runs from 16 to 235. */
const BLACK_LUMA = 16;
const LUMA_SPAN = 219;

/**
 * A film for Chromium's fake camera (`--use-file-for-fake-video-capture`): the picture in the middle of a grey ground,
 * moving a little, because a still one can sit in a blind spot of the reader for ever.
 */
export async function writeMovingY4m(
  file: string,
  image: GrayImage,
  options: VideoOptions = {},
): Promise<void> {
  const video = { ...VIDEO, ...options };
  const chroma = Buffer.alloc((video.widthPx * video.heightPx) >> 1, 128);
  const handle = await open(file, 'w');
  try {
    await handle.write(
      `YUV4MPEG2 W${String(video.widthPx)} H${String(video.heightPx)} F${String(video.framesPerSecond)}:1 Ip A1:1 C420mpeg2\n`,
    );
    for (let frame = 0; frame < video.frames; frame++) {
      const phase = (2 * Math.PI * frame) / video.frames;
      const turnDeg = video.turnDeg * Math.sin(phase);
      const scale = 1 + video.zoom * Math.cos(phase);
      await handle.write('FRAME\n');
      await handle.write(drawFrame(image, video, turnDeg, scale));
      await handle.write(chroma);
    }
  } finally {
    await handle.close();
  }
}

/** The same without movement. */
export function writeStillY4m(file: string, image: GrayImage, options: VideoOptions = {}): Promise<void> {
  return writeMovingY4m(file, image, { ...options, turnDeg: 0, zoom: 0 });
}

function drawFrame(
  image: GrayImage,
  video: { widthPx: number; heightPx: number },
  turnDeg: number,
  scale: number,
): Buffer {
  const luma = Buffer.alloc(video.widthPx * video.heightPx, BACKGROUND_LUMA);
  const cos = Math.cos((turnDeg * Math.PI) / 180) / scale;
  const sin = Math.sin((turnDeg * Math.PI) / 180) / scale;
  for (let y = 0; y < video.heightPx; y++) {
    for (let x = 0; x < video.widthPx; x++) {
      const dx = x - video.widthPx / 2;
      const dy = y - video.heightPx / 2;
      const fromX = Math.floor(cos * dx + sin * dy + image.width / 2);
      const fromY = Math.floor(cos * dy - sin * dx + image.height / 2);
      if (fromX < 0 || fromY < 0 || fromX >= image.width || fromY >= image.height) continue;
      const shade = image.data[fromY * image.width + fromX] ?? 0;
      luma[y * video.widthPx + x] = BLACK_LUMA + Math.round((shade * LUMA_SPAN) / 255);
    }
  }
  return luma;
}
