import type { ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { formatTagCode } from '../../lib/format';

/** A tag code in its groups, mono, never broken over a line. */
export function TagCode({ code, className }: { code: string; className?: string }): ReactNode {
  return (
    <code className={cx('font-mono tracking-wider whitespace-nowrap', className)} translate="no">
      {formatTagCode(code)}
    </code>
  );
}
