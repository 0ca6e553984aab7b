import type { ReactNode } from 'react';

/** The page's main action at the thumb: above the bottom bar on a phone, in the flow on wide screens. */
export function ActionBar({ children }: { children: ReactNode }): ReactNode {
  return (
    <div className="no-print sticky bottom-24 z-20 -mx-4 mt-6 flex flex-wrap gap-3 border-t border-rule bg-paper/95 px-4 py-3 *:flex-1 sm:-mx-6 sm:px-6 lg:static lg:mx-0 lg:border-t-0 lg:bg-transparent lg:px-0 lg:*:flex-none">
      {children}
    </div>
  );
}
