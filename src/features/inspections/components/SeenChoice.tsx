import type { ReactNode } from 'react';
import { cx } from '../../../lib/cx';
import type { RowDraft } from '../inspectionDraft';

const CHOICES = [
  {
    value: 'clean',
    label: 'Not seen',
    on: 'has-checked:border-petrol has-checked:bg-petrol-wash has-checked:ring-petrol',
  },
  {
    value: 'seen',
    label: 'Seen',
    on: 'has-checked:border-danger has-checked:bg-danger-wash has-checked:ring-danger',
  },
] as const;

/** The answer to one question, as two targets for a gloved thumb. */
export function SeenChoice({
  name,
  choice,
  onChoose,
}: {
  name: string;
  choice: RowDraft['choice'] | undefined;
  onChoose: (choice: RowDraft['choice']) => void;
}): ReactNode {
  return (
    <div className="grid grid-cols-2 gap-2.5">
      {CHOICES.map(({ value, label, on }) => (
        <label
          key={value}
          className={cx(
            'flex min-h-14 cursor-pointer items-center gap-3 rounded border border-edge bg-card px-3.5 font-semibold',
            'has-checked:ring-2 has-checked:ring-inset',
            'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-petrol',
            on,
          )}
        >
          <input
            type="radio"
            name={name}
            value={value}
            checked={choice === value}
            onChange={() => onChoose(value)}
            className={cx(
              'size-5 shrink-0 outline-none',
              value === 'seen' ? 'accent-danger' : 'accent-petrol',
            )}
          />
          {label}
        </label>
      ))}
    </div>
  );
}
