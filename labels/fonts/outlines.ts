import type { GlyphPath } from 'fontkit';
import { splitIntoRuns, type FaceName } from './faces';

const SVG_LETTERS = {
  moveTo: 'M',
  lineTo: 'L',
  quadraticCurveTo: 'Q',
  bezierCurveTo: 'C',
  closePath: 'Z',
} as const satisfies Record<GlyphPath['commands'][number]['command'], string>;

/** Where a line of text starts and how large it is, all in the unit of the drawing, y growing downwards. */
export interface TextPlace {
  x: number;
  baseline: number;
  size: number;
}

/** A line of text as SVG path data. */
export function outlineText(text: string, face: FaceName, place: TextPlace): string {
  let data = '';
  let { x } = place;
  for (const { part, text: letters } of splitIntoRuns(text, face)) {
    const scale = place.size / part.font.unitsPerEm;
    for (const letter of letters) {
      const glyph = part.font.glyphForCodePoint(letter.codePointAt(0) ?? 0);
      for (const { command, args } of glyph.path.commands) {
        const points = args.map((value, i) =>
          (i % 2 === 0 ? x + value * scale : place.baseline - value * scale).toFixed(2),
        );
        data += SVG_LETTERS[command] + points.join(' ');
      }
      x += glyph.advanceWidth * scale;
    }
  }
  return data;
}
