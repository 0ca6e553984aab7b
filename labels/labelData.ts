import { z } from 'zod';
import { qrSymbol } from './qr/symbol';

/** All that stands on one label. Texts come ready to print: units and rounding are the caller's. */
export const labelData = qrSymbol.extend({
  /** Ten characters without dashes, as `drawTagCode` gives it. */
  code: z.string().length(10),
  payload: z.string().min(1),
  number: z.string(),
  kindName: z.string(),
  loads: z.array(z.object({ label: z.string(), text: z.string() })),
  company: z.string(),
});
export type LabelData = z.infer<typeof labelData>;

/** On every label: the maker's tag alone says what a sling may carry. */
export const NOT_THE_MAKERS_TAG = "not the maker's tag";
