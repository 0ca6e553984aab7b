import { drawTagCode, tagPayload } from '../../shared/domain/tags/tagCode';
import { chooseMask, type LabelData } from '../../labels';
import { createRandom } from '../support/yardScene';

const PUBLIC_URL = 'https://s.example';

/** Labels of an invented store; the same seed always gives the same ones. */
export function buildLabelItems(count: number, seed = 1): LabelData[] {
  const random = createRandom(seed);
  const randomBytes = (n: number) => Uint8Array.from({ length: n }, () => random() * 256);
  return Array.from({ length: count }, (_, i) => {
    const code = drawTagCode(randomBytes);
    const payload = tagPayload(PUBLIC_URL, code);
    return {
      code,
      payload,
      ...chooseMask(payload),
      number: `CH-${String(i + 1).padStart(4, '0')}`,
      kindName: 'Alloy chain sling',
      loads: [
        { label: 'Vertical', text: '2,000 kg' },
        { label: 'Choker', text: '1,600 kg' },
        { label: 'Basket', text: '4,000 kg' },
      ],
      company: 'Northyard Lifting',
    };
  });
}

export function buildLabelItem(overrides: Partial<LabelData> = {}): LabelData {
  const [item] = buildLabelItems(1);
  if (!item) throw new Error('No label was built.');
  return { ...item, ...overrides };
}

/** Longer than any form allows. */
export const LONG_TEXTS = {
  number: 'NORTHYARD-CHAIN-2025-000000123456-ABCDEF',
  kindName: 'Double-leg alloy chain sling, grade 100, with grab hooks, shortening clutches and master link',
  loads: [
    { label: 'Vertical', text: '123,456 lb' },
    { label: 'Choker', text: '98,765 lb' },
    { label: 'Basket', text: '246,900 lb' },
    { label: 'Bridle at 60°', text: '213,800 lb' },
  ],
  company: 'Northyard Lifting and Heavy Haulage Company of the Northern Isles Limited',
};
