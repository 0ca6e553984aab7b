import type { Transaction } from 'sequelize';
import type { Fitting } from '../../../shared/domain/slings/spec';
import type { SessionUser } from '../../../shared/schemas/people';
import type { ActorContext, Services } from '../../context';
import type { DemoClock } from '../clock';
import type { PictureName } from '../evidence/pictures';
import type { DemoSling } from '../plan/fleet';
import type { EVALUATORS } from '../plan/shipments';
import type { DemoAccount, DemoSite } from '../plan/staff';
import type { Random } from '../random';

export interface SitePlaces {
  id: number;
  racks: readonly number[];
  cages: readonly number[];
  lookOver: number;
}

/** Everything that the acts of the story need, and what they leave behind for later ones. */
export interface World extends Omit<Services, 'now'> {
  transaction: Transaction;
  clock: DemoClock;
  /** For what is drawn while the story runs, such as tag codes. */
  random: Random;
  people: ReadonlyMap<DemoAccount, SessionUser>;
  places: Record<DemoSite, SitePlaces>;
  evaluators: Record<keyof typeof EVALUATORS, number>;
  pictures: ReadonlyMap<PictureName, string>;
  /** What is known of a sling once it is registered. */
  records: Map<DemoSling, SlingTrace>;
}

export interface SlingTrace {
  id: number;
  /** Serial or number, as it stands on the sling. */
  identity: string;
  /** Of its last label. */
  code: string | null;
  fittings: readonly Fitting[];
}

/** One thing that one person did at one moment. */
export interface Act {
  at: Date;
  by: DemoAccount;
  /** Acts on different slings of one lot, the same work on each: done side by side where they follow one another. */
  round?: string;
  run: (context: ActorContext, world: World) => Promise<unknown>;
}

export function getPerson(world: Pick<World, 'people'>, account: DemoAccount): SessionUser {
  const person = world.people.get(account);
  if (!person) throw new Error(`The demo has no ${account}.`);
  return person;
}

export function getTrace(world: Pick<World, 'records'>, sling: DemoSling): SlingTrace {
  const trace = world.records.get(sling);
  if (!trace) throw new Error(`${sling.number} is not registered yet.`);
  return trace;
}

export function getPicture(world: Pick<World, 'pictures'>, name: PictureName): string {
  const id = world.pictures.get(name);
  if (id === undefined) throw new Error(`There is no picture ${name}.`);
  return id;
}
