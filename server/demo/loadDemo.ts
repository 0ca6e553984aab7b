import type { Sequelize, Transaction } from 'sequelize';
import type { SessionUser } from '../../shared/schemas/people';
import type { WriteContext } from '../context';
import type { FileStore } from '../files/fileStore';
import { defineModels } from '../models';
import { Evaluator } from '../models/Evaluator';
import { User } from '../models/User';
import { presentUsers } from '../queries/people';
import { play } from './acts/play';
import { writeStory } from './acts/story';
import { getPerson, type SitePlaces, type World } from './acts/world';
import { createClock } from './clock';
import { keepPictures } from './evidence/keepFile';
import {
  createPeople,
  createPlaces,
  DEMO_DOMAIN,
  DEMO_PASSWORD,
  DEMO_PEOPLE,
  type DemoPlaces,
} from './people';
import { allocateStories } from './plan/allocate';
import { drawFleet } from './plan/fleet';
import { EVALUATORS } from './plan/shipments';
import type { DemoAccount, DemoSite } from './plan/staff';
import { createRandom } from './random';

export interface DemoOptions {
  sequelize: Sequelize;
  files: FileStore;
  publicUrl: string;
  say: (line: string) => void;
}

const STORY_DAYS = 730;
const STORY_SEED = 20_260;
/** Codes and file ids are drawn apart, so that a change to the story leaves the labels as they were. */
const CODE_SEED = 1492;

/** Loads the demo when there is no account yet, all of it or nothing, and says how to sign in. */
export async function loadDemo({ sequelize, files, publicUrl, say }: DemoOptions): Promise<void> {
  defineModels(sequelize);
  if ((await User.count()) === 0) {
    say('loading the demo: 420 slings with two years of history, about half a minute');
    const now = new Date();
    await sequelize.transaction((transaction) =>
      tellStory({ sequelize, files, publicUrl, transaction }, now),
    );
  }
  if ((await User.count({ where: { email: `storekeeper@${DEMO_DOMAIN}` } })) === 0) return;
  say(`demo accounts (password ${DEMO_PASSWORD}):`);
  for (const { account, roles } of DEMO_PEOPLE) say(`  ${account}@${DEMO_DOMAIN} — ${roles.join(', ')}`);
}

async function tellStory(
  base: Pick<World, 'sequelize' | 'files' | 'publicUrl' | 'transaction'>,
  now: Date,
): Promise<void> {
  const clock = createClock(now);
  const began = clock.at(STORY_DAYS, 7);
  const context: WriteContext = { ...base, now: () => began, user: null, at: began };
  const places = await createPlaces(context);
  const accounts = await createPeople(context, places, clock.dayOf(-365));
  const people = await loadPeople(accounts, base.transaction);
  const random = createRandom(CODE_SEED);
  const createdBy = getPerson({ people }, 'storekeeper').id;
  const world: World = {
    ...base,
    clock,
    random,
    people,
    places: { slipStore: sitePlaces(places, 'slipStore'), bladeHall: sitePlaces(places, 'bladeHall') },
    evaluators: await createEvaluators(base.transaction, began),
    pictures: await keepPictures({ ...base, random }, { createdBy, at: began }),
    records: new Map(),
  };
  const storyRandom = createRandom(STORY_SEED);
  const lives = allocateStories(drawFleet(storyRandom), storyRandom);
  await play(writeStory(lives, clock, storyRandom), world);
}

/** The people as they would be signed in; their accounts are not committed yet. */
async function loadPeople(
  accounts: ReadonlyMap<string, User>,
  transaction: Transaction,
): Promise<Map<DemoAccount, SessionUser>> {
  const views = await presentUsers([...accounts.values()], transaction);
  const people = new Map<DemoAccount, SessionUser>();
  for (const [account, { id, loadUnit, lengthUnit }] of accounts) {
    const view = views.find((user) => user.id === id);
    if (!view) throw new Error(`The account ${account} is missing.`);
    const { name, email, roles, siteIds, designations } = view;
    people.set(account as DemoAccount, {
      id,
      name,
      email,
      roles,
      siteIds,
      designations,
      loadUnit,
      lengthUnit,
    });
  }
  return people;
}

function sitePlaces({ locations, ...sites }: DemoPlaces, key: DemoSite): SitePlaces {
  const { id } = sites[key];
  const idsOf = (purpose: string): number[] =>
    locations.filter((place) => place.siteId === id && place.purpose === purpose).map((place) => place.id);
  const racks = idsOf('rack');
  const lookOver = idsOf('look_over')[0] ?? racks[0];
  if (lookOver === undefined) throw new Error('Each site has a rack.');
  return { id, racks, cages: idsOf('cage'), lookOver };
}

async function createEvaluators(transaction: Transaction, createdAt: Date): Promise<World['evaluators']> {
  const create = async (key: keyof typeof EVALUATORS): Promise<number> => {
    const { mayRepair, ...facts } = EVALUATORS[key];
    const evaluator = await Evaluator.create(
      { ...facts, mayRepair: [...mayRepair], createdAt },
      { transaction },
    );
    return evaluator.id;
  };
  return { fennel: await create('fennel'), tarn: await create('tarn') };
}
