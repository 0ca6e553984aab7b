import { TAG_CODE_LENGTH } from '../../../shared/domain/tags/tagCode';
import { formatTagCode } from '../../lib/format';

/** Puts the printed dashes in while a person types; leaves anything longer (a pasted link) as it is. */
export function groupWhileTyping(text: string): string {
  const bare = text.replace(/[\s\-\u2010-\u2015\u2212]/g, '').toUpperCase();
  if (!/^[0-9A-Z]*$/.test(bare) || bare.length > TAG_CODE_LENGTH) return text;
  if (bare.length === TAG_CODE_LENGTH) return formatTagCode(bare);
  return [bare.slice(0, 4), bare.slice(4, 7), bare.slice(7)].filter(Boolean).join('-');
}
