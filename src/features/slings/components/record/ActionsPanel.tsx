import type { ReactNode } from 'react';
import type { Sling } from '../../../../../shared/schemas/slings';
import { LinkButton } from '../../../../components/ui/Button';
import { Panel } from '../../../../components/ui/Panel';
import { paths } from '../../../../config/paths';
import { useUser } from '../../../../lib/session';
import { findLikelyStep } from '../../record/likelyStep';
import { listActions, type ActionLine } from '../../record/listActions';

/** What can be done with the sling now, and what is missing for the rest. Destroy comes last and alone, far from hold. */
export function ActionsPanel({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const offered = findLikelyStep(sling, user)?.to;
  const { open: all, elsewhere, closed } = listActions(sling);
  const here = all.filter(({ action }) => paths.act(sling.id, action) !== offered);
  const open = here.filter(({ action }) => action !== 'destroy');
  if (all.length + elsewhere.length + closed.length === 0) return null;
  return (
    <Panel title="What can be done">
      {open.length > 0 ? (
        <div className="no-print flex flex-wrap gap-3 pb-3">
          {open.map(({ action, name }) => (
            <LinkButton
              key={action}
              to={paths.act(sling.id, action)}
              tone="quiet"
              className="max-sm:flex-1 max-sm:basis-40"
            >
              {name}
            </LinkButton>
          ))}
        </div>
      ) : (
        <p className="pb-3">
          {all.length > 0 ? 'What is open to you stands above.' : 'Nothing else is open to you now.'}
        </p>
      )}
      {closed.length > 0 && (
        <>
          <h3 className="border-t border-rule pt-2.5 font-semibold">Not open, and why</h3>
          <ClosedActions lines={closed} />
        </>
      )}
      {elsewhere.length > 0 && <ClosedActions lines={elsewhere.map(explainElsewhere)} />}
      {here.length > open.length && (
        <p className="no-print border-t border-rule pt-3">
          <LinkButton to={paths.act(sling.id, 'destroy')} tone="danger">
            Record its destruction
          </LinkButton>
        </p>
      )}
    </Panel>
  );
}

function ClosedActions({ lines }: { lines: readonly ActionLine[] }): ReactNode {
  return (
    <dl>
      {lines.map(({ action, name, reasons }) => (
        <div
          key={action}
          className="grid gap-x-4 border-b border-rule py-2 last:border-b-0 sm:grid-cols-[11rem_1fr]"
        >
          <dt className="font-medium">{name}</dt>
          <dd className="text-muted">
            {reasons.map((reason) => (
              <span key={reason} className="block">
                {reason}
              </span>
            ))}
          </dd>
        </div>
      ))}
    </dl>
  );
}

function explainElsewhere(line: ActionLine): ActionLine {
  return line.action === 'withdraw_as_error'
    ? {
        ...line,
        reasons: ['Asks for a complete new inspection by a second designated inspector, photos and a note.'],
      }
    : { ...line, reasons: ['Done on the shipment that takes the sling out.'] };
}
