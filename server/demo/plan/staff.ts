/** The accounts of the demo that act in its history. */
export type DemoAccount =
  'storekeeper' | 'storekeeper2' | 'inspector' | 'inspector2' | 'manager' | 'manager2';

export type DemoSite = 'slipStore' | 'bladeHall';

interface SiteStaff {
  keepers: readonly DemoAccount[];
  inspectors: readonly DemoAccount[];
  managers: readonly DemoAccount[];
}

/** Who works where (see people.ts). */
export const STAFF: Record<DemoSite, SiteStaff> = {
  slipStore: {
    keepers: ['storekeeper', 'storekeeper2'],
    inspectors: ['inspector', 'inspector2'],
    managers: ['manager', 'manager2'],
  },
  bladeHall: { keepers: ['storekeeper2'], inspectors: ['inspector2'], managers: ['manager2'] },
};
