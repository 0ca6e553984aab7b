import { findModuleDots, findStock, LABEL_STOCKS, type LabelStock } from '../../../labels';
import type { ReprintReason } from '../../../shared/schemas/labels';
import { getTagCode, confirmTag } from '../../commands/handleTags';
import { drawTags, printLabels, type DrawnTag } from '../../commands/printLabels';
import { registerSling } from '../../commands/registerSling';
import { performAction } from '../../commands/actions/performAction';
import type { ActorContext } from '../../context';
import { Fitting } from '../../models/Fitting';
import { presentFitting } from '../../queries/slingDetail';
import type { DemoSling } from '../plan/fleet';
import { buildSlingRequest } from './slingRequest';
import { getTrace, type World } from './world';

const FLAT_STOCK = 'roll-300-flat';
const THIN_STOCK = 'roll-300-round';

export async function register(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  const request = buildSlingRequest(sling, world.clock, world.places[sling.lot.site]);
  const { id } = await registerSling(context, request);
  const fittings =
    request.fittings.length === 0
      ? []
      : await Fitting.findAll({ where: { slingId: id }, transaction: context.transaction });
  world.records.set(sling, {
    id,
    identity: request.makerSerial ?? request.number,
    code: null,
    fittings: fittings.map(presentFitting),
  });
}

/** One run of labels for all of them. */
export async function label(
  context: ActorContext,
  world: World,
  slings: readonly DemoSling[],
  reason?: ReprintReason,
): Promise<void> {
  const [first] = slings;
  if (!first) return;
  const drawn = await drawTags(world, slings.length, world.random.bytes);
  const traces = slings.map((sling) => getTrace(world, sling));
  await printLabels(
    context,
    {
      slingIds: traces.map(({ id }) => id),
      stock: chooseStock(first, drawn).id,
      ...(reason === undefined ? {} : { reason }),
    },
    drawn,
  );
  for (const [index, trace] of traces.entries()) trace.code = drawn[index]?.code ?? null;
}

/** A long address makes a denser code, which the usual stock may have no room for. */
function chooseStock(sling: DemoSling, drawn: readonly DrawnTag[]): LabelStock {
  const version = Math.max(...drawn.map(({ symbol }) => symbol.version));
  const usual = findStock(sling.lot.model.isThin ? THIN_STOCK : FLAT_STOCK);
  const stock = [...(usual ? [usual] : []), ...LABEL_STOCKS].find(
    (candidate) => findModuleDots(candidate, version) !== null,
  );
  if (!stock) throw new Error('The public address is too long for every stock of labels.');
  return stock;
}

export async function confirm(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  const { code, identity } = getTrace(world, sling);
  await confirmTag(context, getTagCode(code ?? ''), { via: 'camera', lastFour: identity.slice(-4) });
}

export async function accept(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  await performAction(context, getTrace(world, sling).id, 'accept', {}, null);
}
