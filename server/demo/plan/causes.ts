import type { InspectionType } from '../../../shared/domain/inspection/inspectionTypes';
import type { HoldReason } from '../../../shared/domain/lifecycle/reasons';
import type { PictureName } from '../evidence/pictures';

/** How a sling came to be held. */
export type Cause = { note: string; picture: PictureName | null } & (
  | { how: 'hold'; reason: HoldReason }
  | { how: 'inspection'; type: InspectionType; criterionId: string }
  | { how: 'report'; name: string }
);

const hold = (reason: HoldReason, note: string, picture: PictureName | null): Cause => ({
  how: 'hold',
  reason,
  note,
  picture,
});
const inspection = (
  type: InspectionType,
  criterionId: string,
  note: string,
  picture: PictureName | null,
): Cause => ({ how: 'inspection', type, criterionId, note, picture });
const report = (name: string, note: string, picture: PictureName | null): Cause => ({
  how: 'report',
  name,
  note,
  picture,
});

export const CAUSES = {
  'chain-stretched': inspection(
    'periodic',
    'chain.bent_twisted_link',
    'Third and fourth link below the master link are drawn out.',
    'stretchedLink',
  ),
  'chain-nick': inspection(
    'frequent',
    'chain.nick_gouge',
    'A sharp notch across the straight side of one link, as from a plate edge.',
    'nickedLink',
  ),
  'chain-heat': hold(
    'heat_or_chemical',
    'Came back from the cutting bay with blue links at the hook end.',
    'blueLink',
  ),
  'chain-latch': hold('latch', 'The latch stays open, its spring is broken.', 'openLatch'),
  'chain-overload': hold(
    'overload_or_shock',
    'The load snagged on the sea fastening and came free with a jerk.',
    null,
  ),
  'chain-weld': hold('unauthorised_repair', 'A link was closed with a weld on site.', 'weldedLink'),
  'chain-tag': hold('makers_tag_missing', 'The tag ring is empty.', 'emptyTagRing'),
  'rope-kink': inspection(
    'periodic',
    'rope.kink_crush_birdcage',
    'A kink that stays, about a metre from the lower eye.',
    'kinkedRope',
  ),
  'rope-corrosion': inspection(
    'periodic',
    'rope.corrosion',
    'Rust dust between the strands next to the ferrule.',
    'rustyRope',
  ),
  'rope-suspect': hold('damage_suspected', 'Broken wires near the ferrule.', 'brokenWires'),
  'rope-report': report(
    'Jory, tower crew',
    'Wires sticking out, one of them went through my glove.',
    'brokenWires',
  ),
  'mesh-broken': inspection(
    'periodic',
    'mesh.broken_weld_or_wire',
    'Two spirals open along the left edge.',
    'openMesh',
  ),
  'mesh-stiff': inspection('frequent', 'mesh.stiff', 'Does not roll over its middle third.', null),
  'web-cut': inspection(
    'frequent',
    'web.cut_hole_tear',
    'Cut from the edge, a third of the width.',
    'cutWeb',
  ),
  'web-stitching': inspection(
    'periodic',
    'web.stitching',
    'Two rows of the eye splice are worn through.',
    'openStitching',
  ),
  'web-chemical': hold('heat_or_chemical', 'Lay in a spill of blade cleaner, stiff where it dried.', null),
  'web-report': report(
    'Hanne, blade crew',
    'The edge looks cut where it went round the root ring.',
    'cutWeb',
  ),
  'round-core': inspection(
    'periodic',
    'round.core_exposed',
    'White core yarn shows through a hole in the cover.',
    'openCover',
  ),
  'round-cover': inspection(
    'frequent',
    'round.cover_cut',
    'Cover worn through its outer layer, no core seen.',
    'openCover',
  ),
  'round-report': report('Tomasz, nacelle crew', 'A dark wet patch, smells of oil.', null),
  'fibre-cut': inspection('frequent', 'fibre.cut_break', 'One strand cut half through.', 'frayedRope'),
  'fibre-powder': inspection(
    'periodic',
    'fibre.powder',
    'Powder falls out when the strands are opened.',
    null,
  ),
  'record-doubt': hold(
    'record_in_doubt',
    'The mark on the ferrule and the number in the record do not seem to go together.',
    null,
  ),
} as const satisfies Record<string, Cause>;

export type CauseId = keyof typeof CAUSES;

export function getCause(id: CauseId): Cause {
  return CAUSES[id];
}
