import type { ReactNode } from 'react';
import { ACTION_FACTS, type SlingAction } from '../../../../shared/domain/lifecycle/actions';
import { STATE_FACTS } from '../../../../shared/domain/lifecycle/states';
import type { Sling } from '../../../../shared/schemas/slings';
import { LinkButton } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { paths } from '../../../config/paths';
import { findNextStep } from '../unmetSteps';

type Unmet = Sling['allowedActions'][number]['unmet'];

/** Why the act isn't open to this person on this sling, and for each cause the way to put it right. */
export function NotOpen({
  sling,
  action,
  unmet,
}: {
  sling: Sling;
  action: SlingAction;
  unmet: Unmet;
}): ReactNode {
  const isStateWrong = unmet.some(({ rule }) => rule === 'state');
  const others = sling.allowedActions.filter((answer) => answer.open && answer.action !== action);
  return (
    <>
      {isStateWrong ? (
        <WrongState sling={sling} action={action} />
      ) : (
        <Panel title="Not open yet: what is missing" card>
          <ul className="divide-y divide-rule">
            {unmet.map(({ rule, message }) => {
              const step = findNextStep(rule, sling.id);
              return (
                <li
                  key={rule + message}
                  className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-3 first:pt-0 last:pb-0"
                >
                  <p className="flex min-w-0 flex-1 basis-60 items-start gap-2.5 font-medium">
                    <MissingMark />
                    {message}
                  </p>
                  {step && (
                    <LinkButton to={step.to} tone="quiet">
                      {step.label}
                    </LinkButton>
                  )}
                </li>
              );
            })}
          </ul>
        </Panel>
      )}
      {others.length > 0 && (
        <Panel title="Open to you on this sling" className="mt-6">
          <ul className="flex flex-wrap gap-3">
            {others.map(({ action: other }) => (
              <li key={other}>
                <LinkButton
                  tone="quiet"
                  to={other === 'hold' ? paths.hold(sling.id) : paths.act(sling.id, other)}
                >
                  {ACTION_FACTS[other].name}
                </LinkButton>
              </li>
            ))}
          </ul>
        </Panel>
      )}
    </>
  );
}

/** The table has no such act from here, whoever asks. */
function WrongState({
  sling: { state, condemned },
  action,
}: {
  sling: Sling;
  action: SlingAction;
}): ReactNode {
  const { word, meaning, isTerminal } = STATE_FACTS[state];
  const now = state === 'held' && condemned ? 'condemned' : word.toLowerCase();
  return (
    <Notice tone="warn" title={`Not possible: it is ${now}`}>
      <p>{meaning}</p>
      {action === 'hold' && isTerminal && (
        <p>If you have it in your hands all the same, keep it aside and tell a manager.</p>
      )}
    </Notice>
  );
}

function MissingMark(): ReactNode {
  return (
    <svg viewBox="0 0 20 20" className="mt-0.5 size-5 shrink-0 text-danger" aria-hidden="true">
      <circle cx="10" cy="10" r="8" fill="none" stroke="currentColor" strokeWidth="2.4" />
      <path d="M6.500 10h7" stroke="currentColor" strokeWidth="2.400" />
    </svg>
  );
}
