import type { SlingKind } from '../../../shared/domain/slings/kinds';
import type { CauseId } from './causes';
import type { ShipmentId } from './shipments';
import type { DemoSite } from './staff';

/** What happens to a sling once it was doubted. Every `after` counts days from the step before. */
export type Course =
  | { then: 'held' }
  | { then: 'released'; after: number; note: string }
  | { then: 'condemned'; after: number }
  | { then: 'destroyed'; after: number; destroyedAfter: number }
  | { then: 'shipped'; shipment: ShipmentId };

/** A sling that was held: why, when, and how it went on. */
export type HoldCase = {
  kind: SlingKind;
  site?: DemoSite;
  cause: CauseId;
  /** Days ago; `hoursAgo` for what nobody has brought to a cage yet. */
  ago: number;
  hoursAgo?: number;
} & Course;

const held = (ago: number, kind: SlingKind, cause: CauseId): HoldCase => ({ ago, kind, cause, then: 'held' });
const released = (ago: number, kind: SlingKind, cause: CauseId, after: number, note: string): HoldCase => ({
  ago,
  kind,
  cause,
  // Two inspectors are needed where the first one referred it, and Blade Hall has one.
  site: 'slipStore',
  then: 'released',
  after,
  note,
});
const condemned = (ago: number, kind: SlingKind, cause: CauseId, after: number): HoldCase => ({
  ago,
  kind,
  cause,
  then: 'condemned',
  after,
});
const destroyed = (
  ago: number,
  kind: SlingKind,
  cause: CauseId,
  after: number,
  destroyedAfter: number,
): HoldCase => ({ ago, kind, cause, then: 'destroyed', after, destroyedAfter });
const shipped = (
  ago: number,
  kind: SlingKind,
  cause: CauseId,
  shipment: ShipmentId,
  site: DemoSite,
): HoldCase => ({
  ago,
  kind,
  cause,
  site,
  then: 'shipped',
  shipment,
});
const justNow = (hoursAgo: number, kind: SlingKind, cause: CauseId): HoldCase => ({
  ago: Math.ceil(hoursAgo / 24),
  hoursAgo,
  kind,
  cause,
  then: 'held',
});

/** Held and not in a cage yet: the most urgent thing on every list. */
const NOT_SECURED: readonly HoldCase[] = [
  justNow(2, 'alloy-chain', 'chain-overload'),
  justNow(4, 'synthetic-web', 'web-report'),
  justNow(7, 'wire-rope', 'rope-report'),
  justNow(21, 'synthetic-round', 'round-report'),
  justNow(27, 'alloy-chain', 'chain-latch'),
];

const IN_THE_CAGE: readonly HoldCase[] = [
  held(1, 'alloy-chain', 'chain-latch'),
  held(2, 'synthetic-web', 'web-report'),
  held(3, 'synthetic-round', 'round-cover'),
  held(5, 'wire-rope', 'rope-suspect'),
  held(6, 'synthetic-web', 'web-cut'),
  held(8, 'alloy-chain', 'chain-overload'),
  held(12, 'metal-mesh', 'mesh-stiff'),
  held(17, 'alloy-chain', 'chain-tag'),
  held(24, 'synthetic-rope', 'fibre-cut'),
  held(29, 'synthetic-round', 'round-core'),
  held(38, 'wire-rope', 'rope-corrosion'),
  held(47, 'alloy-chain', 'chain-heat'),
  held(63, 'synthetic-web', 'web-chemical'),
  held(92, 'wire-rope', 'record-doubt'),
];

const CONDEMNED: readonly HoldCase[] = [
  condemned(34, 'synthetic-web', 'web-cut', 6),
  condemned(21, 'synthetic-round', 'round-core', 3),
  condemned(15, 'wire-rope', 'rope-kink', 4),
  condemned(9, 'alloy-chain', 'chain-weld', 2),
];

