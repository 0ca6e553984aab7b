import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { showSafely, type Refusal } from '../reading';

/** A code was read that is none of ours, or one of ours with a wrong character. */
export function RefusalNotice({
  refusal,
  onDismiss,
}: {
  refusal: Refusal;
  onDismiss: () => void;
}): ReactNode {
  const isForeign = refusal.kind === 'foreign';
  return (
    <Notice
      tone="error"
      title={isForeign ? 'This is not one of the store’s labels' : 'A character of this code is wrong'}
      action={
        <Button tone="quiet" onClick={onDismiss}>
          Dismiss
        </Button>
      }
    >
      <p>
        It says: <code className="font-mono break-all">{showSafely(refusal.text)}</code>
      </p>
      <p>
        {isForeign
          ? 'Look for the label with a code like XXXX-XXX-XXX. A sling without one goes by its serial or number: find it in the register and print a label.'
          : 'Compare it with the label character by character and type it again. If the label itself is wrong, don’t use the sling; print it a new label.'}
      </p>
    </Notice>
  );
}
