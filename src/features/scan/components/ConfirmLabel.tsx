import { useState, type FormEvent, type ReactNode } from 'react';
import { confirmTagRequest, type ScanResponse } from '../../../../shared/schemas/labels';
import { mayCall } from '../../../../shared/domain/access/routes';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { showToast } from '../../../components/ui/Toast';
import { useUser } from '../../../lib/session';
import { useConfirmTag } from '../api/confirmTag';
import type { ReadWay } from '../reading';

/** Labels on the wrong twin are the commonest mix-up: the sling's own characters prove that this one hangs right. */
export function ConfirmLabel({ found, via }: { found: ScanResponse; via: ReadWay }): ReactNode {
  const { roles } = useUser();
  if (!mayCall('POST /api/tags/:code/confirm', roles)) {
    return (
      <Notice tone="info" title="Waiting to be confirmed">
        A storekeeper, inspector or manager confirms it on the sling. Until then the sling isn’t used.
      </Notice>
    );
  }
  if (via === 'typed') {
    return (
      <Notice tone="info" title="Scan the label to confirm it">
        A typed code doesn’t confirm a label: it could hang anywhere. Stick it on the sling, then read it
        there with the camera, a photo or a handheld scanner.
      </Notice>
    );
  }
  return <ConfirmForm found={found} via={via} />;
}

function ConfirmForm({ found, via }: { found: ScanResponse; via: Exclude<ReadWay, 'typed'> }): ReactNode {
  const { sling, tag } = found;
  const [lastFour, setLastFour] = useState('');
  const [fault, setFault] = useState<string>();
  const confirm = useConfirmTag(tag.code);
  const what = sling.makerSerial ? 'the maker’s serial' : 'the sling’s number';

  const handleSubmit = (event: FormEvent): void => {
    event.preventDefault();
    const parsed = confirmTagRequest.safeParse({ via, lastFour });
    if (!parsed.success) {
      setFault(parsed.error.issues[0]?.message);
      return;
    }
    confirm.mutate(parsed.data, {
      onSuccess: ({ sling: confirmed }) => showToast(`Label confirmed on ${confirmed.number}`),
    });
  };

  return (
    <Panel card title="Confirm it on the sling">
      <form onSubmit={handleSubmit} noValidate className="flex flex-col gap-4">
        <p>
          With the label on the sling, read {what} off the sling itself{' '}
          {sling.makerSerial ? '(stamped, or on the maker’s tag)' : '(painted, stamped, or on its own tag)'},
          not off the label or a list.
        </p>
        <TextField
          label={`Last four characters of ${what}`}
          mono
          value={lastFour}
          maxLength={8}
          error={fault}
          autoCapitalize="characters"
          spellCheck={false}
          enterKeyHint="done"
          onChange={(event) => {
            setLastFour(event.target.value);
            setFault(undefined);
          }}
        />
        <ProblemNotice problem={confirm.error} />
        <Button type="submit" pending={confirm.isPending} pendingText="Confirming">
          Confirm the label
        </Button>
      </form>
    </Panel>
  );
}