const DESTROYED: readonly HoldCase[] = [
  destroyed(640, 'synthetic-web', 'web-cut', 4, 9),
  destroyed(596, 'synthetic-round', 'round-core', 6, 14),
  destroyed(571, 'synthetic-web', 'web-stitching', 3, 10),
  destroyed(530, 'wire-rope', 'rope-kink', 5, 12),
  destroyed(488, 'synthetic-web', 'web-chemical', 8, 6),
  destroyed(451, 'alloy-chain', 'chain-stretched', 12, 20),
  destroyed(412, 'synthetic-rope', 'fibre-cut', 2, 8),
  destroyed(377, 'synthetic-round', 'round-core', 5, 5),
  destroyed(340, 'synthetic-web', 'web-cut', 4, 11),
  destroyed(301, 'wire-rope', 'rope-corrosion', 9, 15),
  destroyed(266, 'synthetic-web', 'web-cut', 3, 4),
  destroyed(214, 'synthetic-round', 'round-core', 6, 9),
  destroyed(188, 'synthetic-rope', 'fibre-powder', 5, 13),
  destroyed(149, 'alloy-chain', 'chain-weld', 7, 18),
  destroyed(121, 'synthetic-web', 'web-stitching', 4, 6),
  destroyed(96, 'synthetic-round', 'round-core', 5, 10),
  destroyed(58, 'synthetic-web', 'web-cut', 3, 7),
];

const RELEASED: readonly HoldCase[] = [
  released(288, 'alloy-chain', 'chain-latch', 3, 'Latch kit of the maker fitted, closes and holds.'),
  released(
    251,
    'wire-rope',
    'rope-suspect',
    2,
    'Only grease and one bright wire; counted again over the whole length.',
  ),
  released(223, 'synthetic-web', 'web-report', 4, 'Paint, no cut: washed, both faces looked at.'),
  released(
    197,
    'alloy-chain',
    'chain-overload',
    6,
    'Every link gauged, no stretch, hooks within their throat.',
  ),
  released(
    163,
    'synthetic-round',
    'round-cover',
    5,
    'Cover scuffed through its outer layer only, core felt and sound.',
  ),
  released(134, 'alloy-chain', 'chain-tag', 9, 'Tarn Forge tagged it again; the new tag is in the photo.'),
  released(101, 'synthetic-round', 'round-report', 2, 'A stain of hydraulic oil, washed out.'),
  released(
    76,
    'wire-rope',
    'record-doubt',
    3,
    'Number and ferrule mark compared with the certificate: the record is right.',
  ),
  released(52, 'alloy-chain', 'chain-latch', 2, 'Latch kit of the maker fitted.'),
];

const SHIPPED: readonly HoldCase[] = [
  shipped(281, 'alloy-chain', 'chain-nick', 'spring', 'slipStore'),
  shipped(276, 'alloy-chain', 'chain-latch', 'spring', 'slipStore'),
  shipped(273, 'alloy-chain', 'chain-stretched', 'spring', 'slipStore'),
  shipped(171, 'wire-rope', 'rope-kink', 'scrap', 'slipStore'),
  shipped(169, 'wire-rope', 'rope-corrosion', 'scrap', 'slipStore'),
  shipped(44, 'alloy-chain', 'chain-nick', 'back-chain', 'slipStore'),
  shipped(43, 'alloy-chain', 'chain-overload', 'back-chain', 'slipStore'),
  shipped(40, 'wire-rope', 'rope-suspect', 'back-rope', 'slipStore'),
  shipped(52, 'wire-rope', 'rope-suspect', 'late', 'slipStore'),
  shipped(22, 'alloy-chain', 'chain-nick', 'out-repair', 'slipStore'),
  shipped(20, 'alloy-chain', 'chain-stretched', 'out-repair', 'slipStore'),
  shipped(13, 'metal-mesh', 'mesh-broken', 'out-blade', 'bladeHall'),
  shipped(11, 'alloy-chain', 'chain-overload', 'out-blade', 'bladeHall'),
];

/** The hardest to place come first: those at one site, then the oldest. */
export const HOLD_CASES: readonly HoldCase[] = [
  ...SHIPPED,
  ...RELEASED,
  ...DESTROYED,
  ...IN_THE_CAGE,
  ...CONDEMNED,
  ...NOT_SECURED,
];
