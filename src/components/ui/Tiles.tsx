import { useId, type ComponentProps, type ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { FieldError } from './Field';

export interface TileOption {
  value: string;
  label: string;
  hint?: string;
  /** A small drawing, about 48 px, in currentColor. */
  drawing?: ReactNode;
  disabled?: boolean;
}

interface TilesProps {
  legend: string;
  hint?: ReactNode;
  error?: string | undefined;
  options: readonly TileOption[];
  /** Spread onto every input: `register('reasons')`, or `{ name, onChange }`. */
  input: Omit<ComponentProps<'input'>, 'type' | 'className' | 'value' | 'id'>;
  /** For a controlled group: which values are on. */
  selected?: readonly string[];
  columns?: 1 | 2 | 3;
  hideLegend?: boolean;
}

/** One of several, as large tiles. */
export function RadioTiles(props: TilesProps): ReactNode {
  return <Tiles {...props} type="radio" />;
}

/** Any of several, as large tiles. */
export function ChoiceTiles(props: TilesProps): ReactNode {
  return <Tiles {...props} type="checkbox" />;
}

const COLUMNS = {
  1: 'grid-cols-1',
  2: 'grid-cols-1 min-[360px]:grid-cols-2',
  3: 'grid-cols-2 md:grid-cols-3',
} as const;

function Tiles({
  legend,
  hint,
  error,
  options,
  input,
  selected,
  columns = 2,
  hideLegend,
  type,
}: TilesProps & { type: 'radio' | 'checkbox' }): ReactNode {
  const id = useId();
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <fieldset aria-describedby={describedBy || undefined} className="min-w-0">
      <legend className={cx('mb-1.5 font-semibold', hideLegend && 'sr-only')}>{legend}</legend>
      {hint && (
        <p id={`${id}-hint`} className="-mt-1 mb-2 text-[0.9375rem] text-muted">
          {hint}
        </p>
      )}
      <div className={cx('grid gap-2.5', COLUMNS[columns])}>
        {options.map((option) => (
          <Tile
            key={option.value}
            option={option}
            input={{
              ...input,
              type,
              value: option.value,
              ...(selected ? { checked: selected.includes(option.value) } : {}),
            }}
          />
        ))}
      </div>
      <FieldError id={`${id}-error`} message={error} />
    </fieldset>
  );
}

function Tile({ option, input }: { option: TileOption; input: ComponentProps<'input'> }): ReactNode {
  return (
    <label
      className={cx(
        'relative flex min-h-16 cursor-pointer flex-col justify-center gap-2 rounded border border-edge bg-card py-3 pr-11 pl-3.5 leading-tight',
        'has-checked:border-petrol has-checked:bg-petrol-wash has-checked:ring-2 has-checked:ring-petrol has-checked:ring-inset',
        'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-petrol',
        option.disabled && 'cursor-not-allowed opacity-60',
      )}
    >
      {option.drawing && (
        <span className="block size-12 [&>svg]:size-full" aria-hidden="true">
          {option.drawing}
        </span>
      )}
      <span className={cx('min-w-0', Boolean(option.drawing) && '-mr-7')}>
        <span className="font-semibold">{option.label}</span>
        {option.hint && <span className="mt-0.5 block text-[0.9375rem] text-muted">{option.hint}</span>}
      </span>
      <input
        {...input}
        disabled={option.disabled}
        className={cx(
          'absolute right-3 size-5.5 accent-petrol outline-none',
          option.drawing ? 'top-3' : 'top-1/2 -translate-y-1/2',
        )}
      />
    </label>
  );
}
