import type { LocationPurpose } from '../../../shared/domain/lifecycle/states';

export const PURPOSE_NAMES = {
  rack: { name: 'Rack', hint: 'Where slings in service hang' },
  cage: { name: 'Cage', hint: 'Locked: what is held waits here' },
  counter: { name: 'Counter', hint: 'Where slings are handed out' },
  look_over: { name: 'Look-over rack', hint: 'What came back waits for an inspector' },
  goods_in: { name: 'Goods-in', hint: 'What arrived and isn’t accepted yet' },
} as const satisfies Record<LocationPurpose, { name: string; hint: string }>;
