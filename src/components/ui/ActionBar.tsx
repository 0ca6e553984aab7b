import type { ReactNode } from 'react';
import { cx } from '../../lib/cx';

/** The page's main action at the thumb: above the bottom bar on a phone, in the flow on wide screens. */
export function ActionBar({ children }: { children: ReactNode }): ReactNode {
  return (
    <div
      className={cx(
        'no-print sticky bottom-24 z-20 -mx-4 mt-6 flex flex-wrap gap-3 border-t border-rule bg-paper px-4 py-3 *:flex-1 sm:-mx-6 sm:px-6 lg:static lg:mx-0 lg:border-t-0 lg:bg-transparent lg:px-0 lg:*:flex-none',
        // Nothing of the page shows between it and the bottom bar
        'after:absolute after:inset-x-0 after:top-full after:h-24 after:bg-paper lg:after:hidden',
      )}
    >
      {children}
    </div>
  );
}
