import { useId, useState, type ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import type { Sling } from '../../../../../shared/schemas/slings';
import { Button } from '../../../../components/ui/Button';
import { Dialog } from '../../../../components/ui/Dialog';
import { Panel } from '../../../../components/ui/Panel';
import { useUser } from '../../../../lib/session';
import { useCorrectSling } from '../../api/correctSling';
import { CorrectionForm } from './CorrectionForm';

/** Identity and rating change only by an inspector's correction with a reason and evidence. */
export function CorrectionPanel({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const id = useId();
  const [isOpen, setIsOpen] = useState(false);
  const correct = useCorrectSling(sling);
  if (!mayCall('POST /api/slings/:id/corrections', user.roles)) return null;
  const close = (): void => setIsOpen(false);
  return (
    <Panel title="Is the record wrong?" className="no-print">
      <p className="mb-3 text-muted">
        Number, maker, serial, maker’s tag, reach, rated loads, service class and site change only by a
        correction, with a reason and evidence.
      </p>
      <Button tone="quiet" onClick={() => setIsOpen(true)}>
        Correct the record
      </Button>
      <Dialog
        open={isOpen}
        onClose={close}
        title={`Correct the record of ${sling.number}`}
        footer={
          <>
            <Button tone="quiet" onClick={close}>
              Not now
            </Button>
            <Button type="submit" form={id} pending={correct.isPending} pendingText="Correcting">
              Correct it
            </Button>
          </>
        }
      >
        <CorrectionForm id={id} sling={sling} correct={correct} onDone={close} />
      </Dialog>
    </Panel>
  );
}
