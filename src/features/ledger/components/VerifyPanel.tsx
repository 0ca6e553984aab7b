import type { ReactNode } from 'react';
import { mayCall } from '../../../../shared/domain/access/routes';
import { Button } from '../../../components/ui/Button';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { formatCount } from '../../../lib/format';
import { useUser } from '../../../lib/session';
import { useVerifyLedger } from '../api/verifyLedger';

/** Computes the chain anew on demand and says whether every row still fits the one before. */
export function VerifyPanel({ slingId }: { slingId: number }): ReactNode {
  const user = useUser();
  const verify = useVerifyLedger(slingId);
  if (!mayCall('GET /api/ledger/verify', user.roles)) return null;
  const result = verify.data;
  return (
    <div className="no-print mb-4 flex flex-col gap-3">
      <Button
        tone="quiet"
        className="self-start"
        pending={verify.isPending}
        pendingText="Verifying"
        onClick={() => verify.mutate()}
      >
        Verify this chain
      </Button>
      {result?.ok && (
        <Notice tone="good" title="The chain holds">
          {formatCount(result.rows, 'row')} computed anew: each fits the one before and the head on the
          record.
        </Notice>
      )}
      {result && !result.ok && (
        <Notice tone="error" title="The chain does not hold">
          {result.firstBad
            ? `First at row ${result.firstBad.slingSeq}: ${result.firstBad.message}`
            : 'A row was changed or is missing.'}{' '}
          Tell the administrator, and keep the last audit pack.
        </Notice>
      )}
      <ProblemNotice problem={verify.error} />
    </div>
  );
}
