/** The part of fontkit that we use; the package brings no types. */
declare module 'fontkit' {
  export interface GlyphPath {
    commands: {
      command: 'moveTo' | 'lineTo' | 'quadraticCurveTo' | 'bezierCurveTo' | 'closePath';
      args: number[];
    }[];
  }
  export interface Glyph {
    advanceWidth: number;
    path: GlyphPath;
  }
  export interface Font {
    unitsPerEm: number;
    hasGlyphForCodePoint(codePoint: number): boolean;
    glyphForCodePoint(codePoint: number): Glyph;
  }
  export function create(buffer: Buffer): Font;
}
