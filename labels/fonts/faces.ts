import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { create, type Font } from 'fontkit';

export type FaceName = 'sans' | 'sansBold' | 'mono';

/** One font file: a face comes cut into scripts, and a text may need several. */
export interface FontPart {
  /** Unique among all parts, for registering it with the PDF. */
  name: string;
  file: Buffer;
  font: Font;
}

export interface TextRun {
  part: FontPart;
  text: string;
}

const FACES = {
  sans: { family: 'ibm-plex-sans', weight: 400 },
  sansBold: { family: 'ibm-plex-sans', weight: 600 },
  mono: { family: 'ibm-plex-mono', weight: 600 },
} as const satisfies Record<FaceName, { family: string; weight: number }>;

/** In this order, so that the file for plain Latin serves nearly every label alone. */
const SCRIPTS = ['latin', 'latin-ext', 'greek', 'cyrillic'] as const;

/** Printed for a letter that none of the fonts has. */
const REPLACEMENT = '?';

const resolver = createRequire(import.meta.url);
const loaded = new Map<string, FontPart>();

function loadPart(face: FaceName, script: (typeof SCRIPTS)[number]): FontPart | null {
  const { family, weight } = FACES[face];
  const name = `${family}-${script}-${String(weight)}`;
  const known = loaded.get(name);
  if (known) return known;
  // The mono family has no Greek.
  if (family === 'ibm-plex-mono' && script === 'greek') return null;
  const file = readFileSync(resolver.resolve(`@fontsource/${family}/files/${name}-normal.woff`));
  const part = { name, file, font: create(file) };
  loaded.set(name, part);
  return part;
}

interface KnownCharacter {
  part: FontPart;
  character: string;
  widthEm: number;
}

const characters = {
  sans: new Map<string, KnownCharacter>(),
  sansBold: new Map<string, KnownCharacter>(),
  mono: new Map<string, KnownCharacter>(),
} satisfies Record<FaceName, Map<string, KnownCharacter>>;

function findCharacter(face: FaceName, character: string): KnownCharacter | null {
  const codePoint = character.codePointAt(0) ?? 0;
  for (const script of SCRIPTS) {
    const part = loadPart(face, script);
    if (!part?.font.hasGlyphForCodePoint(codePoint)) continue;
    return {
      part,
      character,
      widthEm: part.font.glyphForCodePoint(codePoint).advanceWidth / part.font.unitsPerEm,
    };
  }
  return null;
}

function getCharacter(face: FaceName, character: string): KnownCharacter {
  const known = characters[face].get(character);
  if (known) return known;
  const found = findCharacter(face, character) ?? findCharacter(face, REPLACEMENT);
  if (!found) throw new Error(`The font of face ${face} has no "${REPLACEMENT}".`);
  characters[face].set(character, found);
  return found;
}

/** @returns width in em; kerning left out, which only ever makes a line a hair shorter */
export function measureText(text: string, face: FaceName): number {
  let widthEm = 0;
  for (const character of text) widthEm += getCharacter(face, character).widthEm;
  return widthEm;
}

/** Cuts a text where the font file changes; letters that no file has become a question mark. */
export function splitIntoRuns(text: string, face: FaceName): TextRun[] {
  const runs: TextRun[] = [];
  for (const each of text) {
    const { part, character } = getCharacter(face, each);
    const last = runs.at(-1);
    if (last?.part === part) last.text += character;
    else runs.push({ part, text: character });
  }
  return runs;
}
