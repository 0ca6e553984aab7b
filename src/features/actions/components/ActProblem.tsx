import { useEffect, useRef, useState, type ReactNode } from 'react';
import { EVENT_NAMES, type LedgerEventType } from '../../../../shared/domain/lifecycle/events';
import { Button } from '../../../components/ui/Button';
import { Notice, ProblemNotice } from '../../../components/ui/Notice';
import { formatShortTime } from '../../../lib/format';
import { toProblem, type ApiProblem } from '../../../lib/problem';

export interface ActProblemProps {
  problem: unknown;
  /** Loads the sling as it is now; what was typed is kept by the form. */
  onReload: () => Promise<unknown>;
  /** Takes the message away once the sling is up to date. */
  onDismiss: () => void;
}

/** Why an act was refused. Where somebody else was faster: what they did, and the way to go on. */
export function ActProblem({ problem, ...rest }: ActProblemProps): ReactNode {
  const ref = useRef<HTMLDivElement>(null);
  const hasProblem = problem !== null && problem !== undefined;
  useEffect(() => {
    // On a phone the bar with the button would hide it
    if (hasProblem) void ref.current?.scrollIntoView({ block: 'center' });
  }, [hasProblem, problem]);
  if (!hasProblem) return null;
  return (
    <div ref={ref}>
      <Refusal problem={problem} {...rest} />
    </div>
  );
}

function Refusal({ problem: thrown, onReload, onDismiss }: ActProblemProps): ReactNode {
  const [isLoading, setIsLoading] = useState(false);
  const problem = toProblem(thrown);
  if (problem.status !== 409 && problem.status !== 412) return <ProblemNotice problem={problem} />;

  async function reload(): Promise<void> {
    setIsLoading(true);
    try {
      await onReload();
      onDismiss();
    } finally {
      setIsLoading(false);
    }
  }

  return (
    <Notice
      tone="error"
      title={problem.status === 412 ? 'Somebody changed this sling before you' : problem.title}
      action={
        <Button tone="quiet" pending={isLoading} pendingText="Loading" onClick={() => void reload()}>
          Show it as it is now
        </Button>
      }
    >
      <Changes problem={problem} />
      <p>Nothing was recorded, and what you typed is kept. Look at the sling as it is now, then decide.</p>
    </Notice>
  );
}

function Changes({ problem }: { problem: ApiProblem }): ReactNode {
  if (problem.changes.length === 0) return problem.status === 409 && <p>{problem.detail}</p>;
  return (
    <ul>
      {problem.changes.map((change) => (
        <li key={change.seq}>
          {nameEvent(change.type)} by {change.by}, {formatShortTime(change.at)}
        </li>
      ))}
    </ul>
  );
}

function nameEvent(type: string): string {
  return type in EVENT_NAMES ? EVENT_NAMES[type as LedgerEventType] : 'Changed';
}
