import type { Sequelize } from 'sequelize';
import type { WriteContext } from '../context';
import type { FileStore } from '../files/fileStore';
import { defineModels } from '../models';
import { User } from '../models/User';
import { createPeople, createPlaces, DEMO_DOMAIN, DEMO_PASSWORD, DEMO_PEOPLE } from './people';

export interface DemoOptions {
  sequelize: Sequelize;
  files: FileStore;
  publicUrl: string;
  say: (line: string) => void;
}

const YEAR_MS = 365 * 86_400_000;

/** Loads the demo when there is no account yet, and says how to sign in. */
export async function loadDemo({ sequelize, files, publicUrl, say }: DemoOptions): Promise<void> {
  defineModels(sequelize);
  if ((await User.count()) === 0) {
    const now = new Date();
    const began = new Date(now.getTime() - 2 * YEAR_MS);
    await sequelize.transaction(async (transaction) => {
      const context: WriteContext = {
        sequelize,
        files,
        publicUrl,
        now: () => began,
        user: null,
        at: began,
        transaction,
      };
      const places = await createPlaces(context);
      await createPeople(context, places, new Date(now.getTime() + YEAR_MS).toISOString().slice(0, 10));
    });
  }
  if ((await User.count({ where: { email: `storekeeper@${DEMO_DOMAIN}` } })) === 0) return;
  say(`demo accounts (password ${DEMO_PASSWORD}):`);
  for (const { account, roles } of DEMO_PEOPLE) say(`  ${account}@${DEMO_DOMAIN} — ${roles.join(', ')}`);
}
