import type { ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { toProblem } from '../../lib/problem';

export type NoticeTone = 'info' | 'warn' | 'error' | 'good';
const TONES: Record<NoticeTone, string> = {
  info: 'border-l-petrol bg-card',
  good: 'border-l-petrol bg-petrol-wash',
  warn: 'border-l-signal-yellow bg-warn-wash',
  error: 'border-l-danger bg-danger-wash',
};

export interface NoticeProps {
  tone?: NoticeTone;
  title?: string;
  children?: ReactNode;
  /** A button or link for the next step. */
  action?: ReactNode;
  className?: string;
}

/** A message in the page. Errors are announced at once, warnings when the reader pauses. */
export function Notice({ tone = 'info', title, children, action, className }: NoticeProps): ReactNode {
  return (
    <div
      role={tone === 'error' ? 'alert' : tone === 'info' ? undefined : 'status'}
      className={cx(
        'flex flex-wrap items-center justify-between gap-x-4 gap-y-2.5 rounded-r border border-l-[5px] border-y-rule border-r-rule px-4 py-3',
        TONES[tone],
        className,
      )}
    >
      <div className="min-w-0 flex-1 basis-56">
        {title && <p className="font-semibold">{title}</p>}
        {children && <div className="[&_ul]:mt-1 [&_ul]:list-disc [&_ul]:pl-5">{children}</div>}
      </div>
      {action && <div className="shrink-0">{action}</div>}
    </div>
  );
}

/** Whatever a call threw, in words: what happened, what is still asked for, what to do. Renders nothing for null. */
export function ProblemNotice({
  problem: thrown,
  action,
  className,
}: {
  problem: unknown;
  action?: ReactNode;
  className?: string;
}): ReactNode {
  if (thrown === null || thrown === undefined) return null;
  const problem = toProblem(thrown);
  // One refusal is often the sentence itself: nothing is said twice.
  const lines = [...problem.unmet, ...problem.errors]
    .map(({ message }) => message)
    .filter((message) => !problem.detail.includes(message));
  const wait = problem.retryAfterSeconds;
  return (
    <Notice tone="error" title={problem.title} action={action} {...(className ? { className } : {})}>
      {problem.detail && problem.detail !== problem.title && <p>{problem.detail}</p>}
      {wait !== undefined && (
        <p>Try again in {wait < 90 ? `${wait} seconds` : `${Math.ceil(wait / 60)} minutes`}.</p>
      )}
      {lines.length > 0 && (
        <ul>
          {lines.map((line, i) => (
            <li key={`${i}-${line}`}>{line}</li>
          ))}
        </ul>
      )}
    </Notice>
  );
}
