import { useState, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { formatCount } from '../../../lib/format';

/** Says that an examination goes on where it was left, and offers to begin again. */
export function DraftNotice({ answered, onRestart }: { answered: number; onRestart: () => void }): ReactNode {
  const [answeredThen] = useState(answered);
  return (
    <Notice
      tone="info"
      title="You go on where you left off"
      action={
        <Button tone="quiet" onClick={onRestart}>
          Begin again
        </Button>
      }
    >
      {formatCount(answeredThen, 'answer')} from before {answeredThen === 1 ? 'was' : 'were'} kept on this
      device.
    </Notice>
  );
}
