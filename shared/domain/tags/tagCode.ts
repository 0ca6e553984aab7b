import { computeCheckCharacter, hasValidCheckCharacter } from './iso7064';

/**
 * The tag code on every label: nine random characters of Crockford's Base32 (45 bits) and an ISO/IEC 7064 MOD 37,36
 * check character that is itself in that alphabet. Always held upper case and without dashes.
 */
export type TagCode = string & { readonly __brand: 'TagCode' };

/** Crockford's Base32: no I, L, O (read as 1, 1, 0) and no U. */
export const TAG_ALPHABET = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

export const TAG_CODE_LENGTH = 10;
const RANDOM_LENGTH = TAG_CODE_LENGTH - 1;
const LOW_FIVE_BITS = 0b1_1111;

/** A tenth of all draws end on I, L, O or U, so this many in a row means a broken source of random bytes. */
const MAX_DRAWS = 100;

export type ParsedTagCode =
  { ok: true; code: TagCode } | { ok: false; reason: 'length' | 'alphabet' | 'check' };

function isInAlphabet(text: string): boolean {
  return [...text].every((character) => TAG_ALPHABET.includes(character));
}

/**
 * Draws a new code. 32 symbols are exactly five bits, so taking the low five of each byte keeps the draw unbiased.
 * @param randomBytes a cryptographic source: `n` bytes on each call
 * @throws Error when the source keeps giving draws without a usable check character
 */
export function drawTagCode(randomBytes: (n: number) => Uint8Array): TagCode {
  for (let draw = 0; draw < MAX_DRAWS; draw++) {
    const payload = Array.from(randomBytes(RANDOM_LENGTH), (byte) =>
      TAG_ALPHABET.charAt(byte & LOW_FIVE_BITS),
    ).join('');
    if (payload.length !== RANDOM_LENGTH)
      throw new Error('The source of random bytes gave too few or too many.');
    const parsed = parseTagCode(payload + computeCheckCharacter(payload), { isStrict: true });
    if (parsed.ok) return parsed.code;
  }
  throw new Error('The source of random bytes gives no usable tag code.');
}

/**
 * Reads a code as people write it: any case, with or without dashes and spaces, O as 0, I and L as 1.
 * @param options.isStrict takes only the stored form
 */
export function parseTagCode(text: string, options: { isStrict?: boolean } = {}): ParsedTagCode {
  const code = options.isStrict ? text : normaliseTyping(text);
  if (code.length !== TAG_CODE_LENGTH) return { ok: false, reason: 'length' };
  if (!isInAlphabet(code)) return { ok: false, reason: 'alphabet' };
  if (!hasValidCheckCharacter(code)) return { ok: false, reason: 'check' };
  return { ok: true, code: code as TagCode };
}

/** Dashes that phones put in for the plain one count too. */
function normaliseTyping(text: string): string {
  return text
    .replace(/[\s\-\u2010-\u2015\u2212]/g, '')
    .toUpperCase()
    .replaceAll('O', '0')
    .replaceAll(/[IL]/g, '1');
}

/** `XXXX-XXX-XXX`, as printed. */
export function formatTagCode(code: TagCode): string {
  return `${code.slice(0, 4)}-${code.slice(4, 7)}-${code.slice(7)}`;
}

/**
 * What a reader, a handheld scanner or a person gave us.
 * - `tag`: a well-formed code, bare or in a link of this store. Whether it was ever given is the server's to say.
 * - `wrong_check`: looks like one of ours, but a character is wrong.
 * - `foreign`: anything else. `otherHost` is set when it is a link like ours at another address: another store's
 *   label, or one printed before this store's address changed. It isn't opened as ours without asking.
 */
export type ScanReading =
  | { kind: 'tag'; code: TagCode }
  | { kind: 'wrong_check'; text: string }
  | { kind: 'foreign'; text: string; otherHost: { host: string; code: TagCode } | null };

const TAG_PATH = /^\/t\/([^/]+)\/?$/i;

/**
 * What the QR code holds: `<ORIGIN>/T/<CODE>`, all upper case so that it packs as alphanumeric.
 * @param publicUrl the store's address, an origin without a path
 * @throws TypeError when it is no web address
 */
export function tagPayload(publicUrl: string, code: TagCode): string {
  const address = parseWebAddress(publicUrl);
  if (!address) throw new TypeError('The public address must start with https:// or http://.');
  return `${address.origin}/T/${code}`.toUpperCase();
}

/**
 * @param ownOrigins the store's public address, and any other the app is opened under; none given: a tag link at
 *   any address counts as ours. Hosts are compared, not http against https.
 */
export function parseScan(text: string, ownOrigins: string | readonly string[] = []): ScanReading {
  const trimmed = text.trim();
  const link = parseTagLink(trimmed);
  const parsed = parseTagCode(link?.code ?? trimmed);
  const isOwn = link === null || isOwnHost(link.host, ownOrigins);
  if (parsed.ok) {
    return isOwn
      ? { kind: 'tag', code: parsed.code }
      : { kind: 'foreign', text: trimmed, otherHost: { host: link.host, code: parsed.code } };
  }
  if (isOwn && parsed.reason === 'check') return { kind: 'wrong_check', text: link?.code ?? trimmed };
  return { kind: 'foreign', text: trimmed, otherHost: null };
}

function parseTagLink(text: string): { host: string; code: string } | null {
  const url = parseWebAddress(text);
  const code = url && TAG_PATH.exec(url.pathname)?.[1];
  return url && code ? { host: url.host, code } : null;
}

function isOwnHost(host: string, ownOrigins: string | readonly string[]): boolean {
  const origins = typeof ownOrigins === 'string' ? [ownOrigins] : ownOrigins;
  return origins.length === 0 || origins.some((origin) => parseWebAddress(origin)?.host === host);
}

function parseWebAddress(text: string): URL | null {
  if (!/^https?:\/\//i.test(text)) return null;
  try {
    return new URL(text);
  } catch {
    return null;
  }
}
