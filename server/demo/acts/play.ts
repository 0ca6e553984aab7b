import { getPerson, type Act, type World } from './world';

/** Does each act as its person, at its moment, through the commands that real acts go through. */
export async function play(acts: readonly Act[], world: World): Promise<void> {
  const { sequelize, files, publicUrl, transaction } = world;
  for (const act of acts) {
    const user = getPerson(world, act.by);
    const now = (): Date => act.at;
    await act.run({ sequelize, files, publicUrl, transaction, user, at: act.at, now }, world);
  }
}
