import { constants, inflateSync } from 'node:zlib';
import { AppError } from '../errors';

/** Content that acts when a PDF is opened, by names long enough not to turn up in packed pictures by chance. */
const ACTIVE = /\/(?:JavaScript|Launch|EmbeddedFiles?|RichMedia)\b/;
/** The same with short names: only looked for outside streams. */
const ACTIVE_SHORT = /\/(?:JS|XFA)\b/;

/** Most that the packed objects of one file may unfold to. */
const UNPACKED_BYTES = 32 * 1024 * 1024;
/** How far before its stream a dictionary may begin. */
const DICTIONARY_CHARACTERS = 4000;

/**
 * A PDF is kept to the byte, so it must be whole and passive. Objects may be packed into streams and names spelt
 * with `#` codes: both are undone before looking.
 * @throws AppError 422
 */
export function checkPdf(bytes: Buffer): void {
  const raw = bytes.toString('latin1');
  if (!raw.startsWith('%PDF-') || !raw.slice(-2048).includes('%%EOF')) {
    throw new AppError('invalid', 'The PDF is not whole. Please save it again.');
  }
  const { outside, packed } = splitStreams(raw);
  const objects = [...outside, ...unpack(packed)].map(spellOut);
  if (ACTIVE.test(spellOut(raw)) || objects.some((text) => ACTIVE.test(text) || ACTIVE_SHORT.test(text))) {
    throw new AppError('invalid', 'The PDF holds scripts or attached files. Please print it to a plain PDF.');
  }
}

/** What stands outside streams, and the streams that hold packed objects; one pass, whatever was sent. */
function splitStreams(raw: string): { outside: string[]; packed: string[] } {
  const outside: string[] = [];
  const packed: string[] = [];
  const opening = /\bstream\r?\n/g;
  let from = 0;
  for (let match = opening.exec(raw); match; match = opening.exec(raw)) {
    const start = opening.lastIndex;
    const dictionary = raw.slice(Math.max(from, start - DICTIONARY_CHARACTERS), start);
    outside.push(raw.slice(from, start));
    const end = raw.indexOf('endstream', start);
    from = end < 0 ? raw.length : end;
    if (spellOut(dictionary).includes('/ObjStm')) packed.push(raw.slice(start, from));
    opening.lastIndex = from;
  }
  outside.push(raw.slice(from));
  return { outside, packed };
}

function unpack(packed: readonly string[]): string[] {
  let left = UNPACKED_BYTES;
  return packed.map((stream) => {
    try {
      const text = inflateSync(Buffer.from(stream, 'latin1'), {
        maxOutputLength: left,
        finishFlush: constants.Z_SYNC_FLUSH,
      }).toString('latin1');
      left = Math.max(1, left - text.length);
      return text;
    } catch {
      throw new AppError(
        'invalid',
        'The PDF is locked or packed so that it cannot be checked. Please print it to a plain PDF.',
      );
    }
  });
}

/** `/J#61vaScript` is `/JavaScript`. */
function spellOut(text: string): string {
  return text.replace(/#([0-9A-Fa-f]{2})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
}
