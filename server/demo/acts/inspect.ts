import { criteriaFor } from '../../../shared/domain/inspection/rows';
import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../shared/domain/inspection/inspectionTypes';
import type { Answer } from '../../../shared/domain/inspection/criterion';
import { inspectSling } from '../../commands/inspectSling';
import type { ActorContext } from '../../context';
import type { DemoSling } from '../plan/fleet';
import { getTrace, type SlingTrace, type World } from './world';

/** The one thing that the inspector found. */
export interface Seen {
  criterionId: string;
  note: string;
  photoId: string | null;
}

/** Every question answered for a complete inspection; a frequent one names what was seen and calls the rest clean. */
export async function inspect(
  context: ActorContext,
  world: World,
  sling: DemoSling,
  type: InspectionType,
  seen: Seen | null = null,
): Promise<void> {
  const trace = getTrace(world, sling);
  const { isComplete } = INSPECTION_TYPE_FACTS[type];
  const found = seen ? [answerSeen(seen)] : [];
  const clean = isComplete ? listClean(trace, sling, seen?.criterionId) : [];
  const answers = [...found, ...clean];
  await inspectSling(context, trace.id, { type, answers: answers.map(toSent), restClean: !isComplete }, null);
}

const answerSeen = ({ criterionId, note, photoId }: Seen): Answer => ({
  criterionId,
  seen: true,
  note,
  ...(photoId === null ? {} : { photoIds: [photoId] }),
});

const toSent = ({ photoIds, ...answer }: Answer): Omit<Answer, 'photoIds'> & { photoIds?: string[] } => ({
  ...answer,
  ...(photoIds ? { photoIds: [...photoIds] } : {}),
});

function listClean({ fittings }: SlingTrace, { lot: { model } }: DemoSling, seenId?: string): Answer[] {
  return criteriaFor({ ...model, fittings })
    .filter((row) => row.id !== seenId)
    .map((row) => row.clean);
}
