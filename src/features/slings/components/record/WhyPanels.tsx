import type { ReactNode } from 'react';
import { REASON_FACTS } from '../../../../../shared/domain/lifecycle/reasons';
import type { OpenReasonView, Sling } from '../../../../../shared/schemas/slings';
import { ReasonDrawing } from '../../../../components/sling/ReasonDrawing';
import { LinkButton } from '../../../../components/ui/Button';
import { Panel } from '../../../../components/ui/Panel';
import { paths } from '../../../../config/paths';
import { formatDateTime } from '../../../../lib/format';
import { isOpen } from '../../record/likelyStep';

/** Each thing that makes the answer DO NOT USE, so that nobody has to guess which one. */
export function MayNotUsePanel({ sling }: { sling: Sling }): ReactNode {
  if (sling.mayUse || sling.mayNotUse.length === 0) return null;
  return (
    <Panel title="Why it may not be used">
      <ul className="list-disc pl-5">
        {sling.mayNotUse.map(({ rule, message }) => (
          <li key={rule} className="py-0.5">
            {message}
          </li>
        ))}
      </ul>
    </Panel>
  );
}

/** Open reasons of the hold, each with what clears it. */
export function ReasonsPanel({ sling, timeZone }: { sling: Sling; timeZone: string | undefined }): ReactNode {
  const mayAdd = sling.state === 'held' && isOpen(sling, 'hold');
  if (sling.openReasons.length === 0 && !mayAdd) return null;
  return (
    <Panel title={sling.openReasons.length === 1 ? 'Open reason' : 'Open reasons'}>
      {sling.openReasons.length === 0 && <p className="text-muted">No reason is open.</p>}
      <ul className="flex flex-col">
        {sling.openReasons.map((reason) => (
          <ReasonLine key={reason.id} reason={reason} timeZone={timeZone} />
        ))}
      </ul>
      {mayAdd && (
        <LinkButton to={paths.hold(sling.id)} tone="quiet" className="no-print">
          Add a reason to the hold
        </LinkButton>
      )}
    </Panel>
  );
}

function ReasonLine({
  reason,
  timeZone,
}: {
  reason: OpenReasonView;
  timeZone: string | undefined;
}): ReactNode {
  return (
    <li className="flex gap-3 border-t border-rule py-3 first:border-t-0 first:pt-0">
      <span className="size-11 shrink-0 [&>svg]:size-full" aria-hidden="true">
        <ReasonDrawing code={reason.code} />
      </span>
      <div className="min-w-0 flex-1">
        <p className="font-semibold">
          {REASON_FACTS[reason.code].name}
          {reason.confirmed && <span className="text-danger">, confirmed</span>}
        </p>
        {reason.note && <p className="break-words">{reason.note}</p>}
        <p className="text-[0.9375rem] text-muted">
          {reason.placedBy?.name ?? 'Placed by the system'}, {formatDateTime(reason.placedAt, timeZone)}
        </p>
        <p className="mt-1 border-l-4 border-petrol pl-3">
          <span className="font-medium">
            {reason.clearing.isClearable ? 'What clears it: ' : 'Not cleared here: '}
          </span>
          {reason.clearing.how}
        </p>
      </div>
    </li>
  );
}
