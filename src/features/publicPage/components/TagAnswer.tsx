import type { ReactNode } from 'react';
import type { PublicTag } from '../../../../shared/schemas/publicPage';
import { ScanAnswer } from '../../../components/sling/ScanAnswer';
import { toProblem } from '../../../lib/problem';

/** USE or DO NOT USE. Without an answer from the store it is DO NOT USE: nobody knows better. */
export function TagAnswer({
  tag,
  error,
  onRetry,
}: {
  tag: PublicTag | undefined;
  error: unknown;
  onRetry: () => void;
}): ReactNode {
  if (tag) {
    return (
      <ScanAnswer
        mayUse={tag.verdict === 'use'}
        title={tag.number ? `Sling ${tag.number}` : tag.message}
        lines={tag.number ? [tag.message] : []}
      />
    );
  }
  const { status, retryAfterSeconds } = toProblem(error);
  const wait = retryAfterSeconds === undefined ? 'a little' : `${retryAfterSeconds} seconds`;
  return (
    <ScanAnswer
      mayUse={false}
      title={status === 429 ? 'Too many labels looked up in a short time' : 'The store could not be asked'}
      lines={[
        status === 429
          ? `Try again in ${wait}. Until it is known, don’t use it.`
          : 'Until it is known, don’t use it.',
      ]}
      action={
        <button
          type="button"
          onClick={onRetry}
          className="min-h-14 rounded border-2 border-white px-6 text-lg font-bold hover:bg-white/15"
        >
          Try again
        </button>
      }
    />
  );
}
